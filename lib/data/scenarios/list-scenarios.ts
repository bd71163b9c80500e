import 'server-only'
import { z } from 'zod'
import type { Actor } from '@/lib/auth/actor'
import { scenarioListQuery, type Asked, type ScenarioListQuery } from '@/lib/schemas/list-query'
import { scenarioList, type ScenarioList } from '@/lib/schemas/scenario-dto'
import { authorise } from '../support/authorise'
import { toDto } from '../support/dto'
import { isoOf, isoOrNull, listPage, readQuery, searchConditions, type Condition, type Order } from '../support/list-page'
import { newEm } from '../support/orm'
import { scenarioScope } from '../support/scenario-records'

type Row = {
  id: string, code: string, title: string, owner_id: string, owner_name: string, engine_id: string, engine_name: string, engine_code: string
  current_revision: number, outside_count: number, close_count: number, within_count: number, released_revision: number | null
  archived_at: string | null, updated_at: string
}

const time = z.iso.datetime()
const text = z.tuple([z.string(), z.uuid()])
// Each order is an index of the table.
const orders: Record<NonNullable<ScenarioListQuery['sort']>, Order<Row>> = {
  updated: { columns: ['page.updated_at', 'page.id'], direction: 'desc', place: z.tuple([time, z.uuid()]), from: (row) => [isoOf(row.updated_at), row.id] },
  title: { columns: ['page.title collate "natural_order"', 'page.id'], direction: 'asc', place: text, from: (row) => [row.title, row.id] },
  code: { columns: ['page.code collate "natural_order"', 'page.id'], direction: 'asc', place: text, from: (row) => [row.code, row.id] },
  outside: {
    columns: ['page.outside_count', 'page.updated_at', 'page.id'], direction: 'desc',
    place: z.tuple([z.int32(), time, z.uuid()]), from: (row) => [row.outside_count, isoOf(row.updated_at), row.id],
  },
}

const states: Record<NonNullable<ScenarioListQuery['state']>, Condition[]> = {
  active: [{ sql: 'page.archived_at is null' }],
  archived: [{ sql: 'page.archived_at is not null' }],
  released: [{ sql: 'page.archived_at is null' }, { sql: 'page.released_revision is not null' }],
  outside: [{ sql: 'page.archived_at is null' }, { sql: 'page.outside_count > 0' }],
}

/** A page of the scenarios the actor may read: the shop's, or a builder's own. */
export async function listScenarios(actor: Actor, asked: Asked<ScenarioListQuery> = {}): Promise<ScenarioList> {
  const em = await newEm()
  const { role } = await authorise(em, actor, 'scenario.read', 'scenario.readOwn')
  const { search, engineId, state, sort, cursor } = readQuery(scenarioListQuery, asked)
  const { shop, owner } = scenarioScope(actor, role, 'scenario.read')
  const { rows, nextCursor } = await listPage<Row>(em, {
    pick: 'select page.* from scenarios page',
    where: [
      { sql: 'page.shop_id = ?', values: [shop] },
      ...(owner ? [{ sql: 'page.owner_id = ?', values: [owner] }] : []),
      ...(engineId ? [{ sql: 'page.engine_id = ?', values: [engineId] }] : []),
      ...states[state],
      ...searchConditions('page.search', search),
    ],
    complete: `select page.id, page.code, page.title, page.current_revision, page.outside_count, page.close_count, page.within_count,
      page.released_revision, page.archived_at, page.updated_at, owners.id as owner_id, owners.name as owner_name,
      engines.id as engine_id, engines.name as engine_name, engines.code as engine_code
      from page join users owners on owners.id = page.owner_id join engines on engines.id = page.engine_id`,
    sort, order: orders[sort], cursor,
  })
  return toDto(scenarioList, {
    nextCursor,
    rows: rows.map((row) => ({
      id: row.id, code: row.code, title: row.title,
      owner: { id: row.owner_id, name: row.owner_name },
      engine: { id: row.engine_id, name: row.engine_name, code: row.engine_code },
      counts: { outside: row.outside_count, close: row.close_count, within: row.within_count },
      currentRevision: row.current_revision, releasedRevision: row.released_revision,
      archivedAt: isoOrNull(row.archived_at), updatedAt: isoOf(row.updated_at),
    })),
  })
}
