import { beforeAll, expect, test } from 'vitest'
import { archiveEngine, restoreEngine } from '@/lib/data/engines/archive-engine'
import { updateEngine } from '@/lib/data/engines/update-engine'
import { archiveScenario } from '@/lib/data/scenarios/archive-scenario'
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

const save = { baseRevision: 1, engineVersion: 1, title: 'Climb timing', sheet: sheet() }
const revisionsOf = async (id: string) => (await listRevisions(cast.author, id)).rows.map((row) => row.number)

test('a save is the next revision; the one before stays as it was', async () => {
  const { id, code, revision: first } = await aScenario(cast.author, cast.author)
  const saved = await saveScenario(cast.actors.owner, id, { ...save, title: ' Later backup ', sheet: sheetOutside() })
  expect(saved).toMatchObject({ scenarioId: id, number: 2, title: 'Later backup', sheet: sheetOutside(), engineVersion: 1, author: { name: 'A owner' }, releasedAt: null })
  expect(saved.results.counts.outside).toBeGreaterThan(0)
  expect(await getRevision(cast.author, id, 1)).toEqual(first)
  expect(await getRevision(cast.author, id, 2)).toEqual(saved)
  expect(await getScenario(cast.author, id)).toMatchObject({ code, title: 'Later backup', revision: saved, engineChanged: false, updatedAt: saved.createdAt })
  expect(await revisionsOf(id)).toEqual([2, 1])
})

test('results sent along are ignored: the stored ones are computed here from the inputs', async () => {
  const { id } = await aScenario(cast.author, cast.author)
  const honest = await saveScenario(cast.author, id, { ...save, sheet: sheetOutside() })
  const forged = {
    ...save, baseRevision: 2, sheet: { ...sheet({ notes: 'forged' }), results: { counts: { outside: 0, close: 0, within: 99 } } },
    results: honest.results, counts: { outside: 0, close: 0, within: 99 }, limits: {}, calcVersion: '99', number: 7, author: cast.actors.builder.userId, releasedAt: new Date(),
  }
  const saved = await saveScenario(cast.author, id, forged)
  const { revision } = await getScenario(cast.author, id)
  expect(revision).toEqual(saved)
  const expected = await aScenario(cast.author, cast.author, { sheet: sheet({ notes: 'forged' }) })
  expect(revision).toMatchObject({ number: 3, releasedAt: null, author: { id: cast.author.userId }, calcVersion: expected.revision.calcVersion, limits: expected.revision.limits })
  expect(revision.results).toEqual(expected.revision.results)
  const [row] = await database.orm.em.fork().execute<Record<string, unknown>[]>('select sheet, results from revisions where scenario_id = ? and number = 3', [id])
  expect(row).toEqual({ sheet: sheet({ notes: 'forged' }), results: expected.revision.results })
})

test('nothing different makes no revision', async () => {
  const { id, revision } = await aScenario(cast.author, cast.author)
  const order = Object.fromEntries(Object.entries(sheet()).reverse()) as ReturnType<typeof sheet>
  expect(await saveScenario(cast.actors.owner, id, { ...save, title: 'Climb timing ', sheet: order })).toEqual(revision)
  const zero = sheet({ backup: { schedule: { kind: 'fixed', deg: 17 }, latencyUs: -0, crankRetard: undefined } })
  expect(await saveScenario(cast.author, id, { ...save, sheet: zero })).toEqual(revision)
  expect(await revisionsOf(id)).toEqual([1])
})

test('who comes second is shown the first one’s revision, and both sheets survive', async () => {
  const { id } = await aScenario(cast.author, cast.author)
  const first = await saveScenario(cast.actors.owner, id, { ...save, title: 'First' })
  const second = await refusalOf(saveScenario(cast.author, id, { ...save, title: 'Second' }))
  expect(second).toMatchObject({ code: 'conflict', status: 409, conflict: first })
  expect((await saveScenario(cast.author, id, { ...save, baseRevision: 2, title: 'Second' })).number).toBe(3)
  expect((await refusalOf(saveScenario(cast.author, id, { ...save, baseRevision: 4 }))).code).toBe('conflict')
})

test('of many saves at once one wins and every other sees it', async () => {
  const { id } = await aScenario(cast.author, cast.author)
  const all = await Promise.allSettled(Array.from({ length: 8 }, (_, i) => saveScenario(cast.author, id, { ...save, title: `Save ${i}` })))
  const won = all.flatMap((one) => (one.status === 'fulfilled' ? [one.value] : []))
  expect(won).toHaveLength(1)
  for (const one of all) if (one.status === 'rejected') expect(one.reason).toMatchObject({ code: 'conflict', conflict: won[0] })
  expect(await revisionsOf(id)).toEqual([2, 1])
})

