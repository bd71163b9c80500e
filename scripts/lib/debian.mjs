import { spawnSync } from 'node:child_process'
import fs from 'node:fs'
import { runToEnd } from './children.mjs'
import { stepFailure } from './failed-step.mjs'
import { Failure } from './failure.mjs'
import { installedPrograms, isRoot, postgresIds } from './pg-programs.mjs'

const CREATECLUSTER = '/etc/postgresql-common/createcluster.conf'
const POSTGRES_LINE = `apt-get update && apt-get install -y postgresql-common && sed -i 's/^#\\?create_main_cluster.*/create_main_cluster = false/' ${CREATECLUSTER} && apt-get install -y postgresql`
const CHROMIUM_LINE = 'apt-get update && apt-get install -y chromium'

/** The line for a person who is not root. @param {string} line */
const asSudo = (line) => `sudo sh -c "${line}"`

const hasApt = () => spawnSync('apt-get', ['--version'], { stdio: 'ignore' }).status === 0

/**
 * The sentence for a missing Debian package that may not be installed from here.
 * @param {string} what
 * @param {string} line
 * @param {boolean} debian
 */
export const missingSentence = (what, line, debian) =>
  debian ? `${what} is not on this machine and only root may install it; type\n  ${asSudo(line)}\nand start again.` : `${what} is not on this machine and there is no apt-get to install it: install it by your system’s own means, then start again.`

/** @param {string[]} args */
async function apt(...args) {
  const outcome = await runToEnd('apt-get', ['-q', '-o', 'DPkg::Lock::Timeout=120', ...args], { minutes: 15, env: { DEBIAN_FRONTEND: 'noninteractive' } })
  if (outcome.ok) return
  throw stepFailure(`Installing from Debian (apt-get ${args.join(' ')})`, outcome, 'its own words stand above.', { download: true })
}

/**
 * Installs PostgreSQL's server programs when they are missing, without the cluster Debian would start for all.
 * @param {(line: string) => void} say
 */
export async function installPostgres(say) {
  // Programs put there by hand come without the user that root hands over to.
  if (installedPrograms().length > 0 && (!isRoot || postgresIds())) return
  if (!isRoot || !hasApt()) throw new Failure(missingSentence('PostgreSQL', POSTGRES_LINE, hasApt()))
  say('Installing PostgreSQL from Debian …')
  await apt('update')
  await apt('install', '-y', 'postgresql-common')
  const text = fs.readFileSync(CREATECLUSTER, 'utf8')
  fs.writeFileSync(CREATECLUSTER, withoutMainCluster(text))
  await apt('install', '-y', 'postgresql')
}

/** @param {string} text createcluster.conf */
export function withoutMainCluster(text) {
  const line = 'create_main_cluster = false'
  const set = /^[ \t]*#?[ \t]*create_main_cluster[ \t]*=.*$/m
  return set.test(text) ? text.replace(set, line) : `${text.replace(/\n?$/, '\n')}${line}\n`
}

/** Where the browser tests look for Debian's Chromium. */
export const chromiumPath = () => process.env.CHROMIUM ?? '/usr/bin/chromium'

/** @param {(line: string) => void} say */
export async function installChromium(say) {
  if (fs.existsSync(chromiumPath())) return
  if (!isRoot || !hasApt()) throw new Failure(missingSentence('Chromium', CHROMIUM_LINE, hasApt()))
  say('Installing Chromium from Debian …')
  await apt('update')
  await apt('install', '-y', 'chromium')
}
