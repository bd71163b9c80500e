import { linesOf, settle, splittersFor, startsAsNumber, tooManyLines } from './block-text'
import type { Column, Line, LineError, Reading, Splitter } from './block-text'
import { findFamily, findUnit } from './families'
import type { Unit } from './families'
import { formatInput } from './format'
import { parseQuantity } from './parse'
import { quantityOf, shownIn } from './quantities'
import type { UnitSystem } from './quantities'
import { quantityErrorSentence } from './sentences'

export interface Table {
  /** In base units, one inner list a line. */
  rows: number[][]
  /** The heading line that was passed over, so that the page can say so. */
  heading: string | null
}

export type TableResult = ({ ok: true } & Table) | { ok: false; errors: LineError[] }

/**
 * Columns pasted from a spreadsheet or typed: one row a line, blank lines ignored, a first line without numbers taken as a heading. A unit in
 * the heading ("Gap (in)") holds for its column; without one, plain numbers stand in the person's own units. See `block-text` for
 * what parts the columns.
 */
export function parseTable(text: string, columns: readonly Column[], system: UnitSystem): TableResult {
  const lines = linesOf(text)
  const extra = tooManyLines(lines)
  if (extra !== null) return { ok: false, errors: [extra] }
  const settled = settle(splittersFor(lines, columns.length === 1).map((splitter) => readTable(lines, splitter, columns, system)))
  if (!settled.ok) return settled
  if (settled.value.rows.length === 0) {
    const sample = columns.map(({ kind }) => shownIn(kind, system).example).join('; ')
    return { ok: false, errors: [{ line: 1, column: null, sentence: `There is no line with numbers. Type or paste one row a line, for example ${sample}` }] }
  }
  return { ok: true, ...settled.value }
}

function readTable(lines: readonly Line[], splitter: Splitter, columns: readonly Column[], system: UnitSystem): Reading<Table> {
  const reading: Reading<Table> = { value: { rows: [], heading: null }, errors: [], misfits: 0, lines: [] }
  let units: (Unit | undefined)[] = []
  lines.forEach((line, i) => {
    const cells = splitter(line.text)
    if (i === 0 && !cells.some(startsAsNumber)) {
      reading.value.heading = line.text.trim()
      units = headingUnits(line, cells, columns, system, reading.errors)
      return
    }
    if (cells.length !== columns.length) {
      reading.misfits++
      reading.errors.push({ line: line.number, column: null, sentence: countSentence(line.number, cells.length, columns) })
      return
    }
    const row = columns.map(({ kind, label }, j) => {
      const result = parseQuantity(cells[j] ?? '', kind, system, units[j])
      if (result.ok) return result.value
      reading.errors.push({ line: line.number, column: j + 1, sentence: quantityErrorSentence(result, `Line ${line.number}, ${label}`, kind, system) })
      return 0
    })
    reading.value.rows.push(row)
    reading.lines.push({ number: line.number, values: row })
  })
  return reading
}

function countSentence(line: number, found: number, columns: readonly Column[]): string {
  const labels = columns.map(({ label }) => label).join(', ')
  return `Line ${line} holds ${found} ${found === 1 ? 'value' : 'values'} where ${columns.length} ${columns.length === 1 ? 'is' : 'are'} expected (${labels}). Part the columns with tabs or semicolons.`
}

const bracketed = /[([]([^()[\]]+)[)\]]/g

/** Units named by a heading: in brackets, or the whole cell ("rpm"). A bracket with a unit that does not fit is an error, any other word is none. */
function headingUnits(line: Line, cells: readonly string[], columns: readonly Column[], system: UnitSystem, errors: LineError[]): (Unit | undefined)[] {
  const brackets = [...line.text.matchAll(bracketed)].map((match) => match[1] ?? '')
  // Spaces inside a heading's words part them into too many cells; then the brackets are counted off instead.
  const inCells = cells.length === columns.length
  if (!inCells && brackets.length !== columns.length && brackets.some((word) => findFamily(word) !== null)) {
    errors.push({ line: line.number, column: null, sentence: `Line ${line.number}: the units in the heading cannot be matched to the columns. Part the columns with tabs or semicolons.` })
    return []
  }
  return columns.map(({ kind, label }, j) => {
    const cell = inCells ? (cells[j] ?? '') : ''
    const bracket = inCells ? [...cell.matchAll(bracketed)].at(-1)?.[1] : brackets[j]
    const { family } = quantityOf(kind)
    const unit = findUnit(family, bracket ?? cell)
    if (unit !== null) return unit
    const other = bracket === undefined ? null : findFamily(bracket)
    if (bracket !== undefined && other !== null) {
      const error = { ok: false, code: 'wrongQuantity', typed: cell, unit: bracket, family: other } as const
      errors.push({ line: line.number, column: j + 1, sentence: quantityErrorSentence(error, `Line ${line.number}, ${label}`, kind, system) })
    }
    return undefined
  })
}

/** Rows in base units as lines of tabs for a text box: what `parseTable` reads back, to the six digits shown. */
export function formatTable(rows: readonly (readonly number[])[], columns: readonly Column[], system: UnitSystem): string {
  return rows.map((row) => columns.map(({ kind }, j) => formatInput(row[j] ?? NaN, kind, system)).join('\t')).join('\n')
}

/** Like `parseTable`, but a text box nobody touched gives back the very rows it was filled from. */
export function keepUntouchedTable(text: string, columns: readonly Column[], system: UnitSystem, baseRows: readonly (readonly number[])[] | null): TableResult {
  if (baseRows !== null && baseRows.length > 0 && text.replace(/\r\n?/g, '\n').trim() === formatTable(baseRows, columns, system)) {
    return { ok: true, rows: baseRows.map((row) => [...row]), heading: null }
  }
  return parseTable(text, columns, system)
}
