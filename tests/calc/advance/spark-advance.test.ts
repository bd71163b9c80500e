import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { sparkAdvanceDeg, staggerDeg, type Channel, type Schedule } from '@/lib/calc'
import { deepFreeze } from '@/tests/support/deep-freeze'
import { expectCalcError } from '@/tests/support/expect-calc-error'
import { expectClose } from '@/tests/support/expect-close'
import { fixed, formula, mapSchedule, mechanicalSchedule, retard, table } from './channels'

const at = (schedule: Schedule, rpm: number, mapKpa?: number) => sparkAdvanceDeg({ schedule }, mapKpa === undefined ? { rpm } : { rpm, mapKpa })

describe('schedules', () => {
  it('fixed', () => {
    expect(at({ kind: 'fixed', deg: 24.5 }, 0)).toBe(24.5)
    expect(at({ kind: 'fixed', deg: -3 }, 9000)).toBe(-3)
  })

  it('mechanical: flat, linear, flat', () => {
    for (const [rpm, deg] of [[0, 7], [799, 7], [800, 7], [1100, 11.5], [1400, 16], [2000, 25], [5000, 25]] as const) {
      expectClose(at(mechanicalSchedule, rpm), deg, { rel: 1e-12 })
    }
  })

  it('table: linear between points, flat outside, exact at them, a step of two close points', () => {
    const { schedule } = table([[600, 12.1], [1200, 21.3], [1201, 15], [2600, 27.7]])
    for (const [rpm, deg] of [[0, 12.1], [600, 12.1], [1200, 21.3], [1201, 15], [2600, 27.7], [4000, 27.7]] as const) expect(at(schedule, rpm)).toBe(deg)
    expectClose(at(schedule, 900), 16.7, { rel: 1e-12 })
    expectClose(at(schedule, 1200.5), 18.15, { rel: 1e-12 })
    expect(at(table([[900, 19]]).schedule, 50)).toBe(19)
  })

  it('a flat stretch of a table is exactly flat', () => {
    const { schedule } = table([[500, 0.1 + 0.2], [2600, 0.1 + 0.2]])
    for (let rpm = 500; rpm <= 2600; rpm += 7) expect(at(schedule, rpm)).toBe(0.1 + 0.2)
  })

  it('map: bilinear, flat outside, deg[i][j] at rpm[i] and mapKpa[j]', () => {
    mapSchedule.rpm.forEach((rpm, i) => mapSchedule.mapKpa.forEach((mapKpa, j) => expect(at(mapSchedule, rpm, mapKpa)).toBe(mapSchedule.deg[i]?.[j])))
    // Halfway in speed and a third of the way in pressure: corners 14 12 / 30 26.
    expectClose(at(mapSchedule, 1000, 50), (14 + (12 - 14) / 3 + 30 + (26 - 30) / 3) / 2, { rel: 1e-12 })
    expect(at(mapSchedule, 100, 20)).toBe(14)
    expect(at(mapSchedule, 9000, 300)).toBe(24)
    expectClose(at(mapSchedule, 100, 85), 11, { rel: 1e-12 })
    expectClose(at(mapSchedule, 2000, 500), 22, { rel: 1e-12 })
  })

  it('a table is a map of one pressure and a mechanical advance is a table of two points', () => {
    fc.assert(fc.property(fc.double({ min: 0, max: 4000, noNaN: true }), (rpm) => {
      const asTable = table([[800, 7], [2000, 25]])
      expect(at(asTable.schedule, rpm)).toBe(at(mechanicalSchedule, rpm))
      expect(at({ kind: 'map', rpm: [800, 2000], mapKpa: [80], deg: [[7], [25]] }, rpm, 33)).toBe(at(mechanicalSchedule, rpm))
    }))
  })

  it('formula', () => {
    expectClose(at(formula('12 + 0.005 * rpm - 0.1 * (map - 100)').schedule, 1000, 80), 19, { rel: 1e-12 })
  })
})

