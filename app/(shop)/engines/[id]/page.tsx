import type { Metadata } from 'next'
import { archiveEngine, duplicateEngine, removeEngine, restoreEngine, updateEngine } from '../actions'
import { EngineActs } from '@/components/engine/engine-acts'
import { EngineForm } from '@/components/engine/engine-form'
import { EngineScenarios } from '@/components/engine/engine-scenarios'
import { EngineSheet } from '@/components/engine/engine-sheet'
import { ProblemNote } from '@/components/lists/problem-note'
import { TimeAt } from '@/components/lists/time-at'
import { can } from '@/lib/auth/permissions'
import { requireActor } from '@/lib/auth/session'
import { getEngine } from '@/lib/data/engines/get-engine'
import { listScenarios } from '@/lib/data/scenarios/list-scenarios'
import { pageData } from '@/lib/page-data'
import { engineToForm } from '@/lib/schemas/engine-form'

interface EnginePageProps {
  params: Promise<{ id: string }>
  searchParams: Promise<{ problem?: string | string[] }>
}

export async function generateMetadata({ params }: EnginePageProps): Promise<Metadata> {
  const [actor, { id }] = await Promise.all([requireActor(), params])
  const { name } = await pageData(() => getEngine(actor, id))
  return { title: name }
}

/** The engine's sheet: a form for those who may change it, to read for the others and while it is archived. */
export default async function EnginePage({ params, searchParams }: EnginePageProps) {
  const [actor, { id }, { problem }] = await Promise.all([requireActor(), params, searchParams])
  const seesScenarios = can(actor, 'scenario.read') || can(actor, 'scenario.readOwn')
  const [engine, scenarios] = await pageData(() => Promise.all([getEngine(actor, id), seesScenarios ? listScenarios(actor, { engineId: id }) : null]))
  const system = actor.unitSystem
  const archived = engine.archivedAt !== null
  const values = engineToForm(engine.name, engine.code, engine.spec, system)
  const over = <>Engine {engine.code} · version {engine.version} · {archived && engine.archivedAt ? <>archived <TimeAt iso={engine.archivedAt} /></> : <>changed <TimeAt iso={engine.updatedAt} /></>}</>
  const more = (
    <>
      {scenarios ? <EngineScenarios engineId={id} list={scenarios} isOwn={!can(actor, 'scenario.read')} canStart={!archived && can(actor, 'scenario.create')} /> : null}
      <EngineActs
        id={id} archived={archived} scenarioCount={engine.scenarioCount}
        {...(can(actor, 'engine.write') ? { duplicate: duplicateEngine } : {})}
        {...(can(actor, 'engine.archive') ? { archive: archiveEngine, restore: restoreEngine, remove: removeEngine } : {})}
      />
    </>
  )
  return (
    <>
      {problem ? <div className="body pb-0!"><ProblemNote problem={problem} what="engine" /></div> : null}
      {can(actor, 'engine.write') && !archived
        ? <EngineForm key={`${id} ${system}`} over={over} title={engine.name} saveLabel="Save the engine" initial={values} base={engine.spec} version={engine.version} system={system} save={updateEngine.bind(null, id)}>{more}</EngineForm>
        : <EngineSheet over={over} title={engine.name} values={values} system={system} archived={archived}>{more}</EngineSheet>}
    </>
  )
}
