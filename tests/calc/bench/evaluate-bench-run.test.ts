import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { evaluateBenchRun, sparkAdvanceDeg, type BenchReading, type BenchRunInput } from '@/lib/calc'
import { fixed, formula, mapSchedule } from '@/tests/calc/advance/channels'
import { deepFreeze } from '@/tests/support/deep-freeze'
import { expectCalcError } from '@/tests/support/expect-calc-error'
import { expectClose } from '@/tests/support/expect-close'

const primary = fixed(25, { crankRetard: { belowRpm: 520, byDeg: 11, hysteresisRpm: 60 } })
const backup = fixed(16)
const run = (readings: readonly BenchReading[], change: Partial<BenchRunInput> = {}) =>
  evaluateBenchRun(deepFreeze({ plan: { primary, backup }, readings, toleranceDeg: 0.5, cylinders: 6, ...change }))
const read = (rpm: number, readDeg: number, rest: Partial<BenchReading> = {}): BenchReading => ({ rpm, channel: 'primary', readDeg, ...rest })

describe('evaluateBenchRun: rows', () => {
  it('stand in the order of the readings, each against its plan', () => {
    const { rows, pass } = run([read(1500, 25.7, { cylinder: 3 }), read(300, 13.2), read(1500, 16.25, { channel: 'backup', cylinder: 1 })])
    expect(rows).toEqual([
      { rpm: 1500, channel: 'primary', cylinder: 3, planDeg: 25, readDeg: 25.7, deviationDeg: 25.7 - 25, pass: false, reason: 'early' },
      { rpm: 300, channel: 'primary', cylinder: null, planDeg: 14, readDeg: 13.2, deviationDeg: 13.2 - 14, pass: false, reason: 'late' },
      { rpm: 1500, channel: 'backup', cylinder: 1, planDeg: 16, readDeg: 16.25, deviationDeg: 0.25, pass: true, reason: null },
    ])
    expect(pass).toBe(false)
  })

  it('on the tolerance a reading passes, to either side, rounding aside', () => {
    for (const readDeg of [25.5, 24.5, 25.5 + 9e-10, 24.5 - 9e-10]) expect(run([read(900, readDeg)])).toMatchObject({ pass: true, rows: [{ pass: true, reason: null }] })
    expect(run([read(900, 25.5 + 2e-9)]).rows[0]?.reason).toBe('early')
    expect(run([read(900, 24.5 - 2e-9)]).rows[0]?.reason).toBe('late')
    expect(run([read(900, 25)], { toleranceDeg: 0 }).pass).toBe(true)
  })

  it('the plan follows trend and pressure of the reading', () => {
    const plan = { primary, backup: { schedule: mapSchedule } }
    const { rows } = run([read(490, 25, { trend: 'falling' }), read(490, 14, { trend: 'rising' }), read(490, 14), read(1500, 26, { channel: 'backup', mapKpa: 70 })], { plan })
    expect(rows.map(({ planDeg }) => planDeg)).toEqual([25, 14, 14, 26])
  })

  it('agrees with sparkAdvanceDeg for any channel', () => {
    fc.assert(fc.property(fc.double({ min: 0, max: 4000, noNaN: true }), fc.double({ min: -10, max: 50, noNaN: true }), fc.constantFrom('rising' as const, 'falling' as const), (rpm, readDeg, trend) => {
      const channel = formula('min(30, 8 + rpm / 100)', { crankRetard: { belowRpm: 700, byDeg: 6, hysteresisRpm: 100 }, latencyUs: 30 })
      const row = run([read(rpm, readDeg, { trend })], { plan: { primary: channel, backup } }).rows[0]
      expect(row?.planDeg).toBe(sparkAdvanceDeg(channel, { rpm, trend }))
      expectClose(row?.deviationDeg, readDeg - (row?.planDeg ?? 0), { abs: 1e-12 })
    }))
  })
})

describe('evaluateBenchRun: stagger', () => {
  it('is the difference of the channel means at equal nominal speeds, speeds ascending', () => {
    const { stagger } = run([
      read(2000, 25.2), read(2000, 16.4, { channel: 'backup' }),
      read(900, 25.4, { cylinder: 1 }), read(900, 24.8, { cylinder: 2 }), read(900, 15.6, { channel: 'backup', cylinder: 4 }),
      read(1200, 25), read(300, 16, { channel: 'backup' }), read(300, 14.2),
    ])
    expect(stagger.map(({ rpm }) => rpm)).toEqual([300, 900, 2000])
    const [low, middle, high] = stagger
    for (const [point, staggerDeg, planDeg] of [[low, -1.8, -2], [middle, 25.1 - 15.6, 9], [high, 8.8, 9]] as const) {
      expectClose(point?.staggerDeg, staggerDeg, { abs: 1e-12 })
      expectClose(point?.planDeg, planDeg, { abs: 1e-12 })
      expectClose(point?.deviationDeg, staggerDeg - planDeg, { abs: 1e-12 })
    }
  })

  it('needs both channels at the very speed', () => {
    expect(run([read(900, 25), read(901, 16, { channel: 'backup' })]).stagger).toEqual([])
  })
})

