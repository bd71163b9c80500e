import 'server-only'
import { MikroORM, type EntityManager } from '@mikro-orm/postgresql'
import { cache } from 'react'
import { entities } from '@/entities/index'
import { databaseUrl } from '@/lib/database-url'
import config from '@/mikro-orm.config'

// The promise is cached, not its result: requests that arrive during the first connection share it.
type Slot = { entities: unknown, orm: Promise<MikroORM> }
const globalSlot = globalThis as unknown as { halfspeedOrm?: Slot }

export function getOrm(): Promise<MikroORM> {
  const old = globalSlot.halfspeedOrm
  if (old && old.entities === entities) return old.orm
  if (old) void old.orm.then((orm) => orm.close(true), () => {}) // an entity file was edited under `next dev`
  const orm = Promise.resolve().then(() => MikroORM.init({ ...config, clientUrl: databaseUrl() }))
  const slot: Slot = { entities, orm }
  globalSlot.halfspeedOrm = slot
  orm.catch(() => {
    if (globalSlot.halfspeedOrm === slot) globalSlot.halfspeedOrm = undefined // the next request tries again
  })
  return orm
}

/** A fresh unit of work: one for each data function that writes. */
export async function newEm(): Promise<EntityManager> {
  return (await getOrm()).em.fork()
}

/** The same unit of work for all server components of one request. Only for reads. */
export const requestEm = cache(newEm)

/** For scripts and tests, which end. */
export async function closeOrm(): Promise<void> {
  const slot = globalSlot.halfspeedOrm
  globalSlot.halfspeedOrm = undefined
  if (slot) await (await slot.orm).close(true)
}
