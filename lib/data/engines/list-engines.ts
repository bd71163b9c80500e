import 'server-only'
import { z } from 'zod'
import type { Actor } from '@/lib/auth/actor'
import { engineList, type EngineList } from '@/lib/schemas/engine-dto'
import { engineListQuery, type Asked, type EngineListQuery } from '@/lib/schemas/list-query'
import { authorise } from '../support/authorise'
import { toDto } from '../support/dto'
import { isoOf, isoOrNull, listPage, readQuery, searchConditions, type Order } from '../support/list-page'
import { newEm } from '../support/orm'

type Row = { id: string, name: string, code: string, spec: unknown, version: number, archived_at: string | null, updated_at: string, scenario_count: string }

const text = z.tuple([z.string(), z.uuid()])
const orders: Record<NonNullable<EngineListQuery['sort']>, Order<Row>> = {
  updated: { columns: ['page.updated_at', 'page.id'], direction: 'desc', place: z.tuple([z.iso.datetime(), z.uuid()]), from: (row) => [isoOf(row.updated_at), row.id] },
  name: { columns: ['page.name collate "natural_order"', 'page.id'], direction: 'asc', place: text, from: (row) => [row.name, row.id] },
  code: { columns: ['page.code collate "natural_order"', 'page.id'], direction: 'asc', place: text, from: (row) => [row.code, row.id] },
}

/** A page of the shop's engines. */
export async function listEngines(actor: Actor, asked: Asked<EngineListQuery> = {}): Promise<EngineList> {
  const em = await newEm()
  await authorise(em, actor, 'engine.read')
  const { search, state, sort, cursor } = readQuery(engineListQuery, asked)
  const { rows, nextCursor } = await listPage<Row>(em, {
    pick: 'select page.* from engines page',
    where: [
      { sql: 'page.shop_id = ?', values: [actor.shop.id] },
      { sql: `page.archived_at is ${state === 'archived' ? 'not null' : 'null'}` },
      ...searchConditions('page.search', search),
    ],
    complete: `select page.id, page.name, page.code, page.spec, page.version, page.archived_at, page.updated_at,
      (select count(*) from scenarios where scenarios.engine_id = page.id) as scenario_count from page`,
    sort, order: orders[sort], cursor,
  })
  return toDto(engineList, {
    nextCursor,
    rows: rows.map((row) => ({
      ...row, scenarioCount: Number(row.scenario_count), archivedAt: isoOrNull(row.archived_at), updatedAt: isoOf(row.updated_at),
    })),
  })
}
