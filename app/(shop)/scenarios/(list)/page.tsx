import type { Metadata } from 'next'
import { restoreScenario } from '../actions'
import { engineChoices } from '../engine-choices'
import { ListFailed } from '@/components/lists/list-failed'
import { ProblemNote } from '@/components/lists/problem-note'
import { ScenarioListView } from '@/components/lists/scenario-list-view'
import { PageHead } from '@/components/shell/page-head'
import { can } from '@/lib/auth/permissions'
import { requireActor } from '@/lib/auth/session'
import { listScenarios } from '@/lib/data/scenarios/list-scenarios'
import { listData } from '@/lib/list-data'
import { queryOf } from '@/lib/schemas/list-query'

export const metadata: Metadata = { title: 'Scenarios' }

export default async function ScenariosPage({ searchParams }: { searchParams: Promise<Record<string, string | string[] | undefined>> }) {
  const actor = await requireActor()
  const { problem, ...params } = queryOf(await searchParams)
  const [list, engines] = await Promise.all([listData(() => listScenarios(actor, params)), engineChoices(actor, params.engineId)])
  if (!list.ok) return (
    <>
      <PageHead over="Scenarios" title="This address does not lead to the list" />
      <div className="body"><ListFailed title="The list was not read" sentence={list.sentence} fieldErrors={list.fieldErrors} href="/scenarios" /></div>
    </>
  )
  return (
    <>
      {problem ? <div className="body pb-0!"><ProblemNote problem={problem} what="scenario" /></div> : null}
      <ScenarioListView
        initial={list.data} params={params} engines={engines} isOwn={!can(actor, 'scenario.read')}
        canLayOutEngines={can(actor, 'engine.write')} restore={restoreScenario}
      />
    </>
  )
}
