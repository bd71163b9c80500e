import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { sparkAdvanceDeg, type AdvanceAt } from '@/lib/calc'
import { expectCalcError } from '@/tests/support/expect-calc-error'
import { expectClose } from '@/tests/support/expect-close'
import { formula } from './channels'

const value = (expression: string, rpm = 1000, mapKpa = 80) => sparkAdvanceDeg(formula(expression), { rpm, mapKpa })
const refused = (expression: string, at?: AdvanceAt) => expectCalcError(() => sparkAdvanceDeg(formula(expression), at ?? { rpm: 1000, mapKpa: 80 }), 'channel.schedule.expression')

describe('what a formula can say', () => {
  it.each([
    ['12', 12], ['-2^2', -4], ['2^3^2', 512], ['(2 + 3) * 4 / 8 - 1', 1.5], ['+rpm / 100', 10], ['- - 3', 3], ['1.5e1 + .5 + 2.', 17.5],
    ['0.02 rpm', 20], ['1/2 map', 40], ['2(3 + 4)', 14], ['min(30, rpm / 20, map)', 30], ['max(7)', 7], ['abs(map - 100)', 20], ['sqrt (map + 1)', 9],
    ['rpm < 400 ? 8 : 26', 26], ['rpm >= 1000 and map != 80 ? 1 : rpm == 1000 ? 2 : 3', 2], ['not (rpm > 900) or map <= 80 ? 5 : 6', 5],
    ['900 < rpm < 1100 ? 1 : 2', 1], ['900 < rpm < 1000 ? 1 : 2', 2], ['(rpm > 5) ? (1) : 2', 1], ['max(3, 20 - 1 / 0)', 3], ['0 ^ 0', 1], ['12   ', 12], ['\t12', 12],
  ])('%s', (expression, expected) => {
    expectClose(value(expression), expected, { rel: 1e-12 })
  })

  it('asks for the pressure only where map stands in it', () => {
    expect(sparkAdvanceDeg(formula('rpm / 100'), { rpm: 1000 })).toBe(10)
    for (const expression of ['map', 'rpm > 1 ? 1 : abs(-map)', 'map > 50 ? 1 : 2', 'not (1 < 2 and min(1, map) < 2) ? 1 : 2', '2 ^ sqrt(map)']) {
      expectCalcError(() => sparkAdvanceDeg(formula(expression), { rpm: 1000 }), 'mapKpa')
    }
  })

  it('agrees with the arithmetic of the language', () => {
    const number = fc.integer({ min: -50, max: 50 })
    const sign = fc.constantFrom('+', '-', '*', '/')
    fc.assert(fc.property(number, sign, number, sign, number, (a, first, b, second, c) => {
      const expression = `(${a}) ${first} (${b}) ${second} (${c})`
      const expected: unknown = new Function(`return ${expression}`)()
      if (Number.isFinite(expected)) expectClose(value(expression), expected, { rel: 1e-12, abs: 1e-12 })
      else refused(expression)
    }))
  })
})

