import { ActForm, type FormAction } from './act-form'
import { RowVerdict } from './row-verdict'
import { TimeAt } from './time-at'
import { TextLink } from '@/components/ui/button'
import { RuledRow } from '@/components/ui/ruled-list'
import type { ScenarioRowDto } from '@/lib/schemas/scenario-dto'
import { headLine } from '@/lib/words/findings'

interface ScenarioRowProps {
  row: ScenarioRowDto
  /** Whose it is; left out where all are one person's. */
  withOwner: boolean
  /** Left out on the engine's own page. */
  withEngine?: boolean
  restore?: { action: FormAction, next: string }
}

/** A scenario in a list: verdict in the margin, name, code, revision, when, what the limits say. */
export function ScenarioRow({ row, withOwner, withEngine = true, restore }: ScenarioRowProps) {
  const { code, title, counts, currentRevision, releasedRevision, updatedAt, archivedAt } = row
  return (
    <RuledRow
      mark={<RowVerdict counts={counts} />}
      right={(
        <span className="lright">
          {archivedAt && restore ? <ActForm action={restore.action} fields={{ id: row.id, next: restore.next }} size="small">Restore</ActForm> : null}
          <small>{[withEngine && row.engine.name, withOwner && row.owner.name].filter(Boolean).join(', ')}</small>
        </span>
      )}
    >
      <TextLink href={`/scenarios/${row.id}`}>{title}</TextLink>
      <small>
        {code} <TextLink className="font-normal" href={`/scenarios/${row.id}/revisions`}>revision {currentRevision}</TextLink>, <TimeAt iso={updatedAt} />
        {releasedRevision ? <>; released as plan <TextLink className="font-normal" href={`/plans/${row.id}/${releasedRevision}`}>{code}.{releasedRevision}</TextLink></> : null}
        . {headLine(counts)}.{archivedAt ? <> Archived <TimeAt iso={archivedAt} />.</> : null}
      </small>
    </RuledRow>
  )
}
