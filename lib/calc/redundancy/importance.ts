import { diagramOf } from './diagram'
import { birnbaumOfLeaves, probabilityOfTop } from './evaluate-diagram'
import { meanProbabilities } from './fault-tree-probability'
import type { FaultTree } from './fault-tree-types'
import { takeTree } from './take-tree'

export interface EventImportance {
  readonly id: string
  /** Mean probability of the event itself; of its independent part where it has a common cause. */
  readonly probability: number
  readonly birnbaum: number
  readonly fussellVesely: number | null
  readonly riskAchievementWorth: number | null
  readonly riskReductionWorth: number | null
}

const finiteOrNull = (value: number): number | null => (Number.isFinite(value) ? value : null)

/**
 * How much each event weighs in the top: a list of `{ id, probability, birnbaum, fussellVesely, riskAchievementWorth, riskReductionWorth }`, numbers without a unit, events in order, then the common causes.
 *
 * Q the probability of the top as in `faultTreeProbability`, Q(q = 0) and Q(q = 1) the same with the event never and surely failed:
 * birnbaum = Q(q = 1) − Q(q = 0); fussellVesely = 1 − Q(q = 0)/Q, which is 1 − 1/riskReductionWorth; riskAchievementWorth = Q(q = 1)/Q; riskReductionWorth = Q/Q(q = 0); `null` where infinite or, with Q = 0, undefined.
 * Two measures go by the name of Fussell and Vesely; the other, the share of the top in which a cut set with the event has failed, is larger.
 *
 * Validity: as in `faultTreeProbability`: each event at its mean, latent ones independent of each other.
 * Source: birnbaum-1969, the first measure; the others as reactor practice defines them (memory).
 *
 * @param tree as in `faultTreeProbability`
 * @throws CalcError on `tree` or below it as in `faultTreeProbability`
 * @example
 * importance({ top: 'dead', events: [{ id: 'a', exposure: { kind: 'probability', p: 0.1 } }], gates: [{ id: 'dead', kind: 'or', inputs: ['a'] }] }) // → [{ id: 'a', probability: 0.1, birnbaum: 1, fussellVesely: 1, riskAchievementWorth: 10, riskReductionWorth: null }]
 */
export const importance = (tree: FaultTree): EventImportance[] => {
  const ready = takeTree(tree)
  const diagram = diagramOf(ready)
  const probabilities = meanProbabilities(ready)
  const values = new Float64Array(diagram.leaf.length)
  const top = probabilityOfTop(diagram, probabilities, values)
  const measure = birnbaumOfLeaves(diagram, probabilities, values)
  const scratch = new Float64Array(diagram.leaf.length)
  return ready.leaves.map(({ id }, leaf) => {
    const probability = probabilities[leaf] ?? 0
    const birnbaum = measure[leaf] ?? 0
    const part = probability * birnbaum
    // A difference of two nearly equal numbers has few digits left: then the tree is computed again without the event.
    let without = top - part
    if (part > top / 2) {
      probabilities[leaf] = 0
      without = probabilityOfTop(diagram, probabilities, scratch)
      probabilities[leaf] = probability
    }
    return {
      id, probability, birnbaum,
      fussellVesely: finiteOrNull(part / top),
      riskAchievementWorth: finiteOrNull((top + (1 - probability) * birnbaum) / top),
      riskReductionWorth: finiteOrNull(top / without),
    }
  })
}
