import 'server-only'
import pg from 'pg'
import { databaseUrl } from '@/lib/database-url'

const globalSlot = globalThis as unknown as { halfspeedAuthPool?: pg.Pool }

// Its own small pool: the ORM's connections return dates as strings, which sessions cannot use.
const pool = (): pg.Pool =>
  (globalSlot.halfspeedAuthPool ??= new pg.Pool({ connectionString: databaseUrl(), max: 4 })
    .on('error', (error) => console.error('sign-in pool:', error.message)))

/** Connects at the first query, so that a build needs no database. Everything that takes a Pool here only calls `query`. */
export const authPool = {
  query: (query: string | pg.QueryConfig, values?: unknown[]) => pool().query(query, values),
} as unknown as pg.Pool

/** For scripts and tests, which end. */
export async function closeAuthPool(): Promise<void> {
  const open = globalSlot.halfspeedAuthPool
  globalSlot.halfspeedAuthPool = undefined
  await open?.end()
}
