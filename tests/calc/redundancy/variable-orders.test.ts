import fc from 'fast-check'
import { expect, it } from 'vitest'
import { faultTreeProbability, type FaultTree } from '@/lib/calc/live'
import { takeTree } from '@/lib/calc/redundancy/take-tree'
import { variableOrders } from '@/lib/calc/redundancy/variable-orders'
import { expectClose } from '@/tests/support/expect-close'
import { anyTree } from './brute-force'
import { generatedTree } from './generated-tree'
import { flown } from './trees'

it('every order asks for each leaf below the top once, common causes included', () => {
  fc.assert(fc.property(anyTree(7), (tree) => {
    const [first, ...others] = variableOrders(takeTree(tree)).map((order) => order().sort((a, b) => a - b))
    expect(new Set(first).size).toBe(first?.length)
    for (const other of others) expect(other).toEqual(first)
  }))
})

it('a tree that its first order makes too large comes out the same, its cause taken apart by hand', () => {
  // Both parts of the cause fail for sure with it: the top is a mean of two trees without a cause.
  const plain = generatedTree(2, 60, [36, 26, 10, 5, 2, 1], 1)
  const withRates = (rates: readonly [number, number]): FaultTree => ({ ...plain, events: plain.events.map((event, i) => (i < 2 ? flown(event.id, rates[i] ?? 0, 1) : event)) })
  const cause = -Math.expm1(-0.25 * 0.2)
  const apart = cause * faultTreeProbability(withRates([1e3, 1e3])) + (1 - cause) * faultTreeProbability(withRates([0.15, 0.15]))
  expectClose(faultTreeProbability({ ...withRates([0.2, 0.2]), commonCause: [{ id: 'both', events: ['e0', 'e1'], beta: 0.25 }] }), apart, { rel: 1e-12 })
}, 30_000)
