import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { advanceCurve, sparkAdvanceDeg } from '@/lib/calc'
import { deepFreeze } from '@/tests/support/deep-freeze'
import { expectCalcError } from '@/tests/support/expect-calc-error'
import { expectClose } from '@/tests/support/expect-close'
import { fixed, formula, mapSchedule, mechanicalSchedule, retard, table } from './channels'

describe('advanceCurve', () => {
  it('spaces its samples evenly, both ends included', () => {
    const curve = advanceCurve({ schedule: mechanicalSchedule }, { fromRpm: 200, toRpm: 2600, points: 5 })
    expect(curve.map(({ rpm }) => rpm)).toEqual([200, 800, 1400, 2000, 2600])
    curve.forEach(({ deg }, i) => expectClose(deg, [7, 7, 16, 25, 25][i], { rel: 1e-12 }))
    const ends = advanceCurve(fixed(20), { fromRpm: 0.1, toRpm: 0.7, points: 2 })
    expect(ends).toEqual([{ rpm: 0.1, deg: 20 }, { rpm: 0.7, deg: 20 }])
  })

  it('adds the step as two points of one speed, from below, then from above', () => {
    const curve = advanceCurve(fixed(26, { crankRetard: retard }), { fromRpm: 0, toRpm: 1000, points: 3 })
    expect(curve).toEqual([{ rpm: 0, deg: 15 }, { rpm: 500, deg: 15 }, { rpm: 520, deg: 15 }, { rpm: 520, deg: 26 }, { rpm: 1000, deg: 26 }])
  })

  it('with falling speed the step stands lower by the hysteresis', () => {
    const curve = advanceCurve(fixed(26, { crankRetard: retard }), { fromRpm: 0, toRpm: 1000, points: 3, trend: 'falling' })
    expect(curve).toEqual([{ rpm: 0, deg: 15 }, { rpm: 460, deg: 15 }, { rpm: 460, deg: 26 }, { rpm: 500, deg: 26 }, { rpm: 1000, deg: 26 }])
  })

  it('a sample that falls on the step is replaced by the two', () => {
    const channel = fixed(26, { crankRetard: { belowRpm: 500, byDeg: 11 } })
    expect(advanceCurve(channel, { fromRpm: 0, toRpm: 1000, points: 3 }).map(({ rpm, deg }) => [rpm, deg])).toEqual([[0, 15], [500, 15], [500, 26], [1000, 26]])
    // 0.1 + 3 · 0.1 carries rounding and is still the same speed as 0.4.
    const tiny = fixed(26, { crankRetard: { belowRpm: 0.4, byDeg: 11 } })
    expect(advanceCurve(tiny, { fromRpm: 0.1, toRpm: 1.1, points: 11 })).toHaveLength(12)
    expect(advanceCurve(channel, { fromRpm: 500, toRpm: 1000, points: 2 }).map(({ rpm, deg }) => [rpm, deg])).toEqual([[500, 15], [500, 26], [1000, 26]])
    expect(advanceCurve(channel, { fromRpm: 0, toRpm: 500, points: 2 }).map(({ rpm, deg }) => [rpm, deg])).toEqual([[0, 15], [500, 15], [500, 26]])
  })

  it('a step outside the range adds nothing', () => {
    const channel = fixed(26, { crankRetard: retard })
    expect(advanceCurve(channel, { fromRpm: 600, toRpm: 1000, points: 4 })).toHaveLength(4)
    expect(advanceCurve(channel, { fromRpm: 0, toRpm: 100, points: 4 })).toHaveLength(4)
  })

  it('each point off the step is the spark advance there, and the two of the step differ by the retard', () => {
    const from = fc.double({ min: 0, max: 800, noNaN: true })
    const width = fc.double({ min: 1, max: 3000, noNaN: true })
    fc.assert(fc.property(from, width, fc.integer({ min: 2, max: 60 }), fc.constantFrom('rising' as const, 'falling' as const), (fromRpm, span, points, trend) => {
      const channel = { schedule: mechanicalSchedule, crankRetard: retard, latencyUs: 70 }
      const curve = advanceCurve(channel, { fromRpm, toRpm: fromRpm + span, points, trend })
      curve.forEach(({ rpm, deg }, i) => {
        const next = curve[i + 1]
        if (next?.rpm === rpm) {
          expectClose(next.deg - deg, 11, { rel: 1e-12 })
          expect(rpm).toBe(trend === 'rising' ? 520 : 460)
        } else {
          expect(deg).toBe(sparkAdvanceDeg(channel, { rpm, trend }))
          if (next) expect(next.rpm).toBeGreaterThan(rpm)
        }
      })
    }))
  })

  it('serves maps and formulas, and leaves its arguments alone', () => {
    const range = deepFreeze({ fromRpm: 500, toRpm: 2500, points: 3, mapKpa: 70 })
    expect(advanceCurve(deepFreeze({ schedule: mapSchedule }), range).map(({ deg }) => deg)).toEqual([12, 26, 30])
    expect(advanceCurve(formula('map + rpm / 1000'), range).map(({ deg }) => deg)).toEqual([70.5, 71.5, 72.5])
  })

  it('refuses a range that is none', () => {
    const of = (change: object) => () => advanceCurve(table([[900, 10]]), { fromRpm: 100, toRpm: 2000, points: 10, ...change } as never)
    for (const fromRpm of [-1, undefined, Number.NaN, '5']) expectCalcError(of({ fromRpm }), 'fromRpm')
    for (const toRpm of [100, 99, undefined, Infinity, null]) expectCalcError(of({ toRpm }), 'toRpm')
    for (const points of [1, 0, 2.5, 1e9, Number.NaN, undefined, '5']) expectCalcError(of({ points }), 'points')
    expectCalcError(of({ mapKpa: -1 }), 'mapKpa')
    expectCalcError(of({ trend: 'sinking' }), 'trend')
    expectCalcError(() => advanceCurve({} as never, { fromRpm: 1, toRpm: 2, points: 2 }), 'channel.schedule')
    expectCalcError(() => advanceCurve({ schedule: mapSchedule }, { fromRpm: 1, toRpm: 2, points: 2 }), 'mapKpa')
    expectCalcError(() => advanceCurve(fixed(1), undefined as never), 'fromRpm')
  })
})
