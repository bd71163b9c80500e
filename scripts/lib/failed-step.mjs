import { Failure, diskFullSentence } from './failure.mjs'
import { root } from './paths.mjs'

/**
 * Why a program failed, in one sentence, from the last of its output; null when it shows none of the known causes.
 * @param {string} what the step as it begins a sentence, such as “The build”
 * @param {string} tail
 * @param {boolean} [download] whether it fetches from the network; elsewhere a refused connection means something else
 */
export function knownCause(what, tail, download = false) {
  if (/ENOSPC|EDQUOT|No space left on device|don't have enough free space|disk quota exceeded/i.test(tail)) return diskFullSentence(root)
  if (download && isNetworkTrouble(tail)) return `${what} found no network: connect this machine to the internet (or set its proxy), then start again.`
  if (/Could not get lock|is another process using it/i.test(tail)) return `${what} waits for another installation on this machine: let that one end, then start again.`
  if (/spawn \S+ ENOENT/.test(tail)) return `${what} needs the program ${/spawn (\S+) ENOENT/.exec(tail)?.[1]}, which is not on this machine: install it, then start again.`
  if (/heap out of memory|Cannot allocate memory|\bENOMEM\b/i.test(tail)) return `${what} ran out of memory: close other programs, then start again.`
  return null
}

/**
 * The failure to throw for a program that failed. Its own last words are shown only where they must speak for themselves.
 * @param {string} what
 * @param {{ tail: string, timedOut: boolean }} outcome
 * @param {string} otherwise what to do when the cause is none of the known ones
 * @param {boolean} [download]
 */
export function stepFailure(what, { tail, timedOut }, otherwise, download = false) {
  const known = timedOut ? null : knownCause(what, tail, download)
  if (known) return new Failure(known)
  console.error(lastLines(tail))
  return new Failure(timedOut ? `${what} did not end in its time and was stopped: its last words stand above.` : `${what} failed: ${otherwise}`)
}

/** @param {string} text */
export const isNetworkTrouble = (text) =>
  /\b(ENOTFOUND|EAI_AGAIN|ECONNREFUSED|ECONNRESET|ETIMEDOUT|ENETUNREACH|EHOSTUNREACH|ERR_SOCKET_TIMEOUT)\b|Temporary failure resolving|Could not resolve|Could not connect|Unable to connect|Failed to fetch|network is unreachable/i.test(text)

/**
 * The last lines of an output, for showing above the sentence.
 * @param {string} text
 * @param {number} [lines]
 */
export const lastLines = (text, lines = 40) => text.trimEnd().split('\n').slice(-lines).join('\n')
