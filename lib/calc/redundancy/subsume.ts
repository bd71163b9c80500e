import { PairCache, type NodeTable } from './node-table'

/**
 * Families of sets as zero-suppressed diagrams of one table: 0 holds no set, 1 holds the empty set alone,
 * a node holds the sets of `low` and those of `high` with its own leaf added. `without(f, g)` leaves out of f every set that holds a set of g.
 */
export const subsumer = (table: NodeTable): ((f: number, g: number) => number) => {
  const cache = new PairCache()
  /** Frames of four: f, g, stage, low part. An own stack, as a family can be deeper than the engine's. */
  let frames = new Int32Array(4 * 256)

  return (family, held) => {
    cache.keepPace(table.count)
    let depth = 0
    let f = family
    let g = held
    for (;;) {
      table.step()
      let result = -1
      if (f === 0 || g === 1 || f === g) result = 0
      else if (g === 0 || f === 1) result = f
      else {
        // Leaves above those of f are in no set of f: the sets of g that ask for them hold none of f's.
        const top = table.level[f] ?? 0
        while ((table.level[g] ?? 0) < top) g = table.low[g] ?? 0
        if (g === 1 || f === g) result = 0
        else if (g === 0) result = f
        else result = cache.get(f, g)
      }
      if (result < 0) {
        if (4 * depth === frames.length) {
          const wider = new Int32Array(frames.length * 2)
          wider.set(frames)
          frames = wider
        }
        const at = 4 * depth
        frames[at] = f
        frames[at + 1] = g
        frames[at + 2] = 0
        depth += 1
        if (table.level[g] === table.level[f]) g = table.low[g] ?? 0
        f = table.low[f] ?? 0
        continue
      }
      // Three parts of a frame: low without low, high without low, and that without high.
      for (;;) {
        if (depth === 0) return result
        const at = 4 * (depth - 1)
        const ownF = frames[at] ?? 0
        const ownG = frames[at + 1] ?? 0
        const stage = frames[at + 2] ?? 0
        const same = table.level[ownF] === table.level[ownG]
        if (stage === 0) {
          frames[at + 3] = result
          frames[at + 2] = same ? 1 : 2
          f = table.high[ownF] ?? 0
          g = same ? (table.low[ownG] ?? 0) : ownG
          break
        }
        if (stage === 1) {
          frames[at + 2] = 2
          f = result
          g = table.high[ownG] ?? 0
          break
        }
        depth -= 1
        const low = frames[at + 3] ?? 0
        result = result === 0 ? low : table.node(table.level[ownF] ?? 0, low, result)
        cache.set(ownF, ownG, result)
      }
    }
  }
}
