import 'server-only'
import type { Actor } from '@/lib/auth/actor'
import type { ScenarioDto } from '@/lib/schemas/scenario-dto'
import { authorise } from '../support/authorise'
import { newEm } from '../support/orm'
import { findScenario, scenarioScope, toScenarioDto } from '../support/scenario-records'

/** Takes a scenario out of the lists; nothing of it is lost, and its released plans stay readable. */
export const archiveScenario = (actor: Actor, id: string): Promise<ScenarioDto> => setArchived(actor, id, true)

/** Brings an archived scenario back. */
export const restoreScenario = (actor: Actor, id: string): Promise<ScenarioDto> => setArchived(actor, id, false)

async function setArchived(actor: Actor, id: string, archived: boolean): Promise<ScenarioDto> {
  const forked = await newEm()
  const { role } = await authorise(forked, actor, 'scenario.archive', 'scenario.archiveOwn')
  return forked.transactional(async (em) => {
    const scenario = await findScenario(em, scenarioScope(actor, role, 'scenario.archive'), id, true)
    // Archiving twice keeps the first time.
    if (archived !== Boolean(scenario.archivedAt)) scenario.archivedAt = archived ? new Date() : null
    await em.flush()
    return toScenarioDto(em, actor, role, scenario)
  })
}
