import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { eventProbability, faultTreeProbability, rateSensitivity, timeAveragedProbability, type FaultEvent, type FaultTree } from '@/lib/calc/live'
import { someCases } from '@/tests/support/cases'
import { deepFreeze } from '@/tests/support/deep-freeze'
import { expectCalcError } from '@/tests/support/expect-calc-error'
import { expectClose } from '@/tests/support/expect-close'
import { anyTree, leavesOf, sumOver, tableOf } from './brute-force'
import { chance, flown, latent, tank, treeOf } from './trees'

const alike = (n: number, x: number, kind: string): FaultTree => {
  const ids = Array.from({ length: n }, (_, i) => `e${i}`)
  return treeOf(`T ${kind} ${ids.join(' ')}`, ids.map((id) => latent(id, x / 100)))
}

/** (1/x)·∫(1 − e^(−v))ⁿ dv = (1/x)·Σ qʲ/j over j > n, q = 1 − e^(−x): both ways of writing it, each where it keeps its digits. */
const meanOfAnd = (n: number, x: number): number => {
  const q = -Math.expm1(-x)
  const sum = (from: number, to: number) => Array.from({ length: to - from + 1 }, (_, i) => q ** (from + i) / (from + i)).reduce((total, term) => total + term, 0)
  return q < 0.9 ? sum(n + 1, n + 2000) / x : 1 - sum(1, n) / x
}

/** Simpson's rule over one interval for each of two, on sums over all states. */
const meanByHand = (tree: FaultTree, steps: number): number => {
  const leaves = leavesOf(tree)
  const table = tableOf(tree, leaves)
  const intervals = [...new Set(tree.events.flatMap(({ exposure }) => (exposure.kind === 'latent' ? [exposure.checkIntervalHours] : [])))]
  const ages = Array.from({ length: steps + 1 }, (_, i) => ({ age: i / steps, weight: (i === 0 || i === steps ? 1 : i % 2 === 1 ? 4 : 2) / (3 * steps) }))
  const at = (event: FaultEvent, known: ReadonlyMap<number, number>): number =>
    (event.exposure.kind === 'latent' ? -Math.expm1(-(event.ratePerH ?? 0) * event.exposure.checkIntervalHours * (known.get(event.exposure.checkIntervalHours) ?? 0)) : eventProbability(event))
  const mean = (left: readonly number[], known: ReadonlyMap<number, number>): number => {
    const [interval, ...rest] = left
    if (interval === undefined) return sumOver(table, leavesOf(tree, (event) => at(event, known)).map(({ probability }) => probability))
    return ages.reduce((sum, { age, weight }) => sum + weight * mean(rest, new Map([...known, [interval, age]])), 0)
  }
  return mean(intervals, new Map())
}

