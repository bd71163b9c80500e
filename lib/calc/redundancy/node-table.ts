import { CalcError } from '../calc-error'

/** Bounds of one computation: what they keep away is a page that hangs or a tab that runs out of memory. */
export interface Bounds {
  readonly maxNodes: number
  readonly maxSteps: number
}

/** A computation grew past its bounds; the caller knows what to say of it. */
export class OutOfBounds extends Error {}

export const tooLarge = (given: unknown, limit: string, message: string, field = 'tree'): CalcError => new CalcError({ field, value: given, limit, unit: '', message })

const grown = (values: Int32Array): Int32Array => {
  const wider = new Int32Array(values.length * 2)
  wider.set(values)
  return wider
}

/** Spreads three whole numbers over 32 bits. */
const hashOf = (a: number, b: number, c: number): number => {
  const mixed = Math.imul(a, 0x9e3779b1) ^ Math.imul(b, 0x85ebca6b) ^ Math.imul(c, 0xc2b2ae35)
  return mixed ^ (mixed >>> 15)
}

/**
 * Nodes (level, low, high), each kept once, in typed arrays. 0 and 1 are the two ends; a child is always older than its parent,
 * so that going through the numbers upwards meets children first and needs no recursion.
 */
export class NodeTable {
  count = 2
  level: Int32Array
  low: Int32Array
  high: Int32Array
  #slots: Int32Array
  #steps = 0

  constructor(endLevel: number, private readonly bounds: Bounds, private readonly check: () => void = () => undefined) {
    this.level = new Int32Array(1024)
    this.low = new Int32Array(1024)
    this.high = new Int32Array(1024)
    this.level[0] = endLevel
    this.level[1] = endLevel
    this.#slots = new Int32Array(4096)
  }

  /** The node with these members, made if there is none yet. */
  node(level: number, low: number, high: number): number {
    const mask = this.#slots.length - 1
    let slot = hashOf(level, low, high) & mask
    for (;;) {
      const found = this.#slots[slot] ?? 0
      if (found === 0) break
      if (this.low[found] === low && this.high[found] === high && this.level[found] === level) return found
      slot = (slot + 1) & mask
    }
    if (this.count >= this.bounds.maxNodes) throw new OutOfBounds()
    const made = this.count
    this.count += 1
    if (made >= this.level.length) {
      this.level = grown(this.level)
      this.low = grown(this.low)
      this.high = grown(this.high)
    }
    this.level[made] = level
    this.low[made] = low
    this.high[made] = high
    this.#slots[slot] = made
    if (made * 2 > this.#slots.length) this.#spread()
    return made
  }

  /** Counts a step of work against the bounds, and lets the caller look now and then whether to stop. */
  step(): void {
    this.#steps += 1
    if (this.#steps > this.bounds.maxSteps) throw new OutOfBounds()
    if ((this.#steps & 0x3fff) === 0) this.check()
  }

  #spread(): void {
    const slots = new Int32Array(this.#slots.length * 2)
    const mask = slots.length - 1
    for (let i = 2; i < this.count; i += 1) {
      let slot = hashOf(this.level[i] ?? 0, this.low[i] ?? 0, this.high[i] ?? 0) & mask
      while (slots[slot] !== 0) slot = (slot + 1) & mask
      slots[slot] = i
    }
    this.#slots = slots
  }
}

/** Results of an operation on two nodes. A pair that falls on another's place takes it: what is lost is computed again. */
export class PairCache {
  #entries = new Int32Array(3 * 4096)
  #mask = 4095

  /** The remembered result, or −1. */
  get(a: number, b: number): number {
    const at = 3 * (hashOf(a, b, 0x3c6ef372) & this.#mask)
    return this.#entries[at] === a && this.#entries[at + 1] === b ? (this.#entries[at + 2] ?? 0) - 1 : -1
  }

  set(a: number, b: number, result: number): void {
    const at = 3 * (hashOf(a, b, 0x3c6ef372) & this.#mask)
    this.#entries[at] = a
    this.#entries[at + 1] = b
    this.#entries[at + 2] = result + 1
  }

  /** Keeps pace with a table of `nodes`, up to a fixed size. */
  keepPace(nodes: number): void {
    if (nodes <= this.#mask || this.#mask >= (1 << 20) - 1) return
    const old = this.#entries
    this.#mask = this.#mask * 2 + 1
    this.#entries = new Int32Array(3 * (this.#mask + 1))
    for (let at = 0; at < old.length; at += 3) {
      const result = old[at + 2] ?? 0
      if (result !== 0) this.set(old[at] ?? 0, old[at + 1] ?? 0, result - 1)
    }
  }
}
