import { drawTogether } from './draw-together'
import type { ReadyTree } from './ready-tree'

/** Leaves in the order a walk from the top first meets them; each input list is put in order by `arrange`. */
const walk = (tree: ReadyTree, arrange: (inputs: readonly number[]) => readonly number[]): number[] => {
  const seen = new Uint8Array(tree.eventCount + tree.gates.length)
  const met = new Uint8Array(tree.leaves.length)
  const order: number[] = []
  const meet = (leaf: number): void => {
    if (met[leaf] === 1) return
    met[leaf] = 1
    order.push(leaf)
  }
  const open = [tree.top]
  for (let place = open.pop(); place !== undefined; place = open.pop()) {
    if (seen[place] === 1) continue
    seen[place] = 1
    if (place < tree.eventCount) {
      meet(place)
      const cause = tree.causeOf[place] ?? -1
      if (cause >= 0) meet(cause)
      continue
    }
    const inputs = arrange(tree.gates[place - tree.eventCount]?.inputs ?? [])
    for (let i = inputs.length - 1; i >= 0; i -= 1) open.push(inputs[i] ?? 0)
  }
  return order
}

/** How many inputs stand below each place, counted along every way down; an event counts 1. */
const weights = (tree: ReadyTree): Float64Array => {
  const weight = new Float64Array(tree.eventCount + tree.gates.length).fill(1)
  for (const gate of tree.order) {
    let sum = 0
    for (const input of tree.gates[gate]?.inputs ?? []) sum += weight[input] ?? 0
    weight[tree.eventCount + gate] = Math.min(sum, 1e300)
  }
  return weight
}

/**
 * Orders of the leaves worth trying, each made when it is asked for: a diagram's size hangs on them, and none is best for all trees.
 * Events before gates keeps long chains of gates thin; drawing together what meets serves trees that share much.
 */
export const variableOrders = (tree: ReadyTree): (() => number[])[] => {
  const isGate = (place: number): number => (place >= tree.eventCount ? 1 : 0)
  const eventsFirst = () => walk(tree, (inputs) => [...inputs].sort((a, b) => isGate(a) - isGate(b)))
  const byWeight = (sign: number) => {
    const weight = weights(tree)
    return walk(tree, (inputs) => [...inputs].sort((a, b) => sign * ((weight[a] ?? 0) - (weight[b] ?? 0))))
  }
  return [eventsFirst, () => drawTogether(tree, eventsFirst()), () => drawTogether(tree, byWeight(1)), () => byWeight(-1)]
}
