import 'server-only'
import { MikroORM, type EntityManager } from '@mikro-orm/postgresql'
import { cache } from 'react'
import { entities } from '@/entities/index'
import { databaseUrl } from '@/lib/database-url'
import config from '@/mikro-orm.config'

/**
 * One ORM for each copy of the entities: the framework bundles pages and route handlers apart, so the same process holds several, and
 * each must find its own. The promise is cached, not its result: requests that arrive during the first connection share it.
 */
const holder = globalThis as unknown as { halfspeedOrms?: Map<unknown, Promise<MikroORM>> }

/** Copies that live side by side in a built server, with room to spare; more are left over from edits under the development server. */
const mostCopies = 4

const close = (orm: Promise<MikroORM>) => orm.then((opened) => opened.close(true), () => {})

export function getOrm(): Promise<MikroORM> {
  const orms = (holder.halfspeedOrms ??= new Map())
  const known = orms.get(entities)
  if (known) return known
  const orm = Promise.resolve().then(() => MikroORM.init({ ...config, clientUrl: databaseUrl() }))
  orms.set(entities, orm)
  orm.catch(() => {
    if (orms.get(entities) === orm) orms.delete(entities) // the next request tries again
  })
  const [oldest] = orms
  if (orms.size > mostCopies && process.env.NODE_ENV === 'development' && oldest) {
    orms.delete(oldest[0])
    void close(oldest[1])
  }
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
  const orms = [...(holder.halfspeedOrms?.values() ?? [])]
  holder.halfspeedOrms = undefined
  await Promise.all(orms.map(close))
}
