/** An obstacle told to a person in one sentence that says what to do. It is printed without a stack. */
export class Failure extends Error {}

/**
 * The sentence for what the file system refused, by its error code; undefined for anything else.
 * @param {{ code?: string, path?: string } | null | undefined} error
 * @param {string} [place] the path to name when the error carries none
 * @returns {string | undefined}
 */
export function fileSentence(error, place) {
  const where = error?.path ?? place ?? 'a file of this folder'
  switch (error?.code) {
    case 'ENOSPC':
    case 'EDQUOT':
      return diskFullSentence(where)
    case 'EROFS':
      return `${where} lies on a disk that is mounted read-only: put the project on a disk that can be written, then start again.`
    case 'EACCES':
    case 'EPERM':
      return `${where} cannot be reached by this user: run as the user that owns it, or give it back with chown, then start again.`
    case 'ENOTDIR':
    case 'EEXIST':
      return `${where} is in the way, a file where a folder is needed (or the other way round): move it aside, then start again.`
    default:
      return undefined
  }
}

/** @param {string} where */
export const diskFullSentence = (where) => `The disk that holds ${where} is full: free some space on it, then start again.`

/**
 * The one sentence for whatever stopped a command.
 * @param {unknown} error
 * @returns {string}
 */
export function sentenceOf(error) {
  if (error instanceof Failure) return error.message
  const words = fileSentence(/** @type {{ code?: string, path?: string }} */ (error))
  if (words) return words
  const message = error instanceof Error ? error.message : String(error)
  return `Something unexpected stopped this command: ${message.split('\n')[0]}`
}
