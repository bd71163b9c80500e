import fc from 'fast-check'
import { linearRegression, rSquared as rSquaredOf } from 'simple-statistics'
import { describe, expect, it } from 'vitest'
import { leastSquares, linearTrend } from '@/lib/calc/live'
import { deepFreeze } from '@/tests/support/deep-freeze'
import { expectCalcError } from '@/tests/support/expect-calc-error'
import { expectClose } from '@/tests/support/expect-close'

const number = fc.double({ min: -50, max: 50, noNaN: true })
const line = { rows: [[1, 0], [1, 10], [1, 20], [1, 40]], values: [1, 2, 2, 5] }

describe('leastSquares', () => {
  it('agrees with a hand calculation', () => {
    const fit = leastSquares(deepFreeze(line))
    // x̄ 17.5, Sxx 875, Sxy 85, Syy 9: slope 85/875, SSE 9 − 85²/875.
    const slope = 85 / 875
    const sse = 9 - 85 ** 2 / 875
    expectClose(fit.coefficients[1], slope, { rel: 1e-12 })
    expectClose(fit.coefficients[0], 2.5 - 17.5 * slope, { rel: 1e-12 })
    expectClose(fit.residualSd, Math.sqrt(sse / 2), { rel: 1e-12 })
    expectClose(fit.standardErrors[1], Math.sqrt(sse / 2 / 875), { rel: 1e-12 })
    expectClose(fit.standardErrors[0], Math.sqrt((sse / 2) * (1 / 4 + 17.5 ** 2 / 875)), { rel: 1e-12 })
    expectClose(fit.rSquared, 1 - sse / 9, { rel: 1e-12 })
    expectClose(fit.fStatistic, (9 - sse) / (sse / 2), { rel: 1e-11 })
  })

  it('a column of ones alone gives mean and its standard error', () => {
    const fit = leastSquares({ rows: [[1], [1], [1], [1]], values: [2, 4, 4, 6] })
    expectClose(fit.coefficients[0], 4, { rel: 1e-14 })
    expectClose(fit.standardErrors[0], Math.sqrt(8 / 3 / 4), { rel: 1e-14 })
    expectClose(fit.rSquared, 0, { abs: 1e-15 })
    expect(fit.fStatistic).toBeNull()
  })

  it('without a constant column R² and F are taken about 0', () => {
    const fit = leastSquares({ rows: [[1], [2], [3]], values: [1, 3, 2] })
    // b = 13/14, Σy² 14, SSE 14 − 169/14.
    expectClose(fit.coefficients[0], 13 / 14, { rel: 1e-13 })
    expectClose(fit.rSquared, 169 / 196, { rel: 1e-13 })
    expectClose(fit.fStatistic, (169 / 14) / ((14 - 169 / 14) / 2), { rel: 1e-12 })
  })

  it('agrees with a library and with linearTrend on a straight line', () => {
    const pairs = fc.array(fc.tuple(number, number), { minLength: 3, maxLength: 20 }).filter((list) => Math.max(...list.map(([x]) => x)) - Math.min(...list.map(([x]) => x)) > 1)
    fc.assert(fc.property(pairs, (list) => {
      const fit = leastSquares({ rows: list.map(([x]) => [1, x]), values: list.map(([, y]) => y) })
      const { m, b } = linearRegression(list)
      expectClose(fit.coefficients[1], m, { rel: 1e-6, abs: 1e-6 })
      expectClose(fit.coefficients[0], b, { rel: 1e-6, abs: 1e-6 })
      if (list.some(([, y]) => Math.abs(y - (list[0]?.[1] ?? 0)) > 0.1)) expectClose(fit.rSquared, rSquaredOf(list, (x) => m * x + b), { abs: 1e-6 })
      const trend = linearTrend(list.map(([hours, value]) => ({ hours, value })))
      expectClose(trend.slopePerH, fit.coefficients[1], { rel: 1e-9, abs: 1e-11 })
      expectClose(trend.intercept, fit.coefficients[0], { rel: 1e-9, abs: 1e-11 })
      expectClose(trend.slopeSe, fit.standardErrors[1], { rel: 1e-7, abs: 1e-11 })
      expectClose(trend.interceptSe, fit.standardErrors[0], { rel: 1e-7, abs: 1e-11 })
    }))
  })

  it('residuals stand upright on every column, and unit and order of the columns only carry over', () => {
    const rows = fc.array(fc.tuple(number, number, number), { minLength: 6, maxLength: 15 })
    fc.assert(fc.property(rows, fc.double({ min: 1e-6, max: 1e6, noNaN: true }), (list, unit) => {
      const table = list.map(([a, b]) => [1, a, b])
      const values = list.map(([, , y]) => y)
      let fit
      try {
        fit = leastSquares({ rows: table, values })
      } catch {
        return
      }
      // Columns that nearly depend on each other leave few digits to compare.
      if (fit.standardErrors.some((error) => error > 1e3 * (fit?.residualSd ?? 0))) return
      const residuals = table.map((row, i) => (values[i] ?? 0) - row.reduce((sum, x, j) => sum + x * (fit.coefficients[j] ?? 0), 0))
      for (const j of [0, 1, 2]) expectClose(residuals.reduce((sum, r, i) => sum + r * (table[i]?.[j] ?? 0), 0), 0, { abs: 1e-8 })
      const turned = leastSquares({ rows: table.map(([one, a, b]) => [(b ?? 0) * unit, one ?? 0, a ?? 0]), values })
      expectClose((turned.coefficients[0] ?? 0) * unit, fit.coefficients[2], { rel: 1e-8, abs: 1e-9 })
      expectClose(turned.residualSd, fit.residualSd, { rel: 1e-9, abs: 1e-9 })
    }))
  })

  it('works at any size of numbers', () => {
    for (const size of [1e-280, 1e280]) expectClose(leastSquares({ rows: line.rows, values: line.values.map((value) => value * size) }).coefficients[1], (85 / 875) * size, { rel: 1e-12 })
  })

  it('a fit without residual has no F, values that are all 0 no R²', () => {
    const still = leastSquares({ rows: [[1], [1]], values: [0, 0] })
    expect(still).toEqual({ coefficients: [0], standardErrors: [0], residualSd: 0, rSquared: null, fStatistic: null })
    expect(leastSquares({ rows: [[1, 1], [1, 2], [1, 3]], values: [1, 2, 3] }).fStatistic).toBeNull()
  })

  it('names what cannot be used', () => {
    const of = (change: object) => () => leastSquares({ ...line, ...change } as never)
    for (const rows of [undefined, null, [], [[1, 2]], 'x']) expectCalcError(of({ rows }), 'rows')
    expectCalcError(of({ rows: [[1, 0], [1, 10]], values: [1, 2] }), 'rows')
    expectCalcError(of({ rows: [[], [1]] }), 'rows.0')
    expectCalcError(of({ rows: [Array.from({ length: 51 }, () => 1), [1]] }), 'rows.0')
    expectCalcError(of({ rows: [[1, 0], [1], [1, 20], [1, 40]] }), 'rows.1')
    expectCalcError(of({ rows: [[1, 0], [1, 10], [1, Number.NaN], [1, 40]] }), 'rows.2.1')
    for (const values of [undefined, [], [1, 2, 3], 5]) expectCalcError(of({ values }), 'values')
    expectCalcError(of({ values: [1, 2, '2', 5] }), 'values.2')
    expect(expectCalcError(of({ rows: [[1, 2], [1, 2], [1, 2], [1, 2]] }), 'rows').message).toContain('follows from the others')
    expectCalcError(of({ rows: [[0, 2], [0, 3], [0, 4], [0, 2]] }), 'rows')
    expectCalcError(of({ rows: [[1, 1e-300], [1, 2e-300], [1, 0], [1, 5e-300]], values: [1e300, -1e300, 4e300, 1] }), 'values')
    expectCalcError(() => leastSquares(undefined as never), 'rows')
  })
})
