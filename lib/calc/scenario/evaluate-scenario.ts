import { arcMm } from '../angle/arc'
import { staggerReport } from '../advance/stagger-report'
import { defaultLimits, type Limits } from '../limits'
import type { Notice } from '../notice'
import { calcVersion } from '../version'
import { addCycleLayer, cycleNotComputed } from './cycle-layer'
import { findingsOf } from './findings'
import { part } from './part'
import { curvePowerKw, deadCylindersPart, powerPart } from './power-parts'
import { propellerPart, runUpPart } from './propeller-parts'
import { proofPart } from './proof-part'
import { climbPart } from './climb-part'
import { coilsPart } from './coils-part'
import { redundancyPart } from './redundancy-part'
import { stackPart } from './stack-part'
import { leadsPart, registerPart } from './register-part'
import type { CurvePoint, PartError, PerChannel, ScenarioParts, ScenarioResult } from './result-types'
import { readyScenario } from './ready-scenario'
import type { Scenario } from './scenario-types'
import { advanceCurves, markedPoints, staggerCurve, staggerPoint } from './speed-points'

/** Rated power and curve may differ by this share before it is said. */
const curveAgreement = 0.02

/** Published curvatures, per degree²: Crossley and Cook's surface to the steep end of Heywood's class of curve. */
const publishedCurvature = [1.8e-4, 4e-4] as const

/**
 * A whole scenario in both layers: the closed forms and the simulated cycle. As `evaluateClosedForms`, with `addCycleLayer` on top.
 */
export const evaluateScenario = (scenario: Scenario, limits: Limits = defaultLimits): ScenarioResult =>
  addCycleLayer(scenario, evaluateClosedForms(scenario, limits), limits)

/**
 * The closed-form layer of a scenario, quick enough for every keystroke: every part but the cycle's, the findings ranked, their counts, and what to know beside them.
 * Never throws for a part: what cannot be computed stands as `{ ok: false, error }` and the others go on.
 *
 * @param scenario engine and sheet, checked by their schemas (angles in crank degrees, rpm, mm, kW, kPa)
 * @param limits what the scenario is judged by; the defaults of `limits.ts` unless given
 * @throws nothing for anything a schema lets through; a programming error is not caught
 * Source: the equations of the functions it composes; limits from their own table.
 */
export function evaluateClosedForms(scenario: Scenario, limits: Limits = defaultLimits): ScenarioResult {
  const { engine, sheet } = scenario
  const ready = readyScenario(scenario)
  const curves = part(() => advanceCurves(scenario))
  const stagger = part(() => {
    const { atCranking, atIdle, atMax, smallest, largest, backupEverFirst } = staggerReport(sheet.primary, sheet.backup, {
      crankingRpm: engine.crankingRpm, idleRpm: engine.idleRpm, maxRpm: engine.maxRpm, mapKpa: sheet.manifold.fullKpa,
    })
    const at = (point: { rpm: number; staggerDeg: number }) => staggerPoint(scenario, point.rpm, point.staggerDeg)
    return {
      curve: curves.ok ? staggerCurve(ready, curves.rising) : [],
      atCranking: at(atCranking), atIdle: at(atIdle), atMax: at(atMax), smallest: at(smallest), largest: at(largest), backupEverFirst,
    }
  })
  const sampled: PerChannel<CurvePoint[]>[] = curves.ok
    ? [curves.rising, { primary: curves.falling.primary ?? [], backup: curves.falling.backup ?? [] }]
    : []
  const parts: ScenarioParts = {
    speeds: part(() => ({ points: markedPoints(ready) })),
    curves,
    stagger,
    power: part(() => powerPart(ready)),
    deadCylinders: part(() => deadCylindersPart(ready)),
    runUp: part(() => runUpPart(ready)),
    propeller: part(() => propellerPart(ready)),
    register: curves.ok ? part(() => registerPart(ready, sampled)) : { ok: false, error: curves.error },
    leads: part(() => leadsPart(scenario)),
    proof: part(() => proofPart(ready)),
    marks: part(() => ({ mmPerDeg: arcMm(engine.damperDiameterMm, 1) })),
    coils: part(() => coilsPart(scenario)),
    climb: part(() => climbPart(ready)),
    redundancy: part(() => redundancyPart(scenario)),
    stack: part(() => stackPart(scenario)),
    ...cycleNotComputed,
  }
  const findings = findingsOf(ready, parts, limits)
  const count = (verdict: string) => findings.filter((finding) => finding.verdict === verdict).length
  const notices = noticesOf(scenario)
  const sourceIds = [...findings.flatMap((finding) => finding.sourceIds), ...notices.map((notice) => notice.source), 'heywood-1988']
  return {
    calcVersion, parts, findings, notices,
    counts: { outside: count('outside'), close: count('close'), within: count('within') },
    sourceIds: [...new Set(sourceIds)].sort(),
  }
}

/** Figures that were computed, but outside what their source covers or against another figure given. */
function noticesOf({ engine, sheet }: Scenario): Notice[] {
  const notices: Notice[] = []
  const [mildest, steepest] = publishedCurvature
  const { curvaturePerDeg2 } = sheet.mbt
  if (curvaturePerDeg2 > steepest || curvaturePerDeg2 < mildest)
    notices.push({ code: 'curvatureOutsidePublished', severity: 'caution', field: 'sheet.mbt.curvaturePerDeg2', value: curvaturePerDeg2, limit: `${mildest} … ${steepest}`, source: 'crossley-cook-1991' })
  if (engine.powerCurve.length < 2)
    notices.push({ code: 'powerCurveAssumed', severity: 'info', field: 'engine.powerCurve', value: engine.ratedPowerKw, limit: 'constant torque', source: 'trade' })
  const onCurve = engine.powerCurve.length < 2 ? null : curvePowerKw(engine.powerCurve, engine.ratedRpm)
  if (onCurve !== null && Math.abs(onCurve / engine.ratedPowerKw - 1) > curveAgreement)
    notices.push({ code: 'ratedPowerOffCurve', severity: 'caution', field: 'engine.ratedPowerKw', value: engine.ratedPowerKw, limit: String(onCurve), source: 'trade' })
  return notices
}

/** What was typed that the library cannot compute with: a scenario that has one is not saved. */
export const inputErrors = (result: ScenarioResult): PartError[] =>
  Object.values(result.parts).flatMap((each) => (!each.ok && (each.error.code === 'input' || each.error.code === 'formulaParserNotLoaded' || each.error.code === 'runUpOutside') ? [each.error] : []))
