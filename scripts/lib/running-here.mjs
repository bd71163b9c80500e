import fs from 'node:fs'
import { endGroup } from './children.mjs'
import { Failure } from './failure.mjs'
import { readIfThere, writeWhole } from './keep-file.mjs'
import { withLock } from './lock.mjs'
import { inData } from './paths.mjs'
import { identityOf, isSameAlive } from './processes.mjs'

/**
 * The npm start or npm run dev of this checkout, remembered in .data/start.json.
 * @typedef {{ by: string, port: number, development: boolean, web?: string }} Running
 */

const file = () => inData('start.json')

/** What runs here now; null when nothing does. @returns {Running | null} */
export function runningHere() {
  const running = read()
  return running && isSameAlive(running.by) ? running : null
}

/** @returns {Running | null} */
function read() {
  try {
    return JSON.parse(readIfThere(file()) ?? 'null')
  } catch {
    return null
  }
}

/**
 * Takes the checkout for this command, or says that another has it. A web server that a killed command left is ended.
 * @param {{ port: number, development: boolean }} as
 */
export const takeCheckout = (as) => withLock(inData('start.lock'), async () => {
  const other = runningHere()
  if (other) throw new Failure(`${other.development ? 'npm run dev' : 'npm start'} already runs here (process ${other.by.split(':')[0]}), at http://127.0.0.1:${other.port}: use that one, or stop it with Ctrl-C first.`)
  const left = read()?.web
  if (isSameAlive(left)) await endGroup(Number(left?.split(':')[0]))
  writeWhole(file(), JSON.stringify({ by: identityOf(process.pid), ...as }))
})

/** @param {number | undefined} pid */
export function rememberWeb(pid) {
  const running = read()
  if (running && pid) writeWhole(file(), JSON.stringify({ ...running, web: identityOf(pid) }))
}

export function leaveCheckout() {
  if (read()?.by === identityOf(process.pid)) fs.rmSync(file(), { force: true })
}
