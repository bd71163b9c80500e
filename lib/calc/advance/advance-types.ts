/** One advance at every speed. */
export interface FixedSchedule {
  readonly kind: 'fixed'
  /** Crank degrees before top dead centre. */
  readonly deg: number
}

/** Flyweights: flat up to `startRpm`, linear up to `fullRpm`, flat beyond. Crank degrees. */
export interface MechanicalSchedule {
  readonly kind: 'mechanical'
  readonly initialDeg: number
  readonly startRpm: number
  readonly fullRpm: number
  readonly fullDeg: number
}

/** Linear between points of strictly ascending speed, flat outside; a step is two close points. */
export interface TableSchedule {
  readonly kind: 'table'
  readonly points: readonly { readonly rpm: number, readonly deg: number }[]
}

/** Bilinear over speed and manifold pressure, flat outside; `deg[i][j]` belongs to `rpm[i]` and `mapKpa[j]`. */
export interface MapSchedule {
  readonly kind: 'map'
  readonly rpm: readonly number[]
  readonly mapKpa: readonly number[]
  readonly deg: readonly (readonly number[])[]
}

/** A formula in `rpm` and `map` (manifold pressure, kPa) that gives crank degrees. */
export interface FormulaSchedule {
  readonly kind: 'formula'
  readonly expression: string
}

export type Schedule = FixedSchedule | MechanicalSchedule | TableSchedule | MapSchedule | FormulaSchedule

/**
 * Advance taken out for starting: `byDeg` is subtracted while rpm < `belowRpm`. Once released with rising speed
 * it returns only below `belowRpm − hysteresisRpm`.
 */
export interface CrankRetard {
  readonly belowRpm: number
  readonly byDeg: number
  /** 0 when left out; less than `belowRpm`. */
  readonly hysteresisRpm?: number
}

/** One ignition channel: when it fires, in crank degrees before top dead centre. */
export interface Channel {
  readonly schedule: Schedule
  readonly crankRetard?: CrankRetard
  /** Fixed electronic delay, microseconds, ≥ 0; 0 when left out. Retards by 6e-6 · rpm · latencyUs crank degrees. */
  readonly latencyUs?: number
}

/** `falling`: the speed has been above the crank-retard threshold since the last start. */
export type Trend = 'rising' | 'falling'
export const trends: readonly Trend[] = ['rising', 'falling']

/** Where an advance is asked for: rpm ≥ 0; `mapKpa` > 0 is needed by a map and by a formula in which `map` stands. */
export interface AdvanceAt {
  readonly rpm: number
  readonly mapKpa?: number
  readonly trend?: Trend
}
