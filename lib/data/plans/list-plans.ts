import 'server-only'
import { z } from 'zod'
import type { Actor } from '@/lib/auth/actor'
import { planListQuery, type Asked, type PlanListQuery } from '@/lib/schemas/list-query'
import { planList, type PlanList } from '@/lib/schemas/plan-dto'
import { authorise } from '../support/authorise'
import { toDto } from '../support/dto'
import { isoOf, listPage, readQuery, searchConditions, type Order } from '../support/list-page'
import { newEm } from '../support/orm'
import { planCode } from '../support/plan-records'

type Row = {
  id: string, scenario_id: string, scenario_code: string, number: number, title: string, engine_name: string, engine_code: string
  outside_count: number, close_count: number, within_count: number
  author_id: string, author_name: string, released_at: string, releaser_id: string, releaser_name: string
}

const newestFirst: Order<Row> = {
  columns: ['page.released_at', 'page.id'], direction: 'desc', place: z.tuple([z.iso.datetime(), z.uuid()]), from: (row) => [isoOf(row.released_at), row.id],
}

/** A page of the shop's released plans, the one released last first. Every role reads them. */
export async function listPlans(actor: Actor, asked: Asked<PlanListQuery> = {}): Promise<PlanList> {
  const em = await newEm()
  await authorise(em, actor, 'plan.read')
  const { search, cursor } = readQuery(planListQuery, asked)
  const { rows, nextCursor } = await listPage<Row>(em, {
    pick: `select page.id, page.scenario_id, page.number, page.title, page.engine, page.outside_count, page.close_count, page.within_count,
      page.author_id, page.released_at, page.released_by_id from revisions page`,
    where: [
      { sql: 'page.shop_id = ?', values: [actor.shop.id] },
      { sql: 'page.released_at is not null' },
      ...searchConditions('page.search', search),
    ],
    complete: `select page.id, page.scenario_id, page.number, page.title, page.outside_count, page.close_count, page.within_count, page.released_at,
      page.engine ->> 'name' as engine_name, page.engine ->> 'code' as engine_code, scenarios.code as scenario_code,
      authors.id as author_id, authors.name as author_name, releasers.id as releaser_id, releasers.name as releaser_name
      from page join scenarios on scenarios.id = page.scenario_id
      join users authors on authors.id = page.author_id join users releasers on releasers.id = page.released_by_id`,
    sort: 'released', order: newestFirst, cursor,
  })
  return toDto(planList, {
    nextCursor,
    rows: rows.map((row) => ({
      scenarioId: row.scenario_id, number: row.number, code: planCode(row.scenario_code, row.number), title: row.title,
      engine: { name: row.engine_name, code: row.engine_code },
      counts: { outside: row.outside_count, close: row.close_count, within: row.within_count },
      author: { id: row.author_id, name: row.author_name },
      releasedAt: isoOf(row.released_at), releasedBy: { id: row.releaser_id, name: row.releaser_name },
    })),
  })
}
