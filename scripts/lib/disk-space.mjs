import fs from 'node:fs'
import { Failure } from './failure.mjs'

/**
 * Told before the work begins: a database or an installation that meets a full disk half-way leaves more to tidy.
 * @param {string} folder
 * @param {number} megabytes
 * @param {string} purpose
 */
export function requireSpace(folder, megabytes, purpose) {
  const free = freeMegabytes(folder)
  if (free < megabytes) throw new Failure(`The disk that holds ${folder} has ${free} MB left, and ${purpose} need ${megabytes} MB: free some space, then start again.`)
}

/** @param {string} folder */
export function freeMegabytes(folder) {
  const { bavail, bsize } = fs.statfsSync(folder)
  return Math.floor((bavail * bsize) / 1e6)
}
