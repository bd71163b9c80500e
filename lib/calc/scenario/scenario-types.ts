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

/** Half widths of what may be off, crank degrees; scatter is a standard deviation. */
export interface Tolerances {
  timingCheckDeg: number
  benchDeg: number
  /** Reading a mark by light. */
  markDeg: number
  /** From spark to spark and cylinder to cylinder, one standard deviation. */
  scatterDeg: number
}

/** The closed cycle at full throttle, as the model of pressure and detonation sees it. */
export interface CycleSetup {
  /** Inlet valve closes, exhaust valve opens: crank degrees from firing top dead centre. */
  ivcDeg: number
  evoDeg: number
  /** Charge at inlet closing. */
  chargeK: number
  residualFraction: number
  airFuelRatio: number
  /** Mass of air over what the displacement holds in standard air; null: the charge is solved from the power carried. */
  volumetricEfficiency: number | null
  /** Share of the burn's total from spark to start of burning. */
  delayShare: number
  wallK: number
  headAreaFactor: number
}

export type OctaneScale = 'ron' | 'mon' | 'aki' | 'lean'

/** Planned and worse fuel stand on one scale: none is converted. */
export interface Fuel {
  scale: OctaneScale
  octane: number
  worseOctane: number
}

export interface WorseCase {
  /** Hotter charge at inlet closing, K. */
  hotterK: number
  /** Denser charge at inlet closing: a field below the planned one, or a day of high pressure. */
  denserKpa: number
}

/** Full throttle, at the planned charge. */
export interface ReferenceSetting {
  sparkDeg: number
  rpm: number
  octane: number
  /** Crank degrees it is known to be short of detonation; 0 when nothing better is known. */
  marginDeg: number
}

/** Coil, its drive and what hangs on it; one a channel. */
export interface CoilSetup {
  ohm: number
  mh: number
  /** null: not limited. */
  limitA: number | null
  dwellMs: number
  /** At the coil, running and while the starter turns. */
  supplyV: number
  crankingV: number
  /** Two cylinders at a time, one of them for nothing. */
  wastedSpark: boolean
  ambientK: number
  thermalResistanceKPerW: number
  secondaryPf: number
  /** Share of the stored energy that reaches the plug. */
  transferEfficiency: number
  /** Most voltage the drive lets through; null: not limited. */
  clampKv: number | null
}

export interface Airframe {
  massKg: number
  wingAreaM2: number
  cd0: number
  inducedK: number
  propEfficiency: number
  /** Slowest speed to climb at, 1.3 times the stall. */
  minSpeedMps: number
}

/** Parts a spark goes through, in the order of the chain; `plug` stands for the lead and plug of one cylinder. */
export const redundancyParts = ['supply', 'switch', 'trigger', 'module', 'coil', 'cap', 'plug'] as const
export type RedundancyPart = (typeof redundancyParts)[number]

export interface RedundancySetup {
  /** Failures an hour at the reference temperature of each kind of part; guesses unless a source is known. */
  ratesPerH: Record<RedundancyPart, number>
  /** Temperature at trigger, module and coil, which heat shortens; reference and activation energy of the rates. */
  hotK: number
  referenceK: number
  activationEv: number
  /** Battery and switch serve both channels. */
  sharedSupply: boolean
  /** Both channels fire one coil. */
  sharedCoil: boolean
  flightHours: number
  /** Hours between checks that exercise the backup alone. */
  checkIntervalHours: number
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
  tolerances: Tolerances
  cycle: CycleSetup
  fuel: Fuel
  /** Worse than planned: what detonation is judged at. */
  worse: WorseCase
  /** A setting known to run clean on this engine, which anchors the detonation model; null: none. */
  reference: ReferenceSetting | null
  coils: { primary: CoilSetup; backup: CoilSetup }
  plugGapMm: number
  airframe: Airframe
  /** Where it is to fly: pressure altitude and air temperature. */
  conditions: { pressureAltitudeM: number; temperatureK: number }
  redundancy: RedundancySetup
  notes: string
}

export interface Scenario {
  engine: Engine
  sheet: ScenarioSheet
}
