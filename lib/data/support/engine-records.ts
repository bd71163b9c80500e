import 'server-only'
import { LockMode } from '@mikro-orm/core'
import type { EntityManager } from '@mikro-orm/postgresql'
import { Engine, Scenario } from '@/entities/index'
import type { Actor } from '@/lib/auth/actor'
import { AppError } from '@/lib/errors'
import { engineDto, type EngineDto } from '@/lib/schemas/engine-dto'
import { toDto } from './dto'
import { requireId } from './ids'
import { isoOf, isoOrNull } from './list-page'
import { searchText } from './search-text'

/**
 * An engine of the actor's shop, or not-found. 'change' holds it alone until the transaction ends; 'keep' only keeps it as
 * it is. Where a scenario's row is locked too, the engine comes first.
 */
export async function findEngine(em: EntityManager, actor: Actor, id: string, lock?: 'change' | 'keep'): Promise<Engine> {
  const lockMode = lock && { change: LockMode.PESSIMISTIC_WRITE, keep: LockMode.PESSIMISTIC_READ }[lock]
  const engine = await em.findOne(Engine, { id: requireId(id, 'engine'), shop: actor.shop.id }, { lockMode })
  if (!engine) throw new AppError('notFound', { what: 'engine' })
  return engine
}

export async function toEngineDto(em: EntityManager, engine: Engine): Promise<EngineDto> {
  const { id, name, code, spec, version } = engine
  const scenarioCount = await em.count(Scenario, { engine: id })
  return toDto(engineDto, { id, name, code, spec, version, scenarioCount, archivedAt: isoOrNull(engine.archivedAt ?? null), updatedAt: isoOf(engine.updatedAt) })
}

export const engineSearch = ({ code, name }: { code: string, name: string }): string => searchText(code, name)

export const codeTaken = (code: string): AppError =>
  new AppError('invalid', { fieldErrors: { code: `Another engine of this shop has the code ${code}. Choose another.` } })
