import { connector } from './connect'
import { NodeTable, OutOfBounds, tooLarge } from './node-table'
import type { ReadyTree } from './ready-tree'
import { variableOrders } from './variable-orders'

/**
 * The tree as an ordered binary decision diagram: node i asks whether leaf `leaf[i]` has failed and goes on to `high[i]` or `low[i]`.
 * 0 and 1 are the ends, children come before parents, the root is the last node.
 */
export interface Diagram {
  readonly leaf: Int32Array
  readonly low: Int32Array
  readonly high: Int32Array
  /** Place of each leaf that occurs in the order asked, −1 for others. */
  readonly levelOf: Int32Array
}

/** Sizes to try the orders with, and how many of them, so that a bad order costs little where another is good and a hopeless tree does not cost much. */
const mostNodes = 1_500_000
const attempts = [{ maxNodes: 4_000, orders: 4 }, { maxNodes: 30_000, orders: 4 }, { maxNodes: 200_000, orders: 3 }, { maxNodes: mostNodes, orders: 2 }]
/** A tree of many parts needs as many nodes at the least. */
const nodesPerPart = 10
const stepsPerNode = 20

const build = (tree: ReadyTree, order: readonly number[], maxNodes: number): Diagram => {
  const levelOf = new Int32Array(tree.leaves.length).fill(-1)
  order.forEach((leaf, level) => {
    levelOf[leaf] = level
  })
  const table = new NodeTable(order.length, { maxNodes, maxSteps: stepsPerNode * maxNodes })
  const connect = connector(table)
  const results = new Int32Array(tree.eventCount + tree.gates.length).fill(-1)
  for (let event = 0; event < tree.eventCount; event += 1) {
    const level = levelOf[event] ?? -1
    if (level < 0) continue
    const cause = tree.causeOf[event] ?? -1
    const own = table.node(level, 0, 1)
    results[event] = cause < 0 ? own : connect('or', own, table.node(levelOf[cause] ?? 0, 0, 1))
  }
  const needed = gatesBelowTop(tree)
  for (const gate of tree.order) {
    if (needed[gate] !== 1) continue
    const { kind, k, inputs } = tree.gates[gate] ?? { kind: 'or', k: 1, inputs: [] }
    // Lowest first: each further input is then mostly put on top of what is there, not carried to its bottom.
    const parts = inputs.map((input) => results[input] ?? 0).sort((a, b) => (table.level[b] ?? 0) - (table.level[a] ?? 0))
    results[tree.eventCount + gate] = kind === 'atLeast' ? atLeast(connect, parts, k) : parts.reduce((sum, part) => connect(kind, part, sum))
  }
  return reachable(table, results[tree.top] ?? 0, order, levelOf)
}

const gatesBelowTop = (tree: ReadyTree): Uint8Array => {
  const needed = new Uint8Array(tree.gates.length)
  if (tree.top >= tree.eventCount) needed[tree.top - tree.eventCount] = 1
  for (let i = tree.order.length - 1; i >= 0; i -= 1) {
    const gate = tree.order[i] ?? 0
    if (needed[gate] !== 1) continue
    for (const input of tree.gates[gate]?.inputs ?? []) if (input >= tree.eventCount) needed[input - tree.eventCount] = 1
  }
  return needed
}

/** failed[j] stands for "at least j of the inputs so far have failed"; an input x turns it into failed[j] or (x and failed[j − 1]). */
const atLeast = (connect: ReturnType<typeof connector>, parts: readonly number[], k: number): number => {
  const failed = new Int32Array(k + 1)
  failed[0] = 1
  parts.forEach((part, i) => {
    const left = parts.length - 1 - i
    for (let j = Math.min(k, i + 1); j >= Math.max(1, k - left); j -= 1) failed[j] = connect('or', failed[j] ?? 0, connect('and', part, failed[j - 1] ?? 0))
  })
  return failed[k] ?? 0
}

/** What the root still uses, close together. */
const reachable = (table: NodeTable, root: number, order: readonly number[], levelOf: Int32Array): Diagram => {
  const place = new Int32Array(root + 1)
  place[root] = 1
  let count = 2
  for (let i = root; i >= 2; i -= 1) {
    if (place[i] === 0) continue
    count += 1
    place[table.low[i] ?? 0] = 1
    place[table.high[i] ?? 0] = 1
  }
  const leaf = new Int32Array(count)
  const low = new Int32Array(count)
  const high = new Int32Array(count)
  place[0] = 0
  place[1] = 1
  let next = 2
  for (let i = 2; i <= root; i += 1) {
    if (place[i] === 0) continue
    place[i] = next
    leaf[next] = order[table.level[i] ?? 0] ?? 0
    low[next] = place[table.low[i] ?? 0] ?? 0
    high[next] = place[table.high[i] ?? 0] ?? 0
    next += 1
  }
  return { leaf, low, high, levelOf }
}

const isSame = (one: readonly number[], other: readonly number[]): boolean => one.every((leaf, i) => leaf === other[i])

/** The diagram of a tree, by the first order that keeps it small. */
export const diagramOf = (tree: ReadyTree): Diagram => {
  const waiting = variableOrders(tree)
  const tried: number[][] = []
  const parts = tree.leaves.length + tree.gates.length
  for (const { maxNodes: nodes, orders } of attempts) {
    const maxNodes = Math.min(nodes + nodesPerPart * parts, mostNodes)
    for (let i = 0; i < orders; i += 1) {
      while (tried.length <= i && waiting.length > 0) {
        const next = waiting.shift()?.() ?? []
        if (!tried.some((other) => isSame(next, other))) tried.push(next)
      }
      const order = tried[i]
      if (!order) break
      try {
        return build(tree, order, maxNodes)
      } catch (error) {
        if (!(error instanceof OutOfBounds)) throw error
      }
    }
  }
  throw tooLarge(tree.given, `a decision diagram of at most ${mostNodes} nodes`,
    `This fault tree is too entangled to be computed exactly: its decision diagram grows past ${mostNodes} nodes. Split it, or share fewer events between its branches.`)
}
