import 'server-only'
import type { Actor } from '@/lib/auth/actor'
import type { EngineDto } from '@/lib/schemas/engine-dto'
import { authorise } from '../support/authorise'
import { findEngine, toEngineDto } from '../support/engine-records'
import { newEm } from '../support/orm'

/** One engine, archived or not. */
export async function getEngine(actor: Actor, id: string): Promise<EngineDto> {
  const em = await newEm()
  await authorise(em, actor, 'engine.read')
  return toEngineDto(em, await findEngine(em, actor, id))
}
