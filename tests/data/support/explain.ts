import { getOrm } from '@/lib/data/support/orm'

/** The plan of each page query (`with page as …`) that `read` sends, with the values it sent. */
export async function explainAll(read: () => Promise<unknown>): Promise<string[]> {
  const { em } = await getOrm()
  const connection = em.getConnection()
  const knex = connection.getKnex()
  const sent: { sql: string, bindings: unknown[] }[] = []
  const note = (query: { sql: string, bindings?: unknown[] }) => {
    if (query.sql.startsWith('with page as')) sent.push({ sql: query.sql, bindings: query.bindings ?? [] })
  }
  knex.on('query', note)
  try {
    await read()
  } finally {
    knex.off('query', note)
  }
  if (sent.length === 0) throw new Error('no page query was seen')
  const plans: string[] = []
  for (const { sql, bindings } of sent) {
    const rows = await connection.execute<Record<string, string>[]>(`explain ${sql.replace(/\$\d+/g, '?')}`, bindings)
    plans.push(rows.map((row) => row['QUERY PLAN']).join('\n'))
  }
  return plans
}
