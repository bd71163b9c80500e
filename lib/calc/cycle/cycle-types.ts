import type { CycleEngine } from '../geometry/cycle-engine'
import type { Notice } from '../notice'

/** The charge at inlet-valve closing, not in the manifold. */
export interface Charge {
  readonly pressureKpa: number
  readonly temperatureK: number
  /** Share of burned gas left from the cycle before, 0 … below 1. */
  readonly residualFraction: number
  /** Mass of air to mass of fuel. */
  readonly airFuelRatio: number
}

/** Heat release: a Wiebe curve that starts `delayDeg` after the spark. */
export interface Burn {
  /** Crank degrees before top dead centre. */
  readonly sparkDeg: number
  readonly delayDeg: number
  readonly durationDeg: number
  readonly a?: number
  readonly m?: number
  /** Share of the fuel's heat that is released, above 0 … 1. */
  readonly efficiency: number
  readonly heatingValueKjPerKg?: number
}

export interface HeatLoss {
  readonly wallK: number
  readonly headAreaFactor?: number
}

export interface CycleInput {
  readonly engine: CycleEngine
  readonly rpm: number
  readonly charge: Charge
  /** `null`: motored. */
  readonly burn: Burn | null
  readonly gamma: number | 'temperature'
  /** `null`: none. */
  readonly heatLoss: HeatLoss | null
  /** Octane number of the fuel, on the scale of the primary reference fuels; without it no knock integral. */
  readonly octane?: number
  readonly stepDeg?: number
}

export interface Knock {
  /** 1 or more: detonation expected. */
  readonly integral: number
  /** The octane number that brings the integral to 1. */
  readonly octaneRequired: number
}

/** Figures of one closed cycle. */
export interface CycleFigures {
  /** ∫p dV from inlet closing to exhaust opening. */
  readonly workJ: number
  /** workJ over the displacement: of the closed part alone. */
  readonly imepKpa: number
  /** Work over heat released; `null` motored. */
  readonly efficiency: number | null
  readonly peakKpa: number
  /** Crank degrees after top dead centre. */
  readonly peakDeg: number
  /** Half of the fuel burned, crank degrees after top dead centre; `null` after exhaust opening or motored. */
  readonly ca50Deg: number | null
  readonly heatLossJ: number
  readonly heatReleasedJ: number
  readonly peakTemperatureK: number
  readonly knock: Knock | null
  readonly notices: readonly Notice[]
}

/** Figures with the course over crank angle, inlet closing first. */
export interface CycleCourse extends CycleFigures {
  readonly thetaDeg: Float64Array
  readonly pressureKpa: Float64Array
  readonly temperatureK: Float64Array
  /** Share of the fuel burned. */
  readonly burned: Float64Array
}
