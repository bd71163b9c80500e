import 'server-only'
import { z } from 'zod'
import type { Actor } from '@/lib/auth/actor'
import { revisionListQuery, type Asked, type RevisionListQuery } from '@/lib/schemas/list-query'
import { revisionList, type RevisionList } from '@/lib/schemas/revision-dto'
import { authorise } from '../support/authorise'
import { toDto } from '../support/dto'
import { isoOf, isoOrNull, listPage, readQuery, type Order } from '../support/list-page'
import { newEm } from '../support/orm'
import { findScenario, scenarioScope } from '../support/scenario-records'

type Row = {
  number: number, title: string, author_id: string, author_name: string, outside_count: number, close_count: number, within_count: number
  created_at: string, released_at: string | null, released_by_id: string | null, releaser_name: string | null
}

const newestFirst: Order<Row> = { columns: ['page.number'], direction: 'desc', place: z.tuple([z.int32()]), from: (row) => [row.number] }

/** A page of a scenario's revisions, newest first. */
export async function listRevisions(actor: Actor, id: string, asked: Asked<RevisionListQuery> = {}): Promise<RevisionList> {
  const em = await newEm()
  const { role } = await authorise(em, actor, 'scenario.read', 'scenario.readOwn')
  const scenario = await findScenario(em, scenarioScope(actor, role, 'scenario.read'), id)
  const { cursor } = readQuery(revisionListQuery, asked)
  const { rows, nextCursor } = await listPage<Row>(em, {
    pick: `select page.number, page.title, page.author_id, page.outside_count, page.close_count, page.within_count, page.created_at,
      page.released_at, page.released_by_id from revisions page`,
    where: [{ sql: 'page.scenario_id = ?', values: [scenario.id] }],
    complete: `select page.*, authors.name as author_name, releasers.name as releaser_name
      from page join users authors on authors.id = page.author_id left join users releasers on releasers.id = page.released_by_id`,
    sort: 'number', order: newestFirst, cursor,
  })
  return toDto(revisionList, {
    nextCursor,
    rows: rows.map((row) => ({
      number: row.number, title: row.title,
      author: { id: row.author_id, name: row.author_name },
      counts: { outside: row.outside_count, close: row.close_count, within: row.within_count },
      createdAt: isoOf(row.created_at), releasedAt: isoOrNull(row.released_at),
      releasedBy: row.released_by_id ? { id: row.released_by_id, name: row.releaser_name } : null,
    })),
  })
}
