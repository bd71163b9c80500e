import fc from 'fast-check'
import { sampleStandardDeviation } from 'simple-statistics'
import { describe, expect, it } from 'vitest'
import { controlChartFactors, cpkInterval, individualsChart, normalQuantile, processCapability } from '@/lib/calc/live'
import { deepFreeze } from '@/tests/support/deep-freeze'
import { expectCalcError } from '@/tests/support/expect-calc-error'
import { expectClose } from '@/tests/support/expect-close'

const values = [4.9, 5.3, 5.6, 5.0, 5.2]
const limits = { lower: 4, upper: 6 }
const many = fc.array(fc.double({ min: -100, max: 100, noNaN: true }), { minLength: 2, maxLength: 30 }).filter((list) => Math.max(...list) - Math.min(...list) > 0.01)

describe('processCapability', () => {
  it('agrees with a hand calculation', () => {
    const result = processCapability(deepFreeze(values), limits)
    // Mean 5.2; squares 0.09 + 0.01 + 0.16 + 0.04 + 0 = 0.3 over 4.
    const sd = Math.sqrt(0.075)
    expectClose(result.mean, 5.2, { rel: 1e-14 })
    expectClose(result.sd, sd, { rel: 1e-13 })
    expectClose(result.cp, 2 / (6 * sd), { rel: 1e-12 })
    expectClose(result.cpk, 0.8 / (3 * sd), { rel: 1e-12 })
    expectClose(result.cpm, 2 / (6 * Math.sqrt(0.075 + 0.04)), { rel: 1e-12 })
    expectClose(processCapability(values, { ...limits, target: 5.2 }).cpm, result.cp, { rel: 1e-12 })
    expectClose(processCapability(values, { lower: 5.4, upper: 6 }).cpk, -0.2 / (3 * sd), { rel: 1e-12 })
  })

  it('holds its order of indices and the sd of a library', () => {
    fc.assert(fc.property(many, fc.double({ min: -100, max: 100, noNaN: true }), fc.double({ min: 0.1, max: 100, noNaN: true }), (list, lower, width) => {
      const result = processCapability(list, { lower, upper: lower + width })
      expectClose(result.sd, sampleStandardDeviation(list), { rel: 1e-9 })
      expect(result.cpk).toBeLessThanOrEqual(result.cp * (1 + 1e-12))
      expect(result.cpm).toBeLessThanOrEqual(result.cp * (1 + 1e-12))
      // cpk = cp·(1 − |mean − middle|/half the width)
      expectClose(result.cpk, result.cp * (1 - Math.abs(result.mean - lower - width / 2) / (width / 2)), { rel: 1e-8, abs: 1e-8 })
    }))
  })

  it('names what cannot be used', () => {
    for (const bad of [undefined, null, [], [5], 'x']) expectCalcError(() => processCapability(bad as never, limits), 'values')
    for (const same of [5, 0.1, 1e9 / 3]) expect(expectCalcError(() => processCapability([same, same, same], limits), 'values').message).toContain('differ')
    expectCalcError(() => processCapability([5, Number.NaN], limits), 'values.1')
    expectCalcError(() => processCapability(new Array(3) as never, limits), 'values.0')
    for (const bad of [Number.NaN, undefined, null, '4']) {
      expectCalcError(() => processCapability(values, { ...limits, lower: bad as never }), 'lower')
      expectCalcError(() => processCapability(values, { ...limits, upper: bad as never }), 'upper')
    }
    for (const upper of [4, 3]) expectCalcError(() => processCapability(values, { ...limits, upper }), 'upper')
    for (const target of [Number.NaN, null, '5']) expectCalcError(() => processCapability(values, { ...limits, target: target as never }), 'target')
    expectCalcError(() => processCapability(values, { lower: -1.7e308, upper: 1.7e308 }), 'upper')
    expectCalcError(() => processCapability([1.7e308, -1.7e308], limits), 'values')
    expectCalcError(() => processCapability(values, undefined as never), 'lower')
  })
})

describe('cpkInterval', () => {
  it('stands around cpk and narrows with the number of values', () => {
    const { cpk, lower, upper } = cpkInterval(deepFreeze(values), { ...limits, coverage: 0.8 })
    expect(cpk).toBe(processCapability(values, limits).cpk)
    const reach = normalQuantile(0.9) * Math.sqrt(1 / 45 + cpk ** 2 / 8)
    expectClose(lower, cpk - reach, { rel: 1e-12 })
    expectClose(upper, cpk + reach, { rel: 1e-12 })
    const wider = cpkInterval(values, limits)
    expect(wider.upper).toBeGreaterThan(upper)
    const more = cpkInterval([...values, ...values, ...values], limits)
    expect(more.upper - more.lower).toBeLessThan(wider.upper - wider.lower)
  })

  it('names what cannot be used', () => {
    expectCalcError(() => cpkInterval([5], limits), 'values')
    expectCalcError(() => cpkInterval([5, 5], limits), 'values')
    expectCalcError(() => cpkInterval(values, { ...limits, upper: 4 }), 'upper')
    for (const coverage of [0, 1, Number.NaN, null]) expectCalcError(() => cpkInterval(values, { ...limits, coverage: coverage as never }), 'coverage')
  })
})

