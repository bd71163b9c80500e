import clsx from 'clsx'
import type { ReactNode } from 'react'
import { ChannelChip } from '@/components/ui/channel-chip'
import { letterOf } from '@/lib/words/findings'

export interface DiffColumn {
  label: string
  /** Shown in its place; the label is then for readers. */
  digit: 1 | 2 | null
}

export interface DiffRow {
  key: string
  label: string
  channel: 'primary' | 'backup' | null
  /** Under the label: the limit and the like. */
  under?: ReactNode
  left: ReactNode
  right: ReactNode
  /** 'same', a signed number, or null where there is no number to give. */
  difference: string | null
  isSame: boolean
  /** Texts of several lines stand at the top. */
  isBlock?: boolean
}

export interface DiffGroup {
  title: string | null
  /** Stands after the title. */
  after?: ReactNode
  rows: readonly DiffRow[]
}

function Head({ label, digit }: DiffColumn) {
  return <th scope="col" className="r">{digit === null ? label : <><span className="digit" aria-hidden="true">{digit}</span><span className="sr">{label}</span></>}</th>
}

/** Two versions side by side with a column for the difference. */
export function DiffTable({ caption, columns, groups }: { caption: string, columns: readonly [DiffColumn, DiffColumn], groups: readonly DiffGroup[] }) {
  return (
    <table className="led diff">
      <caption className="sr">{caption}</caption>
      <thead><tr><td /><Head {...columns[0]} /><Head {...columns[1]} /><th scope="col" className="r">difference</th></tr></thead>
      {groups.map(({ title, after, rows }, i) => (
        <tbody key={title ?? i}>
          {title === null ? null : <tr className="gh"><th scope="rowgroup" colSpan={4}>{title}{after ? <> {after}</> : null}</th></tr>}
          {rows.map((row) => (
            <tr key={row.key} className={clsx(row.isBlock && 'tall') || undefined}>
              <th scope="row">{row.channel ? <><ChannelChip channel={letterOf(row.channel)} spoken /> </> : null}{row.label}{row.under ? <> <small>{row.under}</small></> : null}</th>
              <td className="r">{row.left}</td>
              <td className="r">{row.right}</td>
              <td className="r df">{row.isSame || row.difference === 'same' ? <small>same</small> : row.difference ?? <small>changed</small>}</td>
            </tr>
          ))}
        </tbody>
      ))}
    </table>
  )
}
