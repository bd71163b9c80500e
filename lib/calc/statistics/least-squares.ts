import { CalcError } from '../calc-error'
import { meanOf, squaresAbout } from '../shared/moments'
import { takeNumbers } from '../validate/numbers'
import { finiteResult } from '../validate/result'
import { membersOf, takeList } from '../validate/shape'
import { factorise, inverseRowLengths } from './householder'

export interface LeastSquaresInput {
  readonly rows: readonly (readonly number[])[]
  readonly values: readonly number[]
}

export interface LeastSquares {
  readonly coefficients: number[]
  readonly standardErrors: number[]
  readonly residualSd: number
  /** `null` when the values do not vary: there is nothing to explain. */
  readonly rSquared: number | null
  /** `null` when no column is left beside the constant one, or when nothing beyond rounding is left unexplained. */
  readonly fStatistic: number | null
}

/** A column that adds less than this to the others, as a share of its length, is rounding. */
const leastShare = 1e-13
/** Squares left over that are less than this share of the values' own are rounding. */
const leastSquaresShare = 1e-28
/** More columns are a mistake, and would take minutes. */
const mostColumns = 50

const takeRows = (given: unknown): number[][] => {
  const list = takeList(given, 'rows', 'The list of rows', 2)
  const width = takeList(list[0], 'rows.0', 'Row 1', 1).length
  if (width > mostColumns) throw new CalcError({ field: 'rows.0', value: list[0], limit: `≤ ${mostColumns} entries`, unit: '', message: `A row can have at most ${mostColumns} entries; ${width} were given.` })
  const rows: number[][] = []
  for (let i = 0; i < list.length; i += 1) {
    const row = takeList(list[i], `rows.${i}`, `Row ${i + 1}`, 1)
    if (row.length !== width) throw new CalcError({ field: `rows.${i}`, value: row, limit: `${width} entries`, unit: '', message: `Row ${i + 1} must have as many entries as the first, ${width}; ${row.length} were given.` })
    rows.push(takeNumbers(row, `rows.${i}`, { unit: '' }, (j) => `Entry ${j + 1} of row ${i + 1}`))
  }
  if (rows.length <= width) {
    throw new CalcError({ field: 'rows', value: given, limit: `more than ${width} rows`, unit: '', message: `There must be more rows than coefficients, more than ${width}, so that something is left to judge the fit by; ${rows.length} were given.` })
  }
  return rows
}

const takeValues = (given: unknown, count: number): number[] => {
  const list = takeList(given, 'values', 'The list of values', 1)
  if (list.length !== count) throw new CalcError({ field: 'values', value: given, limit: `${count} entries`, unit: '', message: `There must be one value per row, ${count} in all; ${list.length} were given.` })
  return takeNumbers(list, 'values', { unit: '' }, (i) => `Value ${i + 1}`)
}

/** The power of two next below the largest of a list: dividing by it loses nothing. 1 for a list of zeros. */
const scaleOf = (list: readonly number[]): number => {
  let largest = 0
  for (const entry of list) largest = Math.max(largest, Math.abs(entry))
  return largest === 0 ? 1 : 2 ** Math.max(-1022, Math.floor(Math.log2(largest)))
}

/**
 * Least squares of values against columns: `{ coefficients, standardErrors, residualSd, rSquared, fStatistic }`; residualSd in the unit of the values,
 * coefficients and standardErrors in that unit over the column's, rSquared and fStatistic without unit.
 *
 * value ≈ Σ coefficient·column, by Householder reflections with scaled and pivoted columns;
 * residualSd = √(SSE/(n − p)); standardErrors = residualSd·√diag((XᵀX)⁻¹); rSquared = 1 − SSE/SST; fStatistic = ((SST − SSE)/q)/residualSd².
 * With a constant column SST is taken about the mean and q = p − 1, without one about 0 and q = p.
 *
 * Validity: a model that is linear in its coefficients; errors in the values alone, of one size. Columns that differ by less than 1e-13 of their length are refused.
 * Source: common practice, no published source (least squares).
 *
 * @param input.rows more rows than columns, each row of one length (1 … 50 numbers), any finite numbers; the constant term is a column of ones
 * @param input.values one for each row, in any one unit, any finite numbers
 * @throws CalcError on `rows` (too few, or columns that depend on each other), `rows.i`, `rows.i.j`, `values` or `values.i`
 * @example
 * leastSquares({ rows: [[1, 0], [1, 10], [1, 20]], values: [1, 2, 2] }) // → { coefficients: [1.166667, 0.050000], standardErrors: [0.372678, 0.028868], residualSd: 0.408248, rSquared: 0.750000, fStatistic: 3.000000 }
 */
export const leastSquares = (input: LeastSquaresInput): LeastSquares => {
  const members = membersOf(input)
  const rows = takeRows(members.rows)
  const values = takeValues(members.values, rows.length)
  const count = rows.length
  const width = rows[0]?.length ?? 0
  const columns = Array.from({ length: width }, (_, j) => rows.map((row) => row[j] ?? 0))
  const scales = columns.map(scaleOf)
  const valueScale = scaleOf(values)
  const scaledRows = rows.map((row) => row.map((entry, j) => entry / (scales[j] ?? 1)))
  const side = values.map((value) => value / valueScale)
  const factors = factorise(scales.map((_, j) => scaledRows.map((row) => row[j] ?? 0)), leastShare)
  if (factors === null) throw new CalcError({ field: 'rows', value: members.rows, limit: 'columns that do not depend on each other', unit: '', message: 'One of the columns follows from the others, so its coefficient has no single value: leave it out.' })

  const solution = factors.solve(side)
  let sse = 0
  scaledRows.forEach((row, i) => {
    const fitted = row.reduce((sum, entry, j) => sum + entry * (solution[j] ?? 0), 0)
    sse += ((side[i] ?? 0) - fitted) ** 2
  })
  const spread = Math.sqrt(sse / (count - width))

  const hasConstant = columns.some((column) => column[0] !== 0 && column.every((entry) => entry === column[0]))
  const { largest, shares } = squaresAbout(side, meanOf(side))
  const whole = side.reduce((sum, entry) => sum + entry * entry, 0)
  const sst = hasConstant ? largest * largest * shares : whole
  const explaining = hasConstant ? width - 1 : width
  const of = (result: number): number => finiteResult(result, 'values', members.values)
  return {
    coefficients: solution.map((entry, j) => of((entry / (scales[j] ?? 1)) * valueScale)),
    standardErrors: inverseRowLengths(factors).map((length, j) => of(((length * spread) / (scales[j] ?? 1)) * valueScale)),
    residualSd: of(spread * valueScale),
    rSquared: sst === 0 ? null : of(1 - sse / sst),
    fStatistic: explaining === 0 || sse <= leastSquaresShare * whole ? null : of((sst - sse) / explaining / (spread * spread)),
  }
}
