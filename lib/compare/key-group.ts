import type { Part, PartName } from '../calc/live'
import type { KeyGroup, KeyResult } from './key-results'

/** The rows of a part, or why there are none; a revision saved before the part was known has none either. */
export const group = <T>(id: PartName, title: string, part: Part<T> | undefined, rows: (part: T) => KeyResult[]): KeyGroup =>
  (part?.ok ? { id, title, withheld: null, rows: rows(part) } : { id, title, withheld: part?.error ?? null, rows: [] })
