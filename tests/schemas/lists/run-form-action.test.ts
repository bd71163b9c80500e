import { describe, expect, it, onTestFinished, vi } from 'vitest'
import { AppError } from '@/lib/errors'
import { listData } from '@/lib/list-data'
import { runFormAction } from '@/lib/run-form-action'
import { digestOf, formOf, redirectOf } from '@/tests/data/support/next-mocks'

const refused = (code: 'inUse' | 'signedOut' | 'notFound') => () => Promise.reject(new AppError(code))
const done = async () => {}

describe('an action behind a single button', () => {
  it('ends on the page it came from, without the word of an earlier failure', async () => {
    expect(await redirectOf(runFormAction(done, formOf({ next: '/engines?state=archived&problem=inUse' }), '/home'))).toBe('/engines?state=archived')
    expect(await redirectOf(runFormAction(done, formOf({}), '/engines/7'))).toBe('/engines/7')
  })

  it('takes an expected failure back to that page as its code', async () => {
    expect(await redirectOf(runFormAction(refused('inUse'), formOf({ next: '/engines?state=archived' }), '/home'))).toBe('/engines?state=archived&problem=inUse')
    expect(await redirectOf(runFormAction(refused('inUse'), formOf({}), '/engines/7'))).toBe('/engines/7?problem=inUse')
  })

  it('never leads to another site', async () => {
    for (const next of ['https://elsewhere.example/', '//elsewhere.example', 'javascript:alert(1)'])
      expect(await redirectOf(runFormAction(done, formOf({ next }), '/engines/7'))).toBe('/engines/7')
  })

  it('sends someone signed out to sign in and back, and what is not there to the not-found page', async () => {
    expect(await redirectOf(runFormAction(refused('signedOut'), formOf({ next: '/engines/7' }), '/home'))).toBe('/sign-in?next=%2Fengines%2F7')
    const thrown: unknown = await runFormAction(refused('notFound'), formOf({}), '/home').catch((error: unknown) => error)
    expect(digestOf(thrown)).toBe('NEXT_HTTP_ERROR_FALLBACK;404')
  })

  it('leaves the unexpected to the framework', async () => {
    await expect(runFormAction(() => Promise.reject(new Error('broken')), formOf({}), '/home')).rejects.toThrow('broken')
  })
})

describe('what the page of a list reads', () => {
  it('is the list, or the sentence of an address that leads to none', async () => {
    expect(await listData(async () => 7)).toEqual({ ok: true, data: 7 })
    const read = await listData(() => Promise.reject(new AppError('badAddress', { fieldErrors: { sort: 'Sort by name.' } })))
    expect(read).toEqual({ ok: false, sentence: 'Part of this address cannot be read. Open the list from its start.', fieldErrors: { sort: 'Sort by name.' } })
  })

  it('ends on its own page where the role may not or nothing is there, and throws the rest', async () => {
    // What the setting `authInterrupts` of the framework's build puts in place.
    vi.stubEnv('__NEXT_EXPERIMENTAL_AUTH_INTERRUPTS', 'true')
    onTestFinished(() => void vi.unstubAllEnvs())
    for (const [code, digest] of [['forbidden', 'NEXT_HTTP_ERROR_FALLBACK;403'], ['notFound', 'NEXT_HTTP_ERROR_FALLBACK;404']] as const) {
      const thrown: unknown = await listData(() => Promise.reject(new AppError(code))).catch((error: unknown) => error)
      expect(digestOf(thrown)).toBe(digest)
    }
    await expect(listData(() => Promise.reject(new AppError('unavailable')))).rejects.toMatchObject({ code: 'unavailable' })
  })
})
