import 'server-only'
import type { Actor } from '@/lib/auth/actor'
import type { RevisionDto } from '@/lib/schemas/revision-dto'
import { authorise } from '../support/authorise'
import { newEm } from '../support/orm'
import { findRevision, toRevisionDto } from '../support/revision-records'
import { findScenario, scenarioScope } from '../support/scenario-records'

/** One revision as it was saved, with the engine as it was then. */
export async function getRevision(actor: Actor, id: string, number: number): Promise<RevisionDto> {
  const em = await newEm()
  const { role } = await authorise(em, actor, 'scenario.read', 'scenario.readOwn')
  const scenario = await findScenario(em, scenarioScope(actor, role, 'scenario.read'), id)
  return toRevisionDto(await findRevision(em, scenario, number))
}
