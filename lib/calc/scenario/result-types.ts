import type { LimitId, LimitUnit, Verdict } from '../limits'
import type { Notice } from '../notice'

/** Why a part or a figure is withheld; words for it live in lib/words. */
export interface PartError {
  /** 'input' is a CalcError of the library: something typed that cannot be computed with. The others are withheld with a reason. */
  code: 'input' | 'formulaParserNotLoaded' | 'twoPlugs' | 'noRotor' | 'unevenCap' | 'noTorque' | 'runUpOutside' | 'chargeMismatch' | 'chargeUnsolved' | 'burnUncalibrated' | 'notComputed'
  /** Dotted path in the scenario (`engine.…`, `sheet.…`). */
  field: string
  value: unknown
  limit: unknown
  unit: string | null
  message: string
  /** Character index in a formula. */
  at?: number
}

export type Part<T> = ({ ok: true } & T) | { ok: false; error: PartError }

export type ChannelName = 'primary' | 'backup'
export type PerChannel<T> = Record<ChannelName, T>

export interface CurvePoint {
  rpm: number
  deg: number
}

/** Where both channels fire, and what the engine makes, at one speed (full throttle). */
export interface SpeedPoint {
  rpm: number
  primaryDeg: number
  backupDeg: number
  staggerDeg: number
  staggerMs: number
  staggerDistributorDeg: number
  plateArcMm: number | null
}

/** A stagger alone: on either side of a crank-retard jump, or an extreme. */
export type StaggerPoint = Omit<SpeedPoint, 'primaryDeg' | 'backupDeg'>

export type MarkedSpeed = 'cranking' | 'idle' | 'runUp' | 'full'

export interface PowerPoint {
  rpm: number
  primaryKw: number
  backupKw: number
  primaryNm: number
  backupNm: number
}

export interface DeadCylinderRow {
  dead: number
  primary: { kw: number; fraction: number }
  backup: { kw: number; fraction: number }
}

export interface RunUpExpectation {
  rpm: number
  dropRpm: number
  /** Slowest and fastest speed of the band (throttle 0…−1, best torque 0…10° earlier). */
  lowRpm: number
  highRpm: number
}

export interface PropellerPoint {
  rpm: number
  kw: number
  governed: boolean | null
}

export interface PropellerRow {
  pitch: string
  primary: PropellerPoint | null
  backup: PropellerPoint | null
  /** On the primary with one cylinder cold. */
  oneCold: PropellerPoint | null
}

export interface RegisterRow {
  /** Crank advance at the spark, the speed it belongs to. */
  rpm: number
  advanceDeg: number
  startOffsetDeg: number
  endOffsetDeg: number
  /** Worst of the spark's start and end, distributor degrees. */
  registerDeg: number
  freeDeg: number
}

/** One channel's coil at full-power speed and while the starter turns. */
export interface CoilRow {
  currentA: number
  energyMj: number
  crankingCurrentA: number
  crankingEnergyMj: number
  /** A stopped engine with its trigger closed. */
  stalledA: number
  /** null: no steady temperature up to 453 K, or a dwell longer than the spark period. */
  windingK: number | null
  powerW: number | null
  /** Dwell and spark duration over the spark period. */
  periodShare: number
}

/** Climb of the aeroplane with the power of one state of the engine, propeller first. */
export interface ClimbRow {
  state: 'primary' | 'backup' | 'oneCold'
  rpm: number
  /** At the propeller, at this density. */
  powerKw: number
  verdict: 'climbs' | 'level' | 'descends'
  speedMps: number
  climbMps: number
  ceilingM: number | null
}

/** Chance of one kind of loss: an hour, with each guessed rate a tenth and ten times. */
export interface LossRow {
  loss: 'noSpark' | 'channelLost' | 'cylinderLost'
  perHour: number
  lowPerHour: number
  highPerHour: number
}

export interface StackRow {
  what: 'setting' | 'bench' | 'mark' | 'scatter'
  halfWidthDeg: number
}

/** Detonation of one channel at one speed and case. */
export interface DetonationPoint {
  rpm: number
  /** Carried there, and the charge that makes it. */
  powerKw: number
  pressureKpa: number
  sparkDeg: number
  /** null: no spark searched reaches it (never), or every one does (always). */
  limitDeg: number | null
  state: 'limited' | 'never' | 'always'
  /** Limit less spark; where it is never reached, the last spark searched less the spark; null: always. */
  marginDeg: number | null
  /** The margin with the octane number off by its uncertainty. */
  lowDeg: number | null
  highDeg: number | null
  octaneRequired: number
}

