import { cycleParts, type Engine, type Finding, type LimitId, type Limits, type Notice, type PartError, type Scenario, type ScenarioParts, type ScenarioResult, type ScenarioSheet } from '../calc/live'

/** The simulated cycle's share of an evaluation. */
export interface CycleAnswer {
  parts: Pick<ScenarioParts, (typeof cycleParts)[number]>
  findings: Finding[]
  notices: Notice[]
  sourceIds: string[]
}

/** What the cycle is to be computed of; the same key, the same figures. */
export interface CycleRequest {
  key: string
  scenario: Scenario
  limits: Limits
}

/** Findings that stand on the simulated cycle. */
export const cycleLimits: ReadonlySet<LimitId> = new Set<LimitId>(['detonationDeg', 'sparkVoltageRatio'])
const cycleNotices: ReadonlySet<string> = new Set(['chargeTyped', 'gammaOutsideFit', 'burnCoarse'])

/** Notes are read by nobody but people. */
export const cycleKeyOf = (engine: Engine, sheet: ScenarioSheet, limits: Limits): string => JSON.stringify([engine, { ...sheet, notes: '' }, limits])

/** The cycle's share of a whole evaluation. */
export function cycleAnswerOf({ parts, findings, notices, sourceIds }: ScenarioResult): CycleAnswer {
  const { charge, detonation, pressure, spark } = parts
  return {
    parts: { charge, detonation, pressure, spark }, sourceIds,
    findings: findings.filter(({ limitId }) => cycleLimits.has(limitId)), notices: notices.filter(({ code }) => cycleNotices.has(code)),
  }
}

export const isCycleComputed = ({ parts }: CycleAnswer): boolean => cycleParts.every((name) => parts[name].ok || parts[name].error.code !== 'notComputed')

/** Neither a worker nor the page could compute it: said in its place, and nothing old stands for it. */
export function failedAnswer(): CycleAnswer {
  const error: PartError = {
    code: 'notComputed', field: 'sheet.cycle', value: 'failed', limit: null, unit: null,
    message: 'The simulated cycle could not be computed in this browser. Saving computes it on the server.',
  }
  const part = { ok: false as const, error }
  return { parts: { charge: part, detonation: part, pressure: part, spark: part }, findings: [], notices: [], sourceIds: [] }
}
