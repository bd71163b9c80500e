import { wordsOfError, type ErrorCode, type ErrorDetails } from './words/errors'

export type { ErrorCode, ErrorDetails }

/** The closed table code → HTTP status. The words of each code stand in `lib/words/errors.ts`. */
export const errorStatus = {
  notFound: 404,
  forbidden: 403,
  signedOut: 401,
  wrongSignIn: 401,
  addressTaken: 409,
  noShop: 403,
  tooMany: 429,
  conflict: 409,
  engineChanged: 409,
  engineGone: 409,
  archived: 409,
  inUse: 409,
  alreadyReleased: 409,
  releaseRefused: 422,
  newerSheet: 409,
  badAddress: 422,
  tooLarge: 413,
  invalid: 422,
  unavailable: 503,
  unexpected: 500,
} as const satisfies Record<ErrorCode, number>

type Extras = ErrorDetails & {
  /** Sentences by field name, shown at the field. */
  fieldErrors?: Record<string, string>
  /** The version that won, as a DTO, for the page that shows both. */
  conflict?: unknown
}

/** An expected failure: thrown by `lib/data` and `lib/auth`, turned into words by `runAction` and `runRoute`. */
export class AppError extends Error {
  readonly status: number
  readonly fieldErrors: Record<string, string> | undefined
  readonly conflict: unknown

  constructor(readonly code: ErrorCode, readonly details: Extras = {}) {
    super(wordsOfError(code, details))
    this.name = 'AppError'
    this.status = errorStatus[code]
    this.fieldErrors = details.fieldErrors
    this.conflict = details.conflict
  }
}

/**
 * What a server action returns to its form. `values` echoes what was typed, never a secret; `formError` stands at the
 * top of the form, `fieldErrors` at their fields; `code` lets a page add what helps (a link to sign in, both versions).
 */
export type ActionState<T = void> =
  | { ok: true, data: T }
  | {
    ok: false
    code?: ErrorCode
    formError?: string
    fieldErrors?: Record<string, string>
    values?: Record<string, string>
    conflict?: unknown
  }

/** Before anything was sent: no error, no values. */
export const untouched = { ok: false } as const satisfies ActionState
