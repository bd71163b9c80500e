import fc from 'fast-check'
import { randomUUID } from 'node:crypto'
import { beforeAll, beforeEach, describe, expect, test } from 'vitest'
import { Scenario } from '@/entities/index'
import type { Actor } from '@/lib/auth/actor'
import { archiveScenario } from '@/lib/data/scenarios/archive-scenario'
import { listRevisions } from '@/lib/data/scenarios/list-revisions'
import { listScenarios } from '@/lib/data/scenarios/list-scenarios'
import { saveScenario } from '@/lib/data/scenarios/save-scenario'
import { releaseRevision } from '@/lib/data/plans/release-revision'
import { searchText } from '@/lib/data/support/search-text'
import { scenarioSorts, type ScenarioListQuery } from '@/lib/schemas/list-query'
import type { ScenarioRowDto } from '@/lib/schemas/scenario-dto'
import { createActor, createCast, createShop, type Cast } from '../support/actors'
import { freshDatabase } from '../support/fresh-database'
import { aScenario, anEngine, sheet, sheetOutside } from '../support/records'
import { refusalOf } from '../support/refusal'

const database = freshDatabase()
let cast: Cast
beforeAll(async () => {
  cast = await createCast(database.orm)
})

const titles = async (actor: Actor, query: ScenarioListQuery = {}) => (await listScenarios(actor, { sort: 'title', ...query })).rows.map((row) => row.title)

test('a row says what the list needs and no more', async () => {
  const { id, code, engine, revision, updatedAt } = await aScenario(cast.author, cast.author, { sheet: sheetOutside() })
  const { rows, nextCursor } = await listScenarios(cast.author, { search: code })
  expect(nextCursor).toBeNull()
  expect(rows).toEqual([{
    id, code, title: 'Climb timing', owner: { id: cast.author.userId, name: cast.author.name }, engine: { id: engine.id, name: engine.name, code: engine.code },
    counts: revision.results.counts, currentRevision: 1, releasedRevision: null, archivedAt: null, updatedAt,
  }])
})

describe('in a shop of its own', () => {
  let designer: Actor
  let builder: Actor
  let ids: Record<string, string>
  let engineId: string
  beforeAll(async () => {
    const shop = await createShop(database.orm)
    designer = await createActor(database.orm, shop, 'designer')
    builder = await createActor(database.orm, shop, 'builder')
    const engine = await anEngine(designer, { name: 'Six', code: 'L6' })
    engineId = engine.id
    const four = await anEngine(designer, { name: 'Four', code: 'L4' })
    const make = async (author: Actor, title: string, on = engine, typed = sheet()) => (await aScenario(author, designer, { engine: on, title, sheet: typed })).id
    ids = {
      percent: await make(designer, '97% of it'), under: await make(designer, 'a_b'), plain: await make(designer, 'aXb', four),
      slash: await make(designer, 'back\\slash'), quote: await make(builder, `O'Brien "own"`), ten: await make(builder, 'Run 10', four),
      nine: await make(designer, 'Run 9', engine, sheetOutside()), gone: await make(designer, 'Gone'),
    }
    await archiveScenario(designer, ids.gone ?? '')
    await releaseRevision(designer, ids.percent ?? '', 1, {})
  })

  test.each([
    [{}, ['97% of it', 'a_b', 'aXb', 'back\\slash', `O'Brien "own"`, 'Run 9', 'Run 10']],
    [{ search: '%' }, ['97% of it']],
    [{ search: '_' }, ['a_b']],
    [{ search: 'a_b' }, ['a_b']],
    [{ search: '\\' }, ['back\\slash']],
    [{ search: '\\_' }, []],
    [{ search: `o'brien "OWN"` }, [`O'Brien "own"`]],
    [{ search: 'l4-01' }, ['aXb']],
    [{ search: 'six RUN' }, ['Run 9']],
    [{ search: '?' }, []],
    [{ search: '$1' }, []],
    [{ search: '%%%___' }, []],
    [{ state: 'archived' }, ['Gone']],
    [{ state: 'released' }, ['97% of it']],
    [{ state: 'outside' }, ['Run 9']],
    [{ state: 'outside', search: '97' }, []],
  ] as [ScenarioListQuery, string[]][])('%j', async (query, expected) => {
    expect(await titles(designer, query)).toEqual(expected)
  })

  test('of one engine, and none of an engine of another shop', async () => {
    expect(await titles(designer, { engineId, search: 'run' })).toEqual(['Run 9'])
    expect(await titles(cast.author, { engineId })).toEqual([])
  })

  test('a builder sees the own ones, another shop none', async () => {
    expect(await titles(builder)).toEqual([`O'Brien "own"`, 'Run 10'])
    expect(await titles(cast.neighbour)).toEqual([])
    expect((await refusalOf(listScenarios({ ...cast.neighbour, shop: designer.shop }))).code).toBe('notFound')
  })

  test('a save moves it to the front; outside first when asked', async () => {
    await saveScenario(designer, ids.under ?? '', { baseRevision: 1, engineVersion: 1, title: 'a_b', sheet: sheet({ notes: 'again' }) })
    expect((await listScenarios(designer)).rows[0]?.title).toBe('a_b')
    expect((await listScenarios(designer, { sort: 'outside' })).rows.map((row) => row.title).slice(0, 2)).toEqual(['Run 9', 'a_b'])
  })
})

