import type { Metadata } from 'next'
import { ListFailed } from '@/components/lists/list-failed'
import { PlanListView } from '@/components/lists/plan-list-view'
import { PageHead } from '@/components/shell/page-head'
import { can } from '@/lib/auth/permissions'
import { requireActor } from '@/lib/auth/session'
import { listPlans } from '@/lib/data/plans/list-plans'
import { listData } from '@/lib/list-data'
import { queryOf } from '@/lib/schemas/list-query'

export const metadata: Metadata = { title: 'Plans' }

export default async function PlansPage({ searchParams }: { searchParams: Promise<Record<string, string | string[] | undefined>> }) {
  const actor = await requireActor()
  const params = queryOf(await searchParams)
  const list = await listData(() => listPlans(actor, params))
  if (list.ok) return <PlanListView initial={list.data} params={params} canRelease={can(actor, 'plan.release')} />
  return (
    <>
      <PageHead over="Plans" title="This address does not lead to the list" />
      <div className="body"><ListFailed title="The list was not read" sentence={list.sentence} fieldErrors={list.fieldErrors} href="/plans" /></div>
    </>
  )
}
