/** First page, a later page and a search among 10 000 scenarios in the data layer, median ms; printed as JSON. DATABASE_URL names a database of its own. */
import { closeAuthPool } from '@/lib/auth/pool'
import { findActor } from '@/lib/data/people/find-actor'
import { listScenarios } from '@/lib/data/scenarios/list-scenarios'
import { closeOrm, newEm } from '@/lib/data/support/orm'
import { fillScenarios } from '../scripts/lib/fill-scenarios'

const count = 10_000
const runs = 40

const median = (values: number[]) => [...values].sort((one, other) => one - other)[Math.floor(values.length / 2)] ?? NaN

async function timeOf(work: () => Promise<unknown>): Promise<number> {
  const times: number[] = []
  for (let i = 0; i < runs; i += 1) {
    const from = performance.now()
    await work()
    times.push(performance.now() - from)
  }
  return median(times.slice(5))
}

const em = await newEm()
const [designer] = await em.execute<{ user_id: string, shop_id: string }[]>(`select user_id, shop_id from memberships where role = 'designer' limit 1`)
const actor = designer ? await findActor(designer.user_id, designer.shop_id) : null
if (!actor) throw new Error('The demo has no designer.')
await fillScenarios(em, actor.shop.id, count)
const first = await listScenarios(actor, {})
const result = {
  first: await timeOf(() => listScenarios(actor, {})),
  next: await timeOf(() => listScenarios(actor, { cursor: first.nextCursor ?? undefined })),
  byTitle: await timeOf(() => listScenarios(actor, { sort: 'title' })),
  search: await timeOf(() => listScenarios(actor, { search: 'climb' })),
}
console.log(JSON.stringify(result))
await closeAuthPool()
await closeOrm()
