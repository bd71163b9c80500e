import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { importance } from '@/lib/calc/live'
import { deepFreeze } from '@/tests/support/deep-freeze'
import { expectCalcError } from '@/tests/support/expect-calc-error'
import { expectClose } from '@/tests/support/expect-close'
import { anyTree, leavesOf, sumOver, tableOf } from './brute-force'
import { chance, flown, large, tank, treeOf } from './trees'

describe('importance', () => {
  it('gives the published measures of event e1, and by them its chance given the top', () => {
    const [e1] = importance(deepFreeze(large))
    expect(e1?.id).toBe('e1')
    expectClose(e1?.birnbaum, 0.0745557, { abs: 5e-8 })
    expectClose(e1?.fussellVesely, 0.326332, { abs: 5e-7 })
    expectClose(e1?.riskAchievementWorth, 16.9902, { abs: 5e-5 })
    expectClose(e1?.riskReductionWorth, 1.48441, { abs: 5e-6 })
    expectClose((e1?.probability ?? 0) * (e1?.riskAchievementWorth ?? 0), 0.339805, { abs: 5e-7 })
  })

  it('agrees with sums over all states, each leaf set by hand', () => {
    fc.assert(fc.property(anyTree(6), (tree) => {
      const leaves = leavesOf(tree)
      const table = tableOf(tree, leaves)
      const chances = leaves.map(({ probability }) => probability)
      const top = sumOver(table, chances)
      const rows = importance(deepFreeze(tree))
      expect(rows.map(({ id }) => id)).toEqual(leaves.map(({ id }) => id))
      rows.forEach(({ probability, birnbaum, fussellVesely, riskAchievementWorth, riskReductionWorth }, i) => {
        const without = sumOver(table, chances.with(i, 0))
        const failed = sumOver(table, chances.with(i, 1))
        expectClose(probability, chances[i], { rel: 1e-12 })
        expectClose(birnbaum, failed - without, { abs: 1e-13 })
        if (top < 1e-100) return
        expectClose(fussellVesely, 1 - without / top, { abs: 1e-12 })
        expectClose(riskAchievementWorth, failed / top, { rel: 1e-10 })
        if (without < 1e-200) expect(riskReductionWorth === null || riskReductionWorth > 1e100).toBe(true)
        else expectClose(riskReductionWorth, top / without, { rel: 1e-10 })
      })
    }), { numRuns: 100 })
  }, 30_000)

  it('keeps its digits where one event is nearly all of the top', () => {
    const [a, b] = importance(treeOf('T or a b', [chance('a', 1e-3), chance('b', 1e-15)]))
    expectClose(a?.riskReductionWorth, 1e12 * (1 + 1e-12), { rel: 1e-12 })
    expectClose(b?.fussellVesely, 1e-12 * (1 - 1e-3), { rel: 1e-9 })
  })

  it('is null where infinite, or where nothing can fail', () => {
    expect(importance(treeOf('T and a b', [chance('a', 0.5), chance('b', 0.5), chance('c', 0.1)]))).toEqual([
      { id: 'a', probability: 0.5, birnbaum: 0.5, fussellVesely: 1, riskAchievementWorth: 2, riskReductionWorth: null },
      { id: 'b', probability: 0.5, birnbaum: 0.5, fussellVesely: 1, riskAchievementWorth: 2, riskReductionWorth: null },
      { id: 'c', probability: 0.1, birnbaum: 0, fussellVesely: 0, riskAchievementWorth: 1, riskReductionWorth: 1 },
    ])
    expect(importance(treeOf('T and a b', [chance('a', 0), chance('b', 0)]))[0]).toEqual({ id: 'a', probability: 0, birnbaum: 0, fussellVesely: null, riskAchievementWorth: null, riskReductionWorth: null })
  })

  it('puts the common causes last', () => {
    const tree = treeOf('T and a b', [flown('a', 1e-4), flown('b', 1e-4)], { commonCause: [{ id: 'both', events: ['b', 'a'], beta: 0.2 }] })
    expect(importance(tree).map(({ id }) => id)).toEqual(['a', 'b', 'both'])
    expectClose(importance(tree)[2]?.probability, 0.2 * 2e-4, { rel: 1e-4 })
    expectCalcError(() => importance({ ...tank, events: [] }), 'tree.events')
  })
})
