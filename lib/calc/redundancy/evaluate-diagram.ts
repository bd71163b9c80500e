import type { Diagram } from './diagram'

/**
 * Probability that the top has failed, leaf by leaf with the probabilities given. `values`, one place a node, is filled on the way.
 * Only positive numbers are added, so that a tiny probability keeps its digits.
 */
export const probabilityOfTop = ({ leaf, low, high }: Diagram, probabilities: Float64Array, values = new Float64Array(leaf.length)): number => {
  const count = leaf.length
  values[0] = 0
  values[1] = 1
  for (let i = 2; i < count; i += 1) {
    const q = probabilities[leaf[i] ?? 0] ?? 0
    values[i] = q * (values[high[i] ?? 0] ?? 0) + (1 - q) * (values[low[i] ?? 0] ?? 0)
  }
  return values[count - 1] ?? 0
}

/** Birnbaum's measure of every leaf, from the values of all nodes: the chance to come to a node, times what its leaf changes there. */
export const birnbaumOfLeaves = ({ leaf, low, high }: Diagram, probabilities: Float64Array, values: Float64Array): Float64Array => {
  const measure = new Float64Array(probabilities.length)
  const reach = new Float64Array(leaf.length)
  reach[leaf.length - 1] = 1
  for (let i = leaf.length - 1; i >= 2; i -= 1) {
    const at = leaf[i] ?? 0
    const q = probabilities[at] ?? 0
    const here = reach[i] ?? 0
    const up = high[i] ?? 0
    const down = low[i] ?? 0
    // A failure never helps: a difference below 0 is rounding.
    measure[at] = (measure[at] ?? 0) + here * Math.max(0, (values[up] ?? 0) - (values[down] ?? 0))
    reach[up] = (reach[up] ?? 0) + here * q
    reach[down] = (reach[down] ?? 0) + here * (1 - q)
  }
  return measure
}
