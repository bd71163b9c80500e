import { beforeAll, expect, test } from 'vitest'
import { archiveEngine, restoreEngine } from '@/lib/data/engines/archive-engine'
import { createEngine } from '@/lib/data/engines/create-engine'
import { duplicateEngine } from '@/lib/data/engines/duplicate-engine'
import { getEngine } from '@/lib/data/engines/get-engine'
import { removeEngine } from '@/lib/data/engines/remove-engine'
import { updateEngine } from '@/lib/data/engines/update-engine'
import { listScenarios } from '@/lib/data/scenarios/list-scenarios'
import { createCast, type Cast } from '../support/actors'
import { freshDatabase } from '../support/fresh-database'
import { aScenario, anEngine, engineSpec, nextCode } from '../support/records'
import { refusalOf } from '../support/refusal'

const database = freshDatabase()
let cast: Cast
beforeAll(async () => {
  cast = await createCast(database.orm)
})

test('an engine is kept with every figure; what does not belong to it is dropped', async () => {
  const code = nextCode()
  const forged = { name: '  Flat six  ', code, version: 9, shop: cast.neighbour.shop.id, spec: { ...engineSpec, secret: 1 } }
  const made = await createEngine(cast.author, forged)
  expect(made).toEqual({
    id: expect.any(String), name: 'Flat six', code, spec: engineSpec, version: 1, archivedAt: null, scenarioCount: 0,
    updatedAt: expect.stringMatching(/^\d{4}-.*Z$/),
  })
  expect(await getEngine(cast.actors.builder, made.id)).toEqual(made)
  expect(await refusalOf(getEngine(cast.neighbour, made.id))).toMatchObject({ code: 'notFound', message: expect.stringContaining('no such engine') })
})

test('a figure that cannot be is told at its field, and nothing is kept', async () => {
  const code = nextCode()
  const bad = { ...engineSpec, firingOrder: [1, 4, 4, 2, 3, 6], intervalsDeg: [120, 120, 120, 120, 120, 119], boreMm: Number.NaN }
  expect(Object.keys((await refusalOf(createEngine(cast.author, { name: '', code, spec: bad }))).fieldErrors ?? {})).toEqual(expect.arrayContaining(['name', 'spec.boreMm']))
  const odd = await refusalOf(createEngine(cast.author, { name: 'x', code, spec: { ...bad, boreMm: 90 } }))
  expect(odd.fieldErrors).toEqual({
    'spec.firingOrder': 'The firing order names cylinder 4 twice; each of 1 to 6 stands once.',
    'spec.intervalsDeg': 'The firing intervals add up to 719°; they must add up to 720°.',
  })
  for (const name of ['six\0', 'six\ud800']) {
    expect((await refusalOf(createEngine(cast.author, { name, code, spec: engineSpec }))).fieldErrors).toEqual({ name: expect.stringContaining('cannot be stored') })
  }
  await createEngine(cast.author, { name: 'x', code, spec: engineSpec }) // the code is still free
})

test('a code is used once in a shop, capitals or not; another shop may use it too', async () => {
  const engine = await anEngine(cast.author, { code: 'Q260' })
  expect((await refusalOf(anEngine(cast.author, { code: 'q260' }))).fieldErrors).toEqual({ code: 'Another engine of this shop has the code q260. Choose another.' })
  const other = await anEngine(cast.author)
  expect((await refusalOf(updateEngine(cast.author, other.id, { ...other, code: 'q260' }))).fieldErrors).toHaveProperty('code')
  expect((await anEngine(cast.neighbour, { code: engine.code })).code).toBe('Q260')
})

test('each change counts; saving the same again does not; a stale one is shown the stored engine', async () => {
  const made = await anEngine(cast.author)
  const second = await updateEngine(cast.author, made.id, { ...made, spec: { ...engineSpec, boreMm: 91 } })
  expect(second).toMatchObject({ version: 2, spec: { boreMm: 91 } })
  expect(await updateEngine(cast.actors.owner, made.id, second)).toEqual(second)
  const stale = await refusalOf(updateEngine(cast.actors.owner, made.id, { ...made, name: 'Mine' }))
  expect(stale).toMatchObject({ code: 'conflict', status: 409, conflict: second })
  expect(await getEngine(cast.author, made.id)).toEqual(second)
})

test('of two changes at once one wins and the other sees it', async () => {
  const made = await anEngine(cast.author)
  const both = await Promise.allSettled(['Left', 'Right'].map((name) => updateEngine(cast.author, made.id, { ...made, name })))
  expect(both.map((one) => one.status).sort()).toEqual(['fulfilled', 'rejected'])
  const lost = both.find((one) => one.status === 'rejected')
  const kept = await getEngine(cast.author, made.id)
  expect(lost?.reason).toMatchObject({ code: 'conflict', conflict: kept })
  expect(kept.version).toBe(2)
})

test('once scenarios are numbered after it, a code stays; a new name finds them at once', async () => {
  const engine = await anEngine(cast.author, { name: 'Old name' })
  const { id } = await aScenario(cast.author, cast.author, { engine, title: 'Line\nbreak' })
  const { fieldErrors } = await refusalOf(updateEngine(cast.author, engine.id, { ...engine, code: nextCode() }))
  expect(fieldErrors?.code).toContain(engine.code)
  await updateEngine(cast.author, engine.id, { ...engine, name: 'Éclair % six' })
  const found = async (search: string) => (await listScenarios(cast.author, { search })).rows.map((row) => row.id)
  expect(await found('éCLAIR')).toEqual([id])
  expect(await found(`${engine.code} line break éclair`)).toEqual([id])
  expect(await found('old name')).toEqual([])
})

test('archived twice keeps the first time; an archived engine is not changed; restored it is', async () => {
  const made = await anEngine(cast.author)
  const archived = await archiveEngine(cast.author, made.id)
  expect(archived.archivedAt).toEqual(expect.any(String))
  expect(await archiveEngine(cast.author, made.id)).toEqual(archived)
  expect(await refusalOf(updateEngine(cast.author, made.id, { ...made, name: 'New' }))).toMatchObject({ code: 'archived', message: expect.stringContaining('engine is archived') })
  expect(await restoreEngine(cast.author, made.id)).toEqual(made)
})

test('a duplicate has the same figures under a name and a code of its own', async () => {
  const made = await anEngine(cast.author, { code: 'LONGESTCODE1', name: 'n'.repeat(80) })
  const copy = await duplicateEngine(cast.author, made.id)
  const second = await duplicateEngine(cast.author, made.id)
  expect(copy).toMatchObject({ code: 'LONGESTCODEB', name: `Copy of ${'n'.repeat(72)}`, spec: made.spec, version: 1 })
  expect(second.code).toBe('LONGESTCODEC')
  expect((await duplicateEngine(cast.author, copy.id)).name).toBe(copy.name)
})

test('only an engine that no scenario was laid out on is removed', async () => {
  const unused = await anEngine(cast.author)
  await removeEngine(cast.author, unused.id)
  expect((await refusalOf(getEngine(cast.author, unused.id))).code).toBe('notFound')
  const used = await anEngine(cast.author)
  await aScenario(cast.author, cast.author, { engine: used })
  expect((await refusalOf(removeEngine(cast.author, used.id))).code).toBe('inUse')
  expect((await getEngine(cast.author, used.id)).scenarioCount).toBe(1)
})
