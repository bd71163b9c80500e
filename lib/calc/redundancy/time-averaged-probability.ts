import { diagramOf } from './diagram'
import type { FaultTree } from './fault-tree-types'
import { meanOverIntervals, planOf } from './mean-over-intervals'
import { takeTree } from './take-tree'

/**
 * Mean over time of the probability of the top, a number 0 … 1: latent faults that share a check interval grow likely together, and the mean of their product is taken, not the product of their means.
 *
 * (1/T)·∫ Q(t) dt over 0 … T, each latent event of the interval T at 1 − e^(−λt), the others as in `eventProbability`; for two latent events in an `and`
 * about (λT)²/3 where the product of means gives (λT)²/4, for three (λT)³/4 in place of (λT)³/8. Latent common causes age with the events they fail.
 *
 * Validity: events of equal checkIntervalHours are checked at the same time. Events of different intervals are taken to be at ages that have nothing to do with each other
 * (a mean over each): where one interval is a multiple of the other and both begin together, that is a little too kind. Accurate to 1e-9 of the result.
 * Source: iec-61508-6, mean over the interval between tests (memory).
 *
 * @param tree as in `faultTreeProbability`
 * @throws CalcError on `tree` or below it as in `faultTreeProbability`; on `tree` when too many different intervals come together
 * @example
 * timeAveragedProbability({ top: 'both', events: [{ id: 'a', ratePerH: 1e-6, exposure: { kind: 'latent', checkIntervalHours: 100 } }, { id: 'b', ratePerH: 1e-6, exposure: { kind: 'latent', checkIntervalHours: 100 } }], gates: [{ id: 'both', kind: 'and', inputs: ['a', 'b'] }] }) * 1e8 // → 0.33331
 */
export const timeAveragedProbability = (tree: FaultTree): number => {
  const ready = takeTree(tree)
  return meanOverIntervals(planOf(ready, diagramOf(ready)))
}
