import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { morseTest } from '@/lib/calc/live'
import { deepFreeze } from '@/tests/support/deep-freeze'
import { expectCalcError } from '@/tests/support/expect-calc-error'
import { expectClose } from '@/tests/support/expect-close'

describe('morseTest', () => {
  it('agrees with a hand calculation', () => {
    const result = morseTest(deepFreeze({ allFiringKw: 62, cutOutKw: [40, 41.5, 39, 42.5] }))
    expect(result).toEqual({ indicatedKw: [22, 20.5, 23, 19.5], indicatedTotalKw: 85, mechanicalEfficiency: 62 / 85, frictionPowerKw: 23, weakest: 4 })
  })

  it('the weakest of equals is the one with the lowest number', () => {
    expect(morseTest({ allFiringKw: 10, cutOutKw: [3, 4, 4] }).weakest).toBe(2)
    expect(morseTest({ allFiringKw: 10, cutOutKw: [4, 4, 4] }).weakest).toBe(1)
  })

  it('balances: brake power and friction are what the cylinders make', () => {
    const loss = fc.double({ min: 5, max: 40, noNaN: true })
    fc.assert(fc.property(fc.array(loss, { minLength: 2, maxLength: 12 }), fc.double({ min: 0.2, max: 0.999, noNaN: true }), (losses, share) => {
      const allFiringKw = losses.reduce((sum, value) => sum + value, 0) * share
      fc.pre(losses.every((value) => value < allFiringKw))
      const result = morseTest({ allFiringKw, cutOutKw: losses.map((value) => allFiringKw - value) })
      expectClose(result.mechanicalEfficiency, share, { rel: 1e-9 })
      expectClose(result.indicatedTotalKw, allFiringKw + result.frictionPowerKw, { rel: 1e-12 })
      expect(result.indicatedKw[result.weakest - 1]).toBe(Math.min(...result.indicatedKw))
    }))
  })

  it('an engine without friction is the limit, whatever the last digit of a difference does', () => {
    // 0.3 − 0.2 and 0.3 − 0.1 sum to a little less than 0.3.
    expect(morseTest({ allFiringKw: 0.3, cutOutKw: [0.2, 0.1] })).toMatchObject({ mechanicalEfficiency: 1, frictionPowerKw: 0 })
    expect(morseTest({ allFiringKw: 10, cutOutKw: [0, 10] }).indicatedKw).toEqual([10, 0])
    expect(morseTest({ allFiringKw: 10, cutOutKw: [-2, 4] }).indicatedKw).toEqual([12, 6])
  })

  it('names the argument that cannot be used', () => {
    const of = (allFiringKw: unknown, cutOutKw: unknown) => () => morseTest({ allFiringKw, cutOutKw } as never)
    for (const all of [0, -5, Number.NaN, undefined, '50']) expectCalcError(of(all, [1, 2]), 'allFiringKw')
    for (const cut of [undefined, null, [], [30], 'x', { 0: 1, 1: 2 }]) expectCalcError(of(50, cut), 'cutOutKw')
    expectCalcError(of(50, [30, 50.1]), 'cutOutKw.1')
    expectCalcError(of(50, [Number.NaN, 30]), 'cutOutKw.0')
    expectCalcError(of(50, new Array(1_000_000_000)), 'cutOutKw.0')
    expect(expectCalcError(of(50, [40, 45, 40]), 'cutOutKw').message).toContain('50 kW')
    expectCalcError(of(1e308, [-1.7e308, 0]), 'cutOutKw.0')
    expectCalcError(of(1e308, [0, 0]), 'cutOutKw')
    expectCalcError(() => morseTest(null as never), 'allFiringKw')
  })
})
