import { createHash } from 'node:crypto'
import fs from 'node:fs'
import { runToEnd } from './children.mjs'
import { stepFailure } from './failed-step.mjs'
import { Failure } from './failure.mjs'
import { requireSpace } from './disk-space.mjs'
import { readIfThere } from './keep-file.mjs'
import { inRoot } from './paths.mjs'

const stampFile = () => inRoot('node_modules', '.halfspeed-installed')

/** A native addon built for one major version of Node does not load in another. @param {string} lockText */
export const packagesStamp = (lockText) => createHash('sha256').update(`node ${process.versions.node.split('.')[0]}\n${lockText}`).digest('hex')

/**
 * Whether the tree npm wrote down in node_modules is the one package-lock.json asks for.
 * Optional packages for other machines are rightly absent.
 * @param {string} lockText
 * @param {string | null} installedText npm's own list, node_modules/.package-lock.json
 */
export function isInstalled(lockText, installedText) {
  if (installedText === null) return false
  try {
    const wanted = JSON.parse(lockText).packages
    const installed = JSON.parse(installedText).packages
    return Object.entries(wanted).every(([place, { version, optional }]) =>
      place === '' || (installed[place] ? installed[place].version === version : optional === true))
  } catch {
    return false
  }
}

/**
 * Installs the npm packages when they are missing or package-lock.json changed since.
 * @param {(line: string) => void} say
 */
export async function installPackages(say) {
  const lockText = readIfThere(inRoot('package-lock.json'))
  if (lockText === null) throw new Failure('package-lock.json is missing here: get it back with git checkout package-lock.json, then start again.')
  const stamp = packagesStamp(lockText)
  if (readIfThere(stampFile()) === stamp) return
  // Only where there is no stamp at all: one that differs tells of another lock file or another Node.
  if (readIfThere(stampFile()) === null && isInstalled(lockText, readIfThere(inRoot('node_modules', '.package-lock.json')))) {
    fs.writeFileSync(stampFile(), stamp)
    return
  }
  requireSpace(inRoot(), 2000, 'the npm packages')
  say('Installing the npm packages (npm ci), about half a minute …')
  fs.rmSync(stampFile(), { force: true })
  const npm = process.env.npm_execpath
  const args = ['ci', '--include=dev', '--no-audit', '--no-fund', '--loglevel=error']
  const outcome = await (npm ? runToEnd(process.execPath, [npm, ...args], { minutes: 15 }) : runToEnd('npm', args, { minutes: 15 }))
  if (!outcome.ok) {
    throw stepFailure('Installing the npm packages', outcome, 'npm’s own words stand above; when they name no cause, remove node_modules and start again.', { download: true })
  }
  fs.writeFileSync(stampFile(), stamp)
}
