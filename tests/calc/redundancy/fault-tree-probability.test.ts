import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { faultTreeProbability, type FaultTree } from '@/lib/calc/live'
import { deepFreeze } from '@/tests/support/deep-freeze'
import { expectCalcError } from '@/tests/support/expect-calc-error'
import { expectClose } from '@/tests/support/expect-close'
import { anyTree, leavesOf, sumOver, tableOf } from './brute-force'
import { chance, flown, heat, large, latent, repeated, trains, treeOf, twoOfThree } from './trees'

const byHand = (tree: FaultTree): number => {
  const leaves = leavesOf(tree)
  return sumOver(tableOf(tree, leaves), leaves.map(({ probability }) => probability))
}

describe('faultTreeProbability', () => {
  it('gives the solved examples', () => {
    expectClose(faultTreeProbability(deepFreeze(trains)), 0.7225, { rel: 1e-12 })
    expectClose(faultTreeProbability(repeated), 0.662208, { rel: 1e-12 })
    expectClose(faultTreeProbability(twoOfThree), 0.098, { rel: 1e-12 })
    // Counted over all 2²⁵ states; the source prints 0.0045691.
    expectClose(faultTreeProbability(large), 0.00456932178049746, { rel: 1e-13 })
  })

  it('agrees with the sum over all states', () => {
    fc.assert(fc.property(anyTree(7), (tree) => {
      expectClose(faultTreeProbability(deepFreeze(tree)), byHand(tree), { rel: 1e-11, abs: 1e-300 })
    }), { numRuns: 100 })
  }, 30_000)

  it('agrees with the sum over the states of sixteen events', () => {
    const events = Array.from({ length: 16 }, (_, i) => chance(`e${i}`, 0.02 * (i + 1)))
    const tree = treeOf(`
      T 2 A B C D
      A or e0 e1 E
      B and e2 F e3
      C 3 e4 e5 e6 e7 e0 F
      D or e8 E e9
      E and e10 e11 e1
      F or e12 e13 e14 e15 e4`, events)
    expectClose(faultTreeProbability(tree), byHand(tree), { rel: 1e-12 })
  })

  it('grows, or stays, as each event grows; its complement is that of the tree turned about', () => {
    const p = fc.array(fc.double({ min: 0, max: 1, noNaN: true }), { minLength: 7, maxLength: 7 })
    const withChances = (chances: readonly number[], turned = false): FaultTree => ({
      ...repeated,
      events: repeated.events.map(({ id }, i) => chance(id, chances[i] ?? 0)),
      gates: turned ? repeated.gates.map((gate) => ({ ...gate, kind: gate.kind === 'or' ? 'and' : 'or' } as const)) : repeated.gates,
    })
    fc.assert(fc.property(p, fc.nat(6), (chances, i) => {
      expect(faultTreeProbability(withChances(chances.map((value, j) => (i === j ? (1 + value) / 2 : value))))).toBeGreaterThanOrEqual(faultTreeProbability(withChances(chances)) - 1e-15)
      expectClose(faultTreeProbability(withChances(chances)), 1 - faultTreeProbability(withChances(chances.map((value) => 1 - value), true)), { abs: 1e-14 })
    }))
  })

  it('keeps the digits of tiny probabilities', () => {
    expectClose(faultTreeProbability(treeOf('T and a b c', ['a', 'b', 'c'].map((id) => flown(id, 1e-15, 1)))), 1e-45, { rel: 1e-13 })
  })

  it('takes an event as top, an input named twice, and a gate nobody uses', () => {
    expect(faultTreeProbability({ top: 'a', events: [chance('a', 0.3)], gates: [] })).toBe(0.3)
    expectClose(faultTreeProbability(treeOf('T 2 a a b c', [chance('a', 0.1), chance('b', 0.5), chance('c', 0.5)])), 0.1 + 0.9 * 0.25, { rel: 1e-12 })
    expect(faultTreeProbability(treeOf('T or a\nU and b a', [chance('a', 0.3), chance('b', 1)]))).toBe(0.3)
  })

  it('shares a common cause by its beta: the independent part keeps (1 − beta)·λ', () => {
    const twins = (beta: number) => treeOf('T and a b', [flown('a', 1e-3, 10), flown('b', 1e-3, 10)], { commonCause: [{ id: 'both', events: ['a', 'b'], beta }] })
    const own = -Math.expm1(-0.9 * 0.01)
    const cause = -Math.expm1(-0.1 * 0.01)
    expectClose(faultTreeProbability(twins(0.1)), cause + (1 - cause) * own ** 2, { rel: 1e-12 })
    expectClose(faultTreeProbability(twins(0)), (-Math.expm1(-0.01)) ** 2, { rel: 1e-12 })
    expectClose(faultTreeProbability(twins(1)), -Math.expm1(-0.01), { rel: 1e-12 })
  })

  it('neither overflows nor hangs on deep and wide trees', () => {
    const n = 8_000
    const events = Array.from({ length: n }, (_, i) => chance(`e${i}`, 1e-6))
    const chain = (kinds: readonly ('and' | 'or')[]): FaultTree => ({
      top: 'g0', events,
      gates: Array.from({ length: n - 1 }, (_, i) => ({ id: `g${i}`, kind: kinds[i % kinds.length] ?? 'or', inputs: [i === n - 2 ? `e${n - 1}` : `g${i + 1}`, `e${i}`] })),
    })
    expectClose(faultTreeProbability(chain(['or'])), -Math.expm1(n * Math.log1p(-1e-6)), { rel: 1e-9 })
    expectClose(faultTreeProbability(chain(['or', 'and'])), 1e-6 + 1e-12, { rel: 1e-9 })
    expectClose(faultTreeProbability({ top: 'T', events, gates: [{ id: 'T', kind: 'atLeast', k: 2, inputs: events.map(({ id }) => id) }] }), 1 - (1 - 1e-6) ** n - n * 1e-6 * (1 - 1e-6) ** (n - 1), { rel: 1e-7 })
  }, 30_000)

  it('says when a tree is too large to be computed', () => {
    const inputs = Array.from({ length: 4000 }, (_, i) => `e${i}`)
    const error = expectCalcError(() => faultTreeProbability({ top: 'T', events: inputs.map((id) => chance(id, 0.1)), gates: [{ id: 'T', kind: 'atLeast', k: 2000, inputs }] }), 'tree')
    expect(error.message).toContain('entangled')
  }, 30_000)
})

