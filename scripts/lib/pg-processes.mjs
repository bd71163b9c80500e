import fs from 'node:fs'
import path from 'node:path'
import { setTimeout as sleep } from 'node:timers/promises'
import { readIfThere } from './keep-file.mjs'
import { ownerFor, runAs } from './pg-programs.mjs'
import { isAlive, nameOf } from './processes.mjs'

/** Server processes end by themselves this soon after their postmaster was killed, unless stuck. */
const ORPHANS_MS = 5_000

/**
 * The living postmaster of this folder, or null. Its pid file alone proves nothing: after a crash it stays,
 * and its number may belong to a zombie or by now to any other program.
 * @param {string} folder
 * @returns {{ pid: number, port: number } | null}
 */
export function postmasterOf(folder) {
  const lines = (readIfThere(path.join(folder, 'postmaster.pid')) ?? '').split('\n')
  const pid = Number(lines[0])
  if (!isAlive(pid)) return null
  if (fs.existsSync('/proc/self') && !serverProcesses(folder).includes(pid)) return null
  return { pid, port: Number(lines[3]) || 0 }
}

/**
 * All living server processes that work in the folder: they enter it as they start.
 * Asked as their own user, since even root may be kept from another user's /proc links inside a container.
 * @param {string} folder
 */
export function serverProcesses(folder) {
  if (!fs.existsSync('/proc/self')) return []
  const real = fs.existsSync(folder) ? fs.realpathSync(folder) : folder
  const pattern = real.replace(/[\\*?[\]]/g, '\\$&')
  const { out } = runAs(ownerFor(folder), 'find', ['/proc', '-mindepth', '2', '-maxdepth', '2', '-path', '/proc/[0-9]*/cwd', '-lname', pattern])
  return out.split('\n').filter(Boolean).map((line) => Number(line.split('/')[2])).filter((pid) => isAlive(pid) && nameOf(pid) === 'postgres')
}

/**
 * Readies the folder after a crash. Orphaned server processes may still write to it, and a second server beside
 * them would ruin the records, so the pid file that guards against that is removed only once they are gone.
 * @param {string} folder
 */
export async function clearAfterCrash(folder) {
  const until = Date.now() + ORPHANS_MS
  let orphans = serverProcesses(folder)
  while (orphans.length > 0 && Date.now() < until) {
    await sleep(50)
    orphans = serverProcesses(folder)
  }
  for (const pid of orphans) process.kill(pid, 'SIGKILL')
  while (serverProcesses(folder).length > 0) await sleep(20)
  fs.rmSync(path.join(folder, 'postmaster.pid'), { force: true })
}
