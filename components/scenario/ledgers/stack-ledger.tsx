import { Ledger } from '@/components/ui/ledger'
import type { StackRow } from '@/lib/calc/live'
import { formatQuantityText } from '@/lib/units'
import { PartSection, type LedgersProps } from './ledger-parts'

const what: Record<StackRow['what'], string> = {
  setting: 'Setting by light', bench: 'Bench reading', mark: 'Reading the mark', scatter: 'Scatter, one standard deviation',
}

/** What the timing may be off by when everything allowed comes together. */
export function StackLedger(props: LedgersProps) {
  const { parts, system } = props
  const within = (value: number) => `±${formatQuantityText(value, 'angle', system, { decimals: 2 })}`
  return (
    <PartSection name="stack" part={parts.stack} title="Tolerance stack" ledgers={props}>
      {({ rows, expandedDeg, worstCaseDeg, staggerExpandedDeg }) => (
        <>
          <Ledger
            caption="Tolerances of the timing and what they come to, crank degrees" columns={[{ head: 'may be off by' }, { head: 'crank degrees', right: true }]}
            rows={[
              ...rows.map((row) => ({ key: row.what, cells: [what[row.what], within(row.halfWidthDeg)] })),
              { key: 'expanded', breakAbove: true, cells: ['Together, 95 in 100', within(expandedDeg)] },
              { key: 'worst', cells: ['All at their worst at once', within(worstCaseDeg)] },
              { key: 'stagger', cells: ['Between the channels, 95 in 100', within(staggerExpandedDeg)] },
            ]}
          />
          <p className="fine">Findings on angles say whether the stack would carry them past their limit.</p>
        </>
      )}
    </PartSection>
  )
}
