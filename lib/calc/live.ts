/**
 * Every public name, without the formula parser: what a browser loads first. A formula schedule needs
 * `loadFormulaParser()` once; until then it is a CalcError with the code `formulaParserNotLoaded`.
 */
export { CalcError, type CalcErrorDetails } from './calc-error'
export type { Notice } from './notice'
export { calcVersion } from './version'
export { sources, type Provenance, type Source } from './sources'

export { crankDegFromMs, msFromCrankDeg } from './angle/crank-time'
export { crankDegFromDistributor, distributorDegFromCrank } from './angle/distributor'
export { arcMm, degFromArcMm } from './angle/arc'
export { firingSchedule, type Firing, type FiringScheduleInput } from './angle/firing-schedule'

export type {
  AdvanceAt, Channel, CrankRetard, FixedSchedule, FormulaSchedule, MapSchedule, MechanicalSchedule, Schedule, TableSchedule, Trend,
} from './advance/advance-types'
export { sparkAdvanceDeg, staggerDeg } from './advance/spark-advance'
export { advanceCurve, type AdvanceCurveInput, type CurvePoint } from './advance/advance-curve'
export { proofSpeedRpm, type ProofSpeedInput } from './advance/proof-speed'
export { staggerReport, type StaggerPoint, type StaggerReport, type StaggerReportInput } from './advance/stagger-report'
export { loadFormulaParser } from './advance/load-formula-parser'

export { curvatureFromPoint, timingTorqueRatio, type CurvaturePoint, type TimingParabola } from './power/timing-torque'
export { fitTimingParabola, type TimingFit, type TorquePoint } from './power/fit-timing-parabola'
export { brakeRatioFromIndicated, type BrakeRatioInput } from './power/brake-ratio'

export { deadCylinderPower, type DeadCylinderInput, type DeadCylinderPower } from './dead-cylinder/dead-cylinder-power'
export { morseTest, type MorseTestInput, type MorseTestResult } from './dead-cylinder/morse-test'
export { frictionMepKpa, type FrictionMepInput } from './dead-cylinder/friction-mep'
export { mepFromPower, powerFromMep, type MepFromPowerInput, type PowerFromMepInput } from './dead-cylinder/mean-effective-pressure'

export type { PowerCurvePoint, PowerFraction, PropellerLoad } from './propeller/power-curve'
export { fixedPitchOperatingPoint, type FixedPitchInput, type OperatingPoint } from './propeller/fixed-pitch'
export { constantSpeedOperatingPoint, type ConstantSpeedInput, type GovernedPoint } from './propeller/constant-speed'
export { runUpDrop, torqueRatioFromDrop, type RunUpDrop, type RunUpDropInput, type TorqueRatioInput } from './propeller/run-up'

export { rotorRegister, type RotorRegister, type RotorRegisterInput } from './rotor/rotor-register'
export { bestPhasingDeg } from './rotor/best-phasing'

export type { CycleEngine, Cylinder } from './geometry/cycle-engine'
export { cylinderVolumeCc, pistonTravelMm, type CylinderVolumeInput, type PistonTravelInput } from './geometry/cylinder-volume'

export { defaultLimits, judge, type Limit, type LimitId, type Limits, type LimitUnit, type Verdict } from './limits'
export { evaluateScenario, inputErrors } from './scenario/evaluate-scenario'
export { partsStandingOn } from './scenario/dependencies'
export { rankFindings } from './scenario/findings'
export { displacementCc } from './scenario/power-parts'
export type * from './scenario/result-types'
export type { Engine, MbtProvenance, Pitch, Rotation, Rotor, Scenario, ScenarioSheet } from './scenario/scenario-types'
export { dependsOnPressure, findSpeedPoint, speedPointAt } from './scenario/speed-points'
export { storedResult } from './scenario/stored-result'
