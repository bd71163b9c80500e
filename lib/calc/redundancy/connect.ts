import { PairCache, type NodeTable } from './node-table'

type Kind = 'and' | 'or'

/** `and` and `or` of two decision diagrams of one table. Keeps its own stack: a diagram can be deeper than the engine's. */
export const connector = (table: NodeTable): ((kind: Kind, one: number, other: number) => number) => {
  const caches = { and: new PairCache(), or: new PairCache() }
  let first = new Int32Array(256)
  let second = new Int32Array(256)
  /** Result of the low branch, −1 while that is still being worked out. */
  let lows = new Int32Array(256)
  const widen = (values: Int32Array): Int32Array<ArrayBuffer> => {
    const wider = new Int32Array(values.length * 2)
    wider.set(values)
    return wider
  }

  return (kind, one, other) => {
    const cache = caches[kind]
    cache.keepPace(table.count)
    /** Takes all in an `or`, nothing in an `and`; the opposite leaves the other as it is. */
    const ruling = kind === 'or' ? 1 : 0
    let depth = 0
    let f = one
    let g = other
    for (;;) {
      table.step()
      if (f > g) [f, g] = [g, f]
      let result = -1
      if (f <= 1) result = f === ruling ? ruling : g
      else if (f === g) result = f
      else result = cache.get(f, g)
      if (result < 0) {
        if (depth === first.length) {
          first = widen(first)
          second = widen(second)
          lows = widen(lows)
        }
        first[depth] = f
        second[depth] = g
        lows[depth] = -1
        depth += 1
        const level = Math.min(table.level[f] ?? 0, table.level[g] ?? 0)
        if (table.level[f] === level) f = table.low[f] ?? 0
        if (table.level[g] === level) g = table.low[g] ?? 0
        continue
      }
      for (;;) {
        if (depth === 0) return result
        const low = lows[depth - 1] ?? 0
        f = first[depth - 1] ?? 0
        g = second[depth - 1] ?? 0
        const level = Math.min(table.level[f] ?? 0, table.level[g] ?? 0)
        if (low < 0) {
          lows[depth - 1] = result
          if (table.level[f] === level) f = table.high[f] ?? 0
          if (table.level[g] === level) g = table.high[g] ?? 0
          break
        }
        depth -= 1
        result = low === result ? low : table.node(level, low, result)
        cache.set(f, g, result)
      }
    }
  }
}
