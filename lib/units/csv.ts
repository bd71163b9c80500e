export type CsvCell = string | number | boolean | null | undefined

/** A spreadsheet takes a cell that begins so for a formula. */
const formulaStart = /^\s*[=+\-@\uff1d\uff0b\uff0d\uff20]|^[\t\r\n]/
const plainNumber = /^[+-]?(\d+\.?\d*|\.\d+)(e[+-]?\d+)?$/i

function cellText(cell: CsvCell): string {
  if (cell === null || cell === undefined) return ''
  if (typeof cell === 'number') {
    if (!Number.isFinite(cell)) throw new RangeError(`A number in a CSV cell is finite, not ${cell}`)
    return String(cell)
  }
  if (typeof cell === 'boolean') return String(cell)
  // An apostrophe in front makes it text for the spreadsheet; a number is no formula and stays what it is.
  return formulaStart.test(cell) && !plainNumber.test(cell) ? `'${cell}` : cell
}

const quoted = (text: string) => (/[",\r\n]/.test(text) ? `"${text.replaceAll('"', '""')}"` : text)

/** Comma separated values after RFC 4180 (CRLF, quotes doubled), numbers with a point. Text that a spreadsheet would run as a formula is disarmed. */
export function toCsv(rows: readonly (readonly CsvCell[])[], header: readonly string[]): string {
  return [header, ...rows].map((row) => `${row.map((cell) => quoted(cellText(cell))).join(',')}\r\n`).join('')
}
