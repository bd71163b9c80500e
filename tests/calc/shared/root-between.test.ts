import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { rootBetween } from '@/lib/calc/shared/root-between'
import { expectClose } from '@/tests/support/expect-close'

describe('rootBetween', () => {
  it('finds the root of rising and falling functions, from either side', () => {
    fc.assert(fc.property(fc.double({ min: -0.99, max: 0.99, noNaN: true }), fc.constantFrom(1, 3, 7), fc.boolean(), (root, power, falls) => {
      const f = (x: number) => (falls ? -1 : 1) * ((x - root) ** power + 1e-3 * (x - root))
      expectClose(rootBetween(f, -1, 1, 1e-12), root, { abs: 1e-12 })
      expectClose(rootBetween(f, 1, -1, 1e-12), root, { abs: 1e-12 })
    }))
  })

  it('an end that is a root itself is the answer, and so is a root hit on the way', () => {
    expect(rootBetween((x) => x - 2, 2, 5, 0)).toBe(2)
    expect(rootBetween((x) => x - 5, 2, 5, 0)).toBe(5)
    expect(rootBetween((x) => x - 3, 2, 5, 0)).toBe(3)
  })

  it('comes to an end at a jump, and with ends of very unlike size', () => {
    expectClose(rootBetween((x) => (x < 0.3 ? -1 : 1), 0, 1, 0), 0.3, { rel: 1e-15 })
    let calls = 0
    const steep = (x: number) => { calls += 1; return x <= 320 ? -5e-324 : x - 320 }
    expectClose(rootBetween(steep, 320, 2000, 1e-11), 320, { abs: 1e-11 })
    expectClose(rootBetween(steep, 2000, 320, 1e-11), 320, { abs: 1e-11 })
    expect(calls).toBeLessThan(400)
  })
})
