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
