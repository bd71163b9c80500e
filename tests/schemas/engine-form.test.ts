import { describe, expect, test } from 'vitest'
import { engineToForm, formToEngine } from '@/lib/schemas/engine-form'
import { sampleEngine } from '@/tests/support/samples'

const engine = sampleEngine()
const form = (change: Record<string, string> = {}) => ({ ...engineToForm('Flat six', 'J260', engine, 'metric'), ...change })
const errorsOf = (change: Record<string, string>) => {
  const read = formToEngine(form(change), 'metric')
  return read.ok ? {} : read.errors
}

describe('the engine form', () => {
  test.each(['metric', 'us'] as const)('untouched, it gives back the very engine it was filled from (%s)', (system) => {
    const awkward = sampleEngine({ boreMm: 91.7777777777, ratedPowerKw: 82.0269584, powerCurve: [{ rpm: 1203.456789, kw: 20.123456789 }, { rpm: 3201.1, kw: 54.3333333333 }] })
    const read = formToEngine(engineToForm('Flat six', 'J260', awkward, system), system, awkward)
    expect(read).toEqual({ ok: true, input: { name: 'Flat six', code: 'J260', spec: awkward } })
  })
  test('takes a unit with the number', () => {
    const read = formToEngine(form({ boreMm: '3.4 in', ratedPowerKw: '66,7 hp' }), 'metric')
    expect(read.ok && [read.input.spec.boreMm, Math.round(read.input.spec.ratedPowerKw * 100) / 100]).toEqual([86.36, 49.74])
  })
  test.each([
    ['boreMm', 'abc', /Bore/],
    ['boreMm', '9 kPa', /Bore.*pressure/],
    ['boreMm', '2', /Bore must be at least 20/],
    ['idleRpm', '-800', /Idle, usual must be at least 200/],
    ['cylinders', '6.5', /whole number/],
    ['firingOrder', '1 4 5 2 3 3', /names cylinder 3 twice/],
    ['firingOrder', '1 4 5 2 3', /5 cylinders; the engine has 6/],
    ['firingOrder', '1 4 x', /not a number/],
    ['intervalsDeg', '100 100 100 100 100 100', /add up to 600°.*720°/],
    ['intervalsDeg', '360 360', /2 firing intervals for 6 cylinders/],
    ['capTerminals', '1 2 3 4 5 7', /names cylinder 7/],
    ['powerCurve', '1200 20\n1100 22', /must rise/],
    ['powerCurve', '1200 20\n1500 x', /Line 2/],
    ['powerCurve', '1200 20\n2000 30', /must hold the full-power speed/],
    ['maxRpm', '700', /above the idle/],
    ['idleSlowestRpm', '230', /above the fastest cranking/],
    ['name', '', /name/],
    ['code', 'J 26/0', /letters and digits/],
  ])('%s “%s” is refused at its place', (name, value, sentence) => {
    const errors = errorsOf({ [name]: value })
    expect(errors[name]).toMatch(sentence)
  })
  test('several faults are each told at their own field', () => {
    expect(Object.keys(errorsOf({ boreMm: '', strokeMm: 'x', firingOrder: '' })).sort()).toEqual(['boreMm', 'firingOrder', 'strokeMm'])
  })
  test('only the friction that is chosen is asked for', () => {
    const read = formToEngine(form({ frictionKind: 'power', frictionPowerKw: '11', mechanicalEfficiency: 'nonsense' }), 'metric')
    expect(read.ok && read.input.spec.friction).toEqual({ kind: 'power', frictionPowerKw: 11 })
  })
})