describe('timeAveragedProbability', () => {
  it.each(someCases([1e-9, 1e-4, 1e-3, 0.02, 0.3, 1, 1.5, 3, 10, 100, 1000, 1e6, 1e12]))('agrees with closed forms at λT %d', (x) => {
    for (const n of [2, 3, 4, 9, 40]) {
      const expected = meanOfAnd(n, x)
      if (expected > 1e-290) expectClose(timeAveragedProbability(alike(n, x, 'and')), expected, { rel: 1e-11 })
      expectClose(timeAveragedProbability(alike(n, x, 'or')), eventProbability(latent('one', (n * x) / 100)), { rel: 1e-11 })
    }
    expectClose(timeAveragedProbability(alike(3, x, '2')), 3 * meanOfAnd(2, x) - 2 * meanOfAnd(3, x), { rel: 1e-9 })
  })

  it('takes two and three faults of one interval at a third and a quarter, where the product of means says a quarter and an eighth', () => {
    const x = 1e-6
    expectClose(timeAveragedProbability(alike(2, x, 'and')) / x ** 2, 1 / 3, { rel: 1e-5 })
    expectClose(timeAveragedProbability(alike(3, x, 'and')) / x ** 3, 1 / 4, { rel: 1e-5 })
    expectClose(faultTreeProbability(alike(2, x, 'and')) / x ** 2, 1 / 4, { rel: 1e-5 })
    expectClose(faultTreeProbability(alike(3, x, 'and')) / x ** 3, 1 / 8, { rel: 1e-5 })
  })

  it('agrees with a fine sum over the ages of any tree', () => {
    fc.assert(fc.property(anyTree(4).filter(({ events, commonCause = [] }) => events.length + commonCause.length <= 7), (tree) => {
      expectClose(timeAveragedProbability(deepFreeze(tree)), meanByHand(tree, 60), { rel: 1e-5, abs: 1e-12 })
    }), { numRuns: 60 })
  }, 30_000)

  it('agrees with a very fine sum, common cause and second interval included', () => {
    const tree = treeOf('T or A B f\nA and a b\nB and c d a', [latent('a', 1e-3), latent('b', 1e-3), latent('c', 4e-3, 50), latent('d', 2e-2, 50), flown('f', 1e-4)], { commonCause: [{ id: 'both', events: ['a', 'b'], beta: 0.1 }] })
    expectClose(timeAveragedProbability(tree), meanByHand(tree, 120), { rel: 1e-9 })
  })

  it('leaves what does not age together as it is', () => {
    expect(timeAveragedProbability(tank)).toBe(faultTreeProbability(tank))
    const apart = treeOf('T and a b', [latent('a', 1e-3, 100), latent('b', 1e-3, 50)])
    expectClose(timeAveragedProbability(apart), faultTreeProbability(apart), { rel: 1e-14 })
  })

  it('is never kinder than the product of means in an and', () => {
    fc.assert(fc.property(fc.integer({ min: 2, max: 8 }), fc.double({ min: -8, max: 4, noNaN: true }), (n, exponent) => {
      const tree = alike(n, 10 ** exponent, 'and')
      expect(timeAveragedProbability(tree)).toBeGreaterThanOrEqual(faultTreeProbability(tree) * (1 - 1e-12))
    }))
  })

  it('is sure of a sure failure, and says when too many intervals come together', () => {
    expectClose(timeAveragedProbability(treeOf('T or a b c', [chance('c', 1), latent('a', 0.1), latent('b', 0.1)])), 1, { rel: 1e-15 })
    expectClose(timeAveragedProbability(treeOf('T and a b', [latent('a', 1e308, 1e308), latent('b', 1e308, 1e308)])), 1, { rel: 1e-15 })
    const many = Array.from({ length: 40 }, (_, i) => latent(`e${i}`, 0.1, 100 + (i >> 1)))
    expect(expectCalcError(() => timeAveragedProbability(treeOf(`T or ${many.map(({ id }) => id).join(' ')}`, many)), 'tree').message).toContain('interval')
    expectCalcError(() => timeAveragedProbability({ ...tank, top: '' }), 'tree.top')
  })
})

describe('rateSensitivity', () => {
  const tree = treeOf('T or A c p\nA and a b', [latent('a', 1e-3), chance('p', 0.01), latent('b', 2e-3), flown('c', 1e-4)])
  const scaled = (id: string, factor: number): FaultTree => ({ ...tree, events: tree.events.map((event) => (event.id === id ? { ...event, ratePerH: (event.ratePerH ?? 0) * factor } : event)) })

  it('is what the tree says with one rate changed', () => {
    const rows = rateSensitivity(deepFreeze(tree))
    expect(rows.map(({ id }) => id)).toEqual(['a', 'b', 'c'])
    for (const { id, nominal, tenth, tenfold } of someCases(rows)) {
      expectClose(nominal, timeAveragedProbability(tree), { rel: 1e-14 })
      expectClose(tenth, timeAveragedProbability(scaled(id, 0.1)), { rel: 1e-12 })
      expectClose(tenfold, timeAveragedProbability(scaled(id, 10)), { rel: 1e-12 })
    }
  })

  it('moves the parts of a common cause together', () => {
    const twins = (rate: number) => treeOf('T and a b', [latent('a', rate), latent('b', rate)], { commonCause: [{ id: 'both', events: ['a', 'b'], beta: 0.1 }] })
    const [a, b] = rateSensitivity(twins(1e-3))
    expect({ ...a, id: 'b' }).toEqual(b)
    expectClose(a?.tenth, timeAveragedProbability(twins(1e-4)), { rel: 1e-12 })
    expectClose(a?.tenfold, timeAveragedProbability(twins(1e-2)), { rel: 1e-12 })
  })

  it('is empty where nothing has a rate, and finite for any rate', () => {
    expect(rateSensitivity(tank)).toEqual([])
    expect(rateSensitivity(treeOf('T or a', [flown('a', 1.7e308, 0)]))).toEqual([{ id: 'a', nominal: 0, tenth: 0, tenfold: 0 }])
    expect(rateSensitivity(treeOf('T or a', [latent('a', 1.7e308, 9)]))).toEqual([{ id: 'a', nominal: 1, tenth: 1, tenfold: 1 }])
    expectCalcError(() => rateSensitivity({ ...tank, top: '' }), 'tree.top')
  })
})