test('a query that is none of ours is told as a sentence', async () => {
  const asked = { state: 'lost', sort: 'size', engineId: '7', search: 'x'.repeat(201), cursor: 'y'.repeat(2000) }
  const { code, fieldErrors } = await refusalOf(listScenarios(cast.author, asked))
  expect(code).toBe('badAddress')
  expect(Object.keys(fieldErrors ?? {}).sort()).toEqual(['cursor', 'engineId', 'search', 'sort', 'state'])
  const other = Buffer.from(JSON.stringify(['outside', 2 ** 40, '2020-01-01T00:00:00.000Z', randomUUID()])).toString('base64url')
  for (const cursor of ['x', '%00', other]) expect((await refusalOf(listScenarios(cast.author, { sort: 'outside', cursor }))).fieldErrors).toHaveProperty('cursor')
})

describe('page by page', () => {
  let designer: Actor
  let engineId: string
  beforeEach(async () => {
    designer = await createActor(database.orm, await createShop(database.orm), 'designer')
    engineId = (await anEngine(designer)).id
  })

  async function walk(query: ScenarioListQuery): Promise<ScenarioRowDto[]> {
    const rows: ScenarioRowDto[] = []
    for (let cursor: string | undefined, pages = 0; pages < 10; pages++) {
      const page = await listScenarios(designer, { ...query, cursor })
      rows.push(...page.rows)
      if (page.nextCursor === null) return rows
      expect(page.rows).toHaveLength(50)
      cursor = page.nextCursor
    }
    throw new Error('The list has no end.')
  }

  // Few different values, so that pages end amid rows that are equal but for their id.
  const row = fc.record({
    moment: fc.integer({ min: 0, max: 2 }), title: fc.constantFrom('a', 'A', 'é', '😀', 'z 9', 'z 10', `' or 1=1`, 'long '.repeat(23)), outside: fc.integer({ min: 0, max: 2 }),
  })

  test('every row comes once and in order, however many share a value', async () => {
    let round = 0
    await fc.assert(fc.asyncProperty(fc.array(row, { minLength: 101, maxLength: 160 }), async (made) => {
      const em = database.orm.em.fork()
      await em.nativeDelete(Scenario, { shop: designer.shop.id })
      const prefix = `R${(round += 1)}`
      for (const [i, { moment, title, outside }] of made.entries()) em.create(Scenario, {
        shop: designer.shop.id, engine: engineId, owner: designer.userId, code: `${prefix}-${i}`, title, currentRevision: 1,
        outsideCount: outside, closeCount: 0, withinCount: 0, updatedAt: new Date(Date.UTC(2020, 0, 1) + moment), search: searchText(title),
      })
      await em.flush()
      for (const sort of scenarioSorts) {
        const rows = await walk({ sort })
        expect(rows.map((one) => one.code).sort()).toEqual(made.map((_, i) => `${prefix}-${i}`).sort())
        const key = {
          updated: (one: ScenarioRowDto) => one.updatedAt, title: null, code: null,
          outside: (one: ScenarioRowDto) => `${one.counts.outside} ${one.updatedAt}`,
        }[sort]
        if (key) expect(rows.map(key)).toEqual(rows.map(key).sort().reverse())
      }
      const nine = (await walk({ sort: 'title' })).map((one) => one.title).filter((title) => title.startsWith('z'))
      expect(nine).toEqual([...nine].sort((a, b) => a.length - b.length)) // z 9 before z 10
    }), { numRuns: 8 })
  }, 120_000)

  test('the revisions of a scenario likewise', async () => {
    const { id } = await aScenario(designer, designer)
    await database.orm.em.fork().execute(`insert into revisions (scenario_id, shop_id, number, title, sheet, sheet_version, engine_version, engine, results,
      outside_count, close_count, within_count, limits, calc_version, author_id, search)
      select scenario_id, shop_id, n, title, sheet, sheet_version, engine_version, engine, results, 0, 0, 0, limits, calc_version, author_id, search
      from revisions, generate_series(2, 123) n where scenario_id = ?`, [id])
    const numbers: number[] = []
    let cursor: string | undefined
    do {
      const page = await listRevisions(designer, id, { cursor })
      numbers.push(...page.rows.map((one) => one.number))
      cursor = page.nextCursor ?? undefined
    } while (cursor)
    expect(numbers).toEqual(Array.from({ length: 123 }, (_, i) => 123 - i))
  })
})
