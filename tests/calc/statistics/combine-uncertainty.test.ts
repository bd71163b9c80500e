import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { combineUncertainty, normalQuantile, studentTQuantile, type UncertaintyContribution } from '@/lib/calc/live'
import { deepFreeze } from '@/tests/support/deep-freeze'
import { expectCalcError } from '@/tests/support/expect-calc-error'
import { expectClose } from '@/tests/support/expect-close'

const stack: readonly UncertaintyContribution[] = [
  { value: 0.4, distribution: 'normal', dof: 9 },
  { value: 0.9, distribution: 'rectangular', sensitivity: -0.5 },
  { value: 1.2, distribution: 'triangular', sensitivity: 2, dof: 4 },
]

describe('combineUncertainty', () => {
  it('agrees with a hand calculation', () => {
    const result = combineUncertainty(deepFreeze(stack))
    // Squares: 0.4² = 0.16; (0.45)²/3 = 0.0675; 2.4²/6 = 0.96.
    expectClose(result.standard, Math.sqrt(1.1875), { rel: 1e-12 })
    const dof = 1.1875 ** 2 / (0.16 ** 2 / 9 + 0.96 ** 2 / 4)
    expectClose(result.effectiveDof, dof, { rel: 1e-12 })
    expectClose(result.coverageFactor, studentTQuantile(0.975, dof), { rel: 1e-11 })
    expectClose(result.expanded, studentTQuantile(0.975, dof) * Math.sqrt(1.1875), { rel: 1e-11 })
    expectClose(result.worstCase, 1.2 + 0.45 + 2.4, { rel: 1e-12 })
  })

  it('without degrees of freedom takes the normal value', () => {
    const result = combineUncertainty([{ value: 2, distribution: 'normal' }, { value: 1, distribution: 'rectangular' }], { coverage: 0.99 })
    expect(result.effectiveDof).toBeNull()
    expectClose(result.coverageFactor, normalQuantile(0.995), { rel: 1e-12 })
  })

  it('one contribution keeps its own degrees of freedom, whole or not', () => {
    for (const dof of [0.5, 1, 3.7, 250]) expectClose(combineUncertainty([{ value: 0.3, distribution: 'triangular', sensitivity: 7, dof }]).effectiveDof, dof, { rel: 1e-12 })
  })

  it('nothing uncertain is certain', () => {
    expect(combineUncertainty([{ value: 0, distribution: 'normal', dof: 5 }, { value: 3, distribution: 'rectangular', sensitivity: 0, dof: 5 }]))
      .toEqual({ standard: 0, effectiveDof: null, coverageFactor: normalQuantile(0.975), expanded: 0, worstCase: 0 })
  })

  it('scales with the contributions, ignores their order and the sign of a sensitivity, and never exceeds the worst case of limited ones', () => {
    const contribution = fc.record({
      value: fc.double({ min: 0.01, max: 5, noNaN: true }), distribution: fc.constantFrom('normal', 'rectangular', 'triangular'),
      sensitivity: fc.double({ min: 0.1, max: 3, noNaN: true }), dof: fc.double({ min: 1, max: 100, noNaN: true }),
    })
    fc.assert(fc.property(fc.array(contribution, { minLength: 1, maxLength: 6 }), fc.double({ min: 0.01, max: 100, noNaN: true }), (list, by) => {
      const result = combineUncertainty(list)
      const scaled = combineUncertainty(list.map((entry) => ({ ...entry, sensitivity: -entry.sensitivity * by })).reverse())
      for (const key of ['standard', 'expanded', 'worstCase'] as const) expectClose(scaled[key], by * result[key], { rel: 1e-9 })
      expectClose(scaled.effectiveDof, result.effectiveDof, { rel: 1e-9 })
      expect(result.standard).toBeLessThanOrEqual(result.worstCase)
      // Between the least of the ν and their sum.
      expect(result.effectiveDof).toBeGreaterThanOrEqual(Math.min(...list.map(({ dof }) => dof)) * (1 - 1e-12))
      expect(result.effectiveDof).toBeLessThanOrEqual(list.reduce((sum, { dof }) => sum + dof, 0) * (1 + 1e-12))
    }))
  })

  it('holds contributions whose fourth power is beyond a number', () => {
    for (const value of [1e-200, 1e200]) {
      const result = combineUncertainty([{ value, distribution: 'normal', dof: 4 }, { value, distribution: 'normal', dof: 4 }])
      expectClose(result.standard, Math.SQRT2 * value, { rel: 1e-12 })
      expectClose(result.effectiveDof, 8, { rel: 1e-12 })
    }
  })

  it('names what cannot be used', () => {
    const of = (change: object, options?: object) => () => combineUncertainty([{ value: 1, distribution: 'normal' }, { value: 1, distribution: 'normal', ...change } as never], options)
    for (const bad of [undefined, null, [], {}, 'x']) expectCalcError(() => combineUncertainty(bad as never), 'contributions')
    for (const bad of [null, 5, []]) expectCalcError(() => combineUncertainty([{ value: 1, distribution: 'normal' }, bad as never]), 'contributions.1')
    expectCalcError(() => combineUncertainty(new Array(3) as never), 'contributions.0')
    for (const value of [-1, Number.NaN, Infinity, '1', undefined]) expectCalcError(of({ value }), 'contributions.1.value')
    for (const distribution of ['Normal', '', undefined, 3]) expectCalcError(of({ distribution }), 'contributions.1.distribution')
    for (const sensitivity of [Number.NaN, Infinity, null, '1']) expectCalcError(of({ sensitivity }), 'contributions.1.sensitivity')
    for (const dof of [0, -1, Infinity, Number.NaN, null]) expectCalcError(of({ dof }), 'contributions.1.dof')
    for (const coverage of [0, 1, -0.5, 2, Number.NaN, null, '0.9']) expectCalcError(of({}, { coverage }), 'coverage')
    expectCalcError(of({ value: 1e308, sensitivity: 1e10 }), 'contributions.1.value')
    expectCalcError(() => combineUncertainty([{ value: 1, distribution: 'normal', dof: 0.001 }]), 'coverage')
    expectCalcError(() => combineUncertainty([{ value: 1.2e308, distribution: 'rectangular' }, { value: 1.2e308, distribution: 'rectangular' }]), 'contributions')
  })
})
