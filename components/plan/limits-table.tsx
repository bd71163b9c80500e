import { Ledger } from '@/components/ui/ledger'
import type { Limits } from '@/lib/calc/live'
import type { UnitSystem } from '@/lib/units'
import { limitLine } from '@/lib/words/limits'

/** What a revision was judged by, and whose limits they are. */
export function LimitsTable({ limits, system }: { limits: Limits, system: UnitSystem }) {
  return (
    <Ledger
      caption="Limits this was judged by" columns={[{ head: 'judged' }, { head: 'limit' }, { head: 'whose' }]}
      rows={Object.values(limits).map((limit) => {
        const { id, title, limit: words, origin } = limitLine(limit, system)
        return { key: id, cells: [title, words, <span key="origin" className="fine">{origin}</span>] }
      })}
    />
  )
}
