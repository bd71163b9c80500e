import { linesOf, settle, splittersFor, startsAsNumber, tooManyLines } from './block-text'
import type { Column, Line, LineError, Reading, Splitter } from './block-text'
import { findFamily, findUnit } from './families'
import type { Unit } from './families'
import { formatInput } from './format'
import { parseQuantity } from './parse'
import { quantityOf, shownIn } from './quantities'
import type { UnitSystem } from './quantities'
import { quantityErrorSentence } from './sentences'

/** What stands down the first column, along the first row, and in the field. */
export interface MatrixShape {
  row: Column
  column: Column
  cell: Column
}

export interface Matrix {
  rows: number[]
  columns: number[]
  /** `cells[i][j]` at `rows[i]`, `columns[j]`; all in base units. */
  cells: number[][]
}

export type MatrixResult = { ok: true; matrix: Matrix } | { ok: false; errors: LineError[] }

/**
 * A map pasted as a block: the first line holds the columns' heads (pressures), each further line its row's head (a speed) and the values. The
 * corner may be missing, empty, or words; units in it ("rpm \ kPa") hold for the heads, and units that fit the other way round are refused:
 * the block is turned.
 */
export function parseMatrix(text: string, shape: MatrixShape, system: UnitSystem): MatrixResult {
  const lines = linesOf(text)
  const extra = tooManyLines(lines)
  if (extra !== null) return { ok: false, errors: [extra] }
  if (lines.length < 2) {
    const sentence = `A map needs a first line with ${shape.column.label}, then one line for each ${shape.row.label}.`
    return { ok: false, errors: [{ line: lines[0]?.number ?? 1, column: null, sentence }] }
  }
  const settled = settle(splittersFor(lines).map((splitter) => readMatrix(lines, splitter, shape, system)))
  return settled.ok ? { ok: true, matrix: settled.value } : settled
}

function readMatrix(lines: readonly Line[], splitter: Splitter, shape: MatrixShape, system: UnitSystem): Reading<Matrix> {
  const reading: Reading<Matrix> = { value: { rows: [], columns: [], cells: [] }, errors: [], misfits: 0, lines: [] }
  const [first, ...body] = lines.map((line) => ({ number: line.number, cells: splitter(line.text) }))
  const width = body[0]?.cells.length ?? 0
  if (first === undefined || width < 2) {
    const line = body[0]?.number ?? 1
    reading.misfits += lines.length
    reading.errors.push({ line, column: null, sentence: `Line ${line} holds one value where ${shape.row.label} and at least one ${shape.cell.label} are expected. Part the columns with tabs or semicolons.` })
    return reading
  }

  const cell = (text: string, line: number, column: number, { kind, label }: Column, unit?: Unit): number => {
    const result = parseQuantity(text, kind, system, unit)
    if (result.ok) return result.value
    reading.errors.push({ line, column, sentence: quantityErrorSentence(result, `Line ${line}, column ${column}, ${label}`, kind, system) })
    return 0
  }
  const misfit = (line: number, found: number, expected: number) => {
    reading.misfits++
    reading.errors.push({ line, column: null, sentence: `Line ${line} holds ${found} ${found === 1 ? 'value' : 'values'} where ${expected} are expected. Part the columns with tabs or semicolons.` })
  }

  const hasCorner = first.cells.length === width
  const units = hasCorner ? cornerUnits(first.cells[0] ?? '', first.number, shape, system, reading.errors) : {}
  if (!hasCorner && first.cells.length !== width - 1) misfit(first.number, first.cells.length, width - 1)
  else {
    const offset = hasCorner ? 1 : 0
    reading.value.columns = first.cells.slice(offset).map((text, j) => cell(text, first.number, j + 1 + offset, shape.column, units.columns))
    reading.lines.push({ number: first.number, values: reading.value.columns })
  }
  for (const { number, cells } of body) {
    if (cells.length !== width) {
      misfit(number, cells.length, width)
      continue
    }
    const [head = '', ...rest] = cells
    const row = cell(head, number, 1, shape.row, units.rows)
    const values = rest.map((text, j) => cell(text, number, j + 2, shape.cell))
    reading.value.rows.push(row)
    reading.value.cells.push(values)
    reading.lines.push({ number, values: [row, ...values] })
  }
  return reading
}

function cornerUnits(corner: string, line: number, shape: MatrixShape, system: UnitSystem, errors: LineError[]): { rows?: Unit; columns?: Unit } {
  if (startsAsNumber(corner)) {
    errors.push({ line, column: 1, sentence: `Line ${line}: the corner holds ${corner}, a number that belongs to nothing. Leave it empty; the first line holds ${shape.column.label}, the first column ${shape.row.label}.` })
    return {}
  }
  const parts = /[\\|]/.test(corner) ? corner.split(/[\\|]/) : corner.split('/')
  const unitFor = (part: string | undefined, { kind, label }: Column): Unit | undefined => {
    const word = /[([]([^()[\]]+)[)\]]\s*$/.exec(part ?? '')?.[1] ?? part ?? ''
    const { family } = quantityOf(kind)
    const unit = findUnit(family, word)
    const other = unit === null ? findFamily(word) : null
    if (other !== null) {
      const error = { ok: false, code: 'wrongQuantity', typed: corner, unit: word.trim(), family: other } as const
      errors.push({ line, column: 1, sentence: quantityErrorSentence(error, `Line ${line}, ${label}`, kind, system) })
    }
    return unit ?? undefined
  }
  return parts.length === 2 ? { rows: unitFor(parts[0], shape.row), columns: unitFor(parts[1], shape.column) } : {}
}

/** A map in base units as lines of tabs, units in the corner: what `parseMatrix` reads back, to the six digits shown, in either system. */
export function formatMatrix(matrix: Matrix, shape: MatrixShape, system: UnitSystem): string {
  const symbol = ({ kind }: Column) => shownIn(kind, system).unit.symbol
  const first = [`${symbol(shape.row)} \\ ${symbol(shape.column)}`, ...matrix.columns.map((value) => formatInput(value, shape.column.kind, system))]
  const body = matrix.rows.map((row, i) => [
    formatInput(row, shape.row.kind, system),
    ...(matrix.cells[i] ?? []).map((value) => formatInput(value, shape.cell.kind, system)),
  ])
  return [first, ...body].map((cells) => cells.join('\t')).join('\n')
}

/** Like `parseMatrix`, but a text box nobody touched gives back the very map it was filled from. */
export function keepUntouchedMatrix(text: string, shape: MatrixShape, system: UnitSystem, baseMatrix: Matrix | null): MatrixResult {
  if (baseMatrix !== null && text.replace(/\r\n?/g, '\n').trim() === formatMatrix(baseMatrix, shape, system)) {
    return { ok: true, matrix: structuredClone(baseMatrix) }
  }
  return parseMatrix(text, shape, system)
}
