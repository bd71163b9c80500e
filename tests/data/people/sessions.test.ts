import { beforeAll, beforeEach, expect, test, vi } from 'vitest'
import { GET } from '@/app/api/me/route'
import { setUnitSystem, switchShop } from '@/app/(shop)/actions'
import { Membership, Session } from '@/entities/index'
import type { Actor } from '@/lib/auth/actor'
import { getActor, requireActor, touchActor } from '@/lib/auth/session'
import { createActor, createShop, join, signInAs } from '../support/actors'
import { freshDatabase } from '../support/fresh-database'
import { cookieJar, formOf, redirectOf, requestHeaders, revalidatedPaths } from '../support/next-mocks'

vi.mock('next/headers', async () => (await import('../support/next-mocks')).nextHeaders())
vi.mock('next/cache', async () => (await import('../support/next-mocks')).nextCache())

const database = freshDatabase()
let first: Actor['shop']
let second: Actor['shop']
let foreign: Actor['shop']
let actor: Actor
beforeAll(async () => {
  first = await createShop(database.orm, 'First Shop')
  second = await createShop(database.orm, 'A Second Shop')
  foreign = await createShop(database.orm, 'Foreign Shop')
  actor = await createActor(database.orm, first, 'designer')
  await join(database.orm, actor.userId, second.id, 'inspector')
})
beforeEach(() => {
  requestHeaders.delete('x-halfspeed-path')
  revalidatedPaths.length = 0
})

/** Moves the end of this person's sessions to so many days from now. */
const endIn = (days: number) =>
  database.orm.em.fork().nativeUpdate(Session, { user: actor.userId }, { expiresAt: new Date(Date.now() + days * 86_400_000) })

test('the actor of a session has the role of the shop it works in', async () => {
  await signInAs(actor)
  expect(await getActor()).toEqual(actor)
  await signInAs({ ...actor, shop: second })
  expect(await getActor()).toEqual({ ...actor, shop: second, role: 'inspector' })
})

test('a session of a shop the person left works in the one joined first', async () => {
  await signInAs({ ...actor, shop: foreign })
  expect(await getActor()).toEqual(actor)
})

test('pages send whoever is signed out to sign in and back; a false or ended session counts as none', async () => {
  await signInAs(null)
  requestHeaders.set('x-halfspeed-path', '/scenarios/7?at=2400')
  expect(await redirectOf(requireActor())).toBe('/sign-in?next=%2Fscenarios%2F7%3Fat%3D2400')
  requestHeaders.set('x-halfspeed-path', '//elsewhere.example')
  expect(await redirectOf(requireActor())).toBe('/sign-in')

  cookieJar.set('halfspeed_session', 'f'.repeat(40))
  expect(await getActor()).toBeNull()
  await signInAs(actor)
  await endIn(-0.001)
  expect(await getActor()).toBeNull()
})

test('an action of someone signed out says so and leaves the cookie alone', async () => {
  await signInAs(actor)
  await endIn(-0.001)
  const cookie = cookieJar.get('halfspeed_session')
  await expect(touchActor()).rejects.toMatchObject({ code: 'signedOut', message: expect.stringContaining('what you typed is still in place') })
  expect(cookieJar.get('halfspeed_session')).toBe(cookie)
})

test('a session in its second half is prolonged and its cookie written again', async () => {
  await signInAs(actor)
  await endIn(10)
  const token = cookieJar.get('halfspeed_session')
  await touchActor()
  expect(cookieJar.get('halfspeed_session')).toBe(token)
  const [row] = await database.orm.em.fork().find(Session, { user: actor.userId }, { orderBy: { expiresAt: 'desc' } })
  expect(row?.expiresAt.getTime()).toBeGreaterThan(Date.now() + 29 * 86_400_000)
})

test('switching moves this session to another shop of the person, with the role there', async () => {
  await signInAs(actor)
  const otherBrowser = new Map(cookieJar)
  await signInAs(actor)
  expect(await redirectOf(switchShop(formOf({ shopId: second.id })))).toBe('/plans')
  expect(await getActor()).toMatchObject({ shop: second, role: 'inspector' })
  expect(revalidatedPaths).toEqual(['/'])
  expect(await redirectOf(switchShop(formOf({ shopId: first.id })))).toBe('/scenarios')
  await redirectOf(switchShop(formOf({ shopId: second.id })))

  for (const [name, value] of otherBrowser) cookieJar.set(name, value)
  expect(await getActor()).toMatchObject({ shop: first })
})

test.each([['a shop of others', () => foreign.id], ['no shop at all', () => 'x'], ['an empty field', () => '']])('switching to %s is not found', async (_what, id) => {
  await signInAs(actor)
  await expect(switchShop(formOf({ shopId: id() }))).rejects.toMatchObject({ digest: 'NEXT_HTTP_ERROR_FALLBACK;404' })
  expect(await getActor()).toMatchObject({ shop: first })
})

test('units are the person’s own and kept', async () => {
  await signInAs(actor)
  await setUnitSystem(formOf({ unitSystem: 'us' }))
  expect(await getActor()).toMatchObject({ unitSystem: 'us' })
  await expect(setUnitSystem(formOf({ unitSystem: 'furlongs' }))).rejects.toThrow('Choose metric or US units.')
  expect(await getActor()).toMatchObject({ unitSystem: 'us' })
  await setUnitSystem(formOf({ unitSystem: 'metric' }))
})

test('a menu’s form of someone signed out leads to sign in and back', async () => {
  await signInAs(null)
  expect(await redirectOf(setUnitSystem(formOf({ unitSystem: 'us', next: '/engines' })))).toBe('/sign-in?next=%2Fengines')
})

test('GET /api/me answers with the person’s own data and nothing else', async () => {
  await signInAs(actor)
  const response = await GET()
  expect(response.status).toBe(200)
  expect(response.headers.get('cache-control')).toBe('private, no-store')
  expect(await response.json()).toEqual({
    name: actor.name, email: actor.email, unitSystem: 'metric', role: 'designer', shop: first,
    shops: [{ ...second, role: 'inspector' }, { ...first, role: 'designer' }],
  })
  await signInAs(null)
  const refused = await GET()
  expect(refused.status).toBe(401)
  expect(await refused.json()).toEqual({ error: { code: 'signedOut', message: expect.stringContaining('signed out') } })
})

test('a role taken away counts at once, whatever the actor says', async () => {
  const { authorise } = await import('@/lib/data/support/authorise')
  const em = database.orm.em.fork()
  await em.nativeUpdate(Membership, { user: actor.userId, shop: first.id }, { role: 'technician' })
  await expect(authorise(em, actor, 'engine.write')).rejects.toMatchObject({ code: 'forbidden' })
  expect(await authorise(em, actor, 'engine.write', 'plan.read')).toEqual({ role: 'technician' })
  await em.nativeUpdate(Membership, { user: actor.userId, shop: first.id }, { role: 'designer' })
})
