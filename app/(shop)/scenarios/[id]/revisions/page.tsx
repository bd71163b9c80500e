import type { Metadata } from 'next'
import { ListFailed } from '@/components/lists/list-failed'
import { RevisionListView } from '@/components/revision/revision-list-view'
import { PageHead } from '@/components/shell/page-head'
import { requireActor } from '@/lib/auth/session'
import { getScenario } from '@/lib/data/scenarios/get-scenario'
import { listRevisions } from '@/lib/data/scenarios/list-revisions'
import { listData } from '@/lib/list-data'
import { pageData } from '@/lib/page-data'
import { queryOf } from '@/lib/schemas/list-query'

export const metadata: Metadata = { title: 'Revisions' }

interface RevisionsPageProps {
  params: Promise<{ id: string }>
  searchParams: Promise<Record<string, string | string[] | undefined>>
}

export default async function RevisionsPage({ params, searchParams }: RevisionsPageProps) {
  const [actor, { id }, search] = await Promise.all([requireActor(), params, searchParams])
  const { cursor } = queryOf(search)
  const asked: Record<string, string> = cursor ? { cursor } : {}
  const [{ code, title, revision }, list] = await Promise.all([pageData(() => getScenario(actor, id)), listData(() => listRevisions(actor, id, asked))])
  if (!list.ok) return (
    <>
      <PageHead over={<>Scenario {code} · revisions</>} title="This address does not lead to the list" />
      <div className="body"><ListFailed title="The list was not read" sentence={list.sentence} fieldErrors={list.fieldErrors} href={`/scenarios/${id}/revisions`} /></div>
    </>
  )
  return <RevisionListView scenario={{ id, code, title, current: revision.number }} initial={list.data} params={asked} />
}
