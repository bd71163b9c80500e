import { beforeAll, beforeEach, expect, test, vi } from 'vitest'
import { signIn } from '@/app/(public)/sign-in/actions'
import { signOut } from '@/app/(shop)/actions'
import { Membership, Session, SignInLimit } from '@/entities/index'
import { limits } from '@/lib/auth/limits'
import { nobodysHash } from '@/lib/auth/passwords'
import { getActor, touchActor } from '@/lib/auth/session'
import { createPersonWithShop } from '@/lib/data/people/create-person-with-shop'
import { freshDatabase } from '../support/fresh-database'
import { cookieJar, formOf, redirectOf, requestHeaders } from '../support/next-mocks'

vi.mock('next/headers', async () => (await import('../support/next-mocks')).nextHeaders())
vi.mock('next/cache', async () => (await import('../support/next-mocks')).nextCache())
const verifications = vi.hoisted(() => [] as string[])
vi.mock('@node-rs/argon2', async (original) => {
  const real = await original<typeof import('@node-rs/argon2')>()
  return { ...real, verify: (hash: string, password: string) => (verifications.push(hash), real.verify(hash, password)) }
})

const database = freshDatabase()
const email = 'ola@bench.example'
const password = 'pâte à choux 12'
const before = { ok: false } as const
const attempt = (fields: Record<string, string> = {}) => signIn(before, formOf({ email, password, ...fields }))

let userId: string
beforeAll(async () => {
  ({ userId } = await createPersonWithShop({ name: 'Ola', email, password, shopName: 'Bench' }, '192.0.2.1'))
})
beforeEach(async () => {
  cookieJar.clear()
  verifications.length = 0
  requestHeaders.set('x-forwarded-for', '192.0.2.1')
  await database.orm.em.fork().nativeDelete(SignInLimit, {})
})

test('opens a session that outlives the request and holds only a digest of the cookie', async () => {
  expect(await redirectOf(attempt())).toBe('/scenarios')
  const token = cookieJar.get('halfspeed_session') ?? ''
  expect(token).toMatch(/^[a-z0-9]{40}$/)
  expect(await touchActor()).toMatchObject({ userId, name: 'Ola', role: 'owner', shop: { name: 'Bench' } })
  const rows = await database.orm.em.fork().find(Session, { user: userId })
  expect(rows).toHaveLength(1)
  expect(rows[0]?.id).toMatch(/^[0-9a-f]{64}$/)
  expect(rows[0]?.id).not.toContain(token)
})

test('takes the address in any case and the password in either form of its accents', async () => {
  expect(await redirectOf(attempt({ email: ' OLA@Bench.example', password: password.normalize('NFD') }))).toBe('/scenarios')
})

test('a wrong password and an unknown address answer alike: same words, one verification each', async () => {
  const wrong = await attempt({ password: 'not the one at all' })
  expect(verifications).toHaveLength(1)
  const unknown = await attempt({ email: 'nobody@bench.example' })
  expect(verifications).toHaveLength(2)
  expect(verifications[1]).toBe(nobodysHash)
  // The time of a verification is set by these: memory, passes, lanes.
  const cost = (hash: string | undefined) => hash?.split('$').slice(1, 4)
  expect(cost(verifications[0])).toEqual(cost(nobodysHash))

  expect(wrong).toEqual({ ok: false, code: 'wrongSignIn', formError: expect.stringContaining('do not belong together'), values: { email } })
  expect(unknown).toEqual({ ...wrong, values: { email: 'nobody@bench.example' } })
  expect(cookieJar.size).toBe(0)
})

test('refuses what cannot be a sign-in without looking at a password', async () => {
  expect(await attempt({ email: 'x', password: '' })).toMatchObject({ ok: false, fieldErrors: { email: expect.any(String), password: 'Type your password.' } })
  expect(await attempt({ password: 'x'.repeat(201) })).toMatchObject({ ok: false, fieldErrors: { password: expect.stringContaining('200') } })
  expect(verifications).toHaveLength(0)
})

