import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { linearTrend, studentTQuantile, type TrendPoint } from '@/lib/calc/live'
import { deepFreeze } from '@/tests/support/deep-freeze'
import { expectCalcError } from '@/tests/support/expect-calc-error'
import { expectClose } from '@/tests/support/expect-close'

/** A gap that wears open; x̄ 17.5, Sxx 875, Sxy 85, Syy 9. */
const wear: readonly TrendPoint[] = [{ hours: 0, value: 1 }, { hours: 10, value: 2 }, { hours: 20, value: 2 }, { hours: 40, value: 5 }]
const slope = 85 / 875
const intercept = 2.5 - 17.5 * slope
const spread = Math.sqrt((9 - 85 ** 2 / 875) / 2)

describe('linearTrend', () => {
  it('agrees with a hand calculation', () => {
    const trend = linearTrend(deepFreeze(wear))
    expectClose(trend.slopePerH, slope, { rel: 1e-12 })
    expectClose(trend.intercept, intercept, { rel: 1e-12 })
    expectClose(trend.residualSd, spread, { rel: 1e-12 })
    expectClose(trend.slopeSe, spread / Math.sqrt(875), { rel: 1e-12 })
    expectClose(trend.interceptSe, spread * Math.sqrt(1 / 4 + 17.5 ** 2 / 875), { rel: 1e-12 })
    expect(trend.prediction).toBeNull()
    expect(trend.hoursToLimit).toBeNull()
  })

  it('predicts one further reading, not the line', () => {
    const { prediction } = linearTrend(wear, { atHours: 60, coverage: 0.9 })
    const reach = studentTQuantile(0.95, 2) * spread * Math.sqrt(1 + 1 / 4 + (60 - 17.5) ** 2 / 875)
    expect(prediction?.hours).toBe(60)
    expectClose(prediction?.value, intercept + 60 * slope, { rel: 1e-12 })
    expectClose(prediction?.lower, intercept + 60 * slope - reach, { rel: 1e-11 })
    expectClose(prediction?.upper, intercept + 60 * slope + reach, { rel: 1e-11 })
    const wider = linearTrend(wear, { atHours: 60 }).prediction
    expect((wider?.upper ?? 0) - (wider?.lower ?? 0)).toBeGreaterThan(2 * reach)
  })

  it('counts the hours to the limit from the latest point, in whatever order the points stand', () => {
    const steady = [{ hours: 100, value: 4 }, { hours: 120, value: 4.41 }, { hours: 140, value: 4.8 }, { hours: 160, value: 5.2 }]
    const trend = linearTrend(steady, { limit: 7 })
    expectClose(trend.hoursToLimit, (7 - trend.intercept) / trend.slopePerH - 160, { rel: 1e-10 })
    expectClose(linearTrend([...steady].reverse(), { limit: 7 }).hoursToLimit, trend.hoursToLimit, { rel: 1e-10 })
    const falling = steady.map(({ hours, value }) => ({ hours, value: -value }))
    expectClose(linearTrend(falling, { limit: -7 }).hoursToLimit, trend.hoursToLimit, { rel: 1e-10 })
  })

  it('says no hours where the limit lies behind or nothing is certain', () => {
    const exact = [{ hours: 0, value: 1 }, { hours: 10, value: 2 }, { hours: 30, value: 4 }]
    expectClose(linearTrend(exact, { limit: 5 }).hoursToLimit, 10, { rel: 1e-12 })
    expectClose(linearTrend(exact, { limit: 4 }).hoursToLimit, 0, { abs: 1e-12 })
    for (const limit of [3.9, 1, -5]) expect(linearTrend(exact, { limit }).hoursToLimit).toBeNull()
    // slope/slopeSe is 4.8 with two degrees of freedom: more than t at 95 %, 4.30, less than at 99 %, 9.92.
    expect(slope / (spread / Math.sqrt(875))).toBeGreaterThan(studentTQuantile(0.975, 2))
    expect(linearTrend(wear, { limit: 8 }).hoursToLimit).not.toBeNull()
    expect(linearTrend(wear, { limit: 8, coverage: 0.99 }).hoursToLimit).toBeNull()
    for (const value of [0, 0.1, 7e9]) {
      const flat = linearTrend([0, 7, 11].map((hours) => ({ hours, value })), { limit: value + 1, atHours: 50 })
      expect(flat).toEqual({ slopePerH: 0, intercept: value, slopeSe: 0, interceptSe: 0, residualSd: 0, prediction: { hours: 50, value, lower: value, upper: value }, hoursToLimit: null })
    }
  })

  it('moves with the hours and scales with the values', () => {
    fc.assert(fc.property(fc.double({ min: -1e4, max: 1e4, noNaN: true }), fc.double({ min: 1e-3, max: 1e3, noNaN: true }), (shift, by) => {
      const trend = linearTrend(wear, { limit: 9, atHours: 60 })
      const moved = linearTrend(wear.map(({ hours, value }) => ({ hours: hours + shift, value: value * by })), { limit: 9 * by, atHours: 60 + shift })
      expectClose(moved.slopePerH, by * trend.slopePerH, { rel: 1e-9 })
      expectClose(moved.slopeSe, by * trend.slopeSe, { rel: 1e-9 })
      expectClose(moved.hoursToLimit, trend.hoursToLimit, { rel: 1e-8 })
      expectClose(moved.prediction?.upper, by * (trend.prediction?.upper ?? 0), { rel: 1e-8 })
    }))
  })

  it('keeps its digits far from hour 0 and at any size', () => {
    const far = linearTrend(wear.map(({ hours, value }) => ({ hours: hours + 2 ** 30, value })))
    expectClose(far.slopePerH, slope, { rel: 1e-12 })
    for (const size of [1e-250, 1e250]) expectClose(linearTrend(wear.map(({ hours, value }) => ({ hours, value: value * size }))).slopePerH, slope * size, { rel: 1e-12 })
  })

  it('names what cannot be used', () => {
    for (const bad of [undefined, null, [], 'x', wear.slice(0, 2)]) expectCalcError(() => linearTrend(bad as never), 'points')
    expect(expectCalcError(() => linearTrend([1, 2, 3].map((value) => ({ hours: 5, value }))), 'points').message).toContain('two different hours')
    expectCalcError(() => linearTrend([...wear, null as never]), 'points.4')
    for (const bad of [Number.NaN, Infinity, '5', undefined]) {
      expectCalcError(() => linearTrend([...wear, { hours: bad as never, value: 1 }]), 'points.4.hours')
      expectCalcError(() => linearTrend([...wear, { hours: 50, value: bad as never }]), 'points.4.value')
    }
    for (const bad of [Number.NaN, Infinity, '5', null]) {
      expectCalcError(() => linearTrend(wear, { limit: bad as never }), 'limit')
      expectCalcError(() => linearTrend(wear, { atHours: bad as never }), 'atHours')
      expectCalcError(() => linearTrend(wear, { coverage: bad as never }), 'coverage')
    }
    for (const coverage of [0, 1, -1]) expectCalcError(() => linearTrend(wear, { coverage }), 'coverage')
    expectCalcError(() => linearTrend(wear, { atHours: 1e308 }), 'atHours')
    expectCalcError(() => linearTrend(wear.map(({ hours, value }) => ({ hours: hours * 1e-320, value }))), 'points')
    expectCalcError(() => linearTrend([{ hours: 1e308, value: 1 }, { hours: -1e308, value: 2 }, { hours: 0, value: 1 }]), 'points')
  })
})
