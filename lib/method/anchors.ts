import type { Finding, PartName } from '../calc/live'
import type { EquationId } from './topics'

/** The equation behind each finding. A new limit does not compile before it has one. */
export const findingEquation: Record<Finding['limitId'], EquationId> = {
  beyondMbtDeg: 'timing-torque',
  crankingAdvanceDeg: 'spark-advance',
  retardAboveCrankingRpm: 'spark-advance',
  retardBelowIdleRpm: 'spark-advance',
  backupFirstDeg: 'stagger',
  backupPowerRatio: 'timing-torque',
  proofAboveIdleRpm: 'proof-speed',
  registerDeg: 'rotor-register',
  freeDeg: 'rotor-register',
  leadsOutOfPlace: 'firing-schedule',
  markSpacingMm: 'arc',
  detonationDeg: 'knock-limit',
  windingK: 'coil-heat',
  sparkVoltageRatio: 'spark-offered',
  periodShare: 'sparks-per-second',
  climbMps: 'climb-rate',
  noSparkPerH: 'latent-together',
}

/** The equation behind each part of an evaluation. */
export const partEquation: Record<PartName, EquationId> = {
  speeds: 'spark-advance',
  curves: 'spark-advance',
  stagger: 'stagger',
  power: 'timing-torque',
  deadCylinders: 'dead-cylinder-power',
  runUp: 'run-up-drop',
  propeller: 'operating-point',
  register: 'rotor-register',
  leads: 'firing-schedule',
  proof: 'proof-speed',
  marks: 'arc',
  coils: 'coil-current',
  climb: 'climb-rate',
  redundancy: 'latent-together',
  stack: 'combined-uncertainty',
  charge: 'charge',
  detonation: 'knock-limit',
  pressure: 'cycle-pressure',
  spark: 'spark-offered',
}

export const methodPath = (id: EquationId): string => `/method#${id}`
