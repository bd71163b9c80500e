import { describe, expect, it } from 'vitest'
import * as calc from '@/lib/calc'
import { computedText, differenceText, expectedText, toleranceText } from '@/lib/method/check-figures'
import { allowedDifference, isOutside, judgeCheck, usesFormula } from '@/lib/method/judge-check'
import { rememberLast } from '@/lib/method/remember-last'
import { casesOfTopic } from '@/lib/method/topic-cases'
import type { PublishedCase, PublishedCheck } from '@/tests/published/published-case'

const check = (parts: Partial<PublishedCheck>): PublishedCheck => ({ label: 'angle', fn: 'crankDegFromMs', args: [1, 2000], expected: 12, tolerance: { abs: 0.05 }, ...parts })

describe('judging', () => {
  it('takes what the library gives', () => {
    expect(judgeCheck(calc, check({}))).toEqual({ ok: true, computed: 12, difference: 0, isWithin: true })
  })

  it('holds the edge of the tolerance, and not beyond', () => {
    expect(judgeCheck(calc, check({ expected: 11.5, tolerance: { abs: 0.5 } }))).toMatchObject({ difference: 0.5, isWithin: true })
    expect(judgeCheck(calc, check({ expected: 11.5, tolerance: { abs: 0.4999 } }))).toMatchObject({ isWithin: false })
  })

  it('takes a relative tolerance of the expected figure, whatever its sign', () => {
    expect(allowedDifference(check({ expected: -200, tolerance: { rel: 0.01 } }))).toBe(2)
  })

  it('says what the library threw, and counts it as outside', () => {
    const outcome = judgeCheck(calc, check({ args: [1, -1] }))
    expect(outcome).toMatchObject({ ok: false })
    expect(isOutside(outcome)).toBe(true)
    expect(judgeCheck({}, check({}))).toEqual({ ok: false, message: 'the library has no function crankDegFromMs' })
  })

  it('divides by the other call where a ratio was published', () => {
    expect(judgeCheck(calc, check({ expected: 0.5, over: { fn: 'crankDegFromMs', args: [2, 2000] } }))).toMatchObject({ computed: 0.5 })
  })

  it('knows when the formula parser is needed, on either side of a ratio', () => {
    const channel = { schedule: { kind: 'formula', expression: '10' } }
    expect(usesFormula(check({}))).toBe(false)
    expect(usesFormula(check({ args: [channel, { rpm: 1 }] }))).toBe(true)
    expect(usesFormula(check({ over: { fn: 'sparkAdvanceDeg', args: [channel, { rpm: 1 }] } }))).toBe(true)
  })
})

describe('remembering the last answer', () => {
  const counting = () => {
    let calls = 0
    const library = rememberLast({ version: '1', twice: (input: { x: number }) => {
      calls += 1
      if (input.x < 0) throw new RangeError('below 0')
      return 2 * input.x
    } })
    const twice = library.twice
    if (typeof twice !== 'function') throw new Error('no function')
    return { ask: (x: number): unknown => Reflect.apply(twice, undefined, [{ x }]), calls: () => calls, library }
  }

  it('asks once for equal arguments, anew for others', () => {
    const { ask, calls } = counting()
    expect([ask(1), ask(1), ask(2), ask(1)]).toEqual([2, 2, 4, 2])
    expect(calls()).toBe(3)
  })

  it('keeps no error, and what is no function as it is', () => {
    const { ask, calls, library } = counting()
    expect(() => ask(-1)).toThrow('below 0')
    expect(() => ask(-1)).toThrow('below 0')
    expect(calls()).toBe(2)
    expect(library.version).toBe('1')
  })
})

describe('figures', () => {
  it.each([
    ['as printed, with its last zero', check({ expected: 110.03, tolerance: { abs: 0.0005 } }), 110.0304, '110.030', '110.03040', '+0.000400', '±0.0005'],
    ['a whole number', check({ expected: 12600, tolerance: { abs: 0.5 } }), 12599.8, '12\u202f600', '12\u202f599.80', '−0.200', '±0.5'],
    ['a tolerance with a reason says nothing of the digits', check({ expected: 0.9, tolerance: { abs: 0.02 }, toleranceReason: 'Said as “about”.' }), 0.9101, '0.9', '0.910', '+0.0101', '±0.02'],
    ['a small one in powers of ten', check({ expected: 3.50133e-5, tolerance: { rel: 1e-5 } }), 3.5013314e-5, '3.50133\u00a0×\u00a010⁻⁵', '3.501331\u00a0×\u00a010⁻⁵', '+1.4\u00a0×\u00a010⁻¹¹', '±0.00001 of it'],
    ['dust of rounding is no difference', check({ expected: 0.8, tolerance: { abs: 0.005 } }), 0.8 + 1e-15, '0.80', '0.8000', '0', '±0.005'],
    ['a count has no decimals', check({ expected: 392, tolerance: { abs: 1e-9 } }), 392, '392', '392', '0', '±1\u00a0×\u00a010⁻⁹'],
    ['none', check({ expected: 0, tolerance: { abs: 0.05 } }), 0, '0', '0', '0', '±0.05'],
  ])('%s', (_, one, value, expected, computed, difference, tolerance) => {
    expect([expectedText(one), computedText(one, value), differenceText(one, value - one.expected), toleranceText(one)]).toEqual([expected, computed, difference, tolerance])
  })
})

describe('cases of a topic', () => {
  const published: PublishedCase = {
    id: 'two', title: 'Two functions', source: 'heywood-1988', where: 'fig. 1', provenance: 'memory',
    checks: [check({ label: 'first' }), check({ label: 'second', fn: 'arcMm', args: [1, 1] })],
  }

  it('hold the checks of its functions only, with where they are from', () => {
    expect(casesOfTopic({ functions: ['arcMm'] }, [published])).toEqual([{
      id: 'two', title: 'Two functions', provenance: 'memory', source: 'J. B. Heywood 1988 (from memory), fig. 1', note: null, checks: [published.checks[1]],
    }])
    expect(casesOfTopic({ functions: ['morseTest'] }, [published])).toEqual([])
  })
})
