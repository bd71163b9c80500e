import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { arcMm, degFromArcMm } from '@/lib/calc/live'
import { expectCalcError } from '@/tests/support/expect-calc-error'
import { expectClose } from '@/tests/support/expect-close'

describe('arcMm and degFromArcMm', () => {
  it('agree with a hand calculation', () => {
    expectClose(arcMm(164, 9.5), 13.596114873035827, { rel: 1e-9 })
    expectClose(arcMm(164, 360), Math.PI * 164, { rel: 1e-12 })
    expectClose(degFromArcMm(164, Math.PI * 164 / 4), 90, { rel: 1e-12 })
  })

  it('undo each other and keep the sign', () => {
    const diameter = fc.double({ min: 1, max: 1000, noNaN: true })
    fc.assert(fc.property(diameter, fc.double({ min: -720, max: 720, noNaN: true }), (diameterMm, deg) => {
      expectClose(degFromArcMm(diameterMm, arcMm(diameterMm, deg)), deg, { rel: 1e-12, abs: 1e-300 })
      expect(arcMm(diameterMm, -deg) + 0).toBe(-arcMm(diameterMm, deg) + 0)
    }))
  })

  it('name the argument that cannot be used', () => {
    for (const bad of [0, -1, Number.NaN, Infinity, undefined, null, '150']) {
      expectCalcError(() => arcMm(bad as number, 10), 'diameterMm')
      expectCalcError(() => degFromArcMm(bad as number, 10), 'diameterMm')
    }
    expectCalcError(() => arcMm(150, Number.NaN), 'deg')
    expectCalcError(() => degFromArcMm(150, '1' as unknown as number), 'arcMm')
    expectCalcError(() => degFromArcMm(1e-300, 1e300), 'arcMm')
    expectCalcError(() => arcMm(1e300, 1e300), 'deg')
  })
})
