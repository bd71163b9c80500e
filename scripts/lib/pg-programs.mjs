import { spawnSync } from 'node:child_process'
import fs from 'node:fs'
import path from 'node:path'
import { Failure } from './failure.mjs'

/** Where Debian keeps the server programs, one folder a major version; they are not on the PATH. */
const DEBIAN_HOME = '/usr/lib/postgresql'

export const isRoot = process.getuid?.() === 0

/**
 * Every folder with the server programs, newest major version first.
 * @returns {{ major: number, bin: string }[]}
 */
export function installedPrograms() {
  const debian = fs.existsSync(DEBIAN_HOME) ? fs.readdirSync(DEBIAN_HOME).map((version) => path.join(DEBIAN_HOME, version, 'bin')) : []
  const onPath = (process.env.PATH ?? '').split(path.delimiter).filter(Boolean)
  return [...debian, ...onPath]
    .filter((bin) => ['initdb', 'pg_ctl', 'postgres', 'psql'].every((program) => fs.existsSync(path.join(bin, program))))
    .map((bin) => ({ bin, major: majorOf(spawnSync(path.join(bin, 'postgres'), ['--version'], { encoding: 'utf8', cwd: '/' }).stdout ?? '') }))
    .filter(({ major }) => major > 0)
    .sort((a, b) => b.major - a.major)
}

/**
 * "postgres (PostgreSQL) 15.13 (Debian 15.13-0+deb12u1)" → 15; 0 when the text names no version.
 * @param {string} text
 */
export const majorOf = (text) => Number(/\bPostgreSQL\)? (\d+)/.exec(text)?.[1] ?? 0)

/**
 * The ids of the user postgres, whom Debian makes with the server package; undefined without one.
 * @returns {{ uid: number, gid: number } | undefined}
 */
export function postgresIds() {
  const [uid, gid] = ['-u', '-g'].map((flag) => Number(spawnSync('id', [flag, 'postgres'], { encoding: 'utf8' }).stdout))
  return uid && gid ? { uid, gid } : undefined
}

/**
 * The ids to run the server programs under: PostgreSQL refuses root, so root hands over to the folder's owner,
 * or to the user postgres for a new folder. Undefined when the current user runs them itself.
 * @param {string} folder
 */
export function ownerFor(folder) {
  if (!isRoot) return undefined
  const stat = fs.statSync(folder, { throwIfNoEntry: false })
  return stat && stat.uid !== 0 ? { uid: stat.uid, gid: stat.gid } : postgresIds()
}

/**
 * Runs a program to its end as the given user. The working folder is / because that user may not be able to enter ours,
 * and the group is its own because a Ctrl-C meant for the command must not end a pg_ctl in the middle.
 * @param {{ uid: number, gid: number } | undefined} owner
 * @param {string} program
 * @param {string[]} args
 * @param {Record<string, string>} [env]
 */
export function runAs(owner, program, args, env = {}) {
  const result = spawnSync(program, args, /** @type {import('node:child_process').SpawnSyncOptionsWithStringEncoding} */ ({
    cwd: '/', detached: true, encoding: 'utf8', stdio: ['ignore', 'pipe', 'pipe'], env: { ...process.env, LC_ALL: 'C.UTF-8', ...env }, ...owner,
  }))
  if (result.error) throw result.error
  // Half an answer would read as “no server runs here”.
  if (result.signal) throw new Failure(`${path.basename(program)} was ended by ${result.signal}: start again.`)
  return { ok: result.status === 0, out: result.stdout, err: result.stderr }
}
