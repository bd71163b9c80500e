import { diagramOf } from './diagram'
import { probabilityOfTop } from './evaluate-diagram'
import { meanProbability } from './exposure-probability'
import type { FaultTree } from './fault-tree-types'
import type { ReadyTree } from './ready-tree'
import { takeTree } from './take-tree'

/** Each leaf at its mean. */
export const meanProbabilities = ({ leaves }: ReadyTree): Float64Array => Float64Array.from(leaves, ({ load }) => meanProbability(load))

/**
 * Probability of the top of a fault tree, a number 0 … 1, exact for independent events each at its mean; an event used in several places is one event.
 *
 * P(node) = q·P(high) + (1 − q)·P(low) up the tree's binary decision diagram, q the probability of the node's event as in `eventProbability`.
 * Common cause (beta factor): each listed event keeps (1 − beta)·λ, and one more event, the cause, of rate beta·λ fails them all.
 *
 * Validity: events fail independently but for the common causes. Latent faults of one check interval do not: they age together,
 * and the mean of their product is larger than the product of their means; `timeAveragedProbability` takes that in.
 * Source: bryant-1986, decision diagrams; the beta factor as in iec-61508-6 (memory).
 *
 * @param tree `{ top, events, gates, commonCause? }`: top the id of a gate or an event; events as in `eventProbability`, each id once over events, gates and common causes;
 * gates `{ id, kind: 'and' | 'or' | 'atLeast', k?, inputs }`, inputs ids of events and gates, one at least, k with 'atLeast', 1 … number of inputs; commonCause `{ id, events, beta }[]`, beta 0 … 1, its events of equal rates (heat included) and equal exposures, each in one cause at most
 * @throws CalcError on `tree` or the place below it: `tree.events.i.id`, `tree.events.i.exposure.hours`, `tree.gates.i.inputs.j`, `tree.gates.i.k`, `tree.gates` when they make a loop, `tree.commonCause.i.events.j`, `tree.top`; on `tree` when its decision diagram grows too large
 * @example
 * faultTreeProbability({ top: 'dead', events: [{ id: 'a', exposure: { kind: 'probability', p: 0.1 } }, { id: 'b', exposure: { kind: 'probability', p: 0.2 } }], gates: [{ id: 'dead', kind: 'or', inputs: ['a', 'b'] }] }) // → 0.28
 */
export const faultTreeProbability = (tree: FaultTree): number => {
  const ready = takeTree(tree)
  return probabilityOfTop(diagramOf(ready), meanProbabilities(ready))
}
