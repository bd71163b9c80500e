import type { Metadata } from 'next'
import { TimeAt } from '@/components/lists/time-at'
import { LimitsTable } from '@/components/plan/limits-table'
import { FittingCaution, ModelCaution, RunningCaution } from '@/components/plan/plan-cautions'
import { RevisionBody } from '@/components/revision/revision-body'
import { RevisionNotices } from '@/components/revision/revision-notices'
import { SavedInputs } from '@/components/revision/saved-inputs'
import { SheetStamp } from '@/components/scenario/sheet-stamp'
import { PageHead } from '@/components/shell/page-head'
import { ButtonLink } from '@/components/ui/button'
import { Section } from '@/components/ui/section'
import { can } from '@/lib/auth/permissions'
import { requireActor } from '@/lib/auth/session'
import { drawnResult } from '@/lib/compare/drawn-result'
import { getPlan } from '@/lib/data/plans/get-plan'
import { pageData } from '@/lib/page-data'
import { revisionNumber } from '@/lib/schemas/revision-number'

interface PlanPageProps {
  params: Promise<{ scenario: string, number: string }>
}

const readPlan = async (params: PlanPageProps['params']) => {
  const [actor, { scenario, number }] = await Promise.all([requireActor(), params])
  return { actor, scenario, plan: await pageData(() => getPlan(actor, scenario, revisionNumber(number))) }
}

export async function generateMetadata({ params }: PlanPageProps): Promise<Metadata> {
  const { plan } = await readPlan(params)
  return { title: `Plan ${plan.code}` }
}

/** A released plan, to read by every role of the shop. */
export default async function PlanPage({ params }: PlanPageProps) {
  const { actor, scenario, plan } = await readPlan(params)
  const system = actor.unitSystem
  return (
    <>
      <PageHead
        over={<>Plan {plan.code} · {plan.engine.name} · released <TimeAt iso={plan.releasedAt} /> by {plan.releasedBy.name}</>}
        title={plan.title} stamp={<SheetStamp result={plan.results} system={system} stale={false} />}
        actions={can(actor, 'scenario.read') ? <ButtonLink href={`/scenarios/${scenario}`}>Open its scenario</ButtonLink> : undefined}
      />
      <div className="body rbody">
        <ModelCaution />
        <RevisionNotices revision={plan} />
        <RevisionBody
          scenario={{ engine: plan.engine.spec, sheet: plan.sheet }} result={drawnResult(plan)} system={system} name={plan.code} reasons={plan.releaseReasons}
          beforeFigures={<RunningCaution />}
        />
        <FittingCaution />
        <SavedInputs revision={plan} system={system} />
        <Section title="Limits" right="by which this plan was judged"><LimitsTable limits={plan.limits} system={system} /></Section>
        <p className="fine">Laid out and saved by {plan.author.name}, <TimeAt iso={plan.createdAt} />; released by {plan.releasedBy.name}, <TimeAt iso={plan.releasedAt} />. A released plan is never changed. Figures by version {plan.calcVersion} of the library.</p>
      </div>
    </>
  )
}
