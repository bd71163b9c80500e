import { describe, expect, it } from 'vitest'
import { parseQuantity } from '@/lib/units/parse'
import type { QuantityKind, UnitSystem } from '@/lib/units/quantities'
import { quantityKinds } from '@/lib/units/quantities'
import { quantityErrorSentence, rangeSentence } from '@/lib/units/sentences'
import { someCases } from '@/tests/support/cases'

function sentence(text: string, label: string, kind: QuantityKind, system: UnitSystem = 'metric'): string {
  const result = parseQuantity(text, kind, system)
  return result.ok ? expect.fail(`${text} was read`) : quantityErrorSentence(result, label, kind, system)
}

describe('what was wrong, in a sentence', () => {
  it.each(someCases<readonly [string, string, QuantityKind, UnitSystem, string]>([
    ['', 'Bore', 'boreLength', 'us', 'Bore is empty. Type a number in inches, for example 3.386.'],
    ['', 'Advance', 'angle', 'metric', 'Advance is empty. Type a number in degrees, for example 26.5.'],
    ['abc', 'Advance', 'angle', 'metric', 'Advance: “abc” holds no number. Type a number in degrees, for example 26.5.'],
    ['--5', 'Advance', 'angle', 'metric', 'Advance: “--5” is not a number. Type a number in degrees, for example 26.5.'],
    ['5 ft 3 in', 'Radius', 'length', 'metric', 'Radius: “5 ft 3 in” holds more than one number. Type a number in mm, for example 86.'],
    ['3 5/8 in', 'Radius', 'length', 'metric', 'Radius: “3 5/8 in” holds a fraction; write it as a decimal number. Type a number in mm, for example 86.'],
    ['1e999', 'Cylinders', 'count', 'metric', 'Cylinders: “1e999” is too large a number. Type a number, for example 6.'],
    ['1,234', 'Radius', 'length', 'metric', 'Radius: “1,234” can be read as 1.234 or as 1234. Type the one you mean.'],
    ['5 kg', 'Radius', 'length', 'metric', 'Radius: “kg” measures mass, which does not fit here. It takes mm, cm, m, in or ft; without a unit, a number in mm, for example 86.'],
    ['6 rpm', 'Cylinders', 'count', 'metric', 'Cylinders: “rpm” measures a speed of rotation, which does not fit here. It takes a number without a unit, for example 6.'],
    ['0.9 x', 'Ratio', 'ratio', 'metric', 'Ratio: “x” is not a unit known here. It takes % or no unit, for example 0.85.'],
    ['5 furlong', 'Speed', 'engineSpeed', 'metric', 'Speed: “furlong” is not a unit known here. It takes rpm; without a unit, a number in rpm, for example 2450.'],
    ['', 'Curvature', 'curvature', 'metric', 'Curvature is empty. Type a number per deg², for example 0.00045.'],
    ['26.5 deg before', 'Advance', 'angle', 'metric', 'Advance: leave out the words behind the angle in “26.5 deg before”. Before top dead centre is a plain number, after it a negative one, for example 26.5.'],
  ]))('%s in %s', (text, label, kind, system, expected) => {
    expect(sentence(text, label, kind, system)).toBe(expected)
  })

  it('cuts a pasted page', () => {
    expect(sentence('x'.repeat(5000), 'Advance', 'angle').length).toBeLessThan(150)
    expect(sentence(`5 ${'x'.repeat(5000)}`, 'Advance', 'angle').length).toBeLessThan(200)
  })

  it('is one clean sentence or two for every kind, system and mistake', () => {
    for (const kind of someCases(quantityKinds)) {
      for (const system of ['metric', 'us'] as const) {
        for (const text of someCases(['', 'abc', '5 furlong', '1,234', '5 per cow', '1/2'])) {
          expect(sentence(text, 'The field', kind, system), `${kind} ${text}`).toMatch(/^The field(:| is) (?!.*(undefined|NaN|  | in ,)).+[.]$/)
        }
      }
    }
  })
})

describe('a range, in the person’s units', () => {
  it.each(someCases<readonly [QuantityKind, UnitSystem, Parameters<typeof rangeSentence>[3], string]>([
    ['boreLength', 'metric', { min: 20, max: 300 }, 'Bore must be at least 20\u00a0mm and at most 300\u00a0mm.'],
    ['boreLength', 'us', { min: 20, max: 300 }, 'Bore must be at least 0.7875\u00a0in and at most 11.81\u00a0in.'],
    ['angle', 'us', { min: -10, max: 60 }, 'Bore must be at least \u221210° and at most 60°.'],
    ['length', 'us', { above: 0 }, 'Bore must be more than 0\u00a0in.'],
    ['length', 'us', { max: 25.4 }, 'Bore must be at most 1\u00a0in.'],
    ['percent', 'us', { max: 0.29 }, 'Bore must be at most 29\u00a0%.'],
    ['ratio', 'us', { above: 0, below: 1 }, 'Bore must be more than 0 and less than 1.'],
  ]))('%s in %s', (kind, system, range, expected) => {
    expect(rangeSentence('Bore', kind, system, range)).toBe(expected)
  })

  it('names ends that can themselves be typed', () => {
    const ends: [QuantityKind, number, number][] = [['boreLength', 20, 300], ['power', 0.5, 1000], ['pressure', 10, 250], ['temperature', 200, 350], ['altitude', -500, 12000], ['mass', 1, 9999]]
    for (const [kind, min, max] of someCases(ends)) {
      for (const system of ['metric', 'us'] as const) {
        const [low = '', high = ''] = rangeSentence('It', kind, system, { min, max }).slice('It must be at least '.length, -1).split(' and at most ')
        const [lowRead, highRead] = [parseQuantity(low, kind, system), parseQuantity(high, kind, system)]
        expect(lowRead.ok && lowRead.value >= min - 1e-9, `${kind} ${low}`).toBe(true)
        expect(highRead.ok && highRead.value <= max + 1e-9, `${kind} ${high}`).toBe(true)
      }
    }
  })

  it('needs an end', () => {
    expect(() => rangeSentence('It', 'angle', 'us', {})).toThrow(RangeError)
  })
})
