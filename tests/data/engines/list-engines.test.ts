import { randomUUID } from 'node:crypto'
import { beforeAll, expect, test } from 'vitest'
import { archiveEngine } from '@/lib/data/engines/archive-engine'
import { listEngines } from '@/lib/data/engines/list-engines'
import { queryOf, type EngineListQuery } from '@/lib/schemas/list-query'
import { createActor, createShop, type Cast } from '../support/actors'
import { freshDatabase } from '../support/fresh-database'
import { anEngine } from '../support/records'
import { refusalOf } from '../support/refusal'

const database = freshDatabase()
let designer: Cast['author']
beforeAll(async () => {
  designer = await createActor(database.orm, await createShop(database.orm), 'designer')
  for (const [code, name] of [['S10', '100% six'], ['S9', 'a_b six'], ['S2', "O'Dell \\ four"], ['S1', 'axb six']]) await anEngine(designer, { code, name })
  await archiveEngine(designer, (await anEngine(designer, { code: 'S11', name: 'gone' })).id)
})

const codes = async (query: EngineListQuery) => (await listEngines(designer, query)).rows.map((row) => row.code)

test.each([
  [{}, ['S1', 'S2', 'S9', 'S10']],
  [{ sort: 'name' }, ['S10', 'S9', 'S1', 'S2']],
  [{ state: 'archived' }, ['S11']],
  [{ search: '%' }, ['S10']],
  [{ search: '_' }, ['S9']],
  [{ search: 'a_b' }, ['S9']],
  [{ search: '00% ' }, ['S10']],
  [{ search: 'o\\d' }, []],
  [{ search: '\\' }, ['S2']],
  [{ search: "o'd" }, ['S2']],
  [{ search: '  SIX   s1 ' }, ['S1', 'S10']],
  [{ search: '\0' }, ['S1', 'S2', 'S9', 'S10']],
  [{ search: "'; drop table engines; --" }, []],
] as [EngineListQuery, string[]][])('%j', async (query, expected) => {
  expect(await codes({ sort: 'code', ...query })).toEqual(expected)
})

test('unless told otherwise the engine changed last comes first', async () => {
  const rows = (await listEngines(designer)).rows
  expect(rows.map((row) => row.updatedAt)).toEqual(rows.map((row) => row.updatedAt).sort().reverse())
})

test('an address that is none of ours is told as a sentence', async () => {
  const asked = queryOf(new URLSearchParams('sort=size&sort=code&state=&cursor=nonsense'))
  expect(asked).toEqual({ sort: 'size', cursor: 'nonsense' })
  const refusal = await refusalOf(listEngines(designer, asked))
  expect(refusal).toMatchObject({ code: 'badAddress', status: 422, fieldErrors: { sort: 'Sort by updated, name or code.' } })
  for (const cursor of ['nonsense', '', btoa('["code"]'), btoa('["name","a","b"]'), btoa('[]'), btoa('null')]) {
    expect((await refusalOf(listEngines(designer, { cursor }))).fieldErrors).toEqual({ cursor: 'This address does not lead to a page of the list.' })
  }
  const ofCode = Buffer.from(JSON.stringify(['code', 'S1', randomUUID()])).toString('base64url')
  expect((await listEngines(designer, { sort: 'code', cursor: ofCode })).rows.length).toBeGreaterThan(0)
  expect((await refusalOf(listEngines(designer, { sort: 'name', cursor: ofCode }))).fieldErrors).toHaveProperty('cursor')
})
