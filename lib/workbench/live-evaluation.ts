import { cycleParts, type Engine, evaluateClosedForms, type Finding, type Limits, type Part, type PartError, type PartName, partsStandingOn, rankFindings, type ScenarioParts, type ScenarioResult, type ScenarioSheet } from '../calc/live'
import { fieldIndex, type FieldErrors, type FormValues } from '../schemas/field'
import { fieldOfScenarioPath, formToScenario, scenarioToForm } from '../schemas/scenario-form'
import { scenarioFields } from '../schemas/scenario-fields'
import type { UnitSystem } from '../units'
import { cycleAnswerOf, cycleKeyOf, cycleLimits, isCycleComputed, type CycleAnswer, type CycleRequest } from './cycle-answer'

/** What an evaluation stands on besides the typed texts. */
export interface LiveContext {
  engine: Engine
  limits: Limits
  system: UnitSystem
  /** The sheet the form was filled from: untouched fields keep its exact values. */
  base: ScenarioSheet
}

export interface LiveState {
  values: FormValues
  /** The last texts that could be computed with. */
  lastValid: FormValues
  sheet: ScenarioSheet
  /** Newest figures of each part; a part that cannot be computed now keeps its last ones. */
  result: ScenarioResult
  errors: FieldErrors
  /** Character index of the fault in a formula, by field name. */
  faultAt: Record<string, number>
  /** Parts whose figures are the last valid ones. */
  stale: ReadonlySet<PartName>
  staleFindings: ReadonlySet<string>
  /** The simulated cycle as it was last computed, and the sheet it belongs to. */
  cycle: { key: string; answer: CycleAnswer }
  /** The cycle to be computed, while that is of another sheet than this one. */
  due: CycleRequest | null
  /** Parts and findings of the cycle that are being computed again. */
  pending: ReadonlySet<PartName>
  pendingFindings: ReadonlySet<string>
  /** The formula parser is wanted and not there yet. */
  wantsParser: boolean
}

const index = fieldIndex(scenarioFields)

/** Fields that are judged against each other go back together: half of such a group would be as faulty as the whole. */
const isGroup = (path: string) => path.endsWith('.schedule') || path === 'fuel' || path === 'reference'

/** A schedule kind just chosen has nothing to fall back on: then the whole schedule is the last valid one. */
function withLastValid(values: FormValues, lastValid: FormValues, errors: FieldErrors): FormValues {
  const patched = { ...values }
  for (const name of Object.keys(errors)) {
    const path = index.get(name)?.path ?? ''
    if (isGroup(path)) {
      for (const field of scenarioFields) if (field.path === path) patched[field.name] = lastValid[field.name] ?? ''
    } else patched[name] = lastValid[name] ?? ''
  }
  return patched
}

/** Something typed that cannot be computed with, to be said at its field. */
const isTyped = (error: PartError) => error.code === 'input' || error.code === 'runUpOutside'
const isWaiting = (error: PartError) => isTyped(error) || error.code === 'formulaParserNotLoaded'

/** Figures of a failed part stay the last valid ones, unless it is withheld for a reason that is no fault of the typing. Faults of parts still to be computed belong to an older sheet. */
function keepParts(fresh: ScenarioParts, last: ScenarioParts, coming: readonly PartName[]): { parts: ScenarioParts; kept: PartName[]; errors: PartError[] } {
  const parts: Record<string, Part<object>> = { ...fresh }
  const kept: PartName[] = []
  const errors: PartError[] = []
  for (const name of Object.keys(fresh) as PartName[]) {
    const now = fresh[name]
    if (now.ok || !isWaiting(now.error) || coming.includes(name)) continue
    errors.push(now.error)
    if (!last[name].ok) continue
    parts[name] = last[name]
    kept.push(name)
  }
  return { parts: parts as unknown as ScenarioParts, kept, errors }
}

function keepFindings(fresh: Finding[], last: Finding[], isPartMissing: boolean): { findings: Finding[]; kept: string[] } {
  if (!isPartMissing) return { findings: fresh, kept: [] }
  const now = new Set(fresh.map((finding) => finding.id))
  const kept = last.filter((finding) => !now.has(finding.id))
  return { findings: rankFindings([...fresh, ...kept]), kept: kept.map((finding) => finding.id) }
}

const none: ReadonlySet<never> = new Set()

/** The state a page opens with: computed on the server in both layers, so that it stands there without a script. */
export function startLive(values: FormValues, sheet: ScenarioSheet, result: ScenarioResult, { engine, limits }: LiveContext): LiveState {
  const answer = cycleAnswerOf(result)
  const key = cycleKeyOf(engine, sheet, limits)
  const isComputed = isCycleComputed(answer)
  return {
    values, lastValid: values, sheet, result, errors: {}, faultAt: {}, stale: none, staleFindings: none, wantsParser: false,
    cycle: { key: isComputed ? key : '', answer }, due: isComputed ? null : { key, scenario: { engine, sheet }, limits },
    pending: isComputed ? none : new Set(cycleParts), pendingFindings: none,
  }
}

