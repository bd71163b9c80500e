import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { minimalCutSets, singlePoints, type FaultTree } from '@/lib/calc/live'
import { deepFreeze } from '@/tests/support/deep-freeze'
import { expectCalcError } from '@/tests/support/expect-calc-error'
import { anyTree, cutSetsByHand } from './brute-force'
import { chance, flown, heat, large, repeated, tank, trains, treeOf, twoOfThree } from './trees'

const orders = (sets: readonly (readonly string[])[]): Record<number, number> => {
  const counts: Record<number, number> = {}
  for (const { length } of sets) counts[length] = (counts[length] ?? 0) + 1
  return counts
}

/** n times (a or b) and …: 2 to the n cut sets. */
const pairs = (n: number): FaultTree => treeOf([`T and ${Array.from({ length: n }, (_, i) => `g${i}`).join(' ')}`, ...Array.from({ length: n }, (_, i) => `g${i} or a${i} b${i}`)].join('\n'),
  Array.from({ length: n }, (_, i) => [chance(`a${i}`, 0.1), chance(`b${i}`, 0.1)]).flat())

describe('minimalCutSets', () => {
  it('gives those of the solved examples', () => {
    expect(minimalCutSets(deepFreeze(tank))).toEqual([['K2'], ['TANK'], ['K1', 'S'], ['R', 'S'], ['S', 'S1']])
    expect(minimalCutSets(trains)).toEqual([['P1', 'P2'], ['P1', 'V2'], ['P2', 'V1'], ['V1', 'V2']])
    expect(minimalCutSets(repeated)).toEqual([['C'], ['B', 'D'], ['D', 'F'], ['D', 'G'], ['B', 'H', 'I'], ['F', 'H', 'I'], ['G', 'H', 'I']])
    expect(minimalCutSets(twoOfThree)).toEqual([['A', 'B'], ['A', 'C'], ['B', 'C']])
    expect(orders(minimalCutSets(large))).toEqual({ 2: 12, 4: 24, 5: 188, 6: 168 })
  })

  it('agrees with a look at every state', () => {
    fc.assert(fc.property(anyTree(6), (tree) => {
      expect(minimalCutSets(deepFreeze(tree))).toEqual(cutSetsByHand(tree))
    }), { numRuns: 100 })
  }, 30_000)

  it('cut to an order is the same list, cut', () => {
    fc.assert(fc.property(anyTree(6), fc.integer({ min: 1, max: 9 }), (tree, maxOrder) => {
      expect(minimalCutSets(tree, { maxOrder })).toEqual(minimalCutSets(tree).filter(({ length }) => length <= maxOrder))
    }))
    expect(orders(minimalCutSets(large, { maxOrder: 4 }))).toEqual({ 2: 12, 4: 24 })
    expect(minimalCutSets(large, { maxOrder: 1e15 })).toHaveLength(392)
    expect(minimalCutSets(pairs(40), { maxOrder: 39 })).toEqual([])
  })

  it('lists a common cause beside the events it fails', () => {
    const tree = treeOf('T and a b', [flown('a', 1e-4), flown('b', 1e-4)], { commonCause: [{ id: 'both', events: ['a', 'b'], beta: 0.1 }] })
    expect(minimalCutSets(tree)).toEqual([['both'], ['a', 'b']])
  })

  it('finds tens of thousands, and says when there are too many', () => {
    expect(minimalCutSets(pairs(15))).toHaveLength(2 ** 15)
    expect(expectCalcError(() => minimalCutSets(pairs(18)), 'tree').message).toContain('maxOrder')
    expectCalcError(() => minimalCutSets(pairs(18), { maxOrder: 18 }), 'maxOrder')
    expect(minimalCutSets(pairs(18), { maxOrder: 17 })).toEqual([])
  }, 30_000)

  it('stops where it is told to', () => {
    const stop = new AbortController()
    stop.abort(new Error('enough'))
    expect(() => minimalCutSets(tank, { signal: stop.signal })).toThrow('enough')
    let looks = 0
    const signal = { get aborted() { looks += 1; return looks > 4 }, reason: new Error('late enough') }
    expect(() => minimalCutSets(pairs(17), { signal })).toThrow('late enough')
    expect(minimalCutSets(tank, { signal: new AbortController().signal })).toHaveLength(5)
    expect(() => minimalCutSets(tank, { signal: { aborted: true } })).toThrow(DOMException)
  })

  it('names an option that cannot be used', () => {
    for (const maxOrder of [0, -1, 1.5, Number.NaN, null, '2']) expectCalcError(() => minimalCutSets(tank, { maxOrder } as never), 'maxOrder')
    for (const signal of [null, 5, {}, { aborted: 'no' }]) expectCalcError(() => minimalCutSets(tank, { signal } as never), 'signal')
    for (const options of [null, 5, []]) expectCalcError(() => minimalCutSets(tank, options as never), 'options')
    expectCalcError(() => minimalCutSets({ ...tank, top: 'nobody' }), 'tree.top')
  })
})

describe('singlePoints', () => {
  it('are the cut sets of one, with what heat shortens marked', () => {
    const tree = treeOf('T or z A m\nA and a b', [flown('z', 1e-5), { ...flown('a', 1e-4), ...heat }, { ...flown('b', 1e-4), ...heat }, { ...flown('m', 0), ...heat }, { ...flown('q', 1), ...heat }],
      { commonCause: [{ id: 'both', events: ['a', 'b'], beta: 0.1 }] })
    expect(singlePoints(deepFreeze(tree))).toEqual([{ id: 'both', heatSensitive: true }, { id: 'm', heatSensitive: true }, { id: 'z', heatSensitive: false }])
    expect(singlePoints(trains)).toEqual([])
    expect(singlePoints(treeOf('T or a', [{ ...flown('a', 1), ...heat, activationEv: 0 }]))).toEqual([{ id: 'a', heatSensitive: false }])
  })

  it('agree with the cut sets of any tree', () => {
    fc.assert(fc.property(anyTree(6), (tree) => {
      expect(singlePoints(tree).map(({ id }) => [id])).toEqual(minimalCutSets(tree).filter(({ length }) => length === 1))
    }))
    expectCalcError(() => singlePoints({ ...tank, gates: [] }), 'tree.top')
  })
})
