import fs from 'node:fs'
import { askedToStop } from './asked-to-stop.mjs'
import { endAllGroups } from './children.mjs'
import { installPostgres } from './debian.mjs'
import { demoLines } from './demo-sign-ins.mjs'
import { requireSpace } from './disk-space.mjs'
import { stepFailure } from './failed-step.mjs'
import { Failure, sentenceOf } from './failure.mjs'
import { migrate, seed } from './migrate.mjs'
import { build, isBuilt } from './next-build.mjs'
import { installPackages } from './packages.mjs'
import { dataFolder, root } from './paths.mjs'
import { cluster } from './pg-cluster.mjs'
import { requirePort } from './port.mjs'
import { leaveCheckout, rememberWeb, takeCheckout } from './running-here.mjs'
import { keepDatabaseUp } from './watch-database.mjs'
import { startWeb } from './web.mjs'

const say = (/** @type {string} */ line) => console.log(line)

/**
 * npm start and npm run dev: lays what is missing, serves, and tidies up when it ends, however it ends.
 * @param {import('./start-options.mjs').StartOptions} options
 * @returns {Promise<number>} the exit code
 */
export async function startHere(options) {
  const database = cluster('pg', say)
  const stopping = new AbortController()
  const asked = askedToStop(() => {
    if (!stopping.signal.aborted) say('\nStopping …')
    stopping.abort()
  })
  let taken = false
  const run = async () => {
    fs.mkdirSync(dataFolder, { recursive: true })
    await takeCheckout(options)
    taken = true
    await requirePort(options.port)
    await serve(database, options, stopping.signal)
  }
  // A signal ends the waiting at once; what still runs is ended in tidyUp, and how it fails then is no news.
  let told = ''
  await Promise.race([asked, run()]).catch((error) => {
    told = sentenceOf(error)
    console.error(told)
  })
  stopping.abort()
  if (taken) {
    await tidyUp(database).catch((error) => {
      if (sentenceOf(error) !== told) console.error(sentenceOf(error))
      told = sentenceOf(error)
    })
    if (!told) say('Stopped, database included.')
  }
  return told ? 1 : 0
}

/**
 * @param {import('./pg-cluster.mjs').Cluster} database
 * @param {import('./start-options.mjs').StartOptions} options
 * @param {AbortSignal} stopping
 */
async function serve(database, { port, development }, stopping) {
  requireSpace(root, 100, 'the database and its journal')
  await installPackages(say)
  await installPostgres(say)
  await database.start()
  if (stopping.aborted) return
  const migrated = await migrate(database)
  if (migrated > 0) say(`Database brought up to date (${migrated} ${migrated === 1 ? 'migration' : 'migrations'}).`)
  if (!database.info()?.seeded) {
    say('Laying in the demo …')
    await seed(database)
    database.remember({ seeded: true })
  }
  if (!development && !isBuilt()) {
    say('Building, about half a minute …')
    const outcome = await build()
    if (!outcome.ok && !stopping.aborted) {
      throw stepFailure('The build', outcome, 'its own words stand above.')
    }
  }
  if (stopping.aborted) return
  const web = await startWeb({ port, databaseUrl: database.url(), development })
  rememberWeb(web.group)
  say(['', `Halfspeed is at ${web.address}`, '', 'Sign in as one of the demo:', ...demoLines(), '', 'Ctrl-C stops it, database included.', ''].join('\n'))
  const how = await Promise.race([web.ended, keepDatabaseUp(database, stopping)])
  if (!stopping.aborted) throw new Failure(`The web server ended by itself (${how}): start again with npm start.`)
}

/**
 * Ends the web server first, then the database it writes to.
 * @param {import('./pg-cluster.mjs').Cluster} database
 */
async function tidyUp(database) {
  await endAllGroups()
  leaveCheckout()
  await database.stop()
}