describe('individualsChart', () => {
  it('agrees with a hand calculation and points at what is outside', () => {
    const steady = [10, 10.2, 9.9, 10.1, 10, 9.8, 10, 10.1, 9.9, 14, 10, 10.2]
    const chart = individualsChart(deepFreeze(steady))
    const ranges = [0.2, 0.3, 0.2, 0.1, 0.2, 0.2, 0.1, 0.2, 4.1, 4, 0.2]
    const meanRange = ranges.reduce((sum, range) => sum + range, 0) / 11
    expectClose(chart.mean, 124.2 / 12, { rel: 1e-13 })
    expectClose(chart.meanMovingRange, meanRange, { rel: 1e-12 })
    expectClose(chart.upper, 124.2 / 12 + (3 * meanRange) / 1.128, { rel: 1e-12 })
    expectClose(chart.lower, 124.2 / 12 - (3 * meanRange) / 1.128, { rel: 1e-12 })
    expectClose(chart.movingRangeUpper, 3.267 * meanRange, { rel: 1e-12 })
    expect(chart.outside).toEqual([9])
    expect(chart.movingRangeOutside).toEqual([9, 10])
  })

  it('values that do not move are all inside', () => {
    for (const same of [0.1, 7, 1e9 / 3]) {
      expect(individualsChart([same, same, same])).toEqual({ mean: same, meanMovingRange: 0, lower: same, upper: same, movingRangeUpper: 0, outside: [], movingRangeOutside: [] })
    }
  })

  it('turned over, it is the same chart turned over', () => {
    fc.assert(fc.property(many, (list) => {
      const chart = individualsChart(list)
      const turned = individualsChart(list.map((value) => -value))
      expectClose(turned.upper, -chart.lower, { rel: 1e-9, abs: 1e-9 })
      expectClose(turned.movingRangeUpper, chart.movingRangeUpper, { rel: 1e-9 })
      for (const place of chart.outside) expect(Math.abs((list[place] ?? 0) - chart.mean)).toBeGreaterThan((2.659 * chart.meanMovingRange) * (1 - 1e-9))
    }))
  })

  it('names what cannot be used', () => {
    for (const bad of [undefined, null, [], [1], 'x']) expectCalcError(() => individualsChart(bad as never), 'values')
    expectCalcError(() => individualsChart([1, 2, '3' as never]), 'values.2')
    expectCalcError(() => individualsChart([1.7e308, -1.7e308]), 'values')
  })
})

describe('controlChartFactors', () => {
  it('has the closed forms of two values', () => {
    const factors = controlChartFactors(2)
    expectClose(factors.d2, 2 / Math.sqrt(Math.PI), { rel: 1e-8 })
    expectClose(factors.d3, Math.sqrt(2 - 4 / Math.PI), { rel: 1e-8 })
    expectClose(factors.c4, Math.sqrt(2 / Math.PI), { rel: 1e-14 })
    // For three values the mean range is 3/√π.
    expectClose(controlChartFactors(3).d2, 3 / Math.sqrt(Math.PI), { rel: 1e-8 })
  })

  it('larger groups have wider ranges and narrower limits, and no lower limit falls below 0', () => {
    for (let n = 3; n <= 100; n += 1) {
      const [before, factors] = [controlChartFactors(n - 1), controlChartFactors(n)]
      expect(factors.d2).toBeGreaterThan(before.d2)
      for (const key of ['meanByRange', 'meanBySd', 'sdUpper', 'rangeUpper'] as const) expect(factors[key]).toBeLessThan(before[key])
      for (const key of ['sdLower', 'rangeLower'] as const) expect(factors[key]).toBeGreaterThanOrEqual(before[key])
      expect(before.c4).toBeLessThan(factors.c4)
      expect(factors.c4).toBeLessThan(1)
    }
    expect(controlChartFactors(2)).toMatchObject({ sdLower: 0, rangeLower: 0 })
  })

  it('names what is no number of values', () => {
    for (const bad of [1, 0, 2.5, 101, Number.NaN, '5', undefined, null]) expectCalcError(() => controlChartFactors(bad as never), 'count')
  })
})
