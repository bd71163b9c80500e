import { describe, expect, it } from 'vitest'
import { someCases } from '@/tests/support/cases'
import { deepFreeze } from '@/tests/support/deep-freeze'
import { expectCalcError } from '@/tests/support/expect-calc-error'
import { expectClose } from '@/tests/support/expect-close'

describe('expectClose', () => {
  it('accepts what lies within the wider of the two tolerances', () => {
    expectClose(100.00009, 100, { rel: 1e-6 })
    expectClose(0.001, 0, { abs: 0.001 })
    expectClose(5.4, 5, { rel: 1e-9, abs: 0.5 })
  })

  it('rejects what lies outside, and everything that is no number', () => {
    expect(() => expectClose(100.0002, 100, { rel: 1e-6 })).toThrow('off by')
    expect(() => expectClose(1e-12, 0, { rel: 1 })).toThrow('off by')
    for (const bad of [Number.NaN, Infinity, undefined, null, '5']) {
      expect(() => expectClose(bad, 5, { abs: 1e9 })).toThrow('finite')
      expect(() => expectClose(5, bad, { abs: 1e9 })).toThrow('finite')
    }
  })

  it('rejects a missing or meaningless tolerance', () => {
    expect(() => expectClose(1, 1, {})).toThrow('needs a tolerance')
    for (const rel of [Number.NaN, Infinity, -1]) expect(() => expectClose(1, 1, { rel })).toThrow('rel must be')
  })
})

it('an empty case list is refused', () => {
  expect(() => someCases([])).toThrow('tests nothing')
  expect(someCases([1])).toEqual([1])
})

it('a frozen value cannot be written to at any depth', () => {
  const value = deepFreeze({ a: { b: [{ c: 1 }] } })
  expect(() => { (value.a.b[0] as { c: number }).c = 2 }).toThrow(TypeError)
})

it('expectCalcError rejects another error and no error', () => {
  expect(() => expectCalcError(() => { throw new Error('other') }, 'x')).toThrow('other')
  expect(() => expectCalcError(() => 5, 'x')).toThrow('expected a CalcError on x')
})
