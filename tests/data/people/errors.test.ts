import { notFound, redirect } from 'next/navigation'
import { afterEach, expect, test, vi } from 'vitest'
import { z } from 'zod'
import { toDto } from '@/lib/data/support/dto'
import { AppError, errorStatus, type ErrorCode } from '@/lib/errors'
import { runAction } from '@/lib/run-action'
import { runPlainAction } from '@/lib/run-plain-action'
import { runRoute } from '@/lib/run-route'
import { errorWords, wordsOfError } from '@/lib/words/errors'
import { digestOf, formOf, redirectOf } from '../support/next-mocks'

const log = vi.spyOn(console, 'error').mockImplementation(() => {})
afterEach(() => log.mockClear())
const throwing = (error: unknown) => async () => { throw error }

test('every code has a status and a sentence that ends as one', () => {
  const codes = Object.keys(errorStatus) as ErrorCode[]
  expect(codes.sort()).toEqual(Object.keys(errorWords).sort())
  for (const code of codes) {
    expect(wordsOfError(code)).toMatch(/^[A-Z].*\.$/)
    expect(wordsOfError(code, { what: 'engine', id: 'abc', waitSeconds: 5 })).not.toMatch(/undefined|NaN/)
    expect(new AppError(code).status).toBe(errorStatus[code])
  }
  expect(wordsOfError('tooMany', { waitSeconds: 60 })).toContain('Wait a minute')
  expect(wordsOfError('tooMany', { waitSeconds: 61 })).toContain('Wait 2 minutes')
})

test('an action returns its data', async () => {
  expect(await runAction(async () => 7)).toEqual({ ok: true, data: 7 })
})

test('an action shows an expected error, echoes what was typed, and no secret of any name', async () => {
  const form = formOf({ name: 'Six', newPassword: 'hush', apiToken: 'hush', $ACTION_KEY: 'k' })
  form.set('file', new File(['x'], 'x.csv'))
  const theirs = { revision: 4 }
  expect(await runAction(throwing(new AppError('conflict', { what: 'scenario', conflict: theirs })), form)).toEqual({
    ok: false, code: 'conflict', formError: expect.stringMatching(/^Someone else saved this scenario/), values: { name: 'Six' }, conflict: theirs,
  })
  expect(log).not.toHaveBeenCalled()
})

test('zod and calculation errors stand at their fields, the first of each', async () => {
  const schema = z.object({ rows: z.array(z.object({ rpm: z.number('Speed is a number.').min(9, 'At least 9.') })), name: z.string('Name it.') })
  const zod = schema.safeParse({ rows: [{ rpm: 9 }, { rpm: 'x' }] }).error
  expect(await runAction(throwing(zod))).toMatchObject({ code: 'invalid', fieldErrors: { 'rows.1.rpm': 'Speed is a number.', 'name': 'Name it.' } })
  const whole = z.string().refine(() => false, 'The sum is not 720.').safeParse('x').error
  expect(await runAction(throwing(whole))).toMatchObject({ fieldErrors: { form: 'The sum is not 720.' } })
  const calc = Object.assign(new RangeError('Bore must be above 0 mm.'), { field: 'boreMm' })
  expect(await runAction(throwing(calc))).toMatchObject({ code: 'invalid', fieldErrors: { boreMm: 'Bore must be above 0 mm.' } })
  expect(await runAction(throwing(new RangeError('Invalid array length')))).toMatchObject({ code: 'unexpected' })
})

test('an unexpected error is logged once, with the id that is shown, and its text stays inside', async () => {
  const state = await runAction(throwing(new Error('the secret is out')))
  expect(log).toHaveBeenCalledOnce()
  const entry = JSON.parse(String(log.mock.calls[0]?.[0])) as { id: string, message: string }
  expect(entry).toMatchObject({ level: 'error', message: 'the secret is out', stack: expect.arrayContaining([expect.stringMatching(/^at /)]) })
  expect(state).toMatchObject({ ok: false, code: 'unexpected', formError: expect.stringContaining(`reference ${entry.id}.`) })
  expect(JSON.stringify(state)).not.toContain('secret')
})

test('the log keeps the words of the database and leaves out the statement with its values', async () => {
  const message = `insert into "users" ("password_hash", "name") values ('$argon2id$x', 'Ada\nFell - Lane') returning "id" - deadlock detected`
  await runAction(throwing(new Error(message)))
  const entry = String(log.mock.calls[0]?.[0])
  expect(JSON.parse(entry)).toMatchObject({ message: 'deadlock detected' })
  expect(entry).not.toMatch(/argon2id|Ada|Fell/)
})

test.each([
  Object.assign(new Error('x'), { code: '57P01' }), Object.assign(new Error('x'), { code: 'ECONNREFUSED' }),
  Object.assign(new Error('x'), { code: '53300' }), new Error('Connection terminated unexpectedly'),
  new AggregateError([Object.assign(new Error('x'), { code: 'ECONNREFUSED' })]),
])('a database that is down is said to be: %s', async (error) => {
  expect(await runAction(throwing(error))).toMatchObject({ code: 'unavailable', formError: expect.stringContaining('nothing was saved') })
})

test('a breach of a rule of the database is not taken for one that is down', async () => {
  expect(await runAction(throwing(Object.assign(new Error('x'), { code: '23505' })))).toMatchObject({ code: 'unexpected' })
})

test('redirects and not-found pass through actions', async () => {
  expect(await redirectOf(runAction(async () => redirect('/engines')))).toBe('/engines')
  expect(await redirectOf(runPlainAction(async () => redirect('/engines')))).toBe('/engines')
  expect(digestOf(await runAction(async () => notFound()).catch((error: unknown) => error))).toContain('404')
  await expect(runPlainAction(throwing(new AppError('forbidden')))).rejects.toMatchObject({ code: 'forbidden' })
  await expect(runPlainAction(throwing(new TypeError('x')))).rejects.toThrow(TypeError)
})

test('a route answers with the status, the code and the words', async () => {
  const answer = async (error: unknown) => {
    const response = await runRoute(throwing(error))
    return { status: response.status, wait: response.headers.get('retry-after'), ...(await response.json() as object) }
  }
  expect(await answer(new AppError('notFound', { what: 'engine' }))).toEqual({ status: 404, wait: null, error: { code: 'notFound', message: expect.stringMatching(/^There is no such engine/) } })
  expect(await answer(new AppError('tooMany', { waitSeconds: 90 }))).toMatchObject({ status: 429, wait: '90' })
  expect(await answer(new Error('select'))).toMatchObject({ status: 500, error: { message: expect.not.stringContaining('select') } })
  const plain = await runRoute(async () => new Response('a,b', { headers: { 'content-type': 'text/csv' } }))
  expect(await plain.text()).toBe('a,b')
})

test('a result passes its schema: unnamed keys stay inside, a misfit is our mistake and not the field’s', async () => {
  const schema = z.object({ name: z.string() })
  expect(toDto(schema, { name: 'x', passwordHash: 'y' })).toEqual({ name: 'x' })
  expect(await runAction(async () => toDto(schema, { name: 1 }))).toMatchObject({ code: 'unexpected' })
})
