import type { Diagram } from './diagram'
import { NodeTable, type Bounds } from './node-table'
import { subsumer } from './subsume'

/** A family of sets: node i adds leaf `leaf[i]` to the sets of `high[i]` and leaves those of `low[i]` as they are. */
export interface Family {
  readonly table: NodeTable
  readonly root: number
}

/**
 * How many more failures may be asked for at each node when the whole may ask for `most`: −1 where none of the allowed ways leads.
 * Every way down is a set, so what lies beyond belongs to sets that are too large whichever way they came.
 */
const failuresLeft = ({ leaf, low, high }: Diagram, most: number): Int32Array => {
  const left = new Int32Array(leaf.length).fill(-1)
  left[leaf.length - 1] = most
  for (let i = leaf.length - 1; i >= 2; i -= 1) {
    const here = left[i] ?? -1
    if (here < 0) continue
    const up = high[i] ?? 0
    const down = low[i] ?? 0
    left[up] = Math.max(left[up] ?? -1, here - 1)
    left[down] = Math.max(left[down] ?? -1, here)
  }
  return left
}

/**
 * The minimal cut sets of a diagram, those of more than `most` leaves left out where that spares work:
 * minimal(node) = minimal(low) and, with the node's leaf, what of minimal(high) holds no set of minimal(low).
 */
export const minimalFamily = (diagram: Diagram, levels: number, most: number, bounds: Bounds, check: () => void): Family => {
  const { leaf, low, high, levelOf } = diagram
  const table = new NodeTable(levels, bounds, check)
  const without = subsumer(table)
  const left = failuresLeft(diagram, most)
  const minimal = new Int32Array(leaf.length)
  minimal[1] = 1
  for (let i = 2; i < leaf.length; i += 1) {
    if ((left[i] ?? -1) < 0) continue
    const rest = minimal[low[i] ?? 0] ?? 0
    const added = (left[i] ?? 0) < 1 ? 0 : without(minimal[high[i] ?? 0] ?? 0, rest)
    minimal[i] = added === 0 ? rest : table.node(levelOf[leaf[i] ?? 0] ?? 0, rest, added)
  }
  return { table, root: minimal[leaf.length - 1] ?? 0 }
}

/** Fewest members of a set of each family. */
const fewestOf = (table: NodeTable): Int32Array => {
  const fewest = new Int32Array(table.count)
  fewest[0] = 0x3fffffff
  for (let i = 2; i < table.count; i += 1) fewest[i] = Math.min(fewest[table.low[i] ?? 0] ?? 0, (fewest[table.high[i] ?? 0] ?? 0) + 1)
  return fewest
}

/** Every set of at most `most` members as levels, ascending; `null` when there are more than `maxSets`. */
export const setsOf = ({ table, root }: Family, most: number, maxSets: number, check: () => void): number[][] | null => {
  const fewest = fewestOf(table)
  const sets: number[][] = []
  const members: number[] = []
  /** Nodes still to visit, each with how many members lead to it. */
  const nodes = [root]
  const depths = [0]
  for (let node = nodes.pop(); node !== undefined; node = nodes.pop()) {
    const depth = depths.pop() ?? 0
    if (depth + (fewest[node] ?? 0) > most) continue
    members.length = Math.min(members.length, depth)
    if (node === 1) {
      if (sets.length === maxSets) return null
      sets.push(members.slice())
      if (sets.length % 1024 === 0) check()
      continue
    }
    const high = table.high[node] ?? 0
    const low = table.low[node] ?? 0
    if (low !== 0) {
      nodes.push(low)
      depths.push(depth)
    }
    members.push(table.level[node] ?? 0)
    nodes.push(high)
    depths.push(depth + 1)
  }
  return sets
}