describe('crank retard and latency', () => {
  const channel = fixed(26, { crankRetard: retard })

  it('retards strictly below the threshold with rising speed', () => {
    expect(sparkAdvanceDeg(channel, { rpm: 519.999 })).toBe(15)
    expect(sparkAdvanceDeg(channel, { rpm: 520 })).toBe(26)
    expect(sparkAdvanceDeg(channel, { rpm: 100, trend: 'rising' })).toBe(15)
  })

  it('comes back only below the threshold less its hysteresis once released', () => {
    expect(sparkAdvanceDeg(channel, { rpm: 519, trend: 'falling' })).toBe(26)
    expect(sparkAdvanceDeg(channel, { rpm: 460, trend: 'falling' })).toBe(26)
    expect(sparkAdvanceDeg(channel, { rpm: 459.999, trend: 'falling' })).toBe(15)
    const plain = fixed(26, { crankRetard: { belowRpm: 520, byDeg: 11 } })
    expect(sparkAdvanceDeg(plain, { rpm: 519, trend: 'falling' })).toBe(15)
  })

  it('latency retards in proportion to speed', () => {
    expectClose(sparkAdvanceDeg(fixed(26, { latencyUs: 80 }), { rpm: 2500 }), 26 - 1.2, { rel: 1e-12 })
    expect(sparkAdvanceDeg(fixed(26, { latencyUs: 80 }), { rpm: 0 })).toBe(26)
  })

  it('adds up: schedule − retard − latency', () => {
    fc.assert(fc.property(fc.double({ min: 0, max: 4000, noNaN: true }), fc.double({ min: 0, max: 500, noNaN: true }), (rpm, latencyUs) => {
      const whole = sparkAdvanceDeg({ schedule: mechanicalSchedule, crankRetard: retard, latencyUs }, { rpm })
      expectClose(whole, at(mechanicalSchedule, rpm) - (rpm < 520 ? 11 : 0) - 6e-6 * rpm * latencyUs, { rel: 1e-12, abs: 1e-12 })
    }))
  })
})

describe('staggerDeg', () => {
  it('is positive when the backup fires later, and changes sign with the channels', () => {
    expect(staggerDeg(fixed(26), fixed(16.5), { rpm: 2000 })).toBe(9.5)
    expect(staggerDeg(fixed(16.5), fixed(26), { rpm: 2000 })).toBe(-9.5)
    expect(staggerDeg(fixed(26, { crankRetard: retard }), fixed(16.5), { rpm: 300 })).toBe(-1.5)
    expect(staggerDeg(fixed(26, { crankRetard: retard }), fixed(16.5), { rpm: 500, trend: 'falling' })).toBe(9.5)
  })

  it('names the argument in its errors', () => {
    expectCalcError(() => staggerDeg(undefined as never, fixed(1), { rpm: 1 }), 'primary')
    expectCalcError(() => staggerDeg(fixed(1), fixed(Number.NaN), { rpm: 1 }), 'backup.schedule.deg')
    expectCalcError(() => staggerDeg(fixed(1), fixed(1), { rpm: -1 }), 'at.rpm')
    expectCalcError(() => staggerDeg(fixed(1), fixed(1), 5 as never), 'at')
    expectCalcError(() => staggerDeg(fixed(1), { schedule: mapSchedule }, { rpm: 1 }), 'at.mapKpa')
    expectCalcError(() => staggerDeg(fixed(1), fixed(1), { rpm: 1, trend: 'up' as never }), 'at.trend')
    expectCalcError(() => staggerDeg(fixed(1.5e308), fixed(-1.5e308), { rpm: 1 }), 'primary.schedule')
  })
})

