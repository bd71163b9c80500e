import { describe, expect, it } from 'vitest'
import { formatInput } from '@/lib/units/format'
import { keepUntouched, parseQuantity } from '@/lib/units/parse'
import { quantityKinds, shownIn } from '@/lib/units/quantities'
import type { QuantityKind, UnitSystem } from '@/lib/units/quantities'
import { someCases } from '@/tests/support/cases'
import { expectClose } from '@/tests/support/expect-close'

const systems: UnitSystem[] = ['metric', 'us']

function valueOf(text: string, kind: QuantityKind, system: UnitSystem): number {
  const result = parseQuantity(text, kind, system)
  return result.ok ? result.value : expect.fail(`${text} refused: ${JSON.stringify(result)}`)
}

describe('what people type', () => {
  it.each(someCases<readonly [string, QuantityKind, UnitSystem, number]>([
    ['86', 'length', 'metric', 86], ['3.4', 'length', 'us', 86.36], ['3.4 in', 'length', 'metric', 86.36], ['86 mm', 'length', 'us', 86], ['8.6cm', 'boreLength', 'metric', 86],
    ['26.5', 'angle', 'metric', 26.5], ['26,5°', 'angle', 'us', 26.5], ['-4 deg', 'angle', 'metric', -4], ['\u22124\u00a0degrees', 'angle', 'metric', -4],
    ['2450', 'engineSpeed', 'us', 2450], ['10 000 1/min', 'engineSpeed', 'metric', 10000], ['55 µs', 'timeMs', 'metric', 0.055], ['0.055 ms', 'timeUs', 'metric', 55], ['0,003 s', 'timeMs', 'metric', 3],
    ['158', 'displacement', 'us', 2589.156112], ['2.6 l', 'displacement', 'metric', 2600], ['2600', 'displacement', 'metric', 2600],
    ['70', 'power', 'us', 52.198991010758913], ['70 PS', 'power', 'us', 51.4849125], ['52500 W', 'power', 'metric', 52.5],
    ['127', 'torque', 'us', 172.18887943808785], ['30', 'pressure', 'us', 101.59165921023], ['0.95 bar', 'pressure', 'us', 95], ['14.5 psi', 'pressure', 'metric', 99.97398075094123],
    ['123', 'meanPressure', 'us', 848.05514705970841], ['1113', 'mass', 'us', 504.84830781], ['20', 'temperature', 'metric', 293.15], ['250 degF', 'temperature', 'metric', 394.2611111111111],
    ['-40', 'temperature', 'us', 233.15], ['36', 'temperatureDifference', 'us', 20], ['20 °C', 'temperatureDifference', 'us', 20],
    ['5000', 'altitude', 'us', 1524], ['1.5e3', 'altitude', 'metric', 1500], ['64', 'airspeed', 'us', 32.924444444444447], ['119', 'airspeed', 'metric', 33.055555555555557], ['640', 'climb', 'us', 3.2512],
    ['0.91', 'ratio', 'metric', 0.91], ['91 %', 'ratio', 'metric', 0.91], ['91', 'percent', 'metric', 0.91], ['91%', 'percent', 'us', 0.91],
    ['4.5e-4', 'curvature', 'metric', 0.00045], ['4.5e-4 /deg²', 'curvature', 'us', 0.00045], ['6', 'count', 'us', 6], ['0.055', 'markSpacing', 'us', 1.397],
  ]))('%s as %s in %s', (text, kind, system, expected) => {
    expectClose(valueOf(text, kind, system), expected, { rel: 1e-12 })
  })

  it('reads the example of each kind in each system', () => {
    for (const kind of someCases(quantityKinds)) for (const system of systems) expect(parseQuantity(shownIn(kind, system).example, kind, system).ok, `${kind} ${system}`).toBe(true)
  })

  it('says which unit it took and whether that is the field’s own', () => {
    expect(parseQuantity('86', 'length', 'metric')).toEqual({ ok: true, value: 86, unit: 'mm', unitGiven: false, converted: false })
    expect(parseQuantity('86 MM', 'length', 'metric')).toEqual({ ok: true, value: 86, unit: 'MM', unitGiven: true, converted: false })
    expect(parseQuantity('86 mm', 'length', 'us')).toEqual({ ok: true, value: 86, unit: 'mm', unitGiven: true, converted: true })
  })

  it('keeps a plain number in the base unit to its last bit', () => {
    for (const text of someCases(['0.1', '86.36', '2779.999', '1e-7'])) expect(valueOf(text, 'length', 'metric')).toBe(Number(text))
    expect(valueOf('55', 'timeUs', 'metric')).toBe(55)
  })
})

