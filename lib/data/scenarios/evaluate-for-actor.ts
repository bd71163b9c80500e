import 'server-only'
// The index, not ./live: it brings the formula parser.
import '@/lib/calc/index'
import type { Actor } from '@/lib/auth/actor'
import { evaluateScenario } from '@/lib/calc/live'
import { evaluationDto, type EvaluationDto } from '@/lib/schemas/scenario-dto'
import { scenarioEvaluateInput, type ScenarioEvaluateInput } from '@/lib/schemas/scenario-input'
import { authorise } from '../support/authorise'
import { toDto } from '../support/dto'
import { findEngine } from '../support/engine-records'
import { newEm } from '../support/orm'

/** What the library makes of a sheet on an engine of the shop, for a form without JavaScript. Nothing is stored. */
export async function evaluateForActor(actor: Actor, input: ScenarioEvaluateInput): Promise<EvaluationDto> {
  const em = await newEm()
  await authorise(em, actor, 'scenario.create')
  const { engineId, sheet } = scenarioEvaluateInput.parse(input)
  const engine = await findEngine(em, actor, engineId)
  const { id, name, code, spec, version } = engine
  return toDto(evaluationDto, { engine: { id, name, code, spec, version }, sheet, result: evaluateScenario({ engine: spec, sheet }) })
}
