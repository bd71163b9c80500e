import fs from 'node:fs'
import path from 'node:path'
import { setTimeout as sleep } from 'node:timers/promises'
import { Failure } from './failure.mjs'
import { identityOf, isSameAlive } from './processes.mjs'

const PATIENCE_MS = 180_000

/**
 * Runs `work` while holding the lock; waits while another living process holds it.
 * The lock is a symbolic link whose target names its holder: it comes into being whole, and needs no room on a
 * full disk, where a database must still be stopped.
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
    fs.symlinkSync(identityOf(process.pid), file)
    return true
  } catch (error) {
    if (/** @type {NodeJS.ErrnoException} */ (error).code === 'EEXIST') return false
    throw error
  }
}

/** Who holds the lock; null when nobody does. @param {string} file */
function holderOf(file) {
  try {
    return fs.readlinkSync(file)
  } catch (error) {
    if (/** @type {NodeJS.ErrnoException} */ (error).code === 'ENOENT') return null
    throw error
  }
}

/** @param {string} file */
function clearStale(file) {
  const holder = holderOf(file)
  if (holder === null || isSameAlive(holder)) return
  // Renamed before it is removed: of two who saw the same stale lock only one gets it, and a fresh one taken by mistake is put back.
  const aside = `${file}.${process.pid}.stale`
  try {
    fs.renameSync(file, aside)
    const taken = holderOf(aside)
    if (taken !== null && taken !== holder) fs.symlinkSync(taken, file)
  } catch {
    // Somebody else was faster; the next round sees what is there.
  }
  fs.rmSync(aside, { force: true })
}
