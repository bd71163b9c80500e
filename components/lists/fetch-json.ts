/** Why a list could not be fetched, as a sentence; `signedOut` when the session ended meanwhile. */
export class FetchProblem extends Error {
  constructor(sentence: string, readonly signedOut = false) {
    super(sentence)
    this.name = 'FetchProblem'
  }
}

export const noConnection = 'There is no connection just now.'

const sentenceOf = (body: unknown): string | null => {
  const error = typeof body === 'object' && body !== null && 'error' in body ? body.error : null
  return typeof error === 'object' && error !== null && 'message' in error && typeof error.message === 'string' ? error.message : null
}

/** A GET route's answer; its own sentence when it refuses. */
export async function fetchJson<T>(url: string): Promise<T> {
  const response = await fetch(url, { headers: { accept: 'application/json' } }).catch(() => {
    throw new FetchProblem(noConnection)
  })
  const body: unknown = await response.json().catch(() => null)
  if (response.ok && body !== null) return body as T
  if (response.status === 401) throw new FetchProblem('You are signed out.', true)
  throw new FetchProblem(sentenceOf(body) ?? 'The answer could not be read.')
}