describe('bad channels', () => {
  const withSchedule = (schedule: unknown) => () => sparkAdvanceDeg({ schedule } as Channel, { rpm: 1000, mapKpa: 80 })
  const withRetard = (crankRetard: unknown) => () => sparkAdvanceDeg({ schedule: { kind: 'fixed', deg: 1 }, crankRetard } as Channel, { rpm: 1000 })

  it('of no shape', () => {
    for (const bad of [undefined, null, 5, 'x', [], () => 1]) expectCalcError(() => sparkAdvanceDeg(bad as never, { rpm: 1 }), 'channel')
    for (const bad of [undefined, null, 5, 'fixed', []]) expectCalcError(withSchedule(bad), 'channel.schedule')
    for (const bad of [undefined, 'spline', 5, null, {}]) expectCalcError(withSchedule({ kind: bad, deg: 1 }), 'channel.schedule.kind')
  })

  it('fixed and mechanical', () => {
    for (const bad of [undefined, null, Number.NaN, Infinity, '24']) expectCalcError(withSchedule({ kind: 'fixed', deg: bad }), 'channel.schedule.deg')
    for (const [member, bad] of [['initialDeg', '7'], ['startRpm', -1], ['fullRpm', 800], ['fullRpm', 700], ['fullRpm', undefined], ['fullDeg', Infinity]] as const) {
      expectCalcError(withSchedule({ ...mechanicalSchedule, [member]: bad }), `channel.schedule.${member}`)
    }
  })

  it('table', () => {
    const points = (...list: unknown[]) => withSchedule({ kind: 'table', points: list })
    expectCalcError(points(), 'channel.schedule.points')
    expectCalcError(withSchedule({ kind: 'table', points: { 0: 1 } }), 'channel.schedule.points')
    expectCalcError(points({ rpm: 1, deg: 1 }, null), 'channel.schedule.points.1')
    expectCalcError(points({ rpm: -1, deg: 1 }), 'channel.schedule.points.0.rpm')
    expectCalcError(points({ rpm: 1, deg: Number.NaN }), 'channel.schedule.points.0.deg')
    const equal = expectCalcError(points({ rpm: 900, deg: 1 }, { rpm: 900, deg: 2 }), 'channel.schedule.points.1.rpm')
    expect(equal).toMatchObject({ value: 900, limit: '> 900', unit: 'rpm' })
    expectCalcError(points({ rpm: 1, deg: 1 }, { rpm: 3, deg: 2 }, { rpm: 2, deg: 2 }), 'channel.schedule.points.2.rpm')
    expectCalcError(withSchedule({ kind: 'table', points: new Array(1_000_000_000) }), 'channel.schedule.points.0')
  })

  it('map', () => {
    const broken = (change: object) => withSchedule({ ...mapSchedule, ...change })
    expectCalcError(broken({ rpm: [] }), 'channel.schedule.rpm')
    expectCalcError(broken({ rpm: [500, 500, 2500] }), 'channel.schedule.rpm.1')
    expectCalcError(broken({ rpm: [500, 1500, '2500'] }), 'channel.schedule.rpm.2')
    expectCalcError(broken({ mapKpa: [0, 70, 100] }), 'channel.schedule.mapKpa.0')
    expectCalcError(broken({ mapKpa: [40, 100, 70] }), 'channel.schedule.mapKpa.2')
    expectCalcError(broken({ deg: mapSchedule.deg.slice(1) }), 'channel.schedule.deg')
    expectCalcError(broken({ deg: [[1, 2, 3], [1, 2], [1, 2, 3]] }), 'channel.schedule.deg.1')
    expectCalcError(broken({ deg: [[1, 2, 3], [1, 2, 3], 7] }), 'channel.schedule.deg.2')
    expectCalcError(broken({ deg: [[1, 2, 3], [1, null, 3], [1, 2, 3]] }), 'channel.schedule.deg.1.1')
    expectCalcError(() => sparkAdvanceDeg({ schedule: mapSchedule }, { rpm: 1000 }), 'mapKpa')
  })

  it('crank retard and latency', () => {
    for (const bad of [null, 5, 'x', []]) expectCalcError(withRetard(bad), 'channel.crankRetard')
    expectCalcError(withRetard({ byDeg: 5 }), 'channel.crankRetard.belowRpm')
    expectCalcError(withRetard({ belowRpm: 0, byDeg: 5 }), 'channel.crankRetard.belowRpm')
    expectCalcError(withRetard({ belowRpm: 500, byDeg: -1 }), 'channel.crankRetard.byDeg')
    for (const hysteresisRpm of [-1, 500, 600, Number.NaN, null]) expectCalcError(withRetard({ belowRpm: 500, byDeg: 5, hysteresisRpm }), 'channel.crankRetard.hysteresisRpm')
    for (const latencyUs of [-1, Number.NaN, null, '5']) expectCalcError(() => sparkAdvanceDeg(fixed(1, { latencyUs } as never), { rpm: 1 }), 'channel.latencyUs')
    expectCalcError(() => sparkAdvanceDeg(fixed(1, { latencyUs: 1e308 }), { rpm: 1e10 }), 'channel.latencyUs')
  })

  it('speed, pressure and trend', () => {
    for (const rpm of [-1, undefined, null, Number.NaN, Infinity, '900']) expectCalcError(() => sparkAdvanceDeg(fixed(1), { rpm } as never), 'rpm')
    expectCalcError(() => sparkAdvanceDeg(fixed(1), undefined as never), 'rpm')
    for (const mapKpa of [0, -5, null, Number.NaN, '80']) expectCalcError(() => sparkAdvanceDeg(fixed(1), { rpm: 1, mapKpa } as never), 'mapKpa')
    for (const trend of ['', null, 1, 'Rising']) expectCalcError(() => sparkAdvanceDeg(fixed(1), { rpm: 1, trend } as never), 'trend')
  })

  it('are not written to', () => {
    const channel = deepFreeze({ schedule: mapSchedule, crankRetard: retard, latencyUs: 40 })
    expectClose(sparkAdvanceDeg(channel, deepFreeze({ rpm: 500, mapKpa: 40 })), 14 - 11 - 0.12, { rel: 1e-12 })
  })
})
