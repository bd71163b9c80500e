import type { Channel } from '../advance/advance-types'

/** Direction of rotation as somebody standing at the named place sees it. */
export type Rotation = 'clockwise' | 'anticlockwise'

/** Everything of an engine that the evaluation uses. Speeds in rpm, lengths in mm, power in kW, angles in crank degrees. */
export interface Engine {
  cylinders: number
  /** A permutation of 1…cylinders. */
  firingOrder: number[]
  /** From firing i to i + 1, the last back to the first, sum 720; null: even. */
  intervalsDeg: number[] | null
  boreMm: number
  strokeMm: number
  rodMm: number
  compressionRatio: number
  ratedPowerKw: number
  ratedRpm: number
  /** Full-throttle brake power, strictly ascending; empty: constant torque through the rated power is assumed and said. */
  powerCurve: { rpm: number; kw: number }[]
  /** Ignition timing at which rated power and curve were measured, degrees before TDC. */
  powerTimingDeg: number
  /** Friction at rated power and speed. */
  friction: { kind: 'efficiency'; mechanicalEfficiency: number } | { kind: 'power'; frictionPowerKw: number }
  crankingSlowestRpm: number
  crankingRpm: number
  crankingFastestRpm: number
  idleSlowestRpm: number
  idleRpm: number
  maxRpm: number
  damperDiameterMm: number
  damperEnd: 'propeller' | 'accessory'
  /** Crank rotation seen from the damper end. */
  crankRotation: Rotation
  /** Rotor rotation seen from above the cap. */
  distributorRotation: Rotation
  /** Cylinder at each cap terminal, counted clockwise seen from above, starting anywhere. */
  capTerminals: number[]
}

export type MbtProvenance = 'measured' | 'handbook' | 'guess'

/** One named pitch setting: the power the propeller takes at a speed, standard sea level, standing or in climb as the name says. */
export interface Pitch {
  name: string
  rpm: number
  kw: number
}

export interface Rotor {
  /** Distributor degrees. */
  terminalWidthDeg: number
  rotorWidthDeg: number
  /** Crank advance at which the rotor stands centred on its terminal. */
  phasedAtDeg: number
  /** Of the backup's own rotor; used when each channel has a cap. */
  backupPhasedAtDeg: number
  sparkDurationMs: number
  /** A mechanical advance turns the rotor with the trigger, so it does not move the register. */
  mechanicalCarriesRotor: boolean
  /** Radius at which a stagger can be measured on the trigger plate; null: not asked for. */
  plateRadiusMm: number | null
}

/** The working sheet: what a designer lays out on top of an engine. */
export interface ScenarioSheet {
  distribution: 'sharedCap' | 'capEach' | 'directCoils'
  plugsPerCylinder: 1 | 2
  selection: 'oneAtATime' | 'both'
  primary: Channel
  backup: Channel
  /** Least advance for best torque at full throttle, with the curvature of torque about it. */
  mbt: { deg: number; curvaturePerDeg2: number; provenance: MbtProvenance; note: string }
  propeller: { kind: 'fixedPitch' | 'constantSpeed'; governedRpm: number | null; pitches: Pitch[] }
  runUpRpm: number
  /** Manifold pressure at the three conditions; matters where a schedule depends on it. */
  manifold: { idleKpa: number; runUpKpa: number; fullKpa: number }
  rotor: Rotor
  tolerances: { timingCheckDeg: number; benchDeg: number }
  notes: string
}

export interface Scenario {
  engine: Engine
  sheet: ScenarioSheet
}
