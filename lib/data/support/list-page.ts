import 'server-only'
import type { EntityManager } from '@mikro-orm/postgresql'
import { z } from 'zod'
import { AppError } from '@/lib/errors'
import type { Asked } from '@/lib/schemas/list-query'
import { likePattern, searchWords } from './search-text'

/** Rows of a page. */
const pageSize = 50

/** How a list is sorted: expressions over the table as `page`, the id last; `from` reads a row's place in that order. */
export type Order<Row> = {
  columns: string[]
  direction: 'asc' | 'desc'
  /** Kinds of the values a cursor holds, in the order of the columns. */
  place: z.ZodType<unknown[]>
  from: (row: Row) => unknown[]
}

export type Condition = { sql: string, values?: unknown[] }

/** The query of an address through its schema; what does not fit is told as a sentence at its name. */
export function readQuery<S extends z.ZodType>(schema: S, asked: Asked<z.input<S>>): z.output<S> {
  const parsed = schema.safeParse(asked)
  if (parsed.success) return parsed.data
  throw new AppError('badAddress', { fieldErrors: Object.fromEntries(parsed.error.issues.map(({ path, message }) => [path.join('.'), message])) })
}

const writeCursor = (sort: string, place: unknown[]): string => Buffer.from(JSON.stringify([sort, ...place])).toString('base64url')

/** The place a cursor names in this order. A cursor of another order, or one that somebody changed, is told so. */
function readCursor<Row>(cursor: string, sort: string, order: Order<Row>): unknown[] {
  try {
    const [of, ...place] = JSON.parse(Buffer.from(cursor, 'base64url').toString()) as unknown[]
    const parsed = order.place.safeParse(place)
    if (of === sort && parsed.success) return parsed.data
  } catch {
    // Told below like any other address that is not ours.
  }
  throw new AppError('badAddress', { fieldErrors: { cursor: 'This address does not lead to a page of the list.' } })
}

/**
 * A condition for each word typed. The index of a text finds words of three characters or more; a shorter one is looked for in
 * the rows as the list's own order brings them, in a form of which the planner does not guess that it is rare.
 */
export const searchConditions = (column: string, typed: string): Condition[] =>
  searchWords(typed).map((word) => (word.length < 3
    ? { sql: `strpos(${column}, ?) > 0`, values: [word] }
    : { sql: `${column} like ?`, values: [likePattern(word)] }))

/**
 * One page by key: the rows after the cursor's place in an order that ends in the id, so that none is lost or repeated however
 * many share a value. The rows are picked in a query of their own (`pick`: columns and table, called page) before anything is
 * joined to them (`complete`: from page).
 */
export async function listPage<Row extends object>(em: EntityManager, list: {
  pick: string
  where: Condition[]
  complete: string
  sort: string
  order: Order<Row>
  cursor: string | undefined
}): Promise<{ rows: Row[], nextCursor: string | null }> {
  const { order, sort, cursor } = list
  const where = [...list.where]
  if (cursor !== undefined) {
    const place = readCursor(cursor, sort, order)
    const marks = place.map(() => '?').join(', ')
    where.push({ sql: `(${order.columns.join(', ')}) ${order.direction === 'desc' ? '<' : '>'} (${marks})`, values: place })
  }
  const by = order.columns.map((column) => `${column} ${order.direction}`).join(', ')
  const sql = `with page as materialized (
    ${list.pick} where ${where.map((condition) => condition.sql).join(' and ')} order by ${by} limit ${pageSize + 1}
  ) ${list.complete} order by ${by}`
  const found = await em.execute<Row[]>(sql, where.flatMap((condition) => condition.values ?? []))
  const rows = found.slice(0, pageSize)
  const last = rows.at(-1)
  return { rows, nextCursor: found.length > pageSize && last ? writeCursor(sort, order.from(last)) : null }
}

/** The driver gives times as text here; out goes ISO 8601. */
export const isoOf = (time: string | Date): string => new Date(time).toISOString()
export const isoOrNull = (time: string | Date | null): string | null => (time === null ? null : isoOf(time))
