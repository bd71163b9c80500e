'use client'

import type { FormAction } from './act-form'
import { ListPager } from './list-pager'
import { ListSearch } from './list-search'
import { RefreshNote } from './refresh-note'
import { ScenarioRow } from './scenario-row'
import { StateLinks } from './state-links'
import { useFresh } from './use-fresh'
import { PageHead } from '@/components/shell/page-head'
import { ButtonLink, TextLink } from '@/components/ui/button'
import { EmptyNote } from '@/components/ui/note'
import { RuledList } from '@/components/ui/ruled-list'
import { isNarrowed, listAddress, type ListParams } from '@/lib/list-address'
import type { ScenarioList } from '@/lib/schemas/scenario-dto'
import { scenarioHead } from '@/lib/words/list-heads'

const path = '/scenarios'
const states = [
  { value: 'active', label: 'Active' }, { value: 'outside', label: 'Outside a limit' },
  { value: 'released', label: 'Released' }, { value: 'archived', label: 'Archived' },
] as const
const sorts = [
  { value: '', label: 'changed last' }, { value: 'outside', label: 'most outside' },
  { value: 'title', label: 'by name' }, { value: 'code', label: 'by code' },
] as const

interface ScenarioListViewProps {
  initial: ScenarioList
  params: ListParams
  /** Engines to choose from. */
  engines: readonly { id: string, name: string, code: string }[]
  /** The person sees the own scenarios only. */
  isOwn: boolean
  canLayOutEngines: boolean
  restore: FormAction
}

export function ScenarioListView({ initial, params, engines, isOwn, canLayOutEngines, restore }: ScenarioListViewProps) {
  const { data, problem, readAt, retry } = useFresh(listAddress('/api/scenarios', params, { cursor: params.cursor ?? null }), initial)
  const { rows, nextCursor } = data
  const state = params.state ?? 'active'
  const isFiltered = isNarrowed(params)
  const isPart = nextCursor !== null || params.cursor !== undefined
  return (
    <>
      <PageHead
        over="Scenarios" title={scenarioHead(rows, { state, isFiltered, isPart, isOwn })}
        actions={<ButtonLink kind="do" href={params.engineId ? `/scenarios/new?engine=${params.engineId}` : '/scenarios/new'}>New scenario</ButtonLink>}
      />
      <div className="body">
        <div className="ltop">
          <ListSearch
            path={path} params={params} label="Search scenarios" placeholder="Name, code, engine"
            selects={[
              { name: 'engineId', label: 'Engine', choices: [{ value: '', label: 'every engine' }, ...engines.map(({ id, name, code }) => ({ value: id, label: `${name}, ${code}` }))] },
              { name: 'sort', label: 'Order', choices: sorts },
            ]}
          />
          <StateLinks path={path} params={params} label="Which scenarios" states={states} />
        </div>
        <RefreshNote problem={problem} readAt={readAt} retry={retry} />
        {rows.length > 0
          ? <RuledList label="Scenarios">{rows.map((row) => <ScenarioRow key={row.id} row={row} withOwner={!isOwn} restore={{ action: restore, next: listAddress(path, params) }} />)}</RuledList>
          : <NoScenario isFiltered={isFiltered} state={state} hasEngines={engines.length > 0} canLayOutEngines={canLayOutEngines} params={params} />}
        <ListPager path={path} params={params} count={rows.length} nextCursor={nextCursor} of="scenarios" />
      </div>
    </>
  )
}

interface NoScenarioProps {
  isFiltered: boolean
  state: string
  hasEngines: boolean
  canLayOutEngines: boolean
  params: ListParams
}

function NoScenario({ isFiltered, state, hasEngines, canLayOutEngines, params }: NoScenarioProps) {
  if (isFiltered || params.cursor) return (
    <EmptyNote level={2} title="Nothing fits this search">
      <p>Every word must stand in the name, the code or the engine’s name. <TextLink href={listAddress(path, params, { search: null, engineId: null })}>Show them all</TextLink></p>
    </EmptyNote>
  )
  if (state === 'outside') return <EmptyNote level={2} title="None lies outside a limit"><p>Scenarios with a finding outside its limit stand here until the finding is gone. Those close to a limit are among the <TextLink href={path}>active ones</TextLink>.</p></EmptyNote>
  if (state === 'released') return <EmptyNote level={2} title="No plan was released yet"><p>A revision that is released becomes a plan: every role of the shop reads it, and nobody changes it.</p></EmptyNote>
  if (state === 'archived') return <EmptyNote level={2} title="The archive is empty"><p>A scenario that is archived leaves the lists and can be restored from here.</p></EmptyNote>
  if (!hasEngines) return (
    <EmptyNote level={2} title="A scenario is laid out on an engine">
      <p>{canLayOutEngines ? <>There is none yet. <TextLink href="/engines/new">Lay out the first engine</TextLink></> : 'There is none in this shop yet. A designer or the owner lays out the first.'}</p>
    </EmptyNote>
  )
  return (
    <EmptyNote level={2} title="Nothing laid out yet">
      <p>A scenario is a working sheet: when each channel fires on one engine, and what that comes to. <TextLink href="/scenarios/new">Start the first one</TextLink></p>
    </EmptyNote>
  )
}
