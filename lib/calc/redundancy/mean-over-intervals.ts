import type { Diagram } from './diagram'
import { meanProbability } from './exposure-probability'
import { intervalRule, type Rule } from './gauss-rule'
import { tooLarge } from './node-table'
import type { ReadyTree } from './ready-tree'

/** Leaves that are checked together, and with them the nodes that ask for one of them or come to one. */
interface Group {
  readonly leaves: readonly number[]
  readonly touches: Uint8Array
  readonly size: number
}

/** What does not change with the rates: one mean after another uses it. */
export interface Plan {
  readonly tree: ReadyTree
  readonly diagram: Diagram
  readonly groups: readonly Group[]
  /** Nodes to be computed again at each step of the group's loop, children first; those of no group come first of all. */
  readonly nodesOf: readonly Int32Array[]
}

/** Steps through nodes that one call may take. */
const maxWork = 1e9
const stepsPerLeaf = 20

const groupOf = ({ leaf, low, high }: Diagram, leaves: readonly number[]): Group => {
  const own = new Set(leaves)
  const touches = new Uint8Array(leaf.length)
  let size = 0
  for (let i = 2; i < leaf.length; i += 1) {
    if (touches[low[i] ?? 0] !== 1 && touches[high[i] ?? 0] !== 1 && !own.has(leaf[i] ?? 0)) continue
    touches[i] = 1
    size += 1
  }
  return { leaves, touches, size }
}

/** Finds which latent leaves age together. A leaf alone in its interval needs no integration: the top is linear in it, and its mean will do. */
export const planOf = (tree: ReadyTree, diagram: Diagram): Plan => {
  const byInterval = new Map<number, number[]>()
  tree.leaves.forEach(({ intervalHours }, leaf) => {
    if (intervalHours === null || (diagram.levelOf[leaf] ?? -1) < 0) return
    const together = byInterval.get(intervalHours)
    if (together) together.push(leaf)
    else byInterval.set(intervalHours, [leaf])
  })
  // The loop within all others runs most often: it gets the interval that the fewest nodes depend on.
  const groups = [...byInterval.values()].filter(({ length }) => length > 1).map((leaves) => groupOf(diagram, leaves)).sort((a, b) => b.size - a.size)
  const nodesOf = [0, ...groups.keys()].map((): number[] => [])
  nodesOf.length = groups.length + 1
  for (let i = 2; i < diagram.leaf.length; i += 1) {
    let depth = groups.length
    while (depth > 0 && groups[depth - 1]?.touches[i] !== 1) depth -= 1
    nodesOf[depth]?.push(i)
  }
  return { tree, diagram, groups, nodesOf: nodesOf.map((nodes) => Int32Array.from(nodes)) }
}

const workOf = ({ nodesOf }: Plan, rules: readonly Rule[]): number => {
  let turns = 1
  return nodesOf.reduce((work, nodes, depth) => {
    if (depth > 0) turns *= rules[depth - 1]?.at.length ?? 1
    return work + turns * nodes.length
  }, 0)
}

const noGrowth = (): number => 1

/**
 * Mean probability of the top, latent leaves of one interval at one age, those of different intervals at ages that have nothing to do with each other.
 * `growth` multiplies the λt of a leaf; `times` is how often the caller will ask, for the bound on work.
 */
export const meanOverIntervals = (plan: Plan, growth: (leaf: number) => number = noGrowth, times = 1): number => {
  const { tree, diagram: { leaf, low, high }, groups, nodesOf } = plan
  const amounts = Float64Array.from(tree.leaves, ({ load }, i) => (load.kind === 'probability' ? load.amount : load.amount * growth(i)))
  const probabilities = Float64Array.from(tree.leaves, ({ load: { kind } }, i) => meanProbability({ kind, amount: amounts[i] ?? 0 }))
  const rules = groups.map(({ leaves }) => intervalRule(leaves.length, leaves.reduce((sum, i) => sum + (amounts[i] ?? 0), 0)))
  if ((workOf(plan, rules) + stepsPerLeaf * tree.leaves.length) * times > maxWork) {
    throw tooLarge(tree.given, `at most ${maxWork} steps`,
      'This fault tree takes too many steps to be averaged over its check intervals: give parts that are checked together the same interval, or split the tree.')
  }
  const values = new Float64Array(leaf.length)
  values[1] = 1
  const compute = (nodes: Int32Array): void => {
    for (let n = 0; n < nodes.length; n += 1) {
      const i = nodes[n] ?? 0
      const q = probabilities[leaf[i] ?? 0] ?? 0
      values[i] = q * (values[high[i] ?? 0] ?? 0) + (1 - q) * (values[low[i] ?? 0] ?? 0)
    }
  }
  const meanFrom = (depth: number): number => {
    const group = groups[depth]
    const rule = rules[depth]
    if (!group || !rule) return values[leaf.length - 1] ?? 0
    const nodes = nodesOf[depth + 1] ?? new Int32Array()
    let mean = 0
    rule.at.forEach((age, i) => {
      for (const member of group.leaves) probabilities[member] = -Math.expm1(-(amounts[member] ?? 0) * age) + 0
      compute(nodes)
      mean += (rule.weight[i] ?? 0) * meanFrom(depth + 1)
    })
    return mean
  }
  compute(nodesOf[0] ?? new Int32Array())
  // The weights sum to 1 but for rounding, which must not lift a sure failure above 1.
  return Math.min(1, meanFrom(0))
}
