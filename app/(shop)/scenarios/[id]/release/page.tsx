import type { Metadata } from 'next'
import { ReleaseForm } from '@/components/scenario/release-form'
import { PageHead } from '@/components/shell/page-head'
import { SheetStamp } from '@/components/scenario/sheet-stamp'
import { EmptyNote } from '@/components/ui/note'
import { TextLink } from '@/components/ui/button'
import { requireActor } from '@/lib/auth/session'
import { getScenario } from '@/lib/data/scenarios/get-scenario'
import { pageData } from '@/lib/page-data'
import { releasePlan } from '../actions'

export const metadata: Metadata = { title: 'Release a plan' }

/** Releasing the current revision: every finding outside its limit asks for a reason in writing. */
export default async function ReleasePage({ params }: { params: Promise<{ id: string }> }) {
  const [actor, { id }] = await Promise.all([requireActor(), params])
  const { code, revision, engineChanged, canRelease, archivedAt } = await pageData(() => getScenario(actor, id))
  const refusal = !canRelease
    ? 'Releasing a plan belongs to the designers and the owner of the shop.'
    : archivedAt
      ? 'This scenario is archived. Restore it first.'
      : revision.releasedAt
        ? `Revision ${revision.number} is released already. A released plan is never changed; save a new revision to release another.`
        : engineChanged
          ? 'The engine’s sheet was changed since this revision was saved. Open the sheet, look at the new figures, save, then release.'
          : null
  return (
    <>
      <PageHead
        over={<>Scenario {code} · revision {revision.number}</>}
        title={`Release ${code}.${revision.number} as a plan`}
        stamp={<SheetStamp result={revision.results} system={actor.unitSystem} stale={false} />}
      />
      <div className="body">
        {refusal ? <EmptyNote title="Not to be released as it stands" level={2}><p>{refusal} <TextLink href={`/scenarios/${id}`}>Back to the sheet</TextLink></p></EmptyNote> : (
          <ReleaseForm
            title={revision.title} backHref={`/scenarios/${id}`} system={actor.unitSystem}
            outside={revision.results.findings.filter((finding) => finding.verdict === 'outside')}
            release={releasePlan.bind(null, id, revision.number)}
          />
        )}
      </div>
    </>
  )
}
