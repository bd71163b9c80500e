import { describe, expect, it } from 'vitest'
import { evaluateRunUp, runUpDrop, type ExpectedDrops, type RunUpInput } from '@/lib/calc/live'
import { deepFreeze } from '@/tests/support/deep-freeze'
import { expectCalcError } from '@/tests/support/expect-calc-error'
import { expectClose } from '@/tests/support/expect-close'

const expected: ExpectedDrops = { primaryDropRpm: 10, backupDropRpm: 60, toleranceRpm: 25 }
const check = (change: Partial<RunUpInput>) => evaluateRunUp(deepFreeze({ bothRpm: 1800, primaryRpm: 1790, backupRpm: 1735, expected, ...change }))
const both = (backupRpm: number, change: Partial<ExpectedDrops> = {}) => check({ backupRpm, expected: { ...expected, ...change } }).backup.verdict

describe('evaluateRunUp', () => {
  it('takes the drops from the speed on both channels', () => {
    expect(check({})).toEqual({
      primary: { dropRpm: 10, expectedRpm: 10, verdict: 'within' }, backup: { dropRpm: 65, expectedRpm: 60, verdict: 'within' }, differenceRpm: 55, pass: true,
    })
  })

  it('without it the primary is the reference', () => {
    const { bothRpm, ...single } = { bothRpm: 1800, primaryRpm: 1790, backupRpm: 1735, expected }
    expect(bothRpm).toBe(1800)
    expect(evaluateRunUp(single)).toEqual({ primary: null, backup: { dropRpm: 55, expectedRpm: 60, verdict: 'within' }, differenceRpm: 55, pass: true })
    expect(evaluateRunUp({ ...single, backupRpm: 1600 })).toMatchObject({ primary: null, backup: { verdict: 'tooLarge' }, pass: false })
  })

  it('judges each channel against its own expectation, the tolerance included', () => {
    expect([1714, 1715, 1765, 1766].map((rpm) => both(rpm))).toEqual(['tooLarge', 'within', 'within', 'tooSmall'])
    expect(both(1715 - 9e-10)).toBe('within')
    expect(both(1715 - 2e-9)).toBe('tooLarge')
    expect(check({ primaryRpm: 1750 })).toMatchObject({ primary: { dropRpm: 50, verdict: 'tooLarge' }, pass: false })
    expect(check({ primaryRpm: 1830 })).toMatchObject({ primary: { dropRpm: -30, verdict: 'tooSmall' }, differenceRpm: 95, pass: false })
  })

  it('no drop at all is right on a primary expected at 0 and a finding on a backup, however wide the tolerance', () => {
    expect(check({ primaryRpm: 1800, expected: { ...expected, primaryDropRpm: 0 } })).toMatchObject({ primary: { dropRpm: 0, verdict: 'within' }, pass: true })
    expect(both(1800)).toBe('tooSmall')
    expect(both(1800, { toleranceRpm: 100 })).toBe('tooSmall')
    expect(both(1801, { toleranceRpm: 100 })).toBe('tooSmall')
    expect(both(1799, { toleranceRpm: 100 })).toBe('within')
    expect(both(1800, { backupDropRpm: 0 })).toBe('within')
    expect(both(1810, { backupDropRpm: -5 })).toBe('within')
  })

  it('a computed drop is within itself', () => {
    const { rpm, dropRpm } = runUpDrop({ rpm: 1800, torqueRatio: 0.92, torqueExponent: -0.5 })
    const result = check({ primaryRpm: 1800, backupRpm: rpm, expected: { primaryDropRpm: 0, backupDropRpm: dropRpm, toleranceRpm: 0 } })
    expect(result.pass).toBe(true)
    expectClose(result.differenceRpm, dropRpm, { rel: 1e-12 })
  })

  it('names what cannot be used', () => {
    for (const bad of [Number.NaN, Infinity, -1, null, '1800']) expectCalcError(() => check({ bothRpm: bad as never }), 'bothRpm')
    for (const bad of [Number.NaN, -1, undefined, null, '1800']) {
      expectCalcError(() => check({ primaryRpm: bad as never }), 'primaryRpm')
      expectCalcError(() => check({ backupRpm: bad as never }), 'backupRpm')
    }
    for (const bad of [undefined, null, 5, []]) expectCalcError(() => check({ expected: bad as never }), 'expected')
    for (const field of ['primaryDropRpm', 'backupDropRpm', 'toleranceRpm'] as const) {
      for (const bad of [Number.NaN, Infinity, undefined, null, '5']) expectCalcError(() => check({ expected: { ...expected, [field]: bad } }), `expected.${field}`)
    }
    expectCalcError(() => check({ expected: { ...expected, toleranceRpm: -1 } }), 'expected.toleranceRpm')
    expectCalcError(() => evaluateRunUp(undefined as never), 'primaryRpm')
  })
})
