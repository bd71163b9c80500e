import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { bestPhasingDeg, rotorRegister } from '@/lib/calc/live'
import { deepFreeze } from '@/tests/support/deep-freeze'
import { expectCalcError } from '@/tests/support/expect-calc-error'
import { expectClose } from '@/tests/support/expect-close'

const cap = { cylinders: 6, terminalWidthDeg: 7, rotorWidthDeg: 19, phasedAtDeg: 21, advancesDeg: [27, 21, 9] }
const advances = fc.array(fc.double({ min: -20, max: 60, noNaN: true }), { minLength: 1, maxLength: 8 })

describe('rotorRegister', () => {
  it('agrees with a hand calculation; the spark later than the phasing finds the rotor past centre', () => {
    expect(rotorRegister(deepFreeze(cap))).toEqual([
      { advanceDeg: 27, offsetDeg: -3, registerDeg: 10, freeDeg: 44 },
      { advanceDeg: 21, offsetDeg: 0, registerDeg: 13, freeDeg: 47 },
      { advanceDeg: 9, offsetDeg: 6, registerDeg: 7, freeDeg: 41 },
    ])
  })

  it('an offset beyond the half widths has parted the edges', () => {
    expect(rotorRegister({ ...cap, advancesDeg: [-9] })[0]).toEqual({ advanceDeg: -9, offsetDeg: 15, registerDeg: -2, freeDeg: 32 })
  })

  it('register and free angle lose what the offset gains; a wider rotor trades one for the other', () => {
    fc.assert(fc.property(advances, fc.integer({ min: 1, max: 12 }), fc.double({ min: 0.1, max: 30, noNaN: true }), (advancesDeg, cylinders, rotorWidthDeg) => {
      for (const { offsetDeg, registerDeg, freeDeg } of rotorRegister({ ...cap, cylinders, rotorWidthDeg, advancesDeg })) {
        expectClose(registerDeg + freeDeg, 360 / cylinders - 2 * Math.abs(offsetDeg), { abs: 1e-9 })
        expectClose(registerDeg - freeDeg, rotorWidthDeg + cap.terminalWidthDeg - 360 / cylinders, { abs: 1e-9 })
      }
    }))
  })

  it('is symmetric about the phasing', () => {
    const [early, late] = rotorRegister({ ...cap, advancesDeg: [21 + 7, 21 - 7] })
    expect(early?.offsetDeg).toBe(-3.5)
    expect(late?.offsetDeg).toBe(3.5)
    expect(early?.registerDeg).toBe(late?.registerDeg)
  })

  it('names the argument that cannot be used', () => {
    const of = (change: object) => () => rotorRegister({ ...cap, ...change } as never)
    for (const cylinders of [0, 2.5, -6, undefined, '6']) expectCalcError(of({ cylinders }), 'cylinders')
    for (const terminalWidthDeg of [0, -1, 60, 400, Number.NaN]) expectCalcError(of({ terminalWidthDeg }), 'terminalWidthDeg')
    for (const rotorWidthDeg of [0, -1, 360, null]) expectCalcError(of({ rotorWidthDeg }), 'rotorWidthDeg')
    for (const phasedAtDeg of [Number.NaN, undefined, '21']) expectCalcError(of({ phasedAtDeg }), 'phasedAtDeg')
    for (const advancesDeg of [undefined, null, [], 21]) expectCalcError(of({ advancesDeg }), 'advancesDeg')
    expectCalcError(of({ advancesDeg: [21, Number.NaN] }), 'advancesDeg.1')
    expectCalcError(of({ phasedAtDeg: 1.5e308, advancesDeg: [-1.5e308] }), 'advancesDeg.0')
    expectCalcError(() => rotorRegister(undefined as never), 'cylinders')
  })
})

describe('bestPhasingDeg', () => {
  it('is the middle of the extremes', () => {
    expect(bestPhasingDeg([9, 27, 14, 26])).toBe(18)
    expect(bestPhasingDeg([12.5])).toBe(12.5)
    expect(bestPhasingDeg([1.6e308, 1.4e308])).toBe(1.5e308)
  })

  it('makes the smallest register as large as it can be', () => {
    fc.assert(fc.property(advances, fc.double({ min: -5, max: 5, noNaN: true }), (advancesDeg, shift) => {
      const worst = (phasedAtDeg: number) => Math.min(...rotorRegister({ ...cap, phasedAtDeg, advancesDeg }).map(({ registerDeg }) => registerDeg))
      const best = bestPhasingDeg(deepFreeze(advancesDeg))
      expect(worst(best)).toBeGreaterThanOrEqual(worst(best + shift) - 1e-9)
    }))
  })

  it('names what cannot be used', () => {
    for (const bad of [undefined, null, [], 5, 'x']) expectCalcError(() => bestPhasingDeg(bad as never), 'advancesDeg')
    expectCalcError(() => bestPhasingDeg([5, Infinity]), 'advancesDeg.1')
    expectCalcError(() => bestPhasingDeg(['5'] as never), 'advancesDeg.0')
  })
})
