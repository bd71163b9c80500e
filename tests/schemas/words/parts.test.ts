import { describe, expect, test } from 'vitest'
import type { PartError } from '@/lib/calc/live'
import { noticeWords, partTitle, withheldWords } from '@/lib/words/parts'
import { someCases } from '@/tests/support/cases'

const error = (code: PartError['code'], change: Partial<PartError> = {}): PartError => ({ code, field: 'sheet.cycle', value: null, limit: null, unit: null, message: 'A reason of its own.', ...change })
const notice = (code: string, value: number, limit: string) => noticeWords({ code, severity: 'info', field: 'sheet.cycle.volumetricEfficiency', value, limit, source: 'trade' })

describe('what stands in place of a figure', () => {
  test.each(someCases(Object.keys(partTitle).filter((name): name is keyof typeof partTitle => Object.hasOwn(partTitle, name))))('%s has a title', (name) => {
    expect(withheldWords(name, error('input')).title).toBe(`${partTitle[name]}: withheld`)
  })

  test('a charge that does not match the power curve is said in the title, with what to do', () => {
    const { title, reason } = withheldWords('detonation', error('chargeMismatch'))
    expect(title).toBe('Detonation: the charge does not match the power curve')
    expect(reason).toMatch(/^A reason of its own\. .*no margin is shown.*leave it empty/)
  })

  test('a charge or a burn that cannot be found keeps its reason and says what it means', () => {
    for (const code of someCases(['chargeUnsolved', 'burnUncalibrated'] as const)) expect(withheldWords('pressure', error(code)).reason).toMatch(/^A reason of its own\. .{20,}/)
  })

  test('what is being computed, what a saved revision lacks and what failed are three things', () => {
    expect(withheldWords('spark', error('notComputed')).title).toBe('Spark voltage: being computed')
    expect(withheldWords('spark', error('notComputed'), true)).toMatchObject({ title: 'Spark voltage: not computed', reason: expect.stringMatching(/saved this revision/) })
    expect(withheldWords('spark', error('notComputed', { value: 'failed' }))).toEqual({ title: 'Spark voltage: not computed', reason: 'A reason of its own.' })
  })
})

describe('notices', () => {
  test('a typed charge says how far it misses the power', () => {
    expect(notice('chargeTyped', 0.8, '-3.2 %')).toContain('0.8, and makes 3.2 % less power')
    expect(notice('chargeTyped', 0.9, '4.0 %')).toContain('4 % more power')
  })
  test('one without words keeps its code', () => {
    expect(notice('somethingNew', 1, '')).toBe('somethingNew')
  })
})