/** Another revision takes the place of what was typed; the figures follow as after an edit. */
export const takeOver = (state: LiveState, values: FormValues, context: LiveContext): LiveState =>
  editLive({ ...state, values, lastValid: values, sheet: context.base }, {}, context)

/** The cycle was computed; an answer for another sheet than the one that stands here now changes nothing. */
export function takeCycle(state: LiveState, key: string, answer: CycleAnswer, context: LiveContext): LiveState {
  return state.due?.key === key ? editLive({ ...state, cycle: { key, answer } }, {}, context) : state
}

/**
 * The person turned to the other unit system: what can be read is shown in it, what cannot stays as it was typed. The exact numbers
 * go along as the sheet the form is filled from.
 */
export function turnUnits(state: LiveState, context: LiveContext, system: UnitSystem): { state: LiveState, context: LiveContext } {
  const shown = { ...state.values, ...scenarioToForm(state.values.title ?? '', state.sheet, system) }
  // Texts of schedule kinds that are not chosen were typed in the other system: they would be misread.
  const values: FormValues = { ...shown, notes: state.values.notes ?? '' }
  for (const name of Object.keys(state.errors)) values[name] = state.values[name] ?? ''
  const next = { ...context, system, base: state.sheet }
  return { state: editLive({ ...state, values, lastValid: shown }, {}, next), context: next }
}

/** One edit: reads the texts, computes what can be computed, keeps the last valid figures of the rest and says which they are. */
export function editLive(state: LiveState, changes: FormValues, context: LiveContext): LiveState {
  const values = { ...state.values, ...changes }
  const read = formToScenario(values, context.system, context.base)
  const errors: FieldErrors = read.ok ? {} : { ...read.errors }
  const patched = read.ok ? values : withLastValid(values, state.lastValid, read.errors)
  const usable = read.ok ? read : formToScenario(patched, context.system, context.base)
  const sheet = usable.ok ? usable.input.sheet : state.sheet
  const scenario = { engine: context.engine, sheet }
  const closed = evaluateClosedForms(scenario, context.limits)
  const key = cycleKeyOf(context.engine, sheet, context.limits)
  const isCurrent = key === state.cycle.key
  const cycle = isCurrent ? state.cycle.answer : cycleAnswerOf(state.result)
  const { parts, kept, errors: partErrors } = keepParts({ ...closed.parts, ...cycle.parts }, state.result.parts, isCurrent ? [] : cycleParts)
  const faultAt: Record<string, number> = {}
  for (const error of partErrors) {
    if (!isTyped(error)) continue
    const name = fieldOfScenarioPath(error.field, values)
    errors[name] ??= error.message
    if (error.at !== undefined) faultAt[name] = error.at
  }
  const paths = Object.keys(errors).map((name) => index.get(name)?.path ?? name)
  const { findings, kept: keptFindings } = keepFindings(rankFindings([...closed.findings, ...cycle.findings]), state.result.findings, partErrors.length > 0)
  const drivenByFault = findings.filter((finding) => finding.inputs.some((input) => paths.some((path) => `${input}.`.startsWith(`sheet.${path}.`) || `sheet.${path}.`.startsWith(`${input}.`))))
  const count = (verdict: Finding['verdict']) => findings.filter((finding) => finding.verdict === verdict).length
  return {
    values, errors, faultAt, sheet,
    lastValid: usable.ok && partErrors.length === 0 ? patched : state.lastValid,
    result: {
      ...closed, parts, findings, counts: { outside: count('outside'), close: count('close'), within: count('within') },
      notices: [...closed.notices, ...cycle.notices], sourceIds: [...new Set([...closed.sourceIds, ...cycle.sourceIds])].sort(),
    },
    stale: new Set([...kept, ...(paths.length > 0 ? partsStandingOn(paths) : [])]),
    staleFindings: new Set([...keptFindings, ...drivenByFault.map((finding) => finding.id)]),
    cycle: state.cycle,
    due: isCurrent ? null : state.due?.key === key ? state.due : { key, scenario, limits: context.limits },
    pending: isCurrent ? none : new Set(cycleParts),
    pendingFindings: isCurrent ? none : new Set(findings.filter(({ limitId }) => cycleLimits.has(limitId)).map(({ id }) => id)),
    wantsParser: partErrors.some((error) => error.code === 'formulaParserNotLoaded'),
  }
}
