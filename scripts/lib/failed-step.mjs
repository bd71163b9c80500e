import { diskFullSentence } from './failure.mjs'
import { root } from './paths.mjs'

/**
 * The one sentence for a program that failed, from the last of its output.
 * @param {string} what the step as a noun, such as “The build”
 * @param {{ tail: string, timedOut: boolean, minutes?: number }} outcome
 * @param {string} otherwise what to do when the cause is none of the known ones
 */
export function stepSentence(what, outcome, otherwise) {
  if (outcome.timedOut) return `${what} did not end in its time and was stopped: look at what stands above, then start again.`
  if (/ENOSPC|EDQUOT|No space left on device|don't have enough free space|disk quota exceeded/i.test(outcome.tail)) return diskFullSentence(root)
  if (isNetworkTrouble(outcome.tail)) return `${what} found no network: connect this machine to the internet (or set its proxy), then start again.`
  if (/Could not get lock|is another process using it/i.test(outcome.tail)) return `${what} waits for another installation on this machine: let that one end, then start again.`
  if (/\bENOENT\b.*spawn|spawn .*\bENOENT\b/.test(outcome.tail)) return `${what} needs a program that is not on this machine (${/spawn (\S+)/.exec(outcome.tail)?.[1] ?? 'unknown'}): install it, then start again.`
  if (/heap out of memory|Cannot allocate memory|\bENOMEM\b/i.test(outcome.tail)) return `${what} ran out of memory: close other programs, then start again.`
  return `${what} failed: ${otherwise}`
}

/** @param {string} text */
export const isNetworkTrouble = (text) =>
  /\b(ENOTFOUND|EAI_AGAIN|ECONNREFUSED|ECONNRESET|ETIMEDOUT|ENETUNREACH|EHOSTUNREACH|ERR_SOCKET_TIMEOUT)\b|Temporary failure resolving|Could not resolve|Could not connect|Unable to connect|Failed to fetch|network is unreachable/i.test(text)

/**
 * The last lines of an output, for showing above the sentence.
 * @param {string} text
 * @param {number} [lines]
 */
export const lastLines = (text, lines = 25) => text.trimEnd().split('\n').slice(-lines).join('\n')
