import { beforeAll, expect, test } from 'vitest'
import { getRevision } from '@/lib/data/scenarios/get-revision'
import { releaseRevision } from '@/lib/data/plans/release-revision'
import { createCast, type Cast } from '../support/actors'
import { freshDatabase } from '../support/fresh-database'
import { aScenario } from '../support/records'

const database = freshDatabase()
let cast: Cast
beforeAll(async () => {
  cast = await createCast(database.orm)
})

const sql = (text: string, values: unknown[]) => database.orm.em.fork().execute(text, values)

const columns = ['scenario_id', 'shop_id', 'number', 'title', 'sheet', 'sheet_version', 'engine_version', 'engine', 'results', 'outside_count',
  'close_count', 'within_count', 'limits', 'calc_version', 'author_id', 'created_at', 'search', 'id']

test('the database refuses any change of what was saved, and its removal', async () => {
  const { id, revision } = await aScenario(cast.author, cast.author)
  const strange: Record<string, string> = {
    scenario_id: 'gen_random_uuid()', shop_id: 'gen_random_uuid()', author_id: 'gen_random_uuid()', id: 'gen_random_uuid()',
    sheet: `'{}'`, engine: `'{}'`, results: `'{}'`, limits: `'{}'`, created_at: `now() + interval '1 day'`,
    title: `'x'`, calc_version: `'x'`, search: `'x'`,
  }
  for (const column of columns) {
    await expect(sql(`update revisions set ${column} = ${strange[column] ?? `${column} + 1`} where scenario_id = ?`, [id]), column).rejects.toThrow('a revision is never changed')
  }
  await expect(sql('delete from revisions where scenario_id = ?', [id])).rejects.toThrow('a revision is never removed')
  await expect(sql('truncate revisions', [])).rejects.toThrow('revisions are never removed')
  expect(await getRevision(cast.author, id, 1)).toEqual(revision)
})

test('the columns above are all but those of a release', async () => {
  const rows = await sql(`select column_name as name from information_schema.columns where table_name = 'revisions'`, []) as { name: string }[]
  expect(rows.map((row) => row.name).sort()).toEqual([...columns, 'released_at', 'released_by_id', 'release_reasons'].sort())
})

test('a release is whole, and made once', async () => {
  const { id } = await aScenario(cast.author, cast.author)
  const by = cast.author.userId
  for (const part of [`released_at = now()`, `released_by_id = '${by}'`, `release_reasons = '{}'`, `released_at = now(), release_reasons = '{}'`]) {
    await expect(sql(`update revisions set ${part} where scenario_id = ?`, [id]), part).rejects.toThrow('a release names')
  }
  const plan = await releaseRevision(cast.author, id, 1, {})
  for (const part of [`released_at = now()`, `released_at = null`, `released_by_id = '${cast.actors.owner.userId}'`, `release_reasons = '{"a":"b"}'`, `title = title`]) {
    await expect(sql(`update revisions set ${part} where scenario_id = ?`, [id]), part).rejects.toThrow('a released revision is never changed')
  }
  expect((await getRevision(cast.author, id, 1)).releasedAt).toBe(plan.releasedAt)
})

test('a number is used once in a scenario', async () => {
  const { id } = await aScenario(cast.author, cast.author)
  await expect(sql(`insert into revisions select (r).* from (select jsonb_populate_record(revisions, jsonb_build_object('id', gen_random_uuid())) as r from revisions where scenario_id = ?) one`, [id]))
    .rejects.toThrow('revisions_scenario_number_unique')
})

test('with the row of its scenario the revisions go too', async () => {
  const { id } = await aScenario(cast.author, cast.author)
  await sql('delete from scenarios where id = ?', [id])
  expect(await sql('select 1 from revisions where scenario_id = ?', [id])).toEqual([])
})