describe('what is refused', () => {
  it.each(someCases<readonly [string, QuantityKind, object]>([
    ['', 'angle', { code: 'empty' }], [' \u00a0\t', 'angle', { code: 'empty' }],
    ['abc', 'angle', { code: 'notANumber', hint: 'noNumber' }], ['Infinity', 'angle', { code: 'notANumber' }], ['NaN', 'angle', { code: 'notANumber' }],
    ['0x10', 'angle', { code: 'notANumber' }], ['--5', 'angle', { code: 'notANumber', hint: 'malformed' }], ['5-6', 'angle', { code: 'notANumber', hint: 'twoNumbers' }],
    ['20 ± 1', 'angle', { code: 'notANumber', hint: 'twoNumbers' }], ['5 ft 3 in', 'length', { code: 'notANumber', hint: 'twoNumbers' }], ['3 5/8 in', 'length', { code: 'notANumber', hint: 'fraction' }],
    ['1e308 m', 'length', { code: 'notANumber', hint: 'tooBig' }],
    ['5 mm in', 'length', { code: 'unknownUnit', unit: 'mm in' }], ['5 furlong', 'length', { code: 'unknownUnit', unit: 'furlong' }], ['5 cm4', 'displacement', { code: 'unknownUnit', unit: 'cm4' }],
    ['26.5 deg before', 'angle', { code: 'unknownUnit', hint: 'side' }], ['26.5° BTDC', 'angle', { code: 'unknownUnit', hint: 'side' }], ['5 after', 'angle', { code: 'unknownUnit', hint: 'side' }],
    ['5 kg', 'length', { code: 'wrongQuantity', unit: 'kg', family: 'mass' }], ['20°', 'temperature', { code: 'wrongQuantity', family: 'angle' }], ['86 mm', 'displacement', { code: 'wrongQuantity', family: 'length' }],
    ['6 %', 'count', { code: 'wrongQuantity', family: 'fraction' }],
    ['1,234 mm', 'length', { code: 'ambiguous', readings: ['1.234', '1234'] }],
  ]))('%s as %s', (text, kind, expected) => {
    expect(parseQuantity(text, kind, 'metric')).toMatchObject({ ok: false, ...expected })
  })
})

describe('a field nobody touched', () => {
  it('gives the stored value back, whatever the field showed of it', () => {
    const stored = 86.123456789
    for (const system of systems) {
      const shown = formatInput(stored, 'length', system)
      expect(keepUntouched(` ${shown}\n`, 'length', system, stored)).toMatchObject({ ok: true, value: stored, unitGiven: false })
    }
    expect(keepUntouched('86.1235', 'length', 'metric', stored)).toMatchObject({ value: stored })
    expect(keepUntouched('86.1234', 'length', 'metric', stored)).toMatchObject({ value: 86.1234 })
  })

  it('reads as usual where nothing was stored', () => {
    for (const base of someCases([null, undefined, NaN])) expect(keepUntouched('86', 'length', 'metric', base)).toMatchObject({ ok: true, value: 86 })
    expect(keepUntouched('', 'length', 'metric', 86)).toMatchObject({ ok: false, code: 'empty' })
  })
})
