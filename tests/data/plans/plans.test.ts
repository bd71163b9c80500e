import { beforeAll, expect, test } from 'vitest'
import { Shop } from '@/entities/index'
import { roles } from '@/lib/auth/roles'
import { defaultLimits } from '@/lib/calc/limits'
import { getPlan } from '@/lib/data/plans/get-plan'
import { listPlans } from '@/lib/data/plans/list-plans'
import { releaseRevision } from '@/lib/data/plans/release-revision'
import { archiveScenario } from '@/lib/data/scenarios/archive-scenario'
import { getScenario } from '@/lib/data/scenarios/get-scenario'
import { saveScenario } from '@/lib/data/scenarios/save-scenario'
import { createActor, createCast, createShop, type Cast } from '../support/actors'
import { freshDatabase } from '../support/fresh-database'
import { aScenario, anEngine, sheet, sheetOutside } from '../support/records'
import { refusalOf } from '../support/refusal'

const database = freshDatabase()
let cast: Cast
beforeAll(async () => {
  cast = await createCast(database.orm)
})

/** Reasons for everything outside in the revision. */
const reasonsOf = ({ results }: { results: { findings: { id: string, verdict: string }[] } }) =>
  Object.fromEntries(results.findings.filter((one) => one.verdict === 'outside').map((one) => [one.id, `Bench-proved on the unit itself: ${one.id}`]))

test('a released revision is a plan that every role of the shop reads, and nobody else', async () => {
  const engine = await anEngine(cast.author, { code: 'P260' })
  const { id, revision } = await aScenario(cast.author, cast.author, { engine })
  expect((await refusalOf(getPlan(cast.author, id, 1))).code).toBe('notFound')
  const plan = await releaseRevision(cast.actors.designer, id, 1, { reasons: { stray: 'of a finding that is within its limit' } })
  expect(plan).toEqual({
    ...revision, code: 'P260-01.1', limits: defaultLimits, releasedAt: expect.any(String),
    releasedBy: { id: cast.actors.designer.userId, name: 'A designer' }, releaseReasons: {},
  })
  for (const role of roles) expect(await getPlan(cast.actors[role], id, 1)).toEqual(plan)
  expect(await refusalOf(getPlan(cast.neighbour, id, 1))).toMatchObject({ code: 'notFound', message: expect.stringContaining('no such plan') })
  expect(await getScenario(cast.author, id)).toMatchObject({ releasedRevision: 1, revision: { releasedAt: plan.releasedAt } })
})

test('a finding outside its limit needs a written reason, each its own', async () => {
  const { id, revision } = await aScenario(cast.author, cast.author, { sheet: sheetOutside() })
  const reasons = reasonsOf(revision)
  const ids = Object.keys(reasons)
  expect(ids.length).toBeGreaterThan(0)
  const without = await refusalOf(releaseRevision(cast.author, id, 1, {}))
  expect(without).toMatchObject({ code: 'invalid', status: 422 })
  expect(Object.keys(without.fieldErrors ?? {}).sort()).toEqual(ids.map((one) => `reason.${one}`).sort())
  const short = { ...reasons, [ids[0] ?? '']: '   too few   ' }
  expect((await refusalOf(releaseRevision(cast.author, id, 1, { reasons: short }))).fieldErrors).toEqual({ [`reason.${ids[0]}`]: expect.stringContaining('10 characters') })
  expect((await getScenario(cast.author, id)).releasedRevision).toBeNull()
  expect((await releaseRevision(cast.author, id, 1, { reasons })).releaseReasons).toEqual(reasons)
})

test('a shop may forbid releases with something outside; what lies within still goes', async () => {
  const shop = await createShop(database.orm)
  await database.orm.em.fork().nativeUpdate(Shop, shop.id, { releasesOutsideAllowed: false })
  const designer = await createActor(database.orm, shop, 'designer')
  const { id, revision } = await aScenario(designer, designer, { sheet: sheetOutside() })
  expect(await refusalOf(releaseRevision(designer, id, 1, { reasons: reasonsOf(revision) }))).toMatchObject({ code: 'releaseRefused', status: 422 })
  await saveScenario(designer, id, { baseRevision: 1, engineVersion: 1, title: 'Within', sheet: sheet() })
  expect((await releaseRevision(designer, id, 2, {})).number).toBe(2)
})

test('a plan is released once, of any revision, and not of an archived scenario', async () => {
  const { id } = await aScenario(cast.author, cast.author)
  await saveScenario(cast.author, id, { baseRevision: 1, engineVersion: 1, title: 'Second', sheet: sheet() })
  const two = await Promise.allSettled([releaseRevision(cast.author, id, 2, {}), releaseRevision(cast.actors.owner, id, 2, {})])
  expect(two.map((one) => one.status).sort()).toEqual(['fulfilled', 'rejected'])
  expect(await refusalOf(releaseRevision(cast.author, id, 2, {}))).toMatchObject({ code: 'alreadyReleased' })
  await releaseRevision(cast.author, id, 1, {})
  expect((await getScenario(cast.author, id)).releasedRevision).toBe(1)
  for (const number of [0, 3, Number.NaN]) expect((await refusalOf(releaseRevision(cast.author, id, number, {}))).code).toBe('notFound')
  await saveScenario(cast.author, id, { baseRevision: 2, engineVersion: 1, title: 'Third', sheet: sheet() })
  await archiveScenario(cast.author, id)
  expect(await refusalOf(releaseRevision(cast.author, id, 3, {}))).toMatchObject({ code: 'archived' })
  expect((await getPlan(cast.actors.technician, id, 2)).title).toBe('Second') // an archived scenario's plans stay readable
})

test('the list holds released revisions only, newest first, found by code, title and engine', async () => {
  const designer = await createActor(database.orm, await createShop(database.orm), 'designer')
  const engine = await anEngine(designer, { code: 'R260', name: 'Six 100%' })
  const one = await aScenario(designer, designer, { engine, title: 'Climb' })
  const two = await aScenario(designer, designer, { engine, title: 'Cruise_' })
  await saveScenario(designer, one.id, { baseRevision: 1, engineVersion: 1, title: 'Climb again', sheet: sheet() })
  for (const [id, number] of [[one.id, 1], [two.id, 1], [one.id, 2]] as const) await releaseRevision(designer, id, number, {})
  await aScenario(designer, designer, { engine, title: 'Draft' })
  const found = async (search = '') => (await listPlans(designer, { search })).rows.map((row) => row.code)
  expect(await found()).toEqual(['R260-01.2', 'R260-02.1', 'R260-01.1'])
  expect(await found('climb')).toEqual(['R260-01.2', 'R260-01.1'])
  expect(await found('_')).toEqual(['R260-02.1'])
  expect(await found('100% r260-01')).toEqual(['R260-01.2', 'R260-01.1'])
  expect(await found('draft')).toEqual([])
  expect((await listPlans(designer)).rows[0]).toEqual({
    scenarioId: one.id, number: 2, code: 'R260-01.2', title: 'Climb again', engine: { name: 'Six 100%', code: 'R260' },
    counts: expect.objectContaining({ outside: 0 }), author: { id: designer.userId, name: designer.name },
    releasedAt: expect.any(String), releasedBy: { id: designer.userId, name: designer.name },
  })
})
