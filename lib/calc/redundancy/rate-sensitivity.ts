import { diagramOf } from './diagram'
import type { FaultTree } from './fault-tree-types'
import { meanOverIntervals, planOf } from './mean-over-intervals'
import { takeTree } from './take-tree'

export interface RateSensitivity {
  readonly id: string
  /** Probability of the top with the rates as given. */
  readonly nominal: number
  /** With this event's rate at a tenth. */
  readonly tenth: number
  /** With this event's rate ten times as high. */
  readonly tenfold: number
}

/**
 * What the top rests on each guessed rate: a list of `{ id, nominal, tenth, tenfold }`, probabilities of the top with the rates as given and with one rate at a tenth and ten times,
 * in the order of the events; an event that is given as a probability has no rate and is left out.
 *
 * `timeAveragedProbability` with λ/10 and 10·λ for the one event. Events of one common cause must have equal rates: they and the cause move together.
 *
 * Validity: as in `timeAveragedProbability`.
 * Source: common practice, no published source.
 *
 * @param tree as in `faultTreeProbability`
 * @throws CalcError on `tree` or below it as in `timeAveragedProbability`
 * @example
 * rateSensitivity({ top: 'a', events: [{ id: 'a', ratePerH: 0.001, exposure: { kind: 'flight', hours: 1 } }], gates: [] }) // → [{ id: 'a', nominal: 0.0009995, tenth: 0.0001000, tenfold: 0.0099502 }]
 */
export const rateSensitivity = (tree: FaultTree): RateSensitivity[] => {
  const ready = takeTree(tree)
  const plan = planOf(ready, diagramOf(ready))
  const times = 1 + 2 * ready.eventCount
  const nominal = meanOverIntervals(plan, undefined, times)
  /** What an event moves with: its common cause, or itself. */
  const bundleOf = (leaf: number): number => {
    const cause = ready.causeOf[leaf] ?? -1
    return cause < 0 ? leaf : cause
  }
  const known = new Map<number, Pick<RateSensitivity, 'tenth' | 'tenfold'>>()
  const movedBy = (bundle: number): Pick<RateSensitivity, 'tenth' | 'tenfold'> => {
    const before = known.get(bundle)
    if (before) return before
    const moved = (factor: number): number => meanOverIntervals(plan, (leaf) => (bundleOf(leaf) === bundle ? factor : 1), times)
    const result = { tenth: moved(0.1), tenfold: moved(10) }
    known.set(bundle, result)
    return result
  }
  return ready.leaves.slice(0, ready.eventCount).flatMap(({ id, load }, leaf) => (load.kind === 'probability' ? [] : [{ id, nominal, ...movedBy(bundleOf(leaf)) }]))
}