export interface DetonationCases {
  planned: DetonationPoint
  worse: DetonationPoint
  /** At the planned density altitude, planned fuel. */
  altitude: DetonationPoint
}

export interface DetonationRow extends DetonationCases {
  /** Degrees of margin lost for one octane number less, a charge 10 K hotter, 10 kPa denser: at the worst point. */
  perOctaneDeg: number | null
  per10KDeg: number | null
  per10KpaDeg: number | null
}

export interface PressureRow {
  imepKpa: number
  peakKpa: number
  peakDeg: number
  /** Cycle's brake torque over that at its best spark. */
  torqueRatio: number
}

export interface SparkRow {
  demandKv: number
  offeredKv: number
  ratio: number
  crankingDemandKv: number
  crankingOfferedKv: number
  crankingRatio: number
}

export interface Finding {
  /** limit id, a dot, channel where there is one: `crankingAdvanceDeg.primary`. */
  id: string
  limitId: LimitId
  channel: ChannelName | null
  verdict: Verdict
  /** null: there is no such value (no speed proves full timing), judged outside. */
  value: number | null
  /** The limit in the value's own terms (proof speed: idle speed + the allowed excess). */
  limit: number
  sense: 'atMost' | 'atLeast'
  closeBand: number
  unit: LimitUnit
  /** Figures the sentence needs, by name. */
  data: Record<string, number | string | boolean | null>
  /** Dotted paths of the inputs that drive it (`sheet.primary.schedule`). */
  inputs: string[]
  sourceIds: string[]
}

export interface ScenarioParts {
  speeds: Part<{ points: Record<MarkedSpeed, SpeedPoint> }>
  curves: Part<{ rising: PerChannel<CurvePoint[]>; falling: PerChannel<CurvePoint[] | null> }>
  stagger: Part<{ curve: StaggerPoint[]; atCranking: StaggerPoint; atIdle: StaggerPoint; atMax: StaggerPoint; smallest: StaggerPoint; largest: StaggerPoint; backupEverFirst: boolean }>
  power: Part<{ curve: PowerPoint[]; atMax: PowerPoint; backupToPrimary: number; shortOfMbtDeg: PerChannel<number>; curveAssumed: boolean }>
  deadCylinders: Part<{ rpm: number; frictionPowerKw: number; rows: DeadCylinderRow[] }>
  runUp: Part<{ rows: ({ pitch: string; loadKw: number } & PerChannel<RunUpExpectation>)[]; torqueRatio: PerChannel<number> }>
  propeller: Part<{ rows: PropellerRow[] }>
  register: Part<{ worst: PerChannel<RegisterRow>; bestPhasingDeg: PerChannel<number> }>
  leads: Part<{ expected: number[]; actual: number[]; outOfPlace: number }>
  proof: Part<{ rpm: PerChannel<number | null>; toleranceDeg: number }>
  marks: Part<{ mmPerDeg: number }>
  coils: Part<PerChannel<CoilRow>>
  climb: Part<{ densityAltitudeM: number; densityRatio: number; rows: ClimbRow[] }>
  redundancy: Part<{ losses: LossRow[]; cutSets: number; singlePoints: { id: string; heatSensitive: boolean }[]; checkIntervalHours: number }>
  stack: Part<{ rows: StackRow[]; standardDeg: number; expandedDeg: number; worstCaseDeg: number; staggerExpandedDeg: number }>
  /** From here on the cycle layer: simulated, not closed form. */
  charge: Part<{ rpm: number; powerKw: number; pressureKpa: number; volumetricEfficiency: number; from: 'power' | 'typed'; mismatch: number; delayDeg: number; durationDeg: number; mbtDeg: number }>
  detonation: Part<PerChannel<DetonationRow> & { octaneUncertainty: number; anchored: boolean; octaneShift: number; gainDeg: number; gainOctane: number }>
  pressure: Part<PerChannel<PressureRow> & { rpm: number }>
  spark: Part<PerChannel<SparkRow>>
}

/** Parts of the cycle layer: computed beside the page, they follow the closed forms. */
export const cycleParts = ['charge', 'detonation', 'pressure', 'spark'] as const satisfies readonly (keyof ScenarioParts)[]

export type PartName = keyof ScenarioParts

/** What a part holds when it could be computed. */
export type PartFigures<Name extends PartName> = Omit<Extract<ScenarioParts[Name], { ok: true }>, 'ok'>

export interface ScenarioResult {
  calcVersion: string
  parts: ScenarioParts
  /** Ranked: outside, close, within; worst first in each. */
  findings: Finding[]
  counts: Record<Verdict, number>
  notices: Notice[]
  /** Ids of sources.ts the results used. */
  sourceIds: string[]
}
