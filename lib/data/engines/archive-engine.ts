import 'server-only'
import type { Actor } from '@/lib/auth/actor'
import type { EngineDto } from '@/lib/schemas/engine-dto'
import { authorise } from '../support/authorise'
import { findEngine, toEngineDto } from '../support/engine-records'
import { newEm } from '../support/orm'

/** Takes the engine out of the lists; its scenarios stay readable and cannot be saved until it is back. */
export const archiveEngine = (actor: Actor, id: string): Promise<EngineDto> => setArchived(actor, id, true)

/** Brings an archived engine back. */
export const restoreEngine = (actor: Actor, id: string): Promise<EngineDto> => setArchived(actor, id, false)

async function setArchived(actor: Actor, id: string, archived: boolean): Promise<EngineDto> {
  const forked = await newEm()
  await authorise(forked, actor, 'engine.archive')
  return forked.transactional(async (em) => {
    const engine = await findEngine(em, actor, id, 'change')
    // Archiving twice keeps the first time.
    if (archived !== Boolean(engine.archivedAt)) engine.archivedAt = archived ? new Date() : null
    await em.flush()
    return toEngineDto(em, engine)
  })
}
