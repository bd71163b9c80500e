import { describe, expect, it } from 'vitest'
import { formatInput, formatNumber, formatPowerOfTen, formatQuantity, formatQuantityText } from '@/lib/units/format'
import type { QuantityKind, UnitSystem } from '@/lib/units/quantities'
import { unitOf } from '@/lib/units/quantities'
import { someCases } from '@/tests/support/cases'

describe('numbers as shown', () => {
  it.each(someCases<readonly [number, number, string]>([
    [2780, 0, '2780'], [27801, 0, '27\u202f801'], [1234567.89, 1, '1\u202f234\u202f567.9'], [9999.5, 0, '10\u202f000'], [9999.4, 0, '9999'],
    [-3.25, 1, '\u22123.3'], [3.25, 1, '3.3'], [0.05, 1, '0.1'], [-0.05, 1, '\u22120.1'], [2.5, 0, '3'], [-2.5, 0, '\u22123'],
    [1.005, 2, '1.01'], [1.0049999999999999, 2, '1.01'], [1.00499, 2, '1.00'], [8.345, 2, '8.35'], [0.615, 2, '0.62'], [1.45, 1, '1.5'], [4.35 * 100, 0, '435'], [0.1 + 0.2, 1, '0.3'],
    [0, 1, '0.0'], [-0, 1, '0.0'], [-0.04, 1, '0.0'], [0.04, 1, '0.0'], [1e-30, 2, '0.00'], [5e-324, 3, '0.000'], [99.96, 1, '100.0'],
    [1e21, 0, `1${'\u202f000'.repeat(7)}`], [0.00045, 5, '0.00045'],
  ]))('%d to %d decimals', (value, decimals, text) => {
    expect(formatNumber(value, decimals)).toBe(text)
  })

  it('shows the sign where asked, and none on nothing', () => {
    expect([3.3, -3.3, 0, -0.04, 0.04].map((value) => formatNumber(value, 1, true))).toEqual(['+3.3', '\u22123.3', '0.0', '0.0', '0.0'])
  })

  it('refuses what is not finite', () => {
    for (const value of someCases([NaN, Infinity, -Infinity])) {
      expect(() => formatNumber(value, 1)).toThrow(RangeError)
      expect(() => formatInput(value, 'angle', 'metric')).toThrow(RangeError)
    }
  })
})

describe('numbers times a power of ten', () => {
  it.each(someCases<readonly [number, number, string]>([
    [3.2e-6, 1, '3.2·10⁻⁶'], [1e-5, 1, '1.0·10⁻⁵'], [9.96e-6, 1, '1.0·10⁻⁵'], [-3.2e-6, 1, '\u22123.2·10⁻⁶'], [4.4e-12, 0, '4·10⁻¹²'],
    [0, 1, '0'], [1.5, 1, '1.5'], [25, 1, '2.5·10¹'], [5e-324, 1, '4.9·10⁻³²⁴'], [1.7e308, 1, '1.7·10³⁰⁸'],
  ]))('%d to %d decimals', (value, decimals, text) => {
    expect(formatPowerOfTen(value, decimals)).toBe(text)
  })

  it('shows the sign where asked, and refuses what is not finite', () => {
    expect(formatPowerOfTen(3.2e-6, 1, true)).toBe('+3.2·10⁻⁶')
    expect(() => formatPowerOfTen(NaN, 1)).toThrow(RangeError)
  })
})

describe('quantities as shown', () => {
  it.each(someCases<readonly [number, QuantityKind, UnitSystem, string, string, boolean]>([
    [26.5, 'angle', 'metric', '26.5', '°', true], [50, 'power', 'metric', '50.0', 'kW', false], [50, 'power', 'us', '67.1', 'hp', false],
    [172, 'torque', 'us', '127', 'lbf·ft', false], [122, 'pressure', 'us', '36.0', 'inHg', false], [419.15, 'temperature', 'metric', '146', '°C', false], [419.15, 'temperature', 'us', '295', '°F', false],
    [20, 'temperatureDifference', 'us', '36', '°F', false], [1524, 'altitude', 'us', '5000', 'ft', false], [33.0555555, 'airspeed', 'metric', '119', 'km/h', false],
    [90, 'boreLength', 'us', '3.543', 'in', false], [90, 'boreLength', 'metric', '90.0', 'mm', false], [2596, 'displacement', 'us', '158', 'cu in', false], [0.912, 'percent', 'metric', '91', '%', false],
    [0.912, 'ratio', 'us', '0.91', '', false], [3.3, 'climb', 'us', '650', 'ft/min', false], [10.9, 'meanPressure', 'us', '2', 'psi', false],
    [3.2e-6, 'failureRate', 'us', '3.2·10⁻⁶', '/h', false],
  ]))('%d as %s in %s', (value, kind, system, text, unit, joined) => {
    expect(formatQuantity(value, kind, system)).toEqual({ text, unit, joined })
  })

  it('takes other decimals and a sign', () => {
    expect(formatQuantity(90, 'boreLength', 'metric', { decimals: 0, sign: true }).text).toBe('+90')
  })

  it('rounds what was typed in inches as it was typed', () => {
    expect(formatQuantity(1.005 * 25.4, 'length', 'us').text).toBe('1.01')
  })

  it('joins number and unit for sentences', () => {
    expect(formatQuantityText(26.5, 'angle', 'us')).toBe('26.5°')
    expect(formatQuantityText(50, 'power', 'us')).toBe('67.1\u00a0hp')
    expect(formatQuantityText(0.9, 'ratio', 'us')).toBe('0.90')
  })

  it('names the unit of a field as the trade writes it', () => {
    expect(unitOf('angle', 'us')).toEqual({ symbol: '°', word: 'degrees', joined: true, decimals: 1 })
    expect(unitOf('engineSpeed', 'metric').word).toBe('rpm')
    expect(unitOf('count', 'metric').word).toBe('')
  })
})

describe('values in a form field', () => {
  it.each(someCases<readonly [number, QuantityKind, UnitSystem, string]>([
    [26.5, 'angle', 'metric', '26.5'], [-4, 'angle', 'metric', '-4'], [0, 'angle', 'metric', '0'], [-0, 'angle', 'metric', '0'], [86.123456789, 'length', 'metric', '86.1235'], [86.36, 'length', 'us', '3.4'],
    [10000, 'engineSpeed', 'us', '10000'], [1234567, 'plain', 'us', '1234567'], [0.00045, 'curvature', 'us', '0.00045'], [5e-5, 'failureRate', 'metric', '5e-5'], [3.21234567e-6, 'failureRate', 'metric', '3.21235e-6'], [0, 'failureRate', 'us', '0'], [0.5, 'failureRate', 'us', '0.5'], [4.5e-7, 'curvature', 'us', '4.5e-7'],
    [255.3722222222222, 'temperature', 'us', '0'], [273.15, 'temperature', 'metric', '0'], [293.15, 'temperature', 'metric', '20'], [0.91, 'percent', 'us', '91'], [1 / 3, 'ratio', 'us', '0.333333'],
  ]))('%d as %s in %s', (value, kind, system, text) => {
    expect(formatInput(value, kind, system)).toBe(text)
  })
})
