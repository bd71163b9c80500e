import { formatNumber, toCsv } from '@/lib/units'
import type { ChannelLetter } from './channel-chip'

export interface FigureColumn {
  head: string
  unit?: string
  /** The head is this channel's letter, with `head` for readers and files. */
  channel?: ChannelLetter
  decimals?: number
  /** Differences and deviations carry their sign always. */
  signed?: boolean
}

export type FigureCell = number | string | null

/** The numbers of a drawing: shown as a table in its place, read by readers, saved as a file. */
export interface FigureData {
  caption: string
  columns: readonly FigureColumn[]
  rows: readonly (readonly FigureCell[])[]
  /** Indexes of rows outside a limit. */
  hits?: readonly number[]
}

export function cellText(cell: FigureCell, column: FigureColumn | undefined): string {
  if (cell === null) return 'none'
  return typeof cell === 'string' ? cell : formatNumber(cell, column?.decimals ?? 0, column?.signed)
}

/** Numbers with at most six decimals, so that no binary residue shows; what is missing is an empty place. */
export function figureCsv({ columns, rows }: FigureData): string {
  const head = columns.map((column) => (column.unit ? `${column.head} (${column.unit})` : column.head))
  return toCsv(rows.map((row) => row.map((cell) => (typeof cell === 'number' ? Number(cell.toFixed(6)) : cell))), head)
}