test.each([
  ['/engines/1?tab=speeds#cap', '/engines/1?tab=speeds#cap'],
  ['https://elsewhere.example/', '/scenarios'],
  ['//elsewhere.example', '/scenarios'],
  ['', '/scenarios'],
])('afterwards goes to %s → %s', async (next, place) => {
  expect(await redirectOf(attempt({ next }))).toBe(place)
})

test('an account is closed for a while after too many attempts, even to the right password', async () => {
  for (let i = 0; i < limits.signInPerAccount.points; i++) {
    requestHeaders.set('x-forwarded-for', `192.0.2.${i}`)
    expect(await attempt({ password: 'a guess of mine' })).toMatchObject({ code: 'wrongSignIn' })
  }
  verifications.length = 0
  expect(await attempt()).toMatchObject({ ok: false, code: 'tooMany', formError: 'Too many attempts. Wait 15 minutes, then try again.' })
  expect(verifications).toHaveLength(0)
})

test('an unknown address is counted as an account is', async () => {
  const guess = () => attempt({ email: 'nobody@bench.example' })
  for (let i = 0; i < limits.signInPerAccount.points; i++) expect(await guess()).toMatchObject({ code: 'wrongSignIn' })
  expect(await guess()).toMatchObject({ code: 'tooMany' })
})

test('guesses at once are counted one by one', async () => {
  const guesses = Array.from({ length: limits.signInPerAccount.points + 4 }, () => attempt({ password: 'a guess of mine' }))
  const codes = (await Promise.all(guesses)).map((state) => (state.ok ? 'in' : state.code))
  expect(codes.filter((code) => code === 'wrongSignIn')).toHaveLength(limits.signInPerAccount.points)
  expect(codes.filter((code) => code === 'tooMany')).toHaveLength(4)
})

test('the right password clears the account and costs the network address nothing', async () => {
  for (let round = 0; round < 2; round++) {
    for (let i = 1; i < limits.signInPerAccount.points; i++) await attempt({ password: 'a guess of mine' })
    expect(await redirectOf(attempt())).toBe('/scenarios')
  }
  const counted = await database.orm.em.fork().findOneOrFail(SignInLimit, { key: 'signInPerAddress:192.0.2.1' })
  expect(counted.points).toBe(2 * (limits.signInPerAccount.points - 1))
})

test('one network address is limited over all accounts', async () => {
  const em = database.orm.em.fork()
  em.create(SignInLimit, { key: 'signInPerAddress:192.0.2.9', points: limits.signInPerAddress.points, expire: String(Date.now() + 61_000) })
  await em.flush()
  requestHeaders.set('x-forwarded-for', '203.0.113.5, 192.0.2.9')
  expect(await attempt()).toMatchObject({ code: 'tooMany', formError: 'Too many attempts. Wait 2 minutes, then try again.' })
  expect(verifications).toHaveLength(0)
})

test('signing in again ends the session this browser had; signing out ends this one and no other', async () => {
  await redirectOf(attempt())
  const elsewhere = new Map(cookieJar)
  cookieJar.clear()
  await redirectOf(attempt())
  const replaced = new Map(cookieJar)
  await redirectOf(attempt())
  expect(cookieJar.get('halfspeed_session')).not.toBe(replaced.get('halfspeed_session'))

  const here = new Map(cookieJar)
  expect(await redirectOf(signOut())).toBe('/sign-in')
  expect(cookieJar.size).toBe(0)
  const actorWith = async (jar: Map<string, string>) => {
    for (const [name, value] of jar) cookieJar.set(name, value)
    return getActor()
  }
  expect(await actorWith(here)).toBeNull()
  expect(await actorWith(replaced)).toBeNull()
  expect(await actorWith(elsewhere)).toMatchObject({ userId })
})

test('a person who belongs to no shop is told so, after the password only', async () => {
  const { userId: alone } = await createPersonWithShop({ name: 'Al', email: 'al@bench.example', password, shopName: 'Left' }, '192.0.2.1')
  await database.orm.em.fork().nativeDelete(Membership, { user: alone })
  expect(await attempt({ email: 'al@bench.example', password: 'wrong, surely' })).toMatchObject({ code: 'wrongSignIn' })
  expect(await attempt({ email: 'al@bench.example' })).toMatchObject({ code: 'noShop', formError: expect.stringContaining('no shop') })
})