describe('a tree that cannot be used', () => {
  const good = treeOf('T or A a\nA 2 a b c', [flown('a', 1e-4), flown('b', 1e-4), latent('c', 1e-4)], { commonCause: [{ id: 'x', events: ['a', 'b'], beta: 0.1 }] })
  const of = (change: object) => () => faultTreeProbability({ ...good, ...change } as FaultTree)
  const gates = (i: number, change: object) => of({ gates: good.gates.map((gate, j) => (i === j ? { ...gate, ...change } : gate)) })
  const events = (i: number, change: object) => of({ events: good.events.map((event, j) => (i === j ? { ...event, ...change } : event)) })
  const cause = (change: object) => of({ commonCause: [{ id: 'x', events: ['a', 'b'], beta: 0.1, ...change }] })

  it('names the place of an event', () => {
    for (const bad of [undefined, null, 5, []]) expectCalcError(() => faultTreeProbability(bad as never), 'tree')
    for (const bad of [undefined, null, [], {}]) expectCalcError(of({ events: bad }), 'tree.events')
    expectCalcError(of({ events: new Array(3) }), 'tree.events.0')
    for (const id of ['a', 'T', 'A', '', undefined, 5]) expectCalcError(events(1, { id }), 'tree.events.1.id')
    expectCalcError(events(2, { ratePerH: -1 }), 'tree.events.2.ratePerH')
    expectCalcError(events(2, { temperatureK: 300 }), 'tree.events.2.referenceK')
    expectCalcError(events(2, { exposure: { kind: 'latent', checkIntervalHours: 0 } }), 'tree.events.2.exposure.checkIntervalHours')
  })

  it('names the place of a gate', () => {
    for (const bad of [undefined, null, {}]) expectCalcError(of({ gates: bad }), 'tree.gates')
    expectCalcError(of({ gates: new Array(2) }), 'tree.gates.0')
    for (const id of ['T', '', 5]) expectCalcError(gates(1, { id }), 'tree.gates.1.id')
    expectCalcError(gates(1, { kind: 'xor' }), 'tree.gates.1.kind')
    for (const inputs of [undefined, [], 'a']) expectCalcError(gates(1, { inputs }), 'tree.gates.1.inputs')
    for (const input of ['nobody', 'x', 5, undefined]) expectCalcError(gates(1, { inputs: ['a', input, 'c'] }), 'tree.gates.1.inputs.1')
    for (const k of [0, 4, 1.5, -1, undefined, null, Number.NaN]) expectCalcError(gates(1, { k }), 'tree.gates.1.k')
    for (const top of ['nobody', 'x', '', undefined, 5]) expectCalcError(of({ top }), 'tree.top')
  })

  it('refuses a loop, wherever it stands', () => {
    expectCalcError(gates(1, { inputs: ['a', 'b', 'T'] }), 'tree.gates')
    expectCalcError(gates(1, { inputs: ['a', 'b', 'A'] }), 'tree.gates')
    expect(expectCalcError(of({ gates: [...good.gates, { id: 'U', kind: 'or', inputs: ['V'] }, { id: 'V', kind: 'or', inputs: ['U'] }] }), 'tree.gates').message).toContain('loop')
  })

  it('names the place of a common cause', () => {
    for (const bad of [null, {}, 5]) expectCalcError(of({ commonCause: bad }), 'tree.commonCause')
    expectCalcError(of({ commonCause: [5] }), 'tree.commonCause.0')
    for (const id of ['a', 'T', '', undefined]) expectCalcError(cause({ id }), 'tree.commonCause.0.id')
    for (const beta of [-0.1, 1.1, undefined, null]) expectCalcError(cause({ beta }), 'tree.commonCause.0.beta')
    for (const list of [undefined, [], 'a']) expectCalcError(cause({ events: list }), 'tree.commonCause.0.events')
    for (const id of ['nobody', 'A', 'a', 5, 'c']) expectCalcError(cause({ events: ['a', id] }), 'tree.commonCause.0.events.1')
    expectCalcError(of({ commonCause: [{ id: 'x', events: ['a'], beta: 0.1 }, { id: 'y', events: ['b', 'a'], beta: 0.1 }] }), 'tree.commonCause.1.events.1')
    expectCalcError(of({ commonCause: [{ id: 'x', events: ['a'], beta: 0.1 }, { id: 'x', events: ['b'], beta: 0.1 }] }), 'tree.commonCause.1.id')
    for (const change of [{ ratePerH: 2e-4 }, { exposure: { kind: 'flight', hours: 3 } }, { exposure: { kind: 'latent', checkIntervalHours: 2 } }, { exposure: { kind: 'probability', p: 0.1 } }, heat]) {
      expectCalcError(events(1, change), 'tree.commonCause.0.events.1')
    }
  })
})
