import { DiffTable, type DiffColumn } from './diff-table'
import { Num } from '@/components/ui/num'
import { inputRows, noneWord, type InputRow } from '@/lib/compare/input-rows'
import type { FieldDef, FormValues } from '@/lib/schemas/field'
import type { UnitSystem } from '@/lib/units'

interface Version {
  label: string
  values: FormValues
}

interface InputDifferencesProps {
  fields: readonly FieldDef[]
  left: Version
  right: Version
  /** Units the values stand in. */
  system: UnitSystem
  /** Those that are the same too. */
  all?: boolean
  caption?: string
  /** Digits in place of the labels, where a head above has told which is which. */
  digits?: boolean
}

function Cell({ text, row }: { text: string, row: InputRow }) {
  if (text === noneWord) return <span className="fine">{noneWord}</span>
  if (row.layout !== 'line') return <pre className={`block ${row.layout}`}>{text}</pre>
  return row.unit ? <Num value={text} unit={row.unit.joined ? '°' : row.unit.symbol} /> : <b>{text}</b>
}

/** Inputs of two versions beside each other, and the step between them. */
export function InputDifferences({ fields, left, right, system, all = false, caption = 'Inputs that differ', digits = false }: InputDifferencesProps) {
  const rows = inputRows(fields, left.values, right.values, system).filter((row) => all || !row.isSame)
  if (rows.length === 0) return <p className="fine">No input differs.</p>
  const columns: [DiffColumn, DiffColumn] = [{ label: left.label, digit: digits ? 1 : null }, { label: right.label, digit: digits ? 2 : null }]
  return (
    <DiffTable
      caption={caption} columns={columns}
      groups={[{
        title: null,
        rows: rows.map((row) => ({
          key: row.key, channel: row.channel, label: row.label,
          left: <Cell text={row.left} row={row} />, right: <Cell text={row.right} row={row} />,
          difference: row.difference, isSame: row.isSame, isBlock: row.layout !== 'line',
        })),
      }]}
    />
  )
}
