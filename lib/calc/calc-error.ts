/** What a CalcError knows, as plain data: survives a worker's message and a JSON body. */
export interface CalcErrorDetails {
  /** Dotted path of the offending value, array indexes as numbers: `channel.schedule.points.1.rpm`. */
  readonly field: string
  /** The value that was given, untouched. */
  readonly value: unknown
  /** The allowed range in words or signs: `> 0`, `0 … 1`, `a permutation of 1 … 6`. */
  readonly limit: string
  /** Unit of value and limit; empty where there is none. */
  readonly unit: string
  /** A sentence a person can act on. */
  readonly message: string
  /** In a formula: index of the offending character in the expression, from 0. */
  readonly at?: number
  /** Set where a program must tell this error from others. */
  readonly code?: 'formulaParserNotLoaded'
}

/** The one error of the library: an argument that cannot be computed with, or a result beyond what a number can hold. */
export class CalcError extends RangeError {
  readonly field: string
  readonly value: unknown
  readonly limit: string
  readonly unit: string
  readonly at?: number
  readonly code?: 'formulaParserNotLoaded'

  constructor(details: CalcErrorDetails) {
    super(details.message)
    this.name = 'CalcError'
    this.field = details.field
    this.value = details.value
    this.limit = details.limit
    this.unit = details.unit
    if (details.at !== undefined) this.at = details.at
    if (details.code !== undefined) this.code = details.code
  }

  /** The same as plain data. */
  details(): CalcErrorDetails {
    const { field, value, limit, unit, message, at, code } = this
    return { field, value, limit, unit, message, ...(at === undefined ? {} : { at }), ...(code === undefined ? {} : { code }) }
  }
}
