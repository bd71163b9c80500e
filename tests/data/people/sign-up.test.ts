import { beforeEach, expect, test, vi } from 'vitest'
import { signUp } from '@/app/(public)/sign-up/actions'
import { Membership, SignInLimit, User } from '@/entities/index'
import { countSignUp, limits } from '@/lib/auth/limits'
import { getActor } from '@/lib/auth/session'
import { freshDatabase } from '../support/fresh-database'
import { cookieJar, formOf, redirectOf, requestHeaders } from '../support/next-mocks'

vi.mock('next/headers', async () => (await import('../support/next-mocks')).nextHeaders())
const database = freshDatabase()
beforeEach(() => {
  cookieJar.clear()
  requestHeaders.set('x-forwarded-for', '192.0.2.1')
})

const before = { ok: false } as const
const fields = { name: 'Ada Fell', email: ' Ada@Fell.Example ', password: 'ten letters', shopName: 'Fell Shop', next: '' }

test('makes a person, a shop and its owner, and signs in', async () => {
  expect(await redirectOf(signUp(before, formOf(fields)))).toBe('/scenarios')
  expect([...cookieJar.keys()]).toEqual(['halfspeed_session'])
  expect(await getActor()).toMatchObject({ name: 'Ada Fell', email: 'ada@fell.example', unitSystem: 'metric', role: 'owner', shop: { name: 'Fell Shop' } })

  const user = await database.orm.em.fork().findOneOrFail(User, { email: 'ada@fell.example' })
  expect(user.passwordHash).toMatch(/^\$argon2id\$v=19\$m=32768,t=3,p=1\$/)
  expect(JSON.stringify(user)).not.toContain('argon2')
})

test('says that an address is taken, keeps what was typed but the password, and makes no second shop', async () => {
  const shops = async () => database.orm.em.fork().count(Membership)
  const count = await shops()
  expect(await signUp(before, formOf({ ...fields, shopName: 'Second', email: 'ADA@fell.example' }))).toEqual({
    ok: false,
    code: 'addressTaken',
    formError: expect.stringContaining('already has an account'),
    fieldErrors: { email: expect.stringContaining('already has an account') },
    values: { name: 'Ada Fell', email: 'ADA@fell.example', shopName: 'Second', next: '' },
  })
  expect(await shops()).toBe(count)
  expect(cookieJar.size).toBe(0)
})

test.each([
  ['email', 'nonsense', 'name@example.org'],
  ['email', '', 'Type your e-mail address.'],
  ['email', `${'a'.repeat(250)}@b.example`, 'at most 254'],
  ['password', 'nine long', '10 to 200 characters'],
  ['password', 'x'.repeat(201), '10 to 200 characters'],
  ['name', '   ', 'Type your name.'],
  ['name', 'n'.repeat(81), 'at most 80'],
  ['name', 'Ada\u0000', 'control characters'],
  ['shopName', '', 'Type the name of your shop.'],
])('refuses %s “%s” at its field', async (name, value, words) => {
  const state = await signUp(before, formOf({ ...fields, email: 'someone@else.example', [name]: value }))
  expect(state).toMatchObject({ ok: false, code: 'invalid', fieldErrors: { [name]: expect.stringContaining(words) } })
  expect(state.ok ? [] : Object.keys(state.fieldErrors ?? {})).toEqual([name])
  expect(JSON.stringify(state)).not.toContain(name === 'password' ? value : fields.password)
})

test('names every field that was left out', async () => {
  const state = await signUp(before, formOf({}))
  expect(state.ok ? [] : Object.keys(state.fieldErrors ?? {}).sort()).toEqual(['email', 'name', 'password', 'shopName'])
})

test('is limited per network address', async () => {
  requestHeaders.set('x-forwarded-for', '192.0.2.77')
  for (let i = 0; i < limits.signUpPerAddress.points; i++) await countSignUp('192.0.2.77')
  const state = await signUp(before, formOf({ ...fields, email: 'late@fell.example' }))
  expect(state).toMatchObject({ ok: false, code: 'tooMany', formError: 'Too many attempts. Wait 60 minutes, then try again.' })
  expect(await database.orm.em.fork().count(User, { email: 'late@fell.example' })).toBe(0)

  requestHeaders.set('x-forwarded-for', '192.0.2.78')
  expect(await redirectOf(signUp(before, formOf({ ...fields, email: 'late@fell.example' })))).toBe('/scenarios')
  const keys = (await database.orm.em.fork().findAll(SignInLimit)).map(({ key }) => key)
  expect(keys).toContain('signUpPerAddress:192.0.2.77')
})

test('two at once with one address make one person', async () => {
  const twice = [1, 2].map(() => signUp(before, formOf({ ...fields, email: 'twin@fell.example' })).catch((redirected: unknown) => redirected))
  const codes = (await Promise.all(twice)).map((end) => (end instanceof Error ? 'in' : (end as { code: string }).code)).sort()
  expect(codes).toEqual(['addressTaken', 'in'])
})
