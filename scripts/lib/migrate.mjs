import fs from 'node:fs'
import { runToEnd } from './children.mjs'
import { stepFailure } from './failed-step.mjs'
import { Failure } from './failure.mjs'
import { inRoot } from './paths.mjs'

/** @typedef {import('./pg-cluster.mjs').Cluster} Cluster */

/** The migrations of this checkout, oldest first. */
const ownMigrations = () =>
  fs.readdirSync(inRoot('migrations')).flatMap((name) => /^(Migration.*)\.(ts|js)$/.exec(name)?.[1] ?? []).sort()

/**
 * @param {string[]} own
 * @param {string[]} applied
 */
export const compareMigrations = (own, applied) => ({
  pending: own.filter((name) => !applied.includes(name)),
  unknown: applied.filter((name) => !own.includes(name)),
})

/**
 * Brings a database to the tables of this checkout; asks it first, so that a start with nothing to do takes no time.
 * @param {Cluster} database
 * @param {string} [name]
 * @returns {Promise<number>} how many migrations were run
 */
export async function migrate(database, name) {
  const [hasTable] = database.query(`select to_regclass('public.mikro_orm_migrations') is not null`, name)
  const applied = hasTable === 't' ? database.query('select name from mikro_orm_migrations', name) : []
  const { pending, unknown } = compareMigrations(ownMigrations(), applied)
  if (unknown.length > 0) throw new Failure(`The database was last used by a newer version of this program (it knows ${unknown.at(-1)}): go back to that version, or start this one in another folder.`)
  if (pending.length === 0) return 0
  const outcome = await runToEnd(process.execPath, ['--import', 'tsx', inRoot('node_modules', '@mikro-orm', 'cli', 'cli.js'), 'migration:up'], {
    minutes: 10, env: { DATABASE_URL: database.url(name), MIKRO_SNAPSHOT: '' },
  })
  if (!outcome.ok) {
    throw stepFailure('Bringing the database up to date', outcome, 'the database is as it was before that migration; start the version that was used before, or report this.', { quote: true })
  }
  return pending.length
}

/**
 * Lays the demo shops into a database; the script itself does nothing where they are.
 * @param {Cluster} database
 * @param {string} [name]
 */
export async function seed(database, name) {
  const outcome = await runToEnd(process.execPath, ['--conditions=react-server', '--import', 'tsx', inRoot('scripts', 'seed.ts')], {
    minutes: 5, env: { DATABASE_URL: database.url(name) },
  })
  if (outcome.ok) return
  throw stepFailure('Laying in the demo', outcome, 'start again, or begin anew with npm run pg destroy when there is nothing to keep.', { quote: true })
}