test('a save and a change of its engine at once never wait for each other', async () => {
  const engine = await anEngine(cast.author)
  const { id } = await aScenario(cast.author, cast.author, { engine })
  let version = engine.version
  for (let round = 0; round < 6; round++) {
    const [, renamed] = await Promise.allSettled([
      saveScenario(cast.author, id, { ...save, title: `Round ${round}`, baseRevision: (await getScenario(cast.author, id)).revision.number, engineVersion: version }),
      updateEngine(cast.author, engine.id, { ...engine, name: `Name ${round}`, version }),
    ])
    expect(renamed).toMatchObject({ status: 'fulfilled' })
    version += 1
  }
})

test('an engine changed since the form was opened is shown; saving on the new one makes a revision', async () => {
  const engine = await anEngine(cast.author)
  const { id } = await aScenario(cast.author, cast.author, { engine })
  const changed = await updateEngine(cast.author, engine.id, { ...engine, spec: { ...engineSpec, maxRpm: 2900 } })
  expect(await getScenario(cast.author, id)).toMatchObject({ engineChanged: true, engine: changed, revision: { engine: { spec: { maxRpm: 2780 } } } })
  expect(await refusalOf(saveScenario(cast.author, id, save))).toMatchObject({ code: 'engineChanged', conflict: changed })
  const saved = await saveScenario(cast.author, id, { ...save, engineVersion: 2 })
  expect(saved).toMatchObject({ number: 2, engineVersion: 2, engine: { name: engine.name, code: engine.code, spec: changed.spec } })
  expect((await getScenario(cast.author, id)).engineChanged).toBe(false)
  expect((await getRevision(cast.author, id, 1)).engine.spec.maxRpm).toBe(2780)
})

test('on an archived engine, or an archived scenario, nothing is saved', async () => {
  const engine = await anEngine(cast.author)
  const { id } = await aScenario(cast.author, cast.author, { engine })
  await archiveEngine(cast.author, engine.id)
  expect(await refusalOf(saveScenario(cast.author, id, { ...save, title: 'New' }))).toMatchObject({ code: 'engineGone', status: 409 })
  await restoreEngine(cast.author, engine.id)
  expect(await archiveScenario(cast.author, id)).toMatchObject({ canWrite: false, canRelease: false })
  expect(await refusalOf(saveScenario(cast.author, id, { ...save, title: 'New' }))).toMatchObject({ code: 'archived' })
  expect(await revisionsOf(id)).toEqual([1])
})

test('what cannot be computed with, or stored, is told at its place and changes nothing', async () => {
  const { id } = await aScenario(cast.author, cast.author)
  const formula = (expression: string) => ({ ...save, sheet: sheet({ primary: { schedule: { kind: 'formula', expression }, latencyUs: 0 } }) })
  const bad = await refusalOf(saveScenario(cast.author, id, formula('min(20, badName)')))
  expect(bad).toMatchObject({ code: 'invalid', fieldErrors: { 'sheet.primary.schedule.expression': expect.stringContaining('bad') } })
  const { fieldErrors } = await refusalOf(saveScenario(cast.author, id, { ...save, title: '', sheet: sheet({ runUpRpm: -1 }) }))
  expect(Object.keys(fieldErrors ?? {}).sort()).toEqual(['sheet.runUpRpm', 'title'])
  const { fieldErrors: notes } = await refusalOf(saveScenario(cast.author, id, { ...save, sheet: sheet({ notes: 'a\0b' }) }))
  expect(notes).toEqual({ 'sheet.notes': expect.stringContaining('cannot be stored') })
  expect(await revisionsOf(id)).toEqual([1])
  expect((await saveScenario(cast.author, id, formula('rpm < 900 ? 12 : 24'))).number).toBe(2)
})

test('a builder saves own scenarios; others’ are not there, nor any of another shop', async () => {
  const builder = cast.actors.builder
  const own = await aScenario(builder, cast.author)
  expect((await saveScenario(builder, own.id, { ...save, title: 'Mine' })).number).toBe(2)
  expect((await saveScenario(cast.author, own.id, { ...save, baseRevision: 2, title: 'Ours' })).number).toBe(3)
  const others = await aScenario(cast.author, cast.author)
  for (const actor of [builder, cast.neighbour]) expect((await refusalOf(saveScenario(actor, others.id, save))).code).toBe('notFound')
  expect((await refusalOf(saveScenario(cast.actors.technician, others.id, save))).code).toBe('forbidden')
})
