import type { Metadata } from 'next'
import { ProblemNote } from '@/components/lists/problem-note'
import { ScenarioMore } from '@/components/scenario/scenario-more'
import { Workbench } from '@/components/scenario/workbench'
import { can } from '@/lib/auth/permissions'
import { requireActor } from '@/lib/auth/session'
import { evaluateForActor } from '@/lib/data/scenarios/evaluate-for-actor'
import { getRevision } from '@/lib/data/scenarios/get-revision'
import { getScenario } from '@/lib/data/scenarios/get-scenario'
import { defaultLimits } from '@/lib/calc/live'
import { pageData } from '@/lib/page-data'
import { scenarioToForm } from '@/lib/schemas/scenario-form'
import { archiveScenario, duplicateScenario, restoreScenario } from '../actions'
import { saveSheet } from './actions'

interface ScenarioPageProps {
  params: Promise<{ id: string }>
  searchParams: Promise<{ from?: string | string[], problem?: string | string[] }>
}

export async function generateMetadata({ params }: ScenarioPageProps): Promise<Metadata> {
  const [actor, { id }] = await Promise.all([requireActor(), params])
  const { title } = await pageData(() => getScenario(actor, id))
  return { title }
}

/** The workbench. `?from=3` fills the form from an older revision; saving makes it the newest. */
export default async function ScenarioPage({ params, searchParams }: ScenarioPageProps) {
  const [actor, { id }, { from, problem }] = await Promise.all([requireActor(), params, searchParams])
  const scenario = await pageData(() => getScenario(actor, id))
  const { engine, revision } = scenario
  const canArchive = can(actor, 'scenario.archive') || (can(actor, 'scenario.archiveOwn') && scenario.owner.id === actor.userId)
  const older = typeof from === 'string' && from !== String(revision.number) ? await pageData(() => getRevision(actor, id, Number(from))) : null
  const shown = older ?? revision
  const { result } = await pageData(() => evaluateForActor(actor, { engineId: engine.id, sheet: shown.sheet }))
  const system = actor.unitSystem
  return (
    <>
      {problem ? <div className="body pb-0!"><ProblemNote problem={problem} what="scenario" /></div> : null}
      <Workbench
        key={`${id} ${from ?? ''}`}
        scenario={{ id, code: scenario.code, archived: scenario.archivedAt !== null, canWrite: scenario.canWrite, canRelease: scenario.canRelease, releasedRevision: scenario.releasedRevision }}
        engine={{ id: engine.id, name: engine.name, spec: engine.spec, version: engine.version }}
        engineChanged={scenario.engineChanged}
        canOpenEngine={can(actor, 'engine.read')}
        saved={{
          number: revision.number, at: revision.createdAt, by: revision.author.name,
          values: scenarioToForm(revision.title, revision.sheet, system), filledFrom: shown.number,
        }}
        values={scenarioToForm(shown.title, shown.sheet, system)}
        sheet={shown.sheet}
        result={result}
        limits={defaultLimits}
        system={system}
        save={saveSheet.bind(null, id)}
        more={<ScenarioMore id={id} archived={scenario.archivedAt !== null} canArchive={canArchive} duplicate={duplicateScenario} archive={archiveScenario} restore={restoreScenario} />}
      />
    </>
  )
}