describe('what a formula cannot say, and where', () => {
  it.each([
    ['12 + pi', 5], ['e', 0], ['2 i', 2], ['rpm * tau', 6], ['12 mm', 3], ['sin(rpm)', 0], ['1 + random()', 4], ['import("x")', 0], ['evaluate("1")', 0],
    ['rpm xor 2', 4], ['5 mod 3', 2], ['5 to 3', 2], ['5 in 3', 2], ['true', 0], ['Infinity', 0], ['NaN', 0], ['null', 0], ['constructor', 0], ['Rpm', 0], ['0x10', 1],
    ['5 % 3', 2], ['5!', 1], ['rpm = 5', 4], ['rpm; 5', 3], ['rpm\n5', 3], ['[1, 2]', 0], ['{a: 1}', 0], ['"a"', 0], ['rpm.x', 3], ['1 & 2', 2], ['1 | 2', 2], ['~1', 0],
    ['# x', 0], ['rpm \' 2', 4], ['20 − 3', 3], ['3 × 4', 2], ['2 .* 3', 2], ['2.*3', 1], ['2 ° 3', 2], ['a\u0000', 0], ['😀', 0], ['größe', 0],
  ])('%s at %i', (expression, at) => {
    expect(refused(expression).at).toBe(at)
  })

  it.each([
    ['rpm +', 5], ['(rpm', 4], ['rpm)', 3], ['rpm < 3 ? 4', 11], ['5 6', 2], ['*5', 0], ['min(1,', 6], ['()', 1], ['rpm ? ? 2 : 3', 6], ['1 + * 2', 4],
    ['rpm(2)', 0], ['1 + map(2)', 4], ['max', 0], ['2 + max * 3', 4], ['min()', 0], ['abs(1, 2)', 0], ['3 + sqrt()', 4], ['sqrt(1, 2)', 0], ['1e999', 0], ['2 + 1e400', 4],
    ['rpm < 5', 4], ['1 + (rpm < 5)', 9], ['not 1', 0], ['1 and 2', 2], ['3 > 2 > 1', 0], ['min(rpm < 5, 2)', 8], ['rpm ? 1 : 2', 0], ['rpm + 1 ? 1 : 2', 0],
    ['(rpm) ? 1 : 2', 1], ['rpm < 5 and 3 ? 1 : 2', 12], ['(rpm < 5) + 1 ? 1 : 2', 0], ['1 : 2', 0], ['(1 < 2) < 3 ? 1 : 2', 3], ['1 << 2', 2], ['1 >> 2', 2], ['2 ?? 3', 2],
    ['1, 2', 1], ['-max', 1], ['not', 3], ['rpm not 5', 4],
  ])('%s, of the wrong form, at %i', (expression, at) => {
    const error = refused(expression)
    expect(`${error.at} ${error.message}`).toMatch(new RegExp(`^${at} `))
  })

  it('says what to write instead, and counts characters from 1 for people', () => {
    expect(refused('20 − 3').message).toBe('The formula cannot be used, at character 4: “−” is not allowed; write -.')
    expect(refused('12 + pi').message).toContain('character 6: “pi” is not a name it knows')
  })

  it('has no value at this speed', () => {
    for (const expression of ['1 / (rpm - 1000)', 'sqrt(900 - rpm)', '(900 - rpm) ^ 0.5', '0 * (1 / 0)', 'sqrt(-1) ^ 0', 'sqrt(-1) < 3 ? 1 : 2', 'not (sqrt(-1) < 3) ? 1 : 2', 'max(1, sqrt(-1))', '10 ^ rpm', '1 > 0 and sqrt(-1) < 3 ? 1 : 2']) {
      const error = refused(expression)
      expect(error.at).toBeUndefined()
      expect(error.value).toBe(expression)
    }
    expect(value('rpm > 900 or sqrt(-1) < 3 ? 1 : 2')).toBe(1)
  })

  it('is no text, empty, or too long', () => {
    for (const bad of ['', '   ', undefined, null, 5, ['12'], {}]) expectCalcError(() => sparkAdvanceDeg(formula(bad as never), { rpm: 1 }), 'channel.schedule.expression')
    refused(`${'1+'.repeat(250)}1`)
    expect(value(`${'1+'.repeat(249)}1`)).toBe(250)
  })

  it('nests as deep as its length allows without running out of stack', () => {
    expect(value(`${'('.repeat(249)}1${')'.repeat(249)}`)).toBe(1)
    expectClose(value(`${'-'.repeat(498)}1`), 1, { rel: 1e-12 })
    expect(value(`${'1^'.repeat(249)}1`)).toBe(1)
    expect(value(`${'1>2?3:'.repeat(80)}1`)).toBe(1)
    expect(value(`${'abs('.repeat(99)}1${')'.repeat(99)}`)).toBe(1)
  })

  it('never crashes on any text', () => {
    const piece = fc.constantFrom('rpm', 'map', 'min', 'max(', 'abs(', 'sqrt(', '(', ')', '1', '2.5', '+', '-', '*', '/', '^', ',', '?', ':', '<', '>=', '==', ' and ', ' or ', 'not ', ' ', '.', 'e', '%', '!')
    const text = fc.oneof(fc.array(piece, { maxLength: 14 }).map((pieces) => pieces.join('')), fc.string({ unit: 'grapheme', maxLength: 30 }))
    fc.assert(fc.property(text, (expression) => {
      try {
        expect(Number.isFinite(value(expression))).toBe(true)
      } catch (error) {
        expect(error).toMatchObject({ name: 'CalcError', field: 'channel.schedule.expression' })
      }
    }), { numRuns: 2000 })
  })
})
