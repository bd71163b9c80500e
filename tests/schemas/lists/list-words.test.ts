import { describe, expect, it, onTestFinished, vi } from 'vitest'
import { rolesThatMay } from '@/lib/auth/who-may'
import { isNarrowed, listAddress, type ListParams } from '@/lib/list-address'
import { revisionNumber } from '@/lib/schemas/revision-number'
import { defaultLimits } from '@/lib/calc/limits'
import { limitLine } from '@/lib/words/limits'
import { countHead, scenarioHead } from '@/lib/words/list-heads'
import { problemWords } from '@/lib/words/problem'
import { dayWords, timeWords } from '@/lib/words/times'

const rows = (...outside: number[]) => outside.map((count) => ({ counts: { outside: count, close: 1, within: 4 } }))
const plain = { state: 'active', isFiltered: false, isPart: false, isOwn: false }

describe('head of the list of scenarios', () => {
  it('says how many lie outside a limit, and never that they are well', () => {
    expect(scenarioHead(rows(0, 2, 0, 1, 0), plain)).toBe('2 of 5 scenarios outside a limit')
    expect(scenarioHead(rows(1), plain)).toBe('1 of 1 scenario outside a limit')
    expect(scenarioHead(rows(0, 0), plain)).toBe('2 scenarios, none outside a limit')
    expect(scenarioHead(rows(1, 0), { ...plain, isOwn: true })).toBe('1 of your 2 scenarios outside a limit')
    expect(scenarioHead(rows(0, 0), { ...plain, isOwn: true })).toBe('Your 2 scenarios, none outside a limit')
    expect(scenarioHead(rows(0), { ...plain, isOwn: true })).toBe('Your scenario, none outside a limit')
  })

  it('does not count a page as the whole', () => {
    expect(scenarioHead(rows(1, 0), { ...plain, isPart: true })).toBe('1 of these 2 scenarios outside a limit')
    expect(scenarioHead(rows(0, 0), { ...plain, isPart: true })).toBe('These 2 scenarios, none outside a limit')
  })

  it('knows the other states and nothing at all', () => {
    expect(scenarioHead(rows(1, 1), { ...plain, state: 'archived' })).toBe('2 archived scenarios')
    expect(scenarioHead(rows(1), { ...plain, state: 'released' })).toBe('1 scenario with a released plan')
    expect(scenarioHead(rows(1, 3), { ...plain, state: 'outside' })).toBe('2 scenarios outside a limit')
    expect(scenarioHead([], plain)).toBe('No scenario yet')
    expect(scenarioHead([], { ...plain, isFiltered: true })).toBe('No scenario fits')
    expect(scenarioHead([], { ...plain, state: 'outside' })).toBe('No scenario outside a limit')
  })

  it('counts other things', () => {
    expect(countHead(3, 'engine', { isFiltered: false, isPart: false })).toBe('3 engines')
    expect(countHead(1, 'plan', { isFiltered: false, isPart: false, kind: 'released' })).toBe('1 released plan')
    expect(countHead(50, 'engine', { isFiltered: false, isPart: true })).toBe('The first 50 engines')
    expect(countHead(0, 'engine', { isFiltered: false, isPart: false })).toBe('No engine yet')
    expect(countHead(0, 'engine', { isFiltered: true, isPart: false })).toBe('No engine fits')
    expect(countHead(0, 'plan', { isFiltered: false, isPart: false, kind: 'released' })).toBe('No released plan')
  })
})

describe('address of a list', () => {
  it('keeps what was asked, and starts from the first page after any other change', () => {
    const params = { search: 'a b', state: 'outside', cursor: 'xyz' }
    expect(listAddress('/scenarios', params, { state: 'archived' })).toBe('/scenarios?search=a+b&state=archived')
    expect(listAddress('/scenarios', params, { cursor: 'next' })).toBe('/scenarios?search=a+b&state=outside&cursor=next')
    expect(listAddress('/scenarios', params, { state: null, search: '' })).toBe('/scenarios')
    expect(listAddress('/scenarios', params)).toBe('/scenarios?search=a+b&state=outside')
  })

  it('is narrowed by a search or an engine, not by state or order', () => {
    const asked: ListParams[] = [{ search: 'x' }, { engineId: '1' }, { state: 'outside' }, { sort: 'title' }, {}]
    expect(asked.map(isNarrowed)).toEqual([true, true, false, false, false])
  })

  it('takes only plain digits as the number of a revision', () => {
    expect(revisionNumber('12')).toBe(12)
    for (const text of ['0', '-1', '1.5', '1e3', ' 1', '١', '', undefined, ['1'], '12345678901']) expect(revisionNumber(text)).toBeNaN()
  })
})

describe('words around lists', () => {
  it('writes times in UTC and says so, whatever zone it runs in', () => {
    vi.stubEnv('TZ', 'Asia/Kolkata')
    onTestFinished(() => void vi.unstubAllEnvs())
    expect(new Date('2026-12-03T10:42:59.000Z').getHours()).toBe(16)
    expect(timeWords('2026-12-03T10:42:59.000Z')).toBe('3 Dec 2026, 10:42 UTC')
    expect(timeWords('2026-01-31T23:05:00.000-02:00')).toBe('1 Feb 2026, 01:05 UTC')
    expect(dayWords('2026-05-09T00:00:00.000Z')).toBe('9 May 2026')
  })

  it('gives the sentence of a failure in an address, and nothing of what is none', () => {
    expect(problemWords('inUse', 'engine')).toBe('This engine is used by scenarios, so it stays. Archive it instead.')
    for (const problem of ['toString', '<b>', '', undefined, ['inUse'], null]) expect(problemWords(problem, 'engine')).toBeNull()
  })

  it('names the roles that may', () => {
    expect(rolesThatMay('engine.write')).toEqual(['designer', 'owner'])
    expect(rolesThatMay('scenario.read', 'scenario.readOwn')).toEqual(['builder', 'designer', 'owner'])
  })

  it('puts limits into words with whose they are', () => {
    expect(limitLine(defaultLimits.proofAboveIdleRpm, 'metric')).toMatchObject({ title: 'Full timing shows at idle', limit: 'at most 100\u00a0rpm above idle', origin: 'common practice, no published source' })
    expect(limitLine(defaultLimits.markSpacingMm, 'us').limit).toContain('in/°')
    expect(Object.values(defaultLimits).map((limit) => limitLine(limit, 'metric').title)).not.toContain(undefined)
  })
})
