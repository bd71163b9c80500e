import { beforeAll, expect, test } from 'vitest'
import { Scenario } from '@/entities/index'
import { archiveEngine } from '@/lib/data/engines/archive-engine'
import { updateEngine } from '@/lib/data/engines/update-engine'
import { archiveScenario, restoreScenario } from '@/lib/data/scenarios/archive-scenario'
import { createScenario } from '@/lib/data/scenarios/create-scenario'
import { duplicateScenario } from '@/lib/data/scenarios/duplicate-scenario'
import { evaluateForActor } from '@/lib/data/scenarios/evaluate-for-actor'
import { getRevision } from '@/lib/data/scenarios/get-revision'
import { getScenario } from '@/lib/data/scenarios/get-scenario'
import { listRevisions } from '@/lib/data/scenarios/list-revisions'
import { saveScenario } from '@/lib/data/scenarios/save-scenario'
import { createCast, type Cast } from '../support/actors'
import { freshDatabase } from '../support/fresh-database'
import { aScenario, anEngine, engineSpec, sheet, sheetOutside } from '../support/records'
import { refusalOf } from '../support/refusal'

const database = freshDatabase()
let cast: Cast
beforeAll(async () => {
  cast = await createCast(database.orm)
})

test('a new scenario is numbered after its engine and holds its first revision', async () => {
  const engine = await anEngine(cast.author, { code: 'N260' })
  const made = await aScenario(cast.actors.builder, cast.author, { engine })
  expect(made).toMatchObject({
    code: 'N260-01', title: 'Climb timing', owner: { id: cast.actors.builder.userId, name: 'A builder' }, archivedAt: null, releasedRevision: null,
    engine: { ...engine, scenarioCount: 1 }, engineChanged: false, canWrite: true, canRelease: false,
    revision: { number: 1, sheet: sheet(), sheetVersion: 2, engineVersion: 1, engine: { name: engine.name, code: 'N260', spec: engineSpec }, releaseReasons: null },
  })
  expect(made.revision.results.findings.length).toBe(Object.values(made.revision.results.counts).reduce((sum, count) => sum + count, 0))
  expect(await getScenario(cast.author, made.id)).toEqual({ ...made, canRelease: true })
  expect((await refusalOf(getScenario(cast.neighbour, made.id))).code).toBe('notFound')
})

test('of many made at once none shares a number and none is skipped', async () => {
  const engine = await anEngine(cast.author, { code: 'M260' })
  await refusalOf(aScenario(cast.author, cast.author, { engine, title: '' })) // a failed one takes no number
  const all = await Promise.all(Array.from({ length: 12 }, () => aScenario(cast.author, cast.author, { engine })))
  expect(all.map((one) => one.code).sort()).toEqual(Array.from({ length: 12 }, (_, i) => `M260-${String(i + 1).padStart(2, '0')}`))
})

test('on an engine changed, archived, or of another shop nothing is made', async () => {
  const engine = await anEngine(cast.author)
  const input = { engineId: engine.id, engineVersion: 1, title: 'New', sheet: sheet() }
  expect((await refusalOf(createScenario(cast.neighbour, input))).code).toBe('notFound')
  const changed = await updateEngine(cast.author, engine.id, { ...engine, name: 'New name' })
  expect(await refusalOf(createScenario(cast.author, input))).toMatchObject({ code: 'engineChanged', conflict: changed })
  await archiveEngine(cast.author, engine.id)
  expect((await refusalOf(createScenario(cast.author, { ...input, engineVersion: 2 }))).code).toBe('engineGone')
  expect((await refusalOf(createScenario(cast.author, { ...input, engineId: 'none' }))).code).toBe('notFound')
  expect(await database.orm.em.fork().count(Scenario, { engine: engine.id })).toBe(0)
})

test('a duplicate starts from the revision named, belongs to who made it, and is evaluated on the engine as it is now', async () => {
  const engine = await anEngine(cast.author)
  const source = await aScenario(cast.author, cast.author, { engine, title: 'First' })
  await saveScenario(cast.author, source.id, { baseRevision: 1, engineVersion: 1, title: 'Second', sheet: sheetOutside() })
  await updateEngine(cast.author, engine.id, { ...engine, spec: { ...engineSpec, maxRpm: 2850 } })
  const current = await duplicateScenario(cast.actors.owner, source.id)
  expect(current).toMatchObject({ code: `${engine.code}-02`, title: 'Copy of Second', owner: { id: cast.actors.owner.userId }, engineChanged: false })
  expect(current.revision).toMatchObject({ number: 1, sheet: sheetOutside(), engineVersion: 2, engine: { spec: { maxRpm: 2850 } } })
  expect(await duplicateScenario(cast.author, source.id, { revision: 1 })).toMatchObject({ code: `${engine.code}-03`, title: 'Copy of First', revision: { sheet: sheet() } })
  for (const revision of [0, 3, -1, 1.5, Number.NaN, 2 ** 31]) expect((await refusalOf(duplicateScenario(cast.author, source.id, { revision }))).code).toBe('notFound')
  await archiveEngine(cast.author, engine.id)
  expect((await refusalOf(duplicateScenario(cast.author, source.id))).code).toBe('engineGone')
})

test('archived and back: nothing of it is lost, and the first time counts', async () => {
  const { id, ...made } = await aScenario(cast.author, cast.author)
  const archived = await archiveScenario(cast.author, id)
  expect(archived).toEqual({ id, ...made, archivedAt: expect.any(String), canWrite: false, canRelease: false })
  expect(await archiveScenario(cast.author, id)).toEqual(archived)
  expect(await getScenario(cast.author, id)).toEqual(archived)
  expect(await restoreScenario(cast.author, id)).toEqual({ id, ...made })
})

test('a sheet saved by a newer program is refused as such, not guessed at', async () => {
  const { id } = await aScenario(cast.author, cast.author)
  await database.orm.em.fork().execute(`insert into revisions (scenario_id, shop_id, number, title, sheet, sheet_version, engine_version, engine, results,
    outside_count, close_count, within_count, limits, calc_version, author_id, search)
    select scenario_id, shop_id, 2, title, '{}', 3, engine_version, engine, results, 0, 0, 0, limits, calc_version, author_id, search from revisions where scenario_id = ?`, [id])
  expect(await refusalOf(getRevision(cast.author, id, 2))).toMatchObject({ code: 'newerSheet', message: expect.stringContaining('newer version') })
  expect((await getRevision(cast.author, id, 1)).sheet).toEqual(sheet())
})

test('an evaluation for a form gives every figure and stores nothing', async () => {
  const engine = await anEngine(cast.author)
  const made = await aScenario(cast.author, cast.author, { engine })
  const evaluation = await evaluateForActor(cast.actors.builder, { engineId: engine.id, sheet: sheetOutside() })
  expect(evaluation.result.counts.outside).toBeGreaterThan(0)
  expect(evaluation).toMatchObject({ sheet: sheetOutside(), engine: { id: engine.id, spec: engineSpec, version: 1 } })
  expect((await listRevisions(cast.author, made.id)).rows).toHaveLength(1)
})
