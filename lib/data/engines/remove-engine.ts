import 'server-only'
import { Scenario } from '@/entities/index'
import type { Actor } from '@/lib/auth/actor'
import { AppError } from '@/lib/errors'
import { authorise } from '../support/authorise'
import { findEngine } from '../support/engine-records'
import { newEm } from '../support/orm'

/** Removes an engine that no scenario was ever laid out on. The lock keeps one from being started meanwhile. */
export async function removeEngine(actor: Actor, id: string): Promise<void> {
  const forked = await newEm()
  await authorise(forked, actor, 'engine.archive')
  await forked.transactional(async (em) => {
    const engine = await findEngine(em, actor, id, 'change')
    if (await em.count(Scenario, { engine: engine.id }) > 0) throw new AppError('inUse', { what: 'engine' })
    em.remove(engine)
  })
}
