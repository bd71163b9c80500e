import { beforeAll, describe, expect, test, vi } from 'vitest'
import { saveSheet } from '@/app/(shop)/scenarios/[id]/actions'
import '@/lib/calc/index'
import { evaluateScenario } from '@/lib/calc/scenario/evaluate-scenario'
import { storedResult } from '@/lib/calc/scenario/stored-result'
import { scenarioToForm } from '@/lib/schemas/scenario-form'
import { createCast, signInAs, type Cast } from '../support/actors'
import { freshDatabase } from '../support/fresh-database'
import { formOf } from '../support/next-mocks'
import { aScenario, engineSpec, sheet } from '../support/records'

vi.mock('next/headers', async () => (await import('@/tests/data/support/next-mocks')).nextHeaders())
vi.mock('next/cache', async () => (await import('@/tests/data/support/next-mocks')).nextCache())

const database = freshDatabase()
let cast: Cast

beforeAll(async () => {
  cast = await createCast(database.orm)
})

const typed = (change: Record<string, string> = {}) => formOf({
  ...scenarioToForm('Changed', sheet(), 'metric'), unitSystem: 'metric', filledFrom: '1', baseRevision: '1', engineVersion: '1', intent: 'save', ...change,
})

const rowsOf = (id: string) => database.orm.em.fork().execute<{ number: number, results: unknown, outside_count: number, calc_version: string }[]>(
  'select number, results, outside_count, calc_version from revisions where scenario_id = ? order by number', [id])

describe('saving the sheet is a server action', () => {
  test('forged results that come with the form are never read: the server’s own are stored', async () => {
    await signInAs(cast.author)
    const { id } = await aScenario(cast.author, cast.author)
    const forged = JSON.stringify({ findings: [], counts: { outside: 0, close: 0, within: 99 }, calcVersion: 'forged' })
    const answer = await saveSheet(id, { ok: false }, typed({
      'backup.fixed.deg': '4', results: forged, result: forged, 'results.counts.outside': '0', counts: forged, calcVersion: 'forged', limits: '{}', outsideCount: '0', engine: '{}',
    }))
    expect(answer).toMatchObject({ ok: true, data: { kind: 'saved', revision: { number: 2 } } })
    const expected = storedResult(evaluateScenario({ engine: engineSpec, sheet: sheet({ backup: { schedule: { kind: 'fixed', deg: 4 }, latencyUs: 0 } }) }))
    const row = (await rowsOf(id))[1]
    expect(row?.results).toEqual(JSON.parse(JSON.stringify(expected)))
    expect(row?.outside_count).toBe(expected.counts.outside)
    expect(row?.outside_count).toBeGreaterThan(0)
    expect(row?.calc_version).toBe(expected.calcVersion)
  })

  test.each([
    ['primary.table', { 'primary.kind': 'table', 'primary.table': '2000 20\n1000 10' }, /rise/],
    ['primary.formula', { 'primary.kind': 'formula', 'primary.formula': '12 + evil' }, /evil/],
    ['backup.fixed.deg', { 'backup.fixed.deg': '−200' }, /at least/],
    ['runUpRpm', { runUpRpm: '6000' }, /run-up speed must lie between/i],
    ['title', { title: '' }, /name/],
  ] as const)('a fault at %s is told there, what was typed comes back, nothing is stored', async (name, change, words) => {
    await signInAs(cast.author)
    const { id } = await aScenario(cast.author, cast.author)
    const answer = await saveSheet(id, { ok: false }, typed(change))
    expect(answer).toMatchObject({ ok: false, code: 'invalid', values: change })
    expect(answer.ok || answer.fieldErrors?.[name]).toMatch(words)
    expect(JSON.stringify(answer)).not.toMatch(/ at \S+:\d+/)
    expect(await rowsOf(id)).toHaveLength(1)
  })

  test('what can be built but should not be is saved, with its finding', async () => {
    await signInAs(cast.author)
    const { id } = await aScenario(cast.author, cast.author)
    const answer = await saveSheet(id, { ok: false }, typed({ 'backup.fixed.deg': '45', 'primary.retardDeg': '8', 'primary.retardBelowRpm': '1500' }))
    expect(answer).toMatchObject({ ok: true, data: { kind: 'saved' } })
    const outside = answer.ok && answer.data.kind === 'saved' ? answer.data.revision.results.findings.filter((finding) => finding.verdict === 'outside').map((finding) => finding.id) : []
    expect(outside).toEqual(expect.arrayContaining(['backupFirstDeg', 'retardBelowIdleRpm.primary']))
  })

  test('computing without saving stores nothing', async () => {
    await signInAs(cast.author)
    const { id } = await aScenario(cast.author, cast.author)
    expect(await saveSheet(id, { ok: false }, typed({ intent: 'evaluate', 'backup.fixed.deg': '12' }))).toMatchObject({ ok: true, data: { kind: 'evaluated', sheet: { backup: { schedule: { deg: 12 } } } } })
    expect(await rowsOf(id)).toHaveLength(1)
  })

  test('a session that ended, and another shop: refused, with everything typed', async () => {
    await signInAs(cast.author)
    const { id } = await aScenario(cast.author, cast.author)
    await signInAs(null)
    expect(await saveSheet(id, { ok: false }, typed({ notes: 'kept' }))).toMatchObject({ ok: false, code: 'signedOut', values: { notes: 'kept' } })
    await signInAs(cast.neighbour)
    expect(await saveSheet(id, { ok: false }, typed({ notes: 'kept' }))).toMatchObject({ ok: false, code: 'notFound', values: { notes: 'kept' } })
    expect(await rowsOf(id)).toHaveLength(1)
  })
})
