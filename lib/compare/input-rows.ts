import type { FieldDef, FormValues } from '../schemas/field'
import { formatQuantity, formatQuantityText, parseMatrix, parseQuantity, parseTable, unitOf, type UnitSystem } from '../units'
import { longLabel } from './long-label'

/** One input in two versions, as the person reads it. */
export interface InputRow {
  /** The field's name; with a speed behind it for a line of a table: `primary.table:1000`. */
  key: string
  label: string
  channel: 'primary' | 'backup' | null
  left: string
  right: string
  unit: { symbol: string; joined: boolean } | null
  isSame: boolean
  /** Right less left in the person's units, signed; null where there is no such number. */
  difference: string | null
  /** block: lines of figures; words: a text of several lines. */
  layout: 'line' | 'block' | 'words'
}

/** Stands where one side has nothing. */
export const noneWord = 'none'

const channelOf = (name: string) => {
  const letter = name.replace(/^coils\./, '')
  return letter.startsWith('primary.') ? 'primary' : letter.startsWith('backup.') ? 'backup' : null
}

const tidy = (text: string) => text.replace(/\r\n?/g, '\n').trim()

/** Digits behind the point: a difference shows as many as its figures. */
const decimalsOf = (text: string) => /\d*[.,](\d+)/.exec(text)?.[1]?.length ?? 0

function shownText(field: FieldDef, value: string): string {
  if (field.kind === 'check') return value !== '' && value !== 'off' ? 'yes' : 'no'
  if (value === '') return noneWord
  if (field.kind === 'select') return field.options?.find((option) => option.value === value)?.label ?? value
  return field.kind === 'number' ? value.replace(/^-(?=\d)/, '−') : value
}

/** Step between two typed figures, whatever units they were typed in. Between two temperatures it is a difference: 20 K are 36 °F, not −424. */
function numberStep(field: FieldDef, left: string, right: string, system: UnitSystem): { isSame: boolean; text: string } | null {
  const kind = field.quantity
  if (field.kind !== 'number' || !kind) return null
  const [from, to] = [parseQuantity(left, kind, system), parseQuantity(right, kind, system)]
  if (!from.ok || !to.ok) return null
  // Decimals of a power of ten stand behind its first digit, not behind the typed point.
  const decimals = kind === 'failureRate' ? undefined : Math.min(6, Math.max(decimalsOf(left), decimalsOf(right)))
  const stepKind = kind === 'temperature' ? 'temperatureDifference' : kind
  return { isSame: from.value === to.value, text: formatQuantity(to.value - from.value, stepKind, system, { decimals, sign: true }).text }
}

/** A row for each speed of two tables; null where one side is empty or cannot be read. */
function tableRows(field: FieldDef, left: string, right: string, system: UnitSystem): InputRow[] | null {
  const [keyColumn, valueColumn] = field.columns ?? []
  if (!keyColumn || !valueColumn || left === '' || right === '') return null
  const [from, to] = [left, right].map((text) => parseTable(text, [keyColumn, valueColumn], system))
  if (!from?.ok || !to?.ok) return null
  const [lefts, rights] = [from, to].map(({ rows }) => new Map(rows.map(([key = 0, value = 0]) => [key, value])))
  const keys = [...new Set([...(lefts?.keys() ?? []), ...(rights?.keys() ?? [])])].sort((one, other) => one - other)
  const { symbol, joined } = unitOf(valueColumn.kind, system)
  const text = (value: number | undefined) => (value === undefined ? noneWord : formatQuantity(value, valueColumn.kind, system).text)
  return keys.map((key): InputRow => {
    const [was, is] = [lefts?.get(key), rights?.get(key)]
    return {
      key: `${field.name}:${key}`, channel: channelOf(field.name), layout: 'line',
      label: `${longLabel(field)}, at ${formatQuantityText(key, keyColumn.kind, system)}`,
      left: text(was), right: text(is), unit: { symbol, joined }, isSame: was === is,
      difference: was === undefined || is === undefined || was === is ? null : formatQuantity(is - was, valueColumn.kind, system, { sign: true }).text,
    }
  })
}

/** How two maps differ: "4 of 12 cells, at most +2.0°"; null where one side is empty, unreadable, or nothing differs. */
function matrixStep(field: FieldDef, left: string, right: string, system: UnitSystem): string | null {
  const [row, column, cell] = field.columns ?? []
  if (!row || !column || !cell || left === '' || right === '') return null
  const [from, to] = [left, right].map((text) => parseMatrix(text, { row, column, cell }, system))
  if (!from?.ok || !to?.ok) return null
  const axes = ({ rows, columns }: { rows: number[]; columns: number[] }) => `${rows.join()} ${columns.join()}`
  if (axes(from.matrix) !== axes(to.matrix)) return 'other speeds or pressures'
  const steps = to.matrix.cells.flatMap((cells, i) => cells.map((value, j) => value - (from.matrix.cells[i]?.[j] ?? value)))
  const changed = steps.filter((step) => step !== 0)
  if (changed.length === 0) return null
  const largest = changed.reduce((most, step) => (Math.abs(step) > Math.abs(most) ? step : most))
  return `${changed.length} of ${steps.length} cells, at most ${formatQuantityText(largest, cell.kind, system, { sign: true })}`
}

function rowsOf(field: FieldDef, left: string, right: string, system: UnitSystem): InputRow[] {
  const rows = field.kind === 'table' ? tableRows(field, left, right, system) : null
  if (rows) return rows
  const [leftText, rightText] = [shownText(field, left), shownText(field, right)]
  const step = numberStep(field, left, right, system)
  const isSame = leftText === rightText || step?.isSame === true
  const unit = field.kind === 'number' && field.quantity ? unitOf(field.quantity, system) : null
  return [{
    key: field.name, label: longLabel(field), channel: channelOf(field.name),
    left: leftText, right: rightText, isSame,
    unit: unit?.symbol ? { symbol: unit.symbol, joined: unit.joined } : null,
    difference: isSame ? null : field.kind === 'matrix' ? matrixStep(field, left, right, system) : step?.text ?? null,
    layout: field.kind === 'table' || field.kind === 'matrix' ? 'block' : field.kind === 'longText' ? 'words' : 'line',
  }]
}

/**
 * Two versions of a form, field by field in the order of its table. Fields empty on both sides (those of schedule kinds that
 * neither chose) say nothing and are left out.
 */
export function inputRows(fields: readonly FieldDef[], left: FormValues, right: FormValues, system: UnitSystem): InputRow[] {
  return fields.flatMap((field) => {
    const [from, to] = [tidy(left[field.name] ?? ''), tidy(right[field.name] ?? '')]
    return field.kind !== 'check' && from === '' && to === '' ? [] : rowsOf(field, from, to, system)
  })
}
