'use client'

import { ListPager } from './list-pager'
import { ListSearch } from './list-search'
import { RefreshNote } from './refresh-note'
import { RowVerdict } from './row-verdict'
import { TimeAt } from './time-at'
import { useFresh } from './use-fresh'
import { PageHead } from '@/components/shell/page-head'
import { TextLink } from '@/components/ui/button'
import { EmptyNote } from '@/components/ui/note'
import { RuledList, RuledRow } from '@/components/ui/ruled-list'
import { isNarrowed, listAddress, type ListParams } from '@/lib/list-address'
import type { PlanList } from '@/lib/schemas/plan-dto'
import { headLine } from '@/lib/words/findings'
import { countHead } from '@/lib/words/list-heads'

const path = '/plans'

export function PlanListView({ initial, params, canRelease }: { initial: PlanList, params: ListParams, canRelease: boolean }) {
  const { data, problem, readAt, retry } = useFresh(listAddress('/api/plans', params, { cursor: params.cursor ?? null }), initial)
  const { rows, nextCursor } = data
  const isFiltered = isNarrowed(params) || params.cursor !== undefined
  return (
    <>
      <PageHead over="Plans" title={countHead(rows.length, 'plan', { kind: 'released', isFiltered, isPart: nextCursor !== null || params.cursor !== undefined })} />
      <div className="body">
        <div className="ltop"><ListSearch path={path} params={params} label="Search plans" placeholder="Name, code, engine" keep={[]} /></div>
        <RefreshNote problem={problem} readAt={readAt} retry={retry} />
        {rows.length > 0 ? (
          <RuledList label="Plans">
            {rows.map((row) => (
              <RuledRow key={row.code} mark={<RowVerdict counts={row.counts} />} right={<small>{row.engine.name}</small>}>
                <TextLink href={`/plans/${row.scenarioId}/${row.number}`}>{row.code}, {row.title}</TextLink>
                <small>Released <TimeAt iso={row.releasedAt} /> by {row.releasedBy.name}. {headLine(row.counts)}.</small>
              </RuledRow>
            ))}
          </RuledList>
        ) : isFiltered ? (
          <EmptyNote level={2} title="Nothing fits this search"><p>Every word must stand in the name, the code or the engine’s name. <TextLink href={path}>Show them all</TextLink></p></EmptyNote>
        ) : (
          <EmptyNote level={2} title="A plan is one released revision, never changed">
            <p>{canRelease ? <>Release a revision of a <TextLink href="/scenarios">scenario</TextLink>, and every role of the shop reads it here.</> : 'When a designer or the owner releases a revision of a scenario, it stands here for every role of the shop.'}</p>
          </EmptyNote>
        )}
        <ListPager path={path} params={params} count={rows.length} nextCursor={nextCursor} of="plans" />
      </div>
    </>
  )
}
