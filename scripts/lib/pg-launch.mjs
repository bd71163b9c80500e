import fs from 'node:fs'
import { setTimeout as sleep } from 'node:timers/promises'
import { freeMegabytes } from './disk-space.mjs'
import { Failure, diskFullSentence } from './failure.mjs'
import { logOf, writeInfo } from './pg-info.mjs'
import { clearAfterCrash, postmasterOf } from './pg-processes.mjs'
import { programFor } from './pg-programs-for.mjs'
import { ownerFor, runAs } from './pg-programs.mjs'
import { lostPort, startSentence } from './pg-sentences.mjs'
import { freePort } from './port.mjs'

const LOG_LIMIT_BYTES = 10_000_000

/** Recovery after a crash replays the journal before the server answers; a large one takes minutes. */
const START_SECONDS = 600

/** For the test cluster alone, which is thrown away. People's records keep PostgreSQL's own durable settings. */
const FAST_AND_LOSS_PRONE = ['-c fsync=off', '-c synchronous_commit=off', '-c full_page_writes=off']

/**
 * Starts the server of a complete folder; the port it was given stands in the info file.
 * @param {import('./pg-info.mjs').ClusterName} name
 * @param {import('./pg-info.mjs').ClusterInfo} info
 */
export async function launch(name, info) {
  await clearAfterCrash(info.folder)
  const owner = ownerFor(info.folder)
  const log = logOf(info)
  if ((fs.statSync(log, { throwIfNoEntry: false })?.size ?? 0) > LOG_LIMIT_BYTES) fs.renameSync(log, `${log}.old`)
  fs.closeSync(fs.openSync(log, 'a', 0o600))
  if (owner) fs.chownSync(log, owner.uid, owner.gid)
  for (let attempt = 1; ; attempt++) {
    info.port = await freePort(info.port)
    writeInfo(name, info)
    const from = fs.statSync(log).size
    const options = [`-p ${info.port}`, '-c listen_addresses=127.0.0.1', "-c unix_socket_directories=''", '-c max_connections=60', ...(name === 'pg-test' ? FAST_AND_LOSS_PRONE : [])]
    const started = runAs(owner, programFor(info.folder, 'pg_ctl'), ['start', '-D', info.folder, '-w', '-t', String(START_SECONDS), '-l', log, '-o', options.join(' ')])
    if (started.ok) return
    const written = fs.readFileSync(log).subarray(from).toString('utf8') || started.err
    // A full disk may keep its own name from the log.
    if (freeMegabytes(info.folder) < 20) throw new Failure(diskFullSentence(info.folder))
    if (!lostPort(written) || attempt === 3) throw new Failure(startSentence(written, info.folder, log))
    info.port = 0
  }
}

/**
 * Waits until a server that already runs answers: it may be in the middle of its own recovery.
 * @param {import('./pg-info.mjs').ClusterInfo} info
 */
export async function awaitAnswer(info) {
  const until = Date.now() + START_SECONDS * 1000
  while (Date.now() < until && postmasterOf(info.folder)) {
    if (runAs(undefined, programFor(info.folder, 'pg_isready'), ['-q', '-h', '127.0.0.1', '-p', String(info.port)]).ok) return
    await sleep(250)
  }
  throw new Failure(`PostgreSQL runs on ${info.folder} but does not answer: see ${logOf(info)}.`)
}

/** @param {import('./pg-info.mjs').ClusterInfo} info */
export function halt(info) {
  const stopIn = (/** @type {string} */ mode) =>
    runAs(ownerFor(info.folder), programFor(info.folder, 'pg_ctl'), ['stop', '-D', info.folder, '-m', mode, '-w', '-t', '60'])
  if (!stopIn('fast').ok && postmasterOf(info.folder)) stopIn('immediate')
  if (postmasterOf(info.folder)) throw new Failure(`PostgreSQL does not stop: see ${logOf(info)}.`)
}
