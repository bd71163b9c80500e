import { beforeAll, expect, test } from 'vitest'
import { getPlan } from '@/lib/data/plans/get-plan'
import { duplicateScenario } from '@/lib/data/scenarios/duplicate-scenario'
import { getRevision } from '@/lib/data/scenarios/get-revision'
import { getScenario } from '@/lib/data/scenarios/get-scenario'
import { saveScenario } from '@/lib/data/scenarios/save-scenario'
import { statedDefaults } from '@/lib/schemas/stated-defaults'
import { firstSheet } from '@/tests/support/first-sheet'
import { createCast, type Cast } from '../support/actors'
import { freshDatabase } from '../support/fresh-database'
import { aScenario } from '../support/records'
import { refusalOf } from '../support/refusal'

const database = freshDatabase()
let cast: Cast
beforeAll(async () => {
  cast = await createCast(database.orm)
})

const later = ['coils', 'climb', 'redundancy', 'stack', 'charge', 'detonation', 'pressure', 'spark'] as const
const laterLimits = ['detonationDeg', 'windingK', 'sparkVoltageRatio', 'periodShare', 'climbMps', 'noSparkPerH']

/** A scenario whose only other revision, number 2, is a row as version 1 wrote it: its sheet, and results and limits without what came later. */
async function anOldScenario({ released = false }: { released?: boolean } = {}): Promise<string> {
  const { id } = await aScenario(cast.author, cast.author)
  const em = database.orm.em.fork()
  const by = cast.author.userId
  await em.execute(`insert into revisions (scenario_id, shop_id, number, title, sheet, sheet_version, engine_version, engine, results,
    outside_count, close_count, within_count, limits, calc_version, author_id, search, released_at, released_by_id, release_reasons)
    select scenario_id, shop_id, 2, 'Laid out before', ?::jsonb, 1, engine_version, engine,
      jsonb_set(results, '{parts}', (results -> 'parts') ${later.map((name) => `- '${name}'`).join(' ')}),
      0, 0, 18, limits ${laterLimits.map((name) => `- '${name}'`).join(' ')}, '1.0.0', author_id, search,
      ${released ? `now(), '${by}', '{}'` : 'null, null, null'} from revisions where scenario_id = ? and number = 1`, [JSON.stringify(firstSheet()), id])
  await em.execute(`update scenarios set current_revision = 2, title = 'Laid out before' ${released ? ', released_revision = 2' : ''} where id = ?`, [id])
  return id
}

const { tolerances, ...others } = statedDefaults()
const lifted = { ...firstSheet(), ...others, tolerances: { timingCheckDeg: 1.5, benchDeg: 0.4, ...tolerances } }

test('a sheet of version 1 opens with the stated defaults; what was not worked out then says so', async () => {
  const id = await anOldScenario()
  const { revision } = await getScenario(cast.author, id)
  expect(revision).toMatchObject({ number: 2, sheetVersion: 1, sheet: lifted })
  for (const name of later) expect(revision.results.parts[name], name).toMatchObject({ ok: false, error: { code: 'notComputed' } })
  expect(revision.results.parts.stagger.ok).toBe(true)
  expect(Object.keys(revision.limits)).not.toContain('detonationDeg')
  expect(await getRevision(cast.author, id, 2)).toEqual(revision)
})

test('saved again it is of version 2, and everything is worked out', async () => {
  const id = await anOldScenario()
  const { revision } = await getScenario(cast.author, id)
  const saved = await saveScenario(cast.author, id, { baseRevision: 2, engineVersion: 1, title: revision.title, sheet: revision.sheet })
  expect(saved).toMatchObject({ number: 3, sheetVersion: 2, sheet: lifted })
  for (const name of later) expect(saved.results.parts[name].ok, name).toBe(true)
  const [row] = await database.orm.em.fork().execute<{ sheet: unknown, sheet_version: number }[]>('select sheet, sheet_version from revisions where scenario_id = ? and number = 3', [id])
  expect(row).toEqual({ sheet: lifted, sheet_version: 2 })
  expect((await getRevision(cast.author, id, 2)).sheetVersion).toBe(1)
})

test('a duplicate of one is of today', async () => {
  const made = await duplicateScenario(cast.author, await anOldScenario())
  expect(made.revision).toMatchObject({ number: 1, sheetVersion: 2, sheet: lifted })
})

test('a plan released from one still reads, judged by what it was judged by', async () => {
  const id = await anOldScenario({ released: true })
  const plan = await getPlan(cast.actors.builder, id, 2)
  expect(plan).toMatchObject({ title: 'Laid out before', sheet: lifted, sheetVersion: 1, calcVersion: '1.0.0', releaseReasons: {} })
  expect(plan.results.parts.detonation).toMatchObject({ ok: false, error: { code: 'notComputed' } })
  expect(Object.keys(plan.limits)).not.toContain('climbMps')
})

test('a version that is not known yet is refused, wherever it is met', async () => {
  const id = await anOldScenario()
  const em = database.orm.em.fork()
  await em.execute(`insert into revisions (scenario_id, shop_id, number, title, sheet, sheet_version, engine_version, engine, results,
    outside_count, close_count, within_count, limits, calc_version, author_id, search)
    select scenario_id, shop_id, 3, title, sheet, 3, engine_version, engine, results, 0, 0, 0, limits, calc_version, author_id, search
    from revisions where scenario_id = ? and number = 2`, [id])
  expect((await refusalOf(getRevision(cast.author, id, 3))).code).toBe('newerSheet')
  expect((await refusalOf(duplicateScenario(cast.author, id, { revision: 3 }))).code).toBe('newerSheet')
})
