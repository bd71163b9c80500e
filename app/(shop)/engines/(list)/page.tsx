import type { Metadata } from 'next'
import { restoreEngine } from '../actions'
import { EngineListView } from '@/components/lists/engine-list-view'
import { ListFailed } from '@/components/lists/list-failed'
import { ProblemNote } from '@/components/lists/problem-note'
import { PageHead } from '@/components/shell/page-head'
import { can } from '@/lib/auth/permissions'
import { requireActor } from '@/lib/auth/session'
import { listEngines } from '@/lib/data/engines/list-engines'
import { listData } from '@/lib/list-data'
import { queryOf } from '@/lib/schemas/list-query'

export const metadata: Metadata = { title: 'Engines' }

export default async function EnginesPage({ searchParams }: { searchParams: Promise<Record<string, string | string[] | undefined>> }) {
  const actor = await requireActor()
  const { problem, ...params } = queryOf(await searchParams)
  const list = await listData(() => listEngines(actor, params))
  if (!list.ok) return (
    <>
      <PageHead over="Engines" title="This address does not lead to the list" />
      <div className="body"><ListFailed title="The list was not read" sentence={list.sentence} fieldErrors={list.fieldErrors} href="/engines" /></div>
    </>
  )
  return (
    <>
      {problem ? <div className="body pb-0!"><ProblemNote problem={problem} what="engine" /></div> : null}
      <EngineListView
        initial={list.data} params={params} system={actor.unitSystem} canWrite={can(actor, 'engine.write')}
        {...(can(actor, 'engine.archive') ? { restore: restoreEngine } : {})}
      />
    </>
  )
}
