import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { crankDegFromDistributor, distributorDegFromCrank } from '@/lib/calc/live'
import { expectCalcError } from '@/tests/support/expect-calc-error'

describe('distributor and crank degrees', () => {
  it('a distributor turns at half crank speed', () => {
    expect(distributorDegFromCrank(27)).toBe(13.5)
    expect(crankDegFromDistributor(-6.25)).toBe(-12.5)
    expect(distributorDegFromCrank(720)).toBe(360)
  })

  it('undo each other exactly', () => {
    fc.assert(fc.property(fc.double({ min: -1e9, max: 1e9, noNaN: true }), (deg) => {
      fc.pre(Math.abs(deg) > 1e-300)
      expect(crankDegFromDistributor(distributorDegFromCrank(deg))).toBe(deg)
    }))
  })

  it('name the argument that cannot be used', () => {
    for (const bad of [Number.NaN, Infinity, undefined, null, '3', [], {}]) {
      expectCalcError(() => distributorDegFromCrank(bad as number), 'deg')
      expectCalcError(() => crankDegFromDistributor(bad as number), 'deg')
    }
    expectCalcError(() => crankDegFromDistributor(1.5e308), 'deg')
  })
})
