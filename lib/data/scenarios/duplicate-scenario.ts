import 'server-only'
import type { Actor } from '@/lib/auth/actor'
import { can } from '@/lib/auth/permissions'
import { AppError } from '@/lib/errors'
import type { ScenarioDto } from '@/lib/schemas/scenario-dto'
import { authorise } from '../support/authorise'
import { copyTitle } from '../support/copy-title'
import { findEngine } from '../support/engine-records'
import { newEm } from '../support/orm'
import { readSheet } from '../support/read-sheet'
import { findRevision } from '../support/revision-records'
import { addScenario, findScenario, scenarioScope, toScenarioDto } from '../support/scenario-records'

/** A new scenario of the actor from a revision of another (the current one unless named), evaluated on the engine as it is now. */
export async function duplicateScenario(actor: Actor, id: string, { revision: number }: { revision?: number } = {}): Promise<ScenarioDto> {
  const forked = await newEm()
  const { role } = await authorise(forked, actor, 'scenario.create')
  if (!can({ role }, 'scenario.read') && !can({ role }, 'scenario.readOwn')) throw new AppError('forbidden')
  const source = await findScenario(forked, scenarioScope(actor, role, 'scenario.read'), id)
  const revision = await findRevision(forked, source, number ?? source.currentRevision)
  const sheet = readSheet(revision.sheet, revision.sheetVersion)
  const title = copyTitle(revision.title, 120)
  return forked.transactional(async (em) => {
    const engine = await findEngine(em, actor, source.engine.id, 'change')
    if (engine.archivedAt) throw new AppError('engineGone')
    const scenario = addScenario(em, actor, engine, title, sheet)
    await em.flush()
    return toScenarioDto(em, actor, role, scenario)
  }, { clear: true })
}
