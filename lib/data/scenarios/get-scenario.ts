import 'server-only'
import type { Actor } from '@/lib/auth/actor'
import type { ScenarioDto } from '@/lib/schemas/scenario-dto'
import { authorise } from '../support/authorise'
import { newEm } from '../support/orm'
import { findScenario, scenarioScope, toScenarioDto } from '../support/scenario-records'

/** One scenario with its current revision and its engine as it is now. */
export async function getScenario(actor: Actor, id: string): Promise<ScenarioDto> {
  const em = await newEm()
  const { role } = await authorise(em, actor, 'scenario.read', 'scenario.readOwn')
  return toScenarioDto(em, actor, role, await findScenario(em, scenarioScope(actor, role, 'scenario.read'), id))
}
