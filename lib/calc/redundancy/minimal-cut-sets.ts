import { CalcError } from '../calc-error'
import { takeOptionalNumber } from '../validate/number'
import { takeRecord } from '../validate/shape'
import { minimalFamily, setsOf } from './cut-set-family'
import { diagramOf, type Diagram } from './diagram'
import type { FaultTree } from './fault-tree-types'
import { OutOfBounds, tooLarge } from './node-table'
import type { ReadyTree } from './ready-tree'
import { takeTree } from './take-tree'

/** As much of an AbortSignal as is looked at. In a worker, one that reads shared memory can change while the computation runs. */
export interface StopSignal {
  readonly aborted: boolean
  readonly reason?: unknown
}

export interface CutSetOptions {
  readonly maxOrder?: number
  readonly signal?: StopSignal
}

const maxSets = 200_000
const bounds = { maxNodes: 2_000_000, maxSteps: 40_000_000 }

const takeSignal = (value: unknown): (() => void) => {
  if (value === undefined) return () => undefined
  const signal = takeRecord(value, 'signal', 'The signal')
  if (typeof signal.aborted !== 'boolean') {
    throw new CalcError({ field: 'signal', value, limit: 'an AbortSignal', unit: '', message: 'The signal must be an AbortSignal, or have its members aborted and reason.' })
  }
  return () => {
    if (signal.aborted === true) throw signal.reason ?? new DOMException('The search for cut sets was stopped.', 'AbortError')
  }
}

/** Sets by size, then by the places of their members. */
const inOrder = (a: readonly number[], b: readonly number[]): number => {
  if (a.length !== b.length) return a.length - b.length
  for (let i = 0; i < a.length; i += 1) {
    const difference = (a[i] ?? 0) - (b[i] ?? 0)
    if (difference !== 0) return difference
  }
  return 0
}

/** The cut sets of a tree that was checked, as lists of ids. */
export const cutSetsOf = (tree: ReadyTree, diagram: Diagram, maxOrder: number | null, check: () => void): string[][] => {
  const most = Math.min(maxOrder ?? Infinity, tree.leaves.length)
  const leafAt: number[] = []
  diagram.levelOf.forEach((level, leaf) => {
    if (level >= 0) leafAt[level] = leaf
  })
  let sets: number[][] | null = null
  try {
    sets = setsOf(minimalFamily(diagram, leafAt.length, most, bounds, check), most, maxSets, check)
  } catch (error) {
    if (!(error instanceof OutOfBounds)) throw error
  }
  if (sets === null) {
    throw tooLarge(maxOrder ?? tree.given, `at most ${maxSets} cut sets`,
      `This fault tree has more than ${maxSets} minimal cut sets, or more than can be told apart: give maxOrder, a smaller one where there is one, to look at the short ones alone.`,
      maxOrder === null ? 'tree' : 'maxOrder')
  }
  const ids = leafAt.map((leaf) => tree.leaves[leaf]?.id ?? '')
  const sorted = [...ids].sort()
  const rankOf = new Map(sorted.map((id, rank) => [id, rank]))
  const ranks = ids.map((id) => rankOf.get(id) ?? 0)
  check()
  for (const set of sets) {
    set.forEach((level, i) => {
      set[i] = ranks[level] ?? 0
    })
    set.sort((a, b) => a - b)
  }
  check()
  return sets.sort(inOrder).map((set) => set.map((rank) => sorted[rank] ?? ''))
}

/**
 * The smallest groups of faults that bring the top about, a list of lists of ids: ids sorted within a set, sets by size, then by their ids
 * (both by character code). A common cause stands under its own id beside the events it fails.
 *
 * minimal(node) = minimal(low) ∪ { s ∪ {x} : s in minimal(high), s holds no set of minimal(low) }, x the leaf of the node, over the tree's binary decision diagram
 *
 * Validity: what a tree is made of is told apart, not how likely it is: faults of rate 0 are listed. At most 200 000 sets.
 * Source: rauzy-1993, minimal solutions of a decision diagram (memory).
 *
 * @param tree as in `faultTreeProbability`
 * @param options.maxOrder most members of a set, a whole number ≥ 1; all sets when left out
 * @param options.signal an AbortSignal, looked at throughout: when it is aborted its reason is thrown. The call does not let other code of its thread run, so a signal serves where it can change meanwhile, as in a worker that reads shared memory
 * @throws CalcError on `tree` or below it as in `faultTreeProbability`, on `options`, `maxOrder` or `signal`; on `tree`, or on `maxOrder` where that was given, when there are too many sets
 * @example
 * minimalCutSets({ top: 'dead', events: [{ id: 'b', exposure: { kind: 'probability', p: 0.1 } }, { id: 'a', exposure: { kind: 'probability', p: 0.2 } }], gates: [{ id: 'dead', kind: 'and', inputs: ['b', 'a'] }] }) // → [['a', 'b']]
 */
export const minimalCutSets = (tree: FaultTree, options: CutSetOptions = {}): string[][] => {
  const members = takeRecord(options, 'options', 'The set of options')
  const ready = takeTree(tree)
  const maxOrder = takeOptionalNumber(members.maxOrder, 'maxOrder', { name: 'The most members of a cut set', unit: '', min: 1, integer: true }, null)
  const check = takeSignal(members.signal)
  check()
  return cutSetsOf(ready, diagramOf(ready), maxOrder, check)
}
