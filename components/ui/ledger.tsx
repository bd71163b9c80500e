import clsx from 'clsx'
import type { ReactNode } from 'react'

export interface LedgerColumn {
  head: ReactNode
  /** Numbers stand at the right. */
  right?: boolean
  width?: string
}

export interface LedgerRow {
  key: string
  cells: readonly ReactNode[]
  /** Outside its limit. */
  hit?: boolean
  /** Chosen. */
  chosen?: boolean
  /** Ink line above: the table changes channel here. */
  breakAbove?: boolean
}

interface LedgerProps {
  caption: ReactNode
  /** The caption repeats a head in sight: for readers only. */
  captionHidden?: boolean
  columns: readonly LedgerColumn[]
  rows: readonly LedgerRow[]
  /** The first cell of each row names it. */
  rowHeads?: boolean
  className?: string
}

/** A plain ruled table. It scrolls by itself where its column is too narrow; the page never does. */
export function Ledger({ caption, captionHidden = true, columns, rows, rowHeads = true, className }: LedgerProps) {
  return (
    <table className={clsx('led', className)}>
      <caption className={captionHidden ? 'sr' : undefined}>{caption}</caption>
      <thead>
        <tr>
          {columns.map((column, index) => (
            column.head === '' || column.head === null
              ? <td key={index} style={{ width: column.width }} />
              : <th key={index} scope="col" className={column.right ? 'r' : undefined} style={column.width ? { width: column.width } : undefined}>{column.head}</th>
          ))}
        </tr>
      </thead>
      <tbody>
        {rows.map((row) => (
          <tr key={row.key} className={clsx(row.hit && 'hit', row.chosen && 'sel', row.breakAbove && 'brk') || undefined}>
            {row.cells.map((cell, index) => {
              const side = columns[index]?.right ? 'r' : undefined
              return index === 0 && rowHeads ? <th key={index} scope="row" className={side}>{cell}</th> : <td key={index} className={side}>{cell}</td>
            })}
          </tr>
        ))}
      </tbody>
    </table>
  )
}
