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

export { standardAtmosphere, type Air, type StandardAtmosphereInput } from './air/standard-atmosphere'
export { densityAltitudeM, type DensityAltitudeInput } from './air/density-altitude'
export { powerAtDensityRatio } from './air/lapsed-power'

export type { Aeroplane } from './climb/aeroplane'
export type { PropEfficiency } from './climb/prop-efficiency'
export { powerRequiredKw, type PowerRequiredInput } from './climb/power-required'
export { climbRateMps, type ClimbRateInput } from './climb/climb-rate'
export { bestClimb, type BestClimb, type BestClimbInput } from './climb/best-climb'
export { outcome, type Outcome, type OutcomeInput } from './climb/outcome'

export type { Coil } from './coil/coil'
export { coilCurrentA, dwellForCurrentMs, sparkEnergyMj, stalledCurrentA } from './coil/coil-current'
export {
  dwellAvailableMs, sparkPeriodShare, sparksPerSecond, type DwellAvailableInput, type SparkPeriodShareInput, type SparksPerSecondInput,
} from './coil/spark-period'
export { coilHeat, type CoilHeat, type CoilHeatInput } from './coil/coil-heat'

export { breakdownKv, type BreakdownInput } from './spark/breakdown'
export { sparkDemandKv, type SparkDemandInput } from './spark/demand'
export { sparkMargin, type SparkMargin, type SparkMarginInput } from './spark/margin'

export type { CommonCause, Exposure, FaultEvent, FaultGate, FaultTree } from './redundancy/fault-tree-types'
export { eventProbability } from './redundancy/event-probability'
export { faultTreeProbability } from './redundancy/fault-tree-probability'
export { timeAveragedProbability } from './redundancy/time-averaged-probability'
export { minimalCutSets, type CutSetOptions, type StopSignal } from './redundancy/minimal-cut-sets'
export { importance, type EventImportance } from './redundancy/importance'
export { singlePoints, type SinglePoint } from './redundancy/single-points'
export { ignitionTree, type ChannelParts, type CylinderParts, type IgnitionTreeInput, type IgnitionTrees } from './redundancy/ignition-tree'
export { rateSensitivity, type RateSensitivity } from './redundancy/rate-sensitivity'

export type { Burn, Charge, CycleCourse, CycleFigures, CycleInput, HeatLoss, Knock } from './cycle/cycle-types'
export { simulateCycle } from './cycle/simulate-cycle'
export { findMbt, type BestTorqueSpark } from './cycle/find-mbt'
export { knockLimitedSpark, type KnockLimit } from './cycle/knock-limited-spark'
export { sparkMap, type BurnScaling, type SparkMap, type SparkMapInput } from './cycle/spark-map'
export { chargeKpaFromManifold, manifoldKpaFromCharge, type ChargeFromManifoldInput, type FullThrottlePressures, type ManifoldFromChargeInput } from './cycle/manifold-charge'
export { scaleBurn, type BurnAngles, type BurnReference, type ScaleBurnInput } from './cycle/scale-burn'
export { calibrateBurn, type CalibrateBurnTarget } from './cycle/calibrate-burn'
export { crankTorque, type CrankTorque, type CrankTorqueInput } from './cycle/crank-torque'
export { chargePressureFromVolumetricEfficiency, type ChargePressureInput } from './cycle/charge-pressure'
export { combustionEfficiency } from './cycle/combustion-efficiency'
export { autoignitionDelayMs, type AutoignitionInput } from './cycle/autoignition-delay'
export { wallHeatTransfer, type WallHeatInput } from './cycle/wall-heat-transfer'
export { burnedFraction, type BurnedFractionInput } from './cycle/wiebe'

export { normalQuantile } from './statistics/normal-quantile'
export { studentTQuantile } from './statistics/student-t-quantile'
export { combineUncertainty, type CombinedUncertainty, type CoverageInput, type Distribution, type UncertaintyContribution } from './statistics/combine-uncertainty'
export { leastSquares, type LeastSquares, type LeastSquaresInput } from './statistics/least-squares'
export { linearTrend, type LinearTrend, type LinearTrendInput, type TrendPoint, type TrendPrediction } from './statistics/linear-trend'
export { processCapability, type CapabilityLimits, type ProcessCapability } from './statistics/process-capability'
export { cpkInterval, type CpkInterval, type CpkIntervalInput } from './statistics/cpk-interval'
export { individualsChart, type IndividualsChart } from './statistics/individuals-chart'
export { controlChartFactors, type ControlChartFactors } from './statistics/control-chart-factors'

export type { BenchPlan, BenchReading, ChannelName } from './bench/bench-types'
export type { BenchRow, BenchScatter, BenchStagger } from './bench/bench-groups'
export type { BenchCrankRetard } from './bench/retard-step'
export { evaluateBenchRun, type BenchRun, type BenchRunInput } from './bench/evaluate-bench-run'
export { benchReadingsToAdvance, type BenchWheel, type IndexDatum, type RelativeDatum } from './bench/bench-readings-to-advance'
export { evaluateTimingCheck, type TimingCheck, type TimingCheckInput } from './checks/evaluate-timing-check'
export { evaluateRunUp, type ExpectedDrops, type RunUp, type RunUpChannel, type RunUpInput } from './checks/evaluate-run-up'

export { defaultLimits, judge, type Limit, type LimitId, type Limits, type LimitUnit, type Verdict } from './limits'
export { evaluateClosedForms, evaluateScenario, inputErrors } from './scenario/evaluate-scenario'
export { addCycleLayer } from './scenario/cycle-layer'
export { sparkMapOf, type SparkMapChoice } from './scenario/spark-map-of'
export { partsStandingOn } from './scenario/dependencies'
export { rankFindings } from './scenario/draft'
export { displacementCc } from './scenario/power-parts'
export type * from './scenario/result-types'
export type * from './scenario/scenario-types'
export { redundancyParts } from './scenario/scenario-types'
export { cycleParts } from './scenario/result-types'
export { dependsOnPressure, findSpeedPoint, speedPointAt } from './scenario/speed-points'
export { storedResult } from './scenario/stored-result'
