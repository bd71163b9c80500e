/** A published figure held against the library, as plain data: the same files serve this folder's test and a page in the browser. */
export interface PublishedCall {
  /** Name of a function of the library's public face. */
  readonly fn: string
  readonly args: readonly unknown[]
  /** Dotted path into the result; left out when the result is the number. */
  readonly path?: string
}

export interface PublishedCheck extends PublishedCall {
  readonly label: string
  /** When given, the value is divided by this one: for figures published as a ratio. */
  readonly over?: PublishedCall
  /** The value is multiplied by this: for figures published in another unit, or as a share. */
  readonly times?: number
  readonly expected: number
  /** Half of the last printed digit of the source, unless `toleranceReason` says why not. */
  readonly tolerance: { readonly abs: number } | { readonly rel: number }
  readonly toleranceReason?: string
  readonly knownDeviation?: string
}

export interface PublishedCase {
  readonly id: string
  readonly title: string
  /** Id in `sources`. */
  readonly source: string
  /** Example, figure or table in the source. */
  readonly where?: string
  /** `computed`: follows from a published figure or from geometry, was not itself printed. */
  readonly provenance: 'read' | 'memory' | 'common practice' | 'computed'
  readonly note?: string
  readonly checks: readonly PublishedCheck[]
}

type Library = Readonly<Record<string, unknown>>

const callOf = (library: Library, { fn, args, path }: PublishedCall): number => {
  const call = library[fn]
  if (typeof call !== 'function') throw new Error(`the library has no function ${fn}`)
  let value: unknown = (call as (...args: readonly unknown[]) => unknown)(...args)
  for (const key of path?.split('.') ?? []) value = (value as Record<string, unknown> | undefined)?.[key]
  if (typeof value !== 'number' || !Number.isFinite(value)) throw new Error(`${fn}${path ? `, ${path}` : ''}: expected a finite number, got ${String(value)}`)
  return value
}

/** What the library computes for a check. */
export const computedValue = (library: Library, check: PublishedCheck): number =>
  (callOf(library, check) / (check.over ? callOf(library, check.over) : 1)) * (check.times ?? 1)
