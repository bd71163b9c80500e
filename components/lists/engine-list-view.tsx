'use client'

import { ActForm, type FormAction } from './act-form'
import { ListPager } from './list-pager'
import { ListSearch } from './list-search'
import { RefreshNote } from './refresh-note'
import { StateLinks } from './state-links'
import { TimeAt } from './time-at'
import { useFresh } from './use-fresh'
import { PageHead } from '@/components/shell/page-head'
import { ButtonLink, TextLink } from '@/components/ui/button'
import { EmptyNote } from '@/components/ui/note'
import { RuledList, RuledRow } from '@/components/ui/ruled-list'
import { displacementCc } from '@/lib/calc/live'
import { isNarrowed, listAddress, type ListParams } from '@/lib/list-address'
import type { EngineDto, EngineList } from '@/lib/schemas/engine-dto'
import { formatQuantityText, type UnitSystem } from '@/lib/units'
import { countHead } from '@/lib/words/list-heads'

const path = '/engines'
const states = [{ value: 'active', label: 'Active' }, { value: 'archived', label: 'Archived' }] as const
const sorts = [{ value: '', label: 'changed last' }, { value: 'name', label: 'by name' }, { value: 'code', label: 'by code' }] as const

interface EngineListViewProps {
  initial: EngineList
  params: ListParams
  system: UnitSystem
  canWrite: boolean
  /** Absent where the role may not. */
  restore?: FormAction
}

export function EngineListView({ initial, params, system, canWrite, restore }: EngineListViewProps) {
  const { data, problem, readAt, retry } = useFresh(listAddress('/api/engines', params, { cursor: params.cursor ?? null }), initial)
  const { rows, nextCursor } = data
  const isFiltered = isNarrowed(params)
  const isArchive = params.state === 'archived'
  const head = countHead(rows.length, 'engine', { isFiltered, isPart: nextCursor !== null || params.cursor !== undefined, kind: isArchive ? 'archived' : '' })
  return (
    <>
      <PageHead over="Engines" title={head} actions={canWrite ? <ButtonLink kind="do" href="/engines/new">New engine</ButtonLink> : undefined} />
      <div className="body">
        <div className="ltop">
          <ListSearch path={path} params={params} label="Search engines" placeholder="Name or code" selects={[{ name: 'sort', label: 'Order', choices: sorts }]} />
          <StateLinks path={path} params={params} label="Which engines" states={states} />
        </div>
        <RefreshNote problem={problem} readAt={readAt} retry={retry} />
        {rows.length > 0
          ? <RuledList label="Engines">{rows.map((row) => <EngineRow key={row.id} row={row} system={system} restore={restore} next={listAddress(path, params)} />)}</RuledList>
          : <NoEngine isFiltered={isFiltered || params.cursor !== undefined} isArchive={isArchive} canWrite={canWrite} />}
        <ListPager path={path} params={params} count={rows.length} nextCursor={nextCursor} of="engines" />
      </div>
    </>
  )
}

function EngineRow({ row, system, restore, next }: { row: EngineDto, system: UnitSystem, restore?: FormAction, next: string }) {
  const { spec, scenarioCount, archivedAt } = row
  return (
    <RuledRow
      right={(
        <span className="lright">
          {archivedAt && restore ? <ActForm action={restore} fields={{ id: row.id, next }} size="small">Restore</ActForm> : null}
          {scenarioCount > 0
            ? <TextLink className="font-normal" href={`/scenarios?engineId=${row.id}`}>{scenarioCount} {scenarioCount === 1 ? 'scenario' : 'scenarios'}</TextLink>
            : <small>no scenario yet</small>}
        </span>
      )}
    >
      <TextLink href={`/engines/${row.id}`}>{row.name}</TextLink>
      <small>
        {row.code}, {spec.cylinders} {spec.cylinders === 1 ? 'cylinder' : 'cylinders'}, {formatQuantityText(displacementCc(spec), 'displacement', system)}, {formatQuantityText(spec.ratedPowerKw, 'power', system)} at {formatQuantityText(spec.ratedRpm, 'engineSpeed', system)}; changed <TimeAt iso={row.updatedAt} />.
        {archivedAt ? <> Archived <TimeAt iso={archivedAt} />.</> : null}
      </small>
    </RuledRow>
  )
}

function NoEngine({ isFiltered, isArchive, canWrite }: { isFiltered: boolean, isArchive: boolean, canWrite: boolean }) {
  if (isFiltered) return <EmptyNote level={2} title="Nothing fits this search"><p>Every word must stand in the name or the code. <TextLink href={isArchive ? `${path}?state=archived` : path}>Show them all</TextLink></p></EmptyNote>
  if (isArchive) return <EmptyNote level={2} title="The archive is empty"><p>An engine that is archived leaves the lists; its scenarios stay readable, and it can be restored from here.</p></EmptyNote>
  return (
    <EmptyNote level={2} title="Every scenario stands on an engine">
      <p>Its cylinders and firing order, its geometry, what power it makes and how it turns are typed in once. {canWrite ? <TextLink href="/engines/new">Lay out the first engine</TextLink> : 'A designer or the owner lays out the first.'}</p>
    </EmptyNote>
  )
}
