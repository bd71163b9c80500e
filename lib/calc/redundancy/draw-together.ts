import type { ReadyTree } from './ready-tree'

const rounds = 40

/**
 * Another order of the leaves, in which what meets in one gate stands closer together: each gate pulls itself and its inputs to their
 * common middle, all are lined up again, and the line with the least stretch is kept. What a diagram has to remember between two
 * leaves that meet far apart is what makes it large.
 */
export const drawTogether = (tree: ReadyTree, start: readonly number[]): number[] => {
  const { eventCount, gates } = tree
  const count = eventCount + gates.length
  const placeOf = new Float64Array(count)
  start.forEach((leaf, i) => {
    if (leaf < eventCount) placeOf[leaf] = i
  })
  const events = start.filter((leaf) => leaf < eventCount)
  for (const gate of tree.order) {
    const inputs = gates[gate]?.inputs ?? []
    placeOf[eventCount + gate] = inputs.reduce((sum, input) => sum + (placeOf[input] ?? 0), 0) / inputs.length
  }
  let best = events
  let least = Infinity
  for (let round = 0; round < rounds; round += 1) {
    const pull = new Float64Array(count)
    const pulls = new Float64Array(count)
    let stretch = 0
    gates.forEach(({ inputs }, gate) => {
      const members = [eventCount + gate, ...inputs]
      let middle = 0
      let low = Infinity
      let high = -Infinity
      for (const member of members) {
        const place = placeOf[member] ?? 0
        middle += place / members.length
        low = Math.min(low, place)
        high = Math.max(high, place)
      }
      stretch += high - low
      for (const member of members) {
        pull[member] = (pull[member] ?? 0) + middle
        pulls[member] = (pulls[member] ?? 0) + 1
      }
    })
    // The stretch is that of the line before: it was lined up from the same places.
    if (round > 0 && stretch < least) {
      least = stretch
      best = [...events].sort((a, b) => (placeOf[a] ?? 0) - (placeOf[b] ?? 0))
    }
    const wanted = pull.map((sum, place) => ((pulls[place] ?? 0) > 0 ? sum / (pulls[place] ?? 1) : (placeOf[place] ?? 0)))
    const line = [...events, ...gates.map((_, gate) => eventCount + gate)].sort((a, b) => (wanted[a] ?? 0) - (wanted[b] ?? 0))
    line.forEach((place, i) => {
      placeOf[place] = i
    })
  }
  return withCauses(tree, best)
}

/** Each common cause right after the first of its events. */
const withCauses = (tree: ReadyTree, events: readonly number[]): number[] => {
  const met = new Set<number>()
  return events.flatMap((event) => {
    const cause = tree.causeOf[event] ?? -1
    if (cause < 0 || met.has(cause)) return [event]
    met.add(cause)
    return [event, cause]
  })
}
