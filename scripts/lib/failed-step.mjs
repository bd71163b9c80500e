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
 * @param {{ download?: boolean, quote?: boolean }} [how] quote: its one line that names an error belongs in the sentence, the rest is noise
 */
export function stepFailure(what, { tail, timedOut }, otherwise, { download = false, quote = false } = {}) {
  const known = timedOut ? null : knownCause(what, tail, download)
  if (known) return new Failure(known)
  if (quote && !timedOut) return new Failure(`${what} failed (“${firstError(tail)}”): ${otherwise}`)
  console.error(lastLines(tail))
  return new Failure(timedOut ? `${what} did not end in its time and was stopped: its last words stand above.` : `${what} failed: ${otherwise}`)
}

/**
 * The first line that names an error, without the names of error classes before its words.
 * @param {string} text
 */
export function firstError(text) {
  const lines = text.split('\n').map((line) => line.trim()).filter((line) => line !== '' && !/^at /.test(line))
  const line = lines.find((each) => /error\b/i.test(each)) ?? lines.at(-1) ?? 'no reason given'
  return line.replace(/^(\w*(Error|Exception):\s*)+/, '').replace(/\bOriginal error:\s*/, '').replace(/\.$/, '')
}

/** @param {string} text */
export const isNetworkTrouble = (text) =>
  /\b(ENOTFOUND|EAI_AGAIN|ECONNREFUSED|ECONNRESET|ETIMEDOUT|ENETUNREACH|EHOSTUNREACH|ERR_SOCKET_TIMEOUT)\b|Temporary failure resolving|Could not resolve|Could not connect|Unable to connect|Failed to fetch|network is unreachable/i.test(text)

/**
 * The last lines of an output, for showing above the sentence; where in the code it happened is no help to the person who starts.
 * @param {string} text
 * @param {number} [lines]
 */
export const lastLines = (text, lines = 40) => text.trimEnd().split('\n').filter((line) => !/^\s+at .*[:(]/.test(line)).slice(-lines).join('\n')
