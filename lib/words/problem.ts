import { errorWords, wordsOfError, type ErrorCode } from './errors'

const isCode = (text: string): text is ErrorCode => Object.hasOwn(errorWords, text)

/** The sentence of a failure that an address names; null where it names none we know. */
export const problemWords = (problem: unknown, what: string): string | null =>
  (typeof problem === 'string' && isCode(problem) ? wordsOfError(problem, { what }) : null)
