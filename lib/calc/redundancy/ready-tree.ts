import type { Load } from './exposure-probability'

/** What can fail by itself: an event, its independent part where it has a common cause, or a common cause. */
export interface Leaf {
  readonly id: string
  readonly load: Load
  /** Hours between checks of a latent one, else `null`. */
  readonly intervalHours: number | null
  readonly heatSensitive: boolean
}

export interface ReadyGate {
  readonly kind: 'and' | 'or' | 'atLeast'
  readonly k: number
  /** Events count from 0, gates on from there: the first gate is the number of events. */
  readonly inputs: readonly number[]
}

export interface ReadyTree {
  /** As it was given, for errors. */
  readonly given: unknown
  readonly top: number
  readonly eventCount: number
  readonly gates: readonly ReadyGate[]
  /** Gates so that each stands after its inputs, by their place in `gates`. */
  readonly order: readonly number[]
  /** The events in order, then the common causes. */
  readonly leaves: readonly Leaf[]
  /** For each event the leaf of its common cause, or −1. */
  readonly causeOf: readonly number[]
}
