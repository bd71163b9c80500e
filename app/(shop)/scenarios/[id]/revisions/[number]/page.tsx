import type { Metadata } from 'next'
import { TimeAt } from '@/components/lists/time-at'
import { LimitsTable } from '@/components/plan/limits-table'
import { RevisionBody } from '@/components/revision/revision-body'
import { RevisionNotices } from '@/components/revision/revision-notices'
import { SavedInputs } from '@/components/revision/saved-inputs'
import { SheetStamp } from '@/components/scenario/sheet-stamp'
import { PageHead } from '@/components/shell/page-head'
import { ButtonLink, TextLink } from '@/components/ui/button'
import { Section } from '@/components/ui/section'
import { requireActor } from '@/lib/auth/session'
import { drawnResult } from '@/lib/compare/drawn-result'
import { getRevision } from '@/lib/data/scenarios/get-revision'
import { getScenario } from '@/lib/data/scenarios/get-scenario'
import { pageData } from '@/lib/page-data'
import { revisionNumber } from '@/lib/schemas/revision-number'

interface RevisionPageProps {
  params: Promise<{ id: string, number: string }>
}

export async function generateMetadata({ params }: RevisionPageProps): Promise<Metadata> {
  const { number } = await params
  return { title: `Revision ${revisionNumber(number) || ''}`.trim() }
}

/** One revision as it was saved, to read. */
export default async function RevisionPage({ params }: RevisionPageProps) {
  const [actor, { id, number }] = await Promise.all([requireActor(), params])
  const [scenario, revision] = await pageData(() => Promise.all([getScenario(actor, id), getRevision(actor, id, revisionNumber(number))]))
  const system = actor.unitSystem
  const isCurrent = revision.number === scenario.revision.number
  const name = `${scenario.code}.${revision.number}`
  const list = `/scenarios/${id}/revisions`
  return (
    <>
      <PageHead
        over={<><TextLink className="font-normal" href={list}>Scenario {scenario.code}</TextLink> · revision {revision.number} of {scenario.revision.number} · saved <TimeAt iso={revision.createdAt} /> by {revision.author.name}</>}
        title={revision.title} stamp={<SheetStamp result={revision.results} system={system} stale={false} />}
        actions={(
          <>
            {isCurrent ? null : <ButtonLink href={`${list}/compare?left=${revision.number}&right=${scenario.revision.number}`}>Compare with the current one</ButtonLink>}
            {isCurrent || !scenario.canWrite ? <ButtonLink href={`/scenarios/${id}`}>Open the sheet</ButtonLink> : <ButtonLink kind="do" href={`/scenarios/${id}?from=${revision.number}`}>Work on from here</ButtonLink>}
          </>
        )}
      />
      <div className="body rbody">
        {revision.releasedAt ? <p className="oldnote">Released as plan <TextLink href={`/plans/${id}/${revision.number}`}>{name}</TextLink> on <TimeAt iso={revision.releasedAt} />{revision.releasedBy ? ` by ${revision.releasedBy.name}` : ''}.</p> : null}
        <RevisionNotices revision={revision} />
        <RevisionBody scenario={{ engine: revision.engine.spec, sheet: revision.sheet }} result={drawnResult(revision)} system={system} name={name} reasons={revision.releaseReasons ?? undefined} />
        <SavedInputs revision={revision} system={system} />
        <Section title="Limits"><LimitsTable limits={revision.limits} system={system} /></Section>
      </div>
    </>
  )
}
