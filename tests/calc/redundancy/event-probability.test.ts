import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { eventProbability, type FaultEvent } from '@/lib/calc/live'
import { deepFreeze } from '@/tests/support/deep-freeze'
import { expectCalcError } from '@/tests/support/expect-calc-error'
import { expectClose } from '@/tests/support/expect-close'
import { chance, flown, heat, latent } from './trees'

/** x/2! − x²/3! + … for x = parts/1e9, in whole numbers of 1e-60. */
const latentByWholeNumbers = (parts: bigint): number => {
  const unit = 10n ** 60n
  let power = unit
  let factorial = 1n
  let sum = 0n
  for (let n = 1n; n < 60n; n += 1n) {
    power = (power * parts) / 10n ** 9n
    factorial *= n + 1n
    sum += (n % 2n === 1n ? power : -power) / factorial
  }
  return Number(sum / 10n ** 30n) / 1e30
}

describe('eventProbability', () => {
  it('agrees with a hand calculation of each exposure', () => {
    expectClose(eventProbability(deepFreeze(flown('a', 1e-3, 2))), 1 - Math.exp(-0.002), { rel: 1e-12 })
    expectClose(eventProbability(latent('a', 0.02, 100)), 1 - (1 - Math.exp(-2)) / 2, { rel: 1e-12 })
    expect(eventProbability(chance('a', 0.3))).toBe(0.3)
  })

  it('keeps its digits for tiny rates', () => {
    expectClose(eventProbability(flown('a', 1e-15, 1)), 1e-15, { rel: 1e-14 })
    expectClose(eventProbability(latent('a', 1e-15, 1)), 5e-16, { rel: 1e-14 })
    expect(eventProbability(latent('a', 5e-324, 1e-3))).toBe(0)
  })

  it('is right to 1e-12 at any λT, against whole-number arithmetic', () => {
    for (const parts of [1n, 10n, 999n, 10n ** 5n, 999_999n, 10n ** 6n, 1_000_001n, 5n * 10n ** 6n, 10n ** 8n, 999_999_999n, 10n ** 9n, 1_000_000_001n, 3n * 10n ** 9n]) {
      expectClose(eventProbability(latent('a', Number(parts) / 1e9, 1)), latentByWholeNumbers(parts), { rel: 1e-12 })
    }
  })

  it('grows with the interval without a step', () => {
    fc.assert(fc.property(fc.double({ min: -12, max: 3, noNaN: true }), (exponent) => {
      const x = 10 ** exponent
      const [before, at, after] = [1 - 1e-6, 1, 1 + 1e-6].map((factor) => eventProbability(latent('a', x * factor, 1))) as [number, number, number]
      expect(after).toBeGreaterThan(at)
      expect(at).toBeGreaterThan(before)
      expectClose(after - at, at - before, { rel: 1e-3 })
    }))
  })

  it('is sure of a very large exposure', () => {
    expect(eventProbability(flown('a', 1e308, 1e308))).toBe(1)
    expect(eventProbability(latent('a', 1e308, 1e308))).toBe(1)
    expectClose(eventProbability(latent('a', 10, 100)), 0.999, { rel: 1e-12 })
    expect(eventProbability(flown('a', 0, 1e308))).toBe(0)
    expect(eventProbability(flown('a', 1, 0))).toBe(0)
  })

  it('multiplies the rate by heat, and not a probability', () => {
    const rate = 1e-9 * Math.exp(-(0.4 / 8.617e-5) * (1 / 360 - 1 / 300))
    expectClose(eventProbability({ ...flown('a', 1e-9, 1), ...heat }), -Math.expm1(-rate), { rel: 1e-12 })
    expect(eventProbability({ ...flown('a', 1e-9, 1), temperatureK: 300, referenceK: 300, activationEv: 0.4 })).toBe(eventProbability(flown('a', 1e-9, 1)))
    expect(eventProbability({ ...flown('a', 1e-9, 1), ...heat, activationEv: 0 })).toBe(eventProbability(flown('a', 1e-9, 1)))
    expect(eventProbability({ ...chance('a', 0.2), ...heat })).toBe(0.2)
  })

  it('names what cannot be used', () => {
    const of = (change: object) => () => eventProbability({ ...flown('a', 1e-4), ...change } as FaultEvent)
    for (const bad of [undefined, null, 5, 'x', []]) expectCalcError(() => eventProbability(bad as never), 'event')
    for (const id of ['', 5, null]) expectCalcError(of({ id }), 'event.id')
    for (const ratePerH of [undefined, null, -1e-9, Number.NaN, Infinity, '1']) expectCalcError(of({ ratePerH }), 'event.ratePerH')
    expectCalcError(() => eventProbability({ ...chance('a', 0.1), ratePerH: -1 }), 'event.ratePerH')
    for (const name of ['temperatureK', 'referenceK', 'activationEv']) {
      for (const bad of [undefined, null, -1, Number.NaN]) expectCalcError(of({ ...heat, [name]: bad }), `event.${name}`)
    }
    for (const name of ['temperatureK', 'referenceK']) expectCalcError(of({ ...heat, [name]: 0 }), `event.${name}`)
    expectCalcError(of({ temperatureK: 400, referenceK: 1, activationEv: 1 }), 'event.activationEv')
    expectCalcError(of({ ...heat, ratePerH: 1e308, temperatureK: 400 }), 'event.ratePerH')
    for (const exposure of [undefined, null, 5, []]) expectCalcError(of({ exposure }), 'event.exposure')
    expectCalcError(of({ exposure: { kind: 'sometimes' } }), 'event.exposure.kind')
    for (const hours of [-1, Number.NaN, undefined]) expectCalcError(of({ exposure: { kind: 'flight', hours } }), 'event.exposure.hours')
    for (const checkIntervalHours of [0, -1, Infinity, undefined]) expectCalcError(of({ exposure: { kind: 'latent', checkIntervalHours } }), 'event.exposure.checkIntervalHours')
    for (const p of [-1e-9, 1.000001, Number.NaN, undefined]) expectCalcError(of({ exposure: { kind: 'probability', p } }), 'event.exposure.p')
  })
})
