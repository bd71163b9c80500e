import type { FaultEvent, FaultGate, FaultTree } from '@/lib/calc/live'
import { chance } from './trees'

/** The same numbers 0 … 1 for the same seed, on every machine. */
const randomFrom = (seed: number): (() => number) => {
  let state = seed >>> 0
  return () => {
    state = (state + 0x6d2b79f5) >>> 0
    let mixed = Math.imul(state ^ (state >>> 15), state | 1)
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61)
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 2 ** 32
  }
}

/**
 * A tree of `eventCount` events and layers of gates, `or` and `and` in turn, the last layer the top. The gates of a layer share out the layer
 * below, so that nothing is left over, and each takes one more of it: a near one, or, in the share `cross`, any. So branches share gates and events.
 */
export const generatedTree = (seed: number, eventCount: number, layers: readonly number[], cross: number): FaultTree => {
  const random = randomFrom(seed)
  const events: FaultEvent[] = Array.from({ length: eventCount }, (_, i) => chance(`e${i}`, 0.001 + 0.05 * random()))
  const gates: FaultGate[] = []
  let below = events.map(({ id }) => id)
  layers.forEach((size, layer) => {
    const share = below.length / size
    const made = Array.from({ length: size }, (_, i): FaultGate => {
      const own = below.slice(Math.floor(i * share), Math.floor((i + 1) * share))
      const at = Math.floor(random() < cross ? random() * below.length : i * share + 8 * (random() - 0.5))
      const more = below[Math.min(below.length - 1, Math.max(0, at))] ?? ''
      return { id: `g${layer}_${i}`, kind: layer % 2 === 0 ? 'or' : 'and', inputs: [...new Set([...own, more])] }
    })
    gates.push(...made)
    below = made.map(({ id }) => id)
  })
  return { top: below[0] ?? '', events, gates }
}
