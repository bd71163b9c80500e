import { diagramOf } from './diagram'
import type { FaultTree } from './fault-tree-types'
import { cutSetsOf } from './minimal-cut-sets'
import { takeTree } from './take-tree'

export interface SinglePoint {
  readonly id: string
  readonly heatSensitive: boolean
}

/**
 * Faults that bring the top about alone: a list of `{ id, heatSensitive }` by id; heatSensitive says that the activation energy is above 0 eV, for a common cause that of any of its events.
 *
 * the minimal cut sets of one member, as in `minimalCutSets`
 *
 * Validity: a single point counts however rare it is: a rate of 0 does not take it off the list.
 * Source: common practice, no published source.
 *
 * @param tree as in `faultTreeProbability`
 * @throws CalcError on `tree` or below it as in `faultTreeProbability`
 * @example
 * singlePoints({ top: 'dead', events: [{ id: 'switch', exposure: { kind: 'probability', p: 0.1 } }], gates: [{ id: 'dead', kind: 'or', inputs: ['switch'] }] }) // → [{ id: 'switch', heatSensitive: false }]
 */
export const singlePoints = (tree: FaultTree): SinglePoint[] => {
  const ready = takeTree(tree)
  const sensitive = new Map(ready.leaves.map(({ id, heatSensitive }) => [id, heatSensitive]))
  return cutSetsOf(ready, diagramOf(ready), 1, () => undefined).flatMap(([id = '']) => ({ id, heatSensitive: sensitive.get(id) === true }))
}
