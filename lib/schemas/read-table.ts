import { keepUntouchedMatrix, keepUntouchedTable, type LineError, type Matrix, type UnitSystem } from '../units'
import type { FieldDef, FieldErrors, FormValues } from './field'

type Columns = NonNullable<FieldDef['columns']>

/** The first faults name their lines; a page of them helps nobody. */
const mostSentences = 3

const sentencesOf = (errors: readonly LineError[]) => errors.slice(0, mostSentences).map((error) => error.sentence).join(' ')

/** Rows of a table field in base units, none where it is empty; an untouched text gives back the very rows it was filled from. */
export function readRows(name: string, values: FormValues, columns: Columns, system: UnitSystem, base: number[][] | undefined, errors: FieldErrors): number[][] {
  const text = values[name] ?? ''
  if (text.trim() === '') return []
  const read = keepUntouchedTable(text, columns, system, base ?? null)
  if (read.ok) return read.rows
  errors[name] = sentencesOf(read.errors)
  return []
}

/** A map field: pressures in the first line, speeds in the first column. */
export function readMatrix(name: string, values: FormValues, columns: Columns, system: UnitSystem, base: Matrix | undefined, errors: FieldErrors): Matrix {
  const [row, column, cell] = columns
  const text = values[name] ?? ''
  if (row && column && cell && text.trim() !== '') {
    const read = keepUntouchedMatrix(text, { row, column, cell }, system, base ?? null)
    if (read.ok) return read.matrix
    errors[name] = sentencesOf(read.errors)
  }
  return { columns: [], rows: [], cells: [] }
}
