import fs from 'node:fs'
import path from 'node:path'
import { setTimeout as sleep } from 'node:timers/promises'
import { Failure } from './failure.mjs'
import { readIfThere } from './keep-file.mjs'
import { identityOf, isSameAlive } from './processes.mjs'

const PATIENCE_MS = 180_000

/** A lock is created empty and filled a moment later; only an old empty one was left by a crash. */
const EMPTY_MS = 5_000

/**
 * Runs `work` while holding the lock file; waits while another living process holds it.
 * @template T
 * @param {string} file
 * @param {() => T | Promise<T>} work
 * @returns {Promise<T>}
 */
export async function withLock(file, work) {
  fs.mkdirSync(path.dirname(file), { recursive: true })
  const until = Date.now() + PATIENCE_MS
  while (!take(file)) {
    clearStale(file)
    if (Date.now() > until) throw new Failure(`Another command has been holding ${file} for three minutes: wait for it to end, or stop it, then try again.`)
    await sleep(100)
  }
  try {
    return await work()
  } finally {
    fs.rmSync(file, { force: true })
  }
}

/** @param {string} file */
function take(file) {
  try {
    fs.writeFileSync(file, identityOf(process.pid), { flag: 'wx', mode: 0o600 })
    return true
  } catch (error) {
    if (/** @type {NodeJS.ErrnoException} */ (error).code === 'EEXIST') return false
    throw error
  }
}

/** @param {string} file */
function clearStale(file) {
  const holder = readIfThere(file)
  if (holder === null || isSameAlive(holder)) return
  if (holder === '' && Date.now() - (fs.statSync(file, { throwIfNoEntry: false })?.mtimeMs ?? Date.now()) < EMPTY_MS) return
  // Renamed before it is removed: of two who saw the same stale lock only one gets it, and a fresh one taken by mistake is put back.
  const aside = `${file}.${process.pid}.stale`
  try {
    fs.renameSync(file, aside)
    if (readIfThere(aside) !== holder) fs.linkSync(aside, file)
  } catch {
    // Somebody else was faster; the next round sees what is there.
  }
  fs.rmSync(aside, { force: true })
}
