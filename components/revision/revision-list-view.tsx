'use client'

import { ChooseTwo } from './choose-two'
import { ListPager } from '@/components/lists/list-pager'
import { RefreshNote } from '@/components/lists/refresh-note'
import { RowVerdict } from '@/components/lists/row-verdict'
import { TimeAt } from '@/components/lists/time-at'
import { useFresh } from '@/components/lists/use-fresh'
import { PageHead } from '@/components/shell/page-head'
import { ButtonLink, TextLink } from '@/components/ui/button'
import { RuledList, RuledRow } from '@/components/ui/ruled-list'
import { listAddress, type ListParams } from '@/lib/list-address'
import type { RevisionList } from '@/lib/schemas/revision-dto'
import { headLine } from '@/lib/words/findings'

interface RevisionListViewProps {
  scenario: { id: string, code: string, title: string, current: number }
  initial: RevisionList
  params: ListParams
}

/** Every save of a scenario, newest first. */
export function RevisionListView({ scenario: { id, code, title, current: known }, initial, params }: RevisionListViewProps) {
  const path = `/scenarios/${id}/revisions`
  const { data, problem, readAt, retry } = useFresh(listAddress(`/api/scenarios/${id}/revisions`, params, { cursor: params.cursor ?? null }), initial)
  const { rows, nextCursor } = data
  // Someone may have saved since the page came: the newest row of the first page is the current one.
  const current = params.cursor ? known : Math.max(known, ...rows.map(({ number }) => number))
  return (
    <>
      <PageHead
        over={<>Scenario {code} · revisions</>} title={`${current} ${current === 1 ? 'revision' : 'revisions'} of “${title}”`}
        actions={<ButtonLink href={`/scenarios/${id}`}>Open the sheet</ButtonLink>}
      />
      <div className="body">
        <div className="ltop">{current > 1 ? <ChooseTwo action={`${path}/compare`} current={current} left={current - 1} right={current} /> : <p className="fine py-3">With a second revision, two can be compared.</p>}</div>
        <RefreshNote problem={problem} readAt={readAt} retry={retry} />
        <RuledList label="Revisions">
          {rows.map((row) => (
            <RuledRow
              key={row.number} mark={<RowVerdict counts={row.counts} />}
              right={(
                <span className="lright">
                  {row.releasedAt ? <TextLink href={`/plans/${id}/${row.number}`}>plan {code}.{row.number}</TextLink> : null}
                  {row.number === current ? <small>current</small> : <TextLink className="font-normal" href={`${path}/compare?left=${row.number}&right=${current}`}>compare with the current one</TextLink>}
                </span>
              )}
            >
              <TextLink href={`${path}/${row.number}`}>Revision {row.number}{row.title === title ? '' : `, ${row.title}`}</TextLink>
              <small>
                <TimeAt iso={row.createdAt} />, {row.author.name}. {headLine(row.counts)}.
                {row.releasedAt ? <> Released <TimeAt iso={row.releasedAt} />{row.releasedBy ? ` by ${row.releasedBy.name}` : ''}.</> : null}
              </small>
            </RuledRow>
          ))}
        </RuledList>
        <ListPager path={path} params={params} count={rows.length} nextCursor={nextCursor} of="revisions" />
      </div>
    </>
  )
}
