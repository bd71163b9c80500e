import 'server-only'
import { UniqueConstraintViolationException } from '@mikro-orm/core'
import { Engine } from '@/entities/index'
import type { Actor } from '@/lib/auth/actor'
import { engineInput, type EngineInput } from '@/lib/schemas/engine'
import type { EngineDto } from '@/lib/schemas/engine-dto'
import { authorise } from '../support/authorise'
import { codeTaken, engineSearch, toEngineDto } from '../support/engine-records'
import { newEm } from '../support/orm'
import { requireStorable } from '../support/storable'

/** A new engine of the shop. */
export async function createEngine(actor: Actor, input: EngineInput): Promise<EngineDto> {
  const em = await newEm()
  await authorise(em, actor, 'engine.write')
  const { name, code, spec } = engineInput.parse(input)
  requireStorable({ name, spec })
  const engine = em.create(Engine, { shop: actor.shop.id, createdBy: actor.userId, name, code, spec, search: engineSearch({ code, name }) })
  try {
    await em.flush()
  } catch (error) {
    throw error instanceof UniqueConstraintViolationException ? codeTaken(code) : error
  }
  return toEngineDto(em, engine)
}
