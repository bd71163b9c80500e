import { setTimeout as sleep } from 'node:timers/promises'
import { Failure } from './failure.mjs'
import { isAlive } from './processes.mjs'

const LOOK_EVERY_MS = 500
const RESTARTS = 5
const WITHIN_MS = 10 * 60_000

/**
 * Starts the database again when it was killed; its journal brings back every committed record.
 * Ends with a sentence when it keeps dying or comes back elsewhere; returns when told to stop.
 * @param {import('./pg-cluster.mjs').Cluster} database
 * @param {AbortSignal} stopping
 * @returns {Promise<never | string>}
 */
export async function keepDatabaseUp(database, stopping) {
  const address = database.url()
  /** @type {number[]} */
  const restarts = []
  let pid = database.pid()
  while (!stopping.aborted) {
    await sleep(LOOK_EVERY_MS, undefined, { ref: false })
    if (stopping.aborted || isAlive(pid)) continue
    restarts.push(Date.now())
    if (restarts.filter((at) => Date.now() - at < WITHIN_MS).length > RESTARTS) throw new Failure(`The database died ${RESTARTS + 1} times in ten minutes and stays down: see ${database.info()?.folder}.log.`)
    console.error('The database stopped by itself; starting it again …')
    await database.start()
    if (database.url() !== address) throw new Failure('The database came back on another port, since its own was taken meanwhile: start again with npm start.')
    pid = database.pid()
    console.error('The database is back; every saved record is kept.')
  }
  return 'stopped'
}
