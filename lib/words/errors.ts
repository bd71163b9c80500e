/** What a sentence may need to be exact. All of it is shown to people: nothing secret goes in here. */
export type ErrorDetails = {
  /** The thing spoken of, in lower case: 'engine', 'scenario', 'revision' … */
  what?: string
  /** How long to wait, s. */
  waitSeconds?: number
  /** The reference under which an unexpected error was logged. */
  id?: string
}

const waiting = (seconds: number) => {
  const minutes = Math.ceil(seconds / 60)
  return seconds <= 60 ? 'a minute' : `${minutes} minutes`
}
const capital = (text: string) => text.charAt(0).toUpperCase() + text.slice(1)

/**
 * One sentence or two for each code: what happened, what stands, what to do.
 * A row of another shop and a row that never existed read the same.
 */
export const errorWords = {
  notFound: ({ what = 'page' }: ErrorDetails) => `There is no such ${what} in this shop. It may have been removed, or belong to another shop.`,
  forbidden: ({ what }: ErrorDetails) => `Your role in this shop does not cover ${what ?? 'this'}. The shop's owner can change roles.`,
  signedOut: () => 'You are signed out, so nothing was saved. Sign in again in another tab, then come back here: what you typed is still in place.',
  wrongSignIn: () => 'That e-mail address and password do not belong together. Check both and try again.',
  addressTaken: () => 'This e-mail address already has an account here. Sign in with it, or use another address.',
  noShop: () => 'This account belongs to no shop at present. Ask the owner of the shop to add you again.',
  tooMany: ({ waitSeconds = 900 }: ErrorDetails) => `Too many attempts. Wait ${waiting(waitSeconds)}, then try again.`,
  conflict: ({ what = 'record' }: ErrorDetails) => `Someone else saved this ${what} while you were working on it. Nothing of theirs or yours is lost: compare both versions below.`,
  engineChanged: () => 'The engine was changed after this page was opened. Look over the new figures, then save again.',
  engineGone: () => 'The engine of this scenario has been archived or removed, so nothing was saved. Restore the engine, or lay the scenario out on another.',
  archived: ({ what = 'record' }: ErrorDetails) => `This ${what} is archived, so nothing was changed. Restore it first.`,
  inUse: ({ what = 'record' }: ErrorDetails) => `This ${what} is used by scenarios, so it stays. Archive it instead.`,
  alreadyReleased: () => 'This revision is released already. A released plan is never changed.',
  releaseRefused: () => 'This shop releases no revision with a finding outside its limit. Change the scenario, or ask the owner of the shop.',
  newerSheet: () => 'This scenario was saved by a newer version of the program than this one. Start the newer version to open it.',
  badAddress: () => 'Part of this address cannot be read. Open the list from its start.',
  tooLarge: () => 'What was sent is larger than 1 MB, the most that is taken in at once. Nothing was saved. Send less.',
  invalid: () => 'Some of what was typed cannot be used. Nothing was saved; each place is marked.',
  unavailable: () => 'The records cannot be reached just now, so nothing was saved. Keep this page open and try again in a minute.',
  unexpected: ({ id }: ErrorDetails) => `Something went wrong on our side, and nothing was saved.${id ? ` If you report it, give the reference ${id}.` : ''}`,
} as const satisfies Record<string, (details: ErrorDetails) => string>

export type ErrorCode = keyof typeof errorWords

/** The sentence of a code. */
export const wordsOfError = (code: ErrorCode, details: ErrorDetails = {}): string => capital(errorWords[code](details))
