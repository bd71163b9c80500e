import type { QuantityKind } from './quantities'
import { plainText } from './unit-text'

/** A column of a pasted block: what stands in it, and its name in the sentences. */
export interface Column {
  kind: QuantityKind
  label: string
}

export interface Line {
  /** Counted from 1 in the text as pasted, blank lines included. */
  number: number
  text: string
}

export interface LineError {
  line: number
  /** Counted from 1; null where the whole line is meant. */
  column: number | null
  sentence: string
}

export type Splitter = (line: string) => string[]

const by = (mark: string | RegExp): Splitter => (line) => line.split(mark).map((cell) => plainText(cell))
const trimmedBy = (mark: string | RegExp): Splitter => (line) => by(mark)(line.trim())

/** Empty cells at the end of a spreadsheet's selection hold nothing. */
const withoutEmptyEnd = (splitter: Splitter): Splitter => (line) => {
  const cells = splitter(line)
  while (cells.length > 1 && cells.at(-1) === '') cells.pop()
  return cells
}

export function linesOf(text: string): Line[] {
  return text
    .split(/\r\n|\r|\n/)
    .map((line, i) => ({ number: i + 1, text: line }))
    .filter((line) => plainText(line.text) !== '')
}

/**
 * The ways in which this block may be parted into columns, decided once for a whole block. A tab anywhere: tabs. Else a semicolon anywhere: semicolons. Else runs of two
 * or more spaces, single spaces and commas are all tried, see `settle`; a reading counts only if every line comes out right, and if two readings come out
 * right with different numbers the block is refused: "100 285,5" may be 100 and 285.5, or 100285 and 5. So a comma parts columns only in
 * text whose decimals have points. No-break spaces never part columns: they stand inside numbers. A block of one column without tabs or semicolons is not parted at all.
 */
export function splittersFor(lines: readonly Line[], isOneColumn = false): Splitter[] {
  const has = (pattern: RegExp) => lines.some((line) => pattern.test(line.text.trim()))
  // A leading tab is an empty first cell, so the untrimmed text decides.
  if (lines.some((line) => line.text.includes('\t'))) return [withoutEmptyEnd(by('\t'))]
  if (has(/;/)) return [withoutEmptyEnd(by(';'))]
  if (isOneColumn) return [(line) => [plainText(line)]]
  const splitters: Splitter[] = []
  if (has(/ {2,}/)) splitters.push(trimmedBy(/ {2,}/))
  if (has(/,/)) splitters.push(trimmedBy(','))
  splitters.push(trimmedBy(/ +/))
  return splitters
}

/** Digits at its start make a cell a number; the unit 1/min is none. */
export const startsAsNumber = (cell: string) => /^[+-]? ?[.,]?\d(?!\/[a-z°])/i.test(plainText(cell))

/** One attempt at a block: `lines` holds the numbers of each line, in order, for telling two attempts apart. */
export interface Reading<T> {
  value: T
  errors: LineError[]
  /** How many lines have the wrong number of cells: the surest sign of the wrong mark between columns. */
  misfits: number
  lines: { number: number; values: number[] }[]
}

const same = (a: readonly number[], b: readonly number[]) => a.length === b.length && a.every((value, i) => value === b[i])

/** The one reading without errors; else the errors of the attempt that came nearest, or the line that can be read in two ways. */
export function settle<T>(readings: readonly Reading<T>[]): { ok: true; value: T } | { ok: false; errors: LineError[] } {
  const [first, ...others] = readings.filter((reading) => reading.errors.length === 0)
  if (first === undefined) {
    const nearest = [...readings].sort((a, b) => a.misfits - b.misfits || a.errors.length - b.errors.length)[0]
    return { ok: false, errors: nearest?.errors ?? [] }
  }
  for (const other of others) {
    for (let i = 0; i < Math.max(first.lines.length, other.lines.length); i++) {
      if (same(first.lines[i]?.values ?? [], other.lines[i]?.values ?? [])) continue
      const line = (first.lines[i] ?? other.lines[i])?.number ?? 1
      return { ok: false, errors: [{ line, column: null, sentence: `Line ${line} can be read in two ways, because a comma or a space may part columns or stand inside a number. Part the columns with tabs or semicolons.` }] }
    }
  }
  return { ok: true, value: first.value }
}

/** A longer paste is not a schedule; the bound also keeps a stray paste from holding the page up. */
export const mostLines = 1000

export function tooManyLines(lines: readonly Line[]): LineError | null {
  const extra = lines[mostLines]
  return extra === undefined ? null : { line: extra.number, column: null, sentence: `Line ${extra.number}: at most ${mostLines} lines can be read at once.` }
}
