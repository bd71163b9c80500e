/** A remark that travels with a composed result: the figure was computed, but outside what its source covers. */
export interface Notice {
  readonly code: string
  readonly severity: 'info' | 'caution' | 'warning'
  readonly field: string
  readonly value: number
  readonly limit: string
  /** Id in `sources`. */
  readonly source: string
}
