import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { arcMm, distributorDegFromCrank, msFromCrankDeg, staggerDeg, staggerReport, type Channel } from '@/lib/calc'
import { deepFreeze } from '@/tests/support/deep-freeze'
import { expectCalcError } from '@/tests/support/expect-calc-error'
import { expectClose } from '@/tests/support/expect-close'
import { fixed, formula, mapSchedule, mechanicalSchedule, retard, table } from './channels'

const range = { crankingRpm: 150, idleRpm: 750, maxRpm: 2780 }

describe('staggerReport', () => {
  it('gives each stagger as an angle, a time and an arc on the plate', () => {
    const { atCranking, atIdle, atMax } = staggerReport(fixed(26, { crankRetard: retard }), fixed(16.5), { ...range, plateRadiusMm: 31 })
    expect(atCranking).toMatchObject({ rpm: 150, staggerDeg: -1.5, staggerDistributorDeg: -0.75 })
    expect(atIdle).toMatchObject({ rpm: 750, staggerDeg: 9.5 })
    expectClose(atMax.staggerMs, 9.5 / 16.68, { rel: 1e-12 })
    expectClose(atMax.plateArcMm, Math.PI * 62 * 4.75 / 360, { rel: 1e-12 })
    expectClose(atCranking.staggerMs, -1.5 / 0.9, { rel: 1e-12 })
  })

  it('without a plate there is no arc', () => {
    expect(staggerReport(fixed(26), fixed(16.5), range).smallest.plateArcMm).toBeNull()
  })

  it('finds extremes at breakpoints and says when the backup is first', () => {
    const primary = table([[800, 10], [1500, 26], [2400, 18]])
    const report = staggerReport(primary, fixed(16.5), range)
    expect(report.smallest).toMatchObject({ rpm: 150, staggerDeg: -6.5 })
    expect(report.largest).toMatchObject({ rpm: 1500, staggerDeg: 9.5 })
    expect(report.backupEverFirst).toBe(true)
    expect(staggerReport(fixed(20), fixed(20), range).backupEverFirst).toBe(false)
    expect(staggerReport(fixed(20), fixed(20), range).smallest.rpm).toBe(150)
  })

  it('looks at both sides of each step, and stands at the lowest such speed', () => {
    const retarded = fixed(26, { crankRetard: { belowRpm: 900, byDeg: 11 } })
    const up = staggerReport(retarded, fixed(16.5), range)
    expect([up.smallest.rpm, up.smallest.staggerDeg, up.largest.rpm, up.largest.staggerDeg]).toEqual([150, -1.5, 900, 9.5])
    // Backup retarded up to 900 rpm while the primary climbs: the widest stagger stands just below the backup's step.
    const report = staggerReport(table([[200, 16], [2000, 34]]), fixed(16, { crankRetard: { belowRpm: 900, byDeg: 11 } }), { ...range, maxRpm: 1000 })
    expect(report.largest).toMatchObject({ rpm: 900, staggerDeg: 18 })
    expect(report.smallest.rpm).toBe(900)
    expectClose(report.smallest.staggerDeg, 7, { rel: 1e-12 })
  })

  it('both steps at one speed count together', () => {
    const step = { belowRpm: 500, byDeg: 8 }
    const report = staggerReport(fixed(26, { crankRetard: step }), fixed(16, { crankRetard: step }), range)
    expect(report.smallest.staggerDeg).toBe(10)
    expect(report.largest.staggerDeg).toBe(10)
  })

  it('a step at an end of the range: released at it, and its lower side only inside', () => {
    const atStart = staggerReport(fixed(26, { crankRetard: { belowRpm: 150, byDeg: 30 } }), fixed(16), range)
    expect(atStart.smallest.staggerDeg).toBe(10)
    const atEnd = staggerReport(table([[150, 10], [2780, 30]], { crankRetard: { belowRpm: 2780, byDeg: 5 } }), fixed(0), range)
    expect(atEnd.largest).toMatchObject({ rpm: 2780, staggerDeg: 30 })
    const before = staggerReport(fixed(0), fixed(-10, { crankRetard: { belowRpm: 2780, byDeg: 5 }, latencyUs: 10 }), range)
    expect(before.largest.rpm).toBe(2780)
    expectClose(before.largest.staggerDeg, 15 + 6e-5 * 2780, { rel: 1e-12 })
  })

  it('with falling speed the steps stand lower by their hysteresis', () => {
    const channel = fixed(26, { crankRetard: { belowRpm: 900, byDeg: 11, hysteresisRpm: 200 } })
    expect(staggerReport(channel, fixed(16), { ...range, trend: 'falling' }).largest.rpm).toBe(700)
    expect(staggerReport(channel, fixed(16), { ...range, trend: 'falling' }).atIdle.staggerDeg).toBe(10)
    expect(staggerReport(channel, fixed(16), range).atIdle.staggerDeg).toBe(-1)
  })

  it('a formula is sampled each 1 rpm from cranking', () => {
    const report = staggerReport(formula('30 - abs(rpm - 1437) / 100'), fixed(10), range)
    expect(report.largest).toMatchObject({ rpm: 1437, staggerDeg: 20 })
    expect(staggerReport(fixed(10), formula('rpm == 2779 ? 30 : 5'), range).smallest).toMatchObject({ rpm: 2779, staggerDeg: -20 })
  })

  it('rounding accuses nobody: equal shapes on different grids', () => {
    const report = staggerReport(table([[300, 0.1], [2700, 0.7]]), table([[300, 0.1], [900, 0.25], [1100, 0.3], [2700, 0.7]]), range)
    expect(report.backupEverFirst).toBe(false)
    expect(report.largest.rpm).toBe(150)
    expect(report.smallest.rpm).toBe(150)
  })

  it('bounds the stagger everywhere in between (brute force)', () => {
    const deg = fc.integer({ min: 0, max: 40 })
    const points = fc.array(fc.record({ step: fc.integer({ min: 1, max: 900 }), deg }), { minLength: 1, maxLength: 5 })
    const channel = fc.record({ points, below: fc.integer({ min: 1, max: 3000 }), byDeg: fc.integer({ min: 0, max: 15 }), latencyUs: fc.integer({ min: 0, max: 300 }) })
      .map(({ points: steps, below, byDeg, latencyUs }): Channel => {
        let rpm = 0
        return table(steps.map(({ step, deg: value }) => [rpm += step, value] as const), { crankRetard: { belowRpm: below, byDeg, hysteresisRpm: below / 3 }, latencyUs })
      })
    fc.assert(fc.property(channel, channel, fc.constantFrom('rising' as const, 'falling' as const), fc.double({ min: 150, max: 160, noNaN: true }), (primary, backup, trend, start) => {
      const { smallest, largest } = staggerReport(primary, backup, { ...range, trend })
      const at = (rpm: number) => staggerDeg(primary, backup, { rpm, trend })
      const between = Array.from({ length: 100 }, (_, i) => at(start + i * 26))
      expect(Math.min(...between)).toBeGreaterThanOrEqual(smallest.staggerDeg - 1e-9)
      expect(Math.max(...between)).toBeLessThanOrEqual(largest.staggerDeg + 1e-9)
      // Each extreme is attained at its speed, or just below it where that is the lower side of a step.
      for (const { rpm, staggerDeg: extreme } of [smallest, largest]) {
        expect(Math.min(Math.abs(at(rpm) - extreme), Math.abs(at(rpm - 1e-9) - extreme))).toBeLessThanOrEqual(1e-6)
      }
    }), { numRuns: 60 })
  })

  it('changes sign when the channels change places, and agrees with the single functions', () => {
    fc.assert(fc.property(fc.double({ min: 0, max: 40, noNaN: true }), fc.double({ min: 1, max: 200, noNaN: true }), (deg, plateRadiusMm) => {
      const a = { schedule: mechanicalSchedule, crankRetard: retard }
      const there = staggerReport(a, fixed(deg), { ...range, plateRadiusMm })
      const back = staggerReport(fixed(deg), a, { ...range, plateRadiusMm })
      expect(there.largest.staggerDeg).toBe(-back.smallest.staggerDeg + 0)
      expect(there.largest.rpm).toBe(back.smallest.rpm)
      for (const point of [there.atCranking, there.smallest, there.atMax]) {
        expectClose(point.staggerMs, msFromCrankDeg(point.staggerDeg, point.rpm), { rel: 1e-12, abs: 1e-300 })
        expectClose(point.staggerDistributorDeg, distributorDegFromCrank(point.staggerDeg), { rel: 1e-12, abs: 1e-300 })
        expectClose(point.plateArcMm, arcMm(2 * plateRadiusMm, point.staggerDistributorDeg), { rel: 1e-12, abs: 1e-300 })
      }
    }))
  })

  it('names what cannot be used', () => {
    const of = (change: object, primary: unknown = fixed(1), backup: unknown = fixed(1)) => () => staggerReport(primary as never, backup as never, { ...range, ...change } as never)
    for (const crankingRpm of [0, -1, undefined, Number.NaN]) expectCalcError(of({ crankingRpm }), 'crankingRpm')
    for (const idleRpm of [150, 100, undefined, '750']) expectCalcError(of({ idleRpm }), 'idleRpm')
    for (const maxRpm of [750, 1, null, Infinity]) expectCalcError(of({ maxRpm }), 'maxRpm')
    for (const plateRadiusMm of [0, -1, null, '30']) expectCalcError(of({ plateRadiusMm }), 'plateRadiusMm')
    expectCalcError(of({ trend: 1 }), 'trend')
    expectCalcError(of({}, { schedule: mapSchedule }), 'mapKpa')
    expectCalcError(of({ mapKpa: 0 }), 'mapKpa')
    expectCalcError(of({}, 5), 'primary')
    expectCalcError(of({}, fixed(1), { schedule: { kind: 'fixed' } }), 'backup.schedule.deg')
    expectCalcError(of({}, formula('1 / (rpm - 152)')), 'primary.schedule.expression')
    expectCalcError(of({ maxRpm: 1e15 }, fixed(1), formula('rpm')), 'maxRpm')
    expectCalcError(of({ crankingRpm: 1e-320 }, fixed(2)), 'crankingRpm')
    expectCalcError(() => staggerReport(fixed(1), fixed(1), undefined as never), 'crankingRpm')
    expect(() => staggerReport(deepFreeze({ schedule: mapSchedule, crankRetard: retard }), deepFreeze(fixed(1)), deepFreeze({ ...range, mapKpa: 60 }))).not.toThrow()
  })
})
