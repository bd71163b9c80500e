import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { firingSchedule } from '@/lib/calc/live'
import { deepFreeze } from '@/tests/support/deep-freeze'
import { expectCalcError } from '@/tests/support/expect-calc-error'
import { expectClose } from '@/tests/support/expect-close'

const permutation = fc.integer({ min: 1, max: 12 }).chain((n) => {
  const numbers = Array.from({ length: n }, (_, i) => i + 1)
  return fc.shuffledSubarray(numbers, { minLength: n, maxLength: n })
})

describe('firingSchedule', () => {
  it('spaces the firings evenly unless told otherwise', () => {
    expect(firingSchedule({ firingOrder: [1, 4, 5, 2, 3, 6] })).toEqual([
      { cylinder: 1, atDeg: 0 }, { cylinder: 4, atDeg: 120 }, { cylinder: 5, atDeg: 240 },
      { cylinder: 2, atDeg: 360 }, { cylinder: 3, atDeg: 480 }, { cylinder: 6, atDeg: 600 },
    ])
    expect(firingSchedule({ firingOrder: [1] })).toEqual([{ cylinder: 1, atDeg: 0 }])
  })

  it('follows given intervals; the last one leads back to the first', () => {
    expect(firingSchedule({ firingOrder: [2, 1, 3], intervalsDeg: [180, 270, 270] })).toEqual([
      { cylinder: 2, atDeg: 0 }, { cylinder: 1, atDeg: 180 }, { cylinder: 3, atDeg: 450 },
    ])
    expect(firingSchedule({ firingOrder: [1, 2], intervalsDeg: [360.0000004, 359.9999999] })).toHaveLength(2)
  })

  it('even intervals written out give the default', () => {
    fc.assert(fc.property(permutation, (firingOrder) => {
      const even = firingSchedule({ firingOrder })
      const written = firingSchedule({ firingOrder, intervalsDeg: firingOrder.map(() => 720 / firingOrder.length) })
      expect(written.map(({ cylinder }) => cylinder)).toEqual(firingOrder)
      written.forEach(({ atDeg }, i) => expectClose(atDeg, even[i]?.atDeg, { rel: 1e-12, abs: 1e-12 }))
    }))
  })

  it('leaves its arguments alone and hands out fresh results', () => {
    const input = deepFreeze({ firingOrder: [1, 2], intervalsDeg: [300, 420] })
    const first = firingSchedule(input)
    first.pop()
    expect(firingSchedule(input)).toHaveLength(2)
  })

  it('refuses what is no permutation', () => {
    const of = (firingOrder: unknown) => () => firingSchedule({ firingOrder } as never)
    expectCalcError(of(undefined), 'firingOrder')
    expectCalcError(of([]), 'firingOrder')
    expectCalcError(of('123'), 'firingOrder')
    expectCalcError(of([1, 2, 2]), 'firingOrder.2')
    expectCalcError(of([1, 2, 4]), 'firingOrder.2')
    expectCalcError(of([0, 1]), 'firingOrder.0')
    expectCalcError(of([1, 1.5]), 'firingOrder.1')
    expectCalcError(of(new Array(1_000_000_000)), 'firingOrder.0')
    expectCalcError(() => firingSchedule(undefined as never), 'firingOrder')
    expect(expectCalcError(of([3, 1, 3]), 'firingOrder.2').message).toContain('cylinder 3 twice')
  })

  it('refuses intervals that make no cycle', () => {
    const of = (intervalsDeg: unknown) => () => firingSchedule({ firingOrder: [1, 2], intervalsDeg } as never)
    expectCalcError(of(null), 'intervalsDeg')
    expectCalcError(of([]), 'intervalsDeg')
    expectCalcError(of([720]), 'intervalsDeg')
    expectCalcError(of([360, 361]), 'intervalsDeg')
    expectCalcError(of([360, 360.000002]), 'intervalsDeg')
    expectCalcError(of([720, 0]), 'intervalsDeg.1')
    expectCalcError(of([-10, 730]), 'intervalsDeg.0')
    expectCalcError(of([, 720]), 'intervalsDeg.0')
    expectCalcError(of([Number.NaN, 360]), 'intervalsDeg.0')
    expectCalcError(of([1e308, 1e308]), 'intervalsDeg')
  })
})
