/** How long a part is exposed before its fault counts or is found, or its probability as it stands. */
export type Exposure =
  | { readonly kind: 'flight', readonly hours: number }
  /** A fault nobody notices until the next check. */
  | { readonly kind: 'latent', readonly checkIntervalHours: number }
  | { readonly kind: 'probability', readonly p: number }

export interface FaultEvent {
  readonly id: string
  /** Failures an hour at `referenceK` where heat is given; may be left out with a probability. */
  readonly ratePerH?: number
  readonly temperatureK?: number
  readonly referenceK?: number
  readonly activationEv?: number
  readonly exposure: Exposure
}

export interface FaultGate {
  readonly id: string
  readonly kind: 'and' | 'or' | 'atLeast'
  /** How many inputs must fail, with `atLeast`. */
  readonly k?: number
  /** Ids of events and gates. One named twice counts twice towards k. */
  readonly inputs: readonly string[]
}

/** One cause that fails all its events at once: the share `beta` of their rate. */
export interface CommonCause {
  readonly id: string
  readonly events: readonly string[]
  readonly beta: number
}

export interface FaultTree {
  /** Id of the gate, or event, whose failure is asked about. */
  readonly top: string
  readonly events: readonly FaultEvent[]
  readonly gates: readonly FaultGate[]
  readonly commonCause?: readonly CommonCause[]
}
