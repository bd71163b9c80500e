import { beforeAll, expect, test } from 'vitest'
import { checkSignIn } from '@/lib/data/people/check-sign-in'
import { findActor } from '@/lib/data/people/find-actor'
import { listEngines } from '@/lib/data/engines/list-engines'
import { getPlan } from '@/lib/data/plans/get-plan'
import { listPlans } from '@/lib/data/plans/list-plans'
import { getScenario } from '@/lib/data/scenarios/get-scenario'
import { listRevisions } from '@/lib/data/scenarios/list-revisions'
import { listScenarios } from '@/lib/data/scenarios/list-scenarios'
import { layDemo } from '@/scripts/lib/demo'
import { demoSignIns } from '@/scripts/lib/demo-sign-ins.mjs'
import { fingerprint } from '../permissions/fingerprint'
import { freshDatabase } from '../support/fresh-database'

const database = freshDatabase()
beforeAll(async () => {
  expect(await layDemo()).toBe(true)
}, 60_000)

const signedIn = async (email: string) => {
  const person = demoSignIns.find((each) => each.email === email)
  const checked = await checkSignIn({ email, password: person?.password ?? '' }, `demo test ${email}`)
  const actor = await findActor(checked.userId, null)
  if (!actor) throw new Error(`no actor for ${email}`)
  return actor
}

test('everybody of the demo signs in with the printed password, in the role and the shop printed', async () => {
  for (const { email, role, shop, name } of demoSignIns) expect(await signedIn(email)).toMatchObject({ role, name, shop: { name: shop } })
})

test('the shop holds three engines, sheets of every kind, one archived, and two plans', async () => {
  const noor = await signedIn('noor@juniper.example')
  expect((await listEngines(noor, { sort: 'code' })).rows.map((row) => row.code)).toEqual(['J200', 'J260', 'J360'])
  const { rows } = await listScenarios(noor, { sort: 'code' })
  expect(rows.map(({ code, counts }) => [code, counts.outside])).toEqual([['J200-01', 0], ['J260-01', 0], ['J260-03', 1], ['J260-04', 0], ['J260-05', 1], ['J360-01', 0]])
  expect((await listScenarios(noor, { state: 'archived' })).rows.map(({ code, counts }) => [code, counts.outside])).toEqual([['J260-02', 2]])
  const kinds = new Set<string>()
  for (const { id } of [...rows, ...(await listScenarios(noor, { state: 'archived' })).rows]) {
    const { revision: { sheet, results } } = await getScenario(noor, id)
    kinds.add(sheet.primary.schedule.kind)
    expect(results.findings.length).toBeGreaterThan(10)
  }
  expect([...kinds].sort()).toEqual(['fixed', 'formula', 'map', 'mechanical', 'table'])
  const climb = rows.find((row) => row.code === 'J260-05')
  expect((await listRevisions(noor, climb?.id ?? '')).rows.map((row) => [row.number, row.releasedAt !== null])).toEqual([[3, false], [2, true], [1, false]])
})

test('every role reads the plans; the builder sees the own scenario only; the other shop sees nothing of it', async () => {
  for (const { email, shop } of demoSignIns) {
    const { rows } = await listPlans(await signedIn(email))
    expect(rows.map((row) => row.code)).toEqual(shop === 'Juniper Field Engine Shop' ? ['J260-05.2', 'J260-01.1'] : [])
  }
  const ines = await signedIn('ines@juniper.example')
  expect((await listScenarios(ines)).rows.map((row) => row.code)).toEqual(['J260-04'])
  const [plan] = (await listPlans(ines)).rows
  const { releaseReasons, results } = await getPlan(ines, plan?.scenarioId ?? '', 2)
  expect(Object.keys(releaseReasons)).toEqual(results.findings.filter((one) => one.verdict === 'outside').map((one) => one.id))
  const ben = await signedIn('ben@saltmarsh.example')
  expect((await listScenarios(ben)).rows.map((row) => row.code)).toEqual(['SA24-01'])
  expect((await listEngines(ben)).rows.map((row) => row.code)).toEqual(['SA24'])
})

test('a second run changes nothing; one that was cut short is finished by the next', async () => {
  const before = await fingerprint(database.orm)
  expect(await layDemo()).toBe(false)
  expect(await fingerprint(database.orm)).toBe(before)
  await database.orm.em.fork().execute(`delete from scenarios where code in ('SA24-01', 'J360-01')`)
  expect(await layDemo()).toBe(true)
  const noor = await signedIn('noor@juniper.example')
  expect((await listScenarios(noor, { sort: 'code' })).rows.map((row) => row.code)).toEqual(['J200-01', 'J260-01', 'J260-03', 'J260-04', 'J260-05', 'J360-02'])
})
