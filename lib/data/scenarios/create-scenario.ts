import 'server-only'
import type { Actor } from '@/lib/auth/actor'
import { AppError } from '@/lib/errors'
import type { ScenarioDto } from '@/lib/schemas/scenario-dto'
import { scenarioCreateInput, type ScenarioCreateInput } from '@/lib/schemas/scenario-input'
import { authorise } from '../support/authorise'
import { findEngine, toEngineDto } from '../support/engine-records'
import { newEm } from '../support/orm'
import { addScenario, toScenarioDto } from '../support/scenario-records'
import { asStored, requireStorable } from '../support/storable'

/** A new scenario of the actor, evaluated here, as revision 1. */
export async function createScenario(actor: Actor, input: ScenarioCreateInput): Promise<ScenarioDto> {
  const forked = await newEm()
  const { role } = await authorise(forked, actor, 'scenario.create')
  const { engineId, engineVersion, title, sheet } = scenarioCreateInput.parse(input)
  requireStorable({ title, sheet })
  return forked.transactional(async (em) => {
    const engine = await findEngine(em, actor, engineId, 'change')
    if (engine.archivedAt) throw new AppError('engineGone')
    if (engine.version !== engineVersion) throw new AppError('engineChanged', { conflict: await toEngineDto(em, engine) })
    const scenario = addScenario(em, actor, engine, title, asStored(sheet))
    await em.flush()
    return toScenarioDto(em, actor, role, scenario)
  })
}
