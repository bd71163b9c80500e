import { spawn } from 'node:child_process'
import { setTimeout as sleep } from 'node:timers/promises'
import { Failure } from './failure.mjs'
import { root } from './paths.mjs'
import { descendantsOf, isGroupAlive, isSameAlive } from './processes.mjs'

const TAIL_CHARACTERS = 20_000
const GRACE_MS = 10_000

/** The kernel ends a killed process a moment after the signal. */
const KILLED_MS = 2_000

/** Every process group started here and not yet ended. @type {Set<number>} */
const groups = new Set()

/** A child sees a pipe: whether its colours are wanted is seen here, from where its output ends up. */
const COLOUR = process.stdout.isTTY ? { FORCE_COLOR: '1' } : { NO_COLOR: '1', FORCE_COLOR: undefined }

/** Once the command is ending, nothing more is started and nobody waits for what was ended. */
let ending = false

/**
 * Starts a program as the leader of a group of its own, so that it and all it starts can be ended together,
 * and a Ctrl-C in the terminal reaches only the command that must tidy up first.
 * @param {string} program
 * @param {string[]} args
 * @param {NodeJS.ProcessEnv} [env]
 */
export function startGroup(program, args, env = {}) {
  if (ending) throw new Failure('This command is ending.')
  const child = spawn(program, args, {
    cwd: root, detached: true, stdio: ['ignore', 'pipe', 'pipe'], env: { ...process.env, ...COLOUR, NEXT_TELEMETRY_DISABLED: '1', ...env },
  })
  if (child.pid) groups.add(child.pid)
  return child
}

/**
 * Ends a whole group: asks first, and after a grace kills what is left. A browser or server that one of them
 * started in a group of its own is ended too.
 * @param {number | undefined} group
 * @param {number} [graceMs]
 */
export async function endGroup(group, graceMs = GRACE_MS) {
  if (!group) return
  const below = descendantsOf(group)
  const lives = () => isGroupAlive(group) || below.some(isSameAlive)
  const settle = async (/** @type {number} */ ms) => {
    for (const until = Date.now() + ms; lives() && Date.now() < until;) await sleep(25)
  }
  signalTo(-group, 'SIGTERM')
  await settle(graceMs)
  if (isGroupAlive(group)) signalTo(-group, 'SIGKILL')
  for (const each of below) if (isSameAlive(each)) signalTo(Number(each.split(':')[0]), 'SIGKILL')
  await settle(KILLED_MS)
  groups.delete(group)
}

/**
 * @param {number} pid negative for a whole group
 * @param {NodeJS.Signals} signal
 */
function signalTo(pid, signal) {
  try {
    process.kill(pid, signal)
  } catch {
    // Gone already.
  }
}

/** Ends everything started here, for good. */
export async function endAllGroups() {
  ending = true
  await Promise.all([...groups].map((group) => endGroup(group)))
}

/**
 * @typedef {{ ok: boolean, code: number | null, timedOut: boolean, seconds: number, tail: string }} Outcome
 */

/**
 * Runs a program to its end. Its output is passed on when `show` is set; the last of it is kept either way.
 * Never hangs: past its time the group is ended, and what a finished program left behind is ended too.
 * @param {string} program
 * @param {string[]} args
 * @param {{ env?: NodeJS.ProcessEnv, minutes: number, show?: boolean }} options
 * @returns {Promise<Outcome>}
 */
export async function runToEnd(program, args, { env, minutes, show = false }) {
  const began = performance.now()
  const child = startGroup(program, args, env)
  let tail = ''
  let timedOut = false
  const keep = (/** @type {NodeJS.WriteStream} */ stream) => (/** @type {Buffer} */ part) => {
    if (show) stream.write(part)
    tail = (tail + part.toString('utf8')).slice(-TAIL_CHARACTERS)
  }
  child.stdout.on('data', keep(process.stdout))
  child.stderr.on('data', keep(process.stderr))
  const closed = new Promise((resolve) => child.once('close', resolve))
  const timer = setTimeout(() => {
    timedOut = true
    void endGroup(child.pid)
  }, minutes * 60_000)
  const code = await new Promise((resolve) => {
    child.once('error', (error) => {
      tail += error.message
      resolve(127)
    })
    child.once('exit', resolve)
  })
  clearTimeout(timer)
  if (ending) return new Promise(() => {})
  await endGroup(child.pid, 2_000)
  // The pipes close with the last holder; one that left the group must not hold up the command.
  await Promise.race([closed, sleep(2_000, undefined, { ref: false })])
  return { ok: code === 0 && !timedOut, code, timedOut, seconds: (performance.now() - began) / 1000, tail }
}