describe('evaluateBenchRun: scatter', () => {
  it('is range and sample standard deviation, where two cylinders were read; the primary first', () => {
    const { scatter } = run([
      read(900, 16.2, { channel: 'backup', cylinder: 1 }), read(900, 15.8, { channel: 'backup', cylinder: 2 }),
      read(1500, 25.3, { cylinder: 1 }), read(1500, 24.9, { cylinder: 2 }), read(1500, 25.1, { cylinder: 3 }), read(1500, 29),
      read(900, 25.2, { cylinder: 4 }), read(900, 25.1, { cylinder: 5 }),
      read(2000, 25.2, { cylinder: 4 }), read(2000, 25.1, { cylinder: 4 }), read(2200, 25.2, { cylinder: 4 }),
    ])
    expect(scatter.map(({ channel, rpm }) => [channel, rpm])).toEqual([['primary', 900], ['primary', 1500], ['backup', 900]])
    expectClose(scatter[1]?.rangeDeg, 0.4, { abs: 1e-12 })
    expectClose(scatter[1]?.sdDeg, 0.2, { rel: 1e-12 })
    expectClose(scatter[2]?.rangeDeg, 0.4, { abs: 1e-12 })
    expectClose(scatter[2]?.sdDeg, Math.sqrt(0.08), { rel: 1e-12 })
  })

  it('does not take a difference of the plan for scatter', () => {
    const { scatter } = run([read(490, 25.1, { trend: 'falling', cylinder: 1 }), read(490, 14.1, { cylinder: 2 })])
    expectClose(scatter[0]?.rangeDeg, 0, { abs: 1e-12 })
  })
})

describe('evaluateBenchRun: crank retard', () => {
  const rising = [read(300, 14.1), read(450, 13.9), read(500, 14), read(540, 25.2), read(900, 25)]

  it('is found between the last retarded and the first other speed', () => {
    const { crankRetard } = run(rising)
    expect(crankRetard).toHaveLength(1)
    expect(crankRetard[0]).toMatchObject({ channel: 'primary', aboveRpm: 500, atMostRpm: 540 })
    expectClose(crankRetard[0]?.stepDeg, 11.1, { abs: 1e-12 })
  })

  it('shows a step elsewhere than planned', () => {
    expect(run([read(300, 14), read(350, 25), read(900, 25)]).crankRetard).toMatchObject([{ aboveRpm: 300, atMostRpm: 350 }])
  })

  it('is not found where speeds overlap, where one side is missing, or from falling readings', () => {
    expect(run([...rising, read(540, 14)]).crankRetard).toEqual([])
    expect(run([...rising, read(700, 14)]).crankRetard).toEqual([])
    expect(run(rising.slice(0, 3)).crankRetard).toEqual([])
    expect(run(rising.slice(3)).crankRetard).toEqual([])
    expect(run(rising.map((reading) => ({ ...reading, trend: 'falling' as const }))).crankRetard).toEqual([])
    expect(run([...rising, read(700, 14, { trend: 'falling' })]).crankRetard).toHaveLength(1)
  })

  it('half the retard is the bound, at it a reading is not retarded', () => {
    expect(run([read(300, 25 - 5.5), read(400, 25)]).crankRetard).toEqual([])
    expect(run([read(300, 25 - 5.5 - 1e-9), read(400, 25)]).crankRetard).toHaveLength(1)
  })

  it('both channels can have one, the primary first; a retard of nothing has none', () => {
    const both = { primary, backup: fixed(16, { crankRetard: { belowRpm: 400, byDeg: 4 } }) }
    const readings = [read(300, 12, { channel: 'backup' }), read(500, 16, { channel: 'backup' }), ...rising]
    expect(run(readings, { plan: both }).crankRetard.map(({ channel, aboveRpm, atMostRpm }) => [channel, aboveRpm, atMostRpm])).toEqual([['primary', 500, 540], ['backup', 300, 500]])
    expect(run(readings, { plan: { primary: fixed(25, { crankRetard: { belowRpm: 400, byDeg: 0 } }), backup } }).crankRetard).toEqual([])
  })
})

describe('evaluateBenchRun: errors', () => {
  it('names what cannot be used', () => {
    const valid = { plan: { primary, backup }, readings: [read(900, 25, { cylinder: 2 })], toleranceDeg: 0.5, cylinders: 6 }
    const of = (change: object) => () => evaluateBenchRun({ ...valid, ...change } as never)
    for (const plan of [undefined, null, 5, []]) expectCalcError(of({ plan }), 'plan')
    expectCalcError(of({ plan: { primary } }), 'plan.backup')
    expectCalcError(of({ plan: { primary: fixed(Number.NaN), backup } }), 'plan.primary.schedule.deg')
    for (const toleranceDeg of [-1, Number.NaN, undefined, '1']) expectCalcError(of({ toleranceDeg }), 'toleranceDeg')
    for (const cylinders of [0, 2.5, undefined]) expectCalcError(of({ cylinders }), 'cylinders')
    for (const readings of [undefined, [], 'x', {}]) expectCalcError(of({ readings }), 'readings')
    const one = (change: object) => of({ readings: [valid.readings[0], { ...valid.readings[0], ...change }] })
    expectCalcError(of({ readings: [valid.readings[0], null] }), 'readings.1')
    for (const rpm of [-1, Number.NaN, undefined]) expectCalcError(one({ rpm }), 'readings.1.rpm')
    for (const channel of ['both', undefined, 1]) expectCalcError(one({ channel }), 'readings.1.channel')
    for (const readDeg of [Number.NaN, Infinity, '25', null]) expectCalcError(one({ readDeg }), 'readings.1.readDeg')
    for (const cylinder of [0, 7, 1.5, null, '2']) expectCalcError(one({ cylinder }), 'readings.1.cylinder')
    for (const mapKpa of [0, -1, null]) expectCalcError(one({ mapKpa }), 'readings.1.mapKpa')
    for (const trend of ['up', null, 1]) expectCalcError(one({ trend }), 'readings.1.trend')
    expectCalcError(of({ plan: { primary: { schedule: mapSchedule }, backup } }), 'readings.0.mapKpa')
    expectCalcError(of({ plan: { primary: fixed(-1e308), backup }, readings: [read(900, 1.5e308)] }), 'readings.0.readDeg')
    expectCalcError(() => evaluateBenchRun(undefined as never), 'plan')
  })
})
