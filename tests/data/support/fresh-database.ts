import { afterAll } from 'vitest'
import { closeAuthPool } from '@/lib/auth/pool'
import { closeOrm } from '@/lib/data/support/orm'
import { useDatabase as cloneDatabase } from './database'

/** A database of its own for a test file that calls the program's own functions: their connections are closed before the database goes. */
export function freshDatabase(): ReturnType<typeof cloneDatabase> {
  const database = cloneDatabase()
  // Hooks at the end run last registered first.
  afterAll(async () => {
    await closeAuthPool()
    await closeOrm()
  })
  return database
}
