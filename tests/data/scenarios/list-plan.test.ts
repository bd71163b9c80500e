import { beforeAll, expect, test } from 'vitest'
import type { Actor } from '@/lib/auth/actor'
import { listPlans } from '@/lib/data/plans/list-plans'
import { releaseRevision } from '@/lib/data/plans/release-revision'
import { listRevisions } from '@/lib/data/scenarios/list-revisions'
import { listScenarios } from '@/lib/data/scenarios/list-scenarios'
import type { ScenarioListQuery } from '@/lib/schemas/list-query'
import { fillScenarios } from '@/scripts/lib/fill-scenarios'
import { createActor, createCast, type Cast } from '../support/actors'
import { explainAll } from '../support/explain'
import { freshDatabase } from '../support/fresh-database'
import { aScenario } from '../support/records'

const database = freshDatabase()
let cast: Cast
let first: string
beforeAll(async () => {
  cast = await createCast(database.orm)
  first = (await aScenario(cast.author, cast.author)).id
  await fillScenarios(database.orm.em.fork(), cast.shop.id, 10_000)
}, 120_000)

const walked = /Seq Scan on (scenarios|revisions)/

test.each([
  {}, { sort: 'title' }, { sort: 'code' }, { sort: 'outside' },
  { state: 'archived' }, { state: 'archived', sort: 'title' }, { state: 'released' }, { state: 'outside' }, { state: 'outside', sort: 'outside' },
  { search: 'winter' }, { search: 'nothing like it' }, { search: 'trial 17', sort: 'title' }, { search: '-9', state: 'outside' }, { search: 'x1' }, { search: 'q z' },
] as ScenarioListQuery[])('10 000 scenarios, %j: an index leads to every page', async (query) => {
  for (const actor of [cast.author, cast.actors.builder]) {
    let cursor: string | undefined
    const plans = await explainAll(async () => {
      cursor = (await listScenarios(actor, query)).nextCursor ?? undefined
    })
    const next = cursor ? await explainAll(() => listScenarios(actor, { ...query, cursor })) : []
    expect(plans.length + next.length).toBeGreaterThan(0)
    for (const plan of [...plans, ...next]) expect(plan).not.toMatch(walked)
  }
})

test('of one engine, of one scenario’s revisions, and of plans likewise', async () => {
  await releaseRevision(cast.author, first, 1, {})
  const row = (await listScenarios(cast.author)).rows[0]
  const reads = [
    () => listScenarios(cast.author, { engineId: row?.engine.id }),
    () => listRevisions(cast.author, first),
    () => listPlans(cast.author),
    () => listPlans(cast.author, { search: 'climb' }),
  ]
  for (const read of reads) for (const plan of await explainAll(read)) expect(plan).not.toMatch(walked)
})

test('the rows of a page are picked by index order, not sorted out of all of them', async () => {
  const order = async (actor: Actor, query: ScenarioListQuery) => (await explainAll(() => listScenarios(actor, query))).join('\n')
  for (const [sort, index] of [['updated', 'updated'], ['title', 'title'], ['code', 'code'], ['outside', 'outside']] as const)
    expect(await order(cast.author, { sort })).toContain(`scenarios_${index}_index`)
  const newcomer = await createActor(database.orm, cast.shop, 'builder')
  await aScenario(newcomer, cast.author)
  expect(await order(newcomer, {})).toContain('scenarios_owner_index')
  expect(await order(cast.author, { search: 'nothing like it' })).toContain('scenarios_search_index')
})
