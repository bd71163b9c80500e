import { EquationLink } from '@/components/method/equation-link'
import { DiffTable, type DiffColumn } from './diff-table'
import { DetonationCaution } from '@/components/ui/detonation-caution'
import { Num } from '@/components/ui/num'
import { VerdictMark } from '@/components/ui/verdict-mark'
import type { ScenarioResult } from '@/lib/calc/live'
import { findingRows, keyRows, type ResultRow, type ResultSide } from '@/lib/compare/result-rows'
import type { UnitSystem } from '@/lib/units'

type Result = Pick<ScenarioResult, 'parts' | 'findings'>

interface ResultDifferencesProps {
  left: Result
  right: Result
  columns: readonly [DiffColumn, DiffColumn]
  system: UnitSystem
}

function Side({ side, unit }: { side: ResultSide | null, unit: ResultRow['unit'] }) {
  if (!side) return <span className="fine">withheld</span>
  const { text, verdict, spread } = side
  const isNumber = /\d/.test(text)
  return (
    <>
      {verdict === 'outside' || verdict === 'close' ? <VerdictMark verdict={verdict} wordless /> : null}
      {isNumber ? <Num value={text} unit={unit.joined ? '°' : unit.symbol} bad={verdict === 'outside'} /> : <b className={verdict === 'outside' ? 'bad' : undefined}>{text}</b>}
      {spread ? <> <small className="block">{spread}</small></> : null}
    </>
  )
}

/** Results of two evaluations side by side: what the limits judge first, then the figures people quote. */
export function ResultDifferences({ left, right, columns, system }: ResultDifferencesProps) {
  const groups = [{ id: 'findings', title: 'Judged by the limits', equation: null, rows: findingRows(left, right, system) }, ...keyRows(left, right, system)]
  const tellsDetonation = groups.some(({ rows }) => rows.some(({ id }) => /^(detonationDeg|margin)\./.test(id)))
  return (
    <>
      {tellsDetonation ? <DetonationCaution /> : null}
      <DiffTable
        caption="Results, with the difference of the second from the first" columns={columns}
        groups={groups.map(({ title, equation, rows }) => ({
          title, after: equation ? <EquationLink id={equation} of={title} /> : undefined,
          rows: rows.map((row) => ({
            key: row.id, label: row.label, channel: row.channel,
            under: row.equation ? <>{row.limit} <EquationLink id={row.equation} of={row.label} /></> : row.limit,
            left: <Side side={row.left} unit={row.unit} />, right: <Side side={row.right} unit={row.unit} />,
            // A figure that one side withholds has no difference; the word beside it says so.
            difference: row.difference ?? (row.left?.text === row.right?.text ? 'same' : null), isSame: row.difference === 'same',
          })),
        }))}
      />
    </>
  )
}
