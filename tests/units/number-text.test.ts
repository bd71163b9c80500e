import { describe, expect, it } from 'vitest'
import { readNumber } from '@/lib/units/number-text'
import { someCases } from '@/tests/support/cases'

const nb = '\u00a0'
const narrow = '\u202f'
const thin = '\u2009'

describe('numbers that have one reading', () => {
  it.each(someCases<readonly [string, number]>([
    ['26.5', 26.5], ['26,5', 26.5], [' 26.5 ', 26.5], ['.5', 0.5], [',5', 0.5], ['26.', 26], ['26,', 26], ['007', 7],
    ['-3', -3], ['\u22123', -3], ['\u20133', -3], ['\u20113', -3], ['+3', 3], ['- 3', -3], ['\u200b3', 3],
    ['1e3', 1000], ['1E3', 1000], ['4.2e-4', 0.00042], ['4,2e-4', 0.00042], ['1e+3', 1000],
    ['3.2·10⁻⁶', 3.2e-6], ['3.2 × 10^-6', 3.2e-6], ['3,2x10⁻⁶', 3.2e-6], ['4*10^3', 4000], ['4·10⁺³', 4000], ['-2·10¹²', -2e12],
    ['10 000', 10000], [`10${nb}000`, 10000], [`10${narrow}000`, 10000], [`10${thin}000`, 10000], ['1 234 567', 1234567], ["10'000", 10000], ['10’000', 10000],
    ['1 234,5', 1234.5], ['1 234,567', 1234.567], ['1 234.567', 1234.567],
    ['1,234.5', 1234.5], ['1.234,5', 1234.5], ['1,234,567', 1234567], ['1.234.567', 1234567], ['1,234,567.8', 1234567.8], ['1.234.567,8', 1234567.8],
    ['3.386', 3.386], ['1.234', 1.234], ['0,125', 0.125], ['-0,125', -0.125], ['1234,567', 1234.567], ['1,2345', 1.2345], ['12,50', 12.5],
    ['0', 0], ['0.000', 0],
  ]))('%s', (text, value) => {
    expect(readNumber(text)).toEqual({ ok: true, value, rest: '' })
  })

  it('never gives a negative zero', () => {
    const read = readNumber('-0')
    expect(read.ok && Object.is(read.value, 0)).toBe(true)
  })

  it.each(someCases<readonly [string, number, string]>([
    ['86 mm', 86, 'mm'], ['86mm', 86, 'mm'], ['2450 1/min', 2450, '/min'], ['2450 min-1', 2450, 'min-1'], ["5'", 5, "'"], ['3.4"', 3.4, '"'],
    ['10 000 ft', 10000, 'ft'], ['1e3mm', 1000, 'mm'], ['1e3 mm', 1000, 'mm'], ['2600 cm3', 2600, 'cm3'], ['4e-4 1/deg²', 0.0004, '/deg²'], ['5 em', 5, 'em'],
    ['3.2·10⁻⁶ /h', 3.2e-6, '/h'], ['3·10', 3, '·10'], ['3 x 10', 3, 'x 10'],
  ]))('%s leaves its unit behind', (text, value, rest) => {
    expect(readNumber(text)).toEqual({ ok: true, value, rest })
  })
})

describe('numbers that are refused', () => {
  it.each(someCases<readonly [string, string]>([
    ['', 'noNumber'], ['abc', 'noNumber'], ['Infinity', 'noNumber'], ['NaN', 'noNumber'], ['.', 'noNumber'], ['-', 'noNumber'], ['mm', 'noNumber'],
    ['--5', 'malformed'], ['+-5', 'malformed'], ['x5', 'malformed'], ['1,23.4', 'malformed'], ['1.2.3', 'malformed'], ['1,234,56', 'malformed'], ['1.234,5,6', 'malformed'],
    ['12,34,567', 'malformed'], ["5'10", 'malformed'], ['\u0665', 'noNumber'],
    ['26 5', 'twoNumbers'], ['10  000', 'twoNumbers'], ['1234 567', 'twoNumbers'], ['1 234.567 8', 'twoNumbers'],
    ['1/2', 'fraction'], ['3 5/8', 'fraction'], ['3 1/2 in', 'fraction'],
    ['1e999', 'tooBig'], ['-1e999', 'tooBig'], ['1e-999', 'tooSmall'],
  ]))('%s: %s', (text, problem) => {
    expect(readNumber(text)).toEqual({ ok: false, problem })
  })

  it.each(someCases<readonly [string, [string, string]]>([
    ['1,234', ['1.234', '1234']], ['-12,500', ['-12.500', '-12500']], ['100,000', ['100.000', '100000']], ['1,234e2', ['1.234e2', '1234e2']], ['10,500 rpm', ['10.500', '10500']],
  ]))('%s has two readings, and says both', (text, readings) => {
    expect(readNumber(text)).toEqual({ ok: false, problem: 'ambiguous', readings })
  })

  it('takes a comma before three digits where it cannot part thousands', () => {
    for (const text of someCases(['0,500', '00,500', '1234,500', '1 234,500'])) expect(readNumber(text).ok, text).toBe(true)
  })

  it('stays quick on a page of digits', () => {
    expect(readNumber('1 '.repeat(50_000)).ok).toBe(false)
    expect(readNumber(`${'1,'.repeat(50_000)}x`).ok).toBe(false)
  })
})
