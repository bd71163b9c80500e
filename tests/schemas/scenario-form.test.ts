import { describe, expect, test } from 'vitest'
import type { ScenarioSheet } from '@/lib/calc/scenario/scenario-types'
import { formToScenario, scenarioToForm } from '@/lib/schemas/scenario-form'
import { sampleSheet } from '@/tests/support/samples'

const sheet = sampleSheet()
const form = (change: Record<string, string> = {}, from: ScenarioSheet = sheet) => ({ ...scenarioToForm('Climb timing', from, 'metric'), ...change })
const errorsOf = (change: Record<string, string>) => {
  const read = formToScenario(form(change), 'metric')
  return read.ok ? {} : read.errors
}

const schedules: ScenarioSheet['primary']['schedule'][] = [
  { kind: 'fixed', deg: 26.123456789 },
  { kind: 'mechanical', initialDeg: 8.3333333333, startRpm: 900.123456789, fullRpm: 2400, fullDeg: 27 },
  { kind: 'table', points: [{ rpm: 1000.333333333, deg: 25.777777777 }, { rpm: 2200, deg: 27.4 }] },
  { kind: 'map', rpm: [800, 2400.123456789], mapKpa: [40.1234567, 98], deg: [[30, 20], [34.999999999, 26]] },
  { kind: 'formula', expression: 'rpm < 900 ? 12 : min(27, 12 + (rpm - 900) / 80)' },
]

describe('the scenario form', () => {
  for (const system of ['metric', 'us'] as const) test.each(schedules)(`untouched, it gives back the very sheet it was filled from (${system}, $kind)`, (schedule) => {
    const awkward = sampleSheet({ primary: { schedule, latencyUs: 55.5555555555 }, mbt: { ...sheet.mbt, deg: 36.4444444444 }, rotor: { ...sheet.rotor, plateRadiusMm: 31.7777777777 } })
    const read = formToScenario(scenarioToForm('Climb timing', awkward, system), system, awkward)
    expect(read).toEqual({ ok: true, input: { title: 'Climb timing', sheet: awkward } })
  })
  test('a spreadsheet block goes into a table, with a head and commas', () => {
    const read = formToScenario(form({ 'primary.table': 'rpm\tdeg\r\n1000\t25,8\r\n2200\t27,4\r\n' }), 'metric')
    expect(read.ok && read.input.sheet.primary.schedule).toEqual(sheet.primary.schedule)
  })
  test('an empty crank retard means none', () => {
    const read = formToScenario(form({ 'primary.retardDeg': '', 'primary.retardBelowRpm': '', 'primary.retardHysteresisRpm': '' }), 'metric')
    expect(read.ok && read.input.sheet.primary).not.toHaveProperty('crankRetard')
  })
  test('an empty pitch row is passed over, a half filled one is asked for', () => {
    expect(errorsOf({ 'pitch.1.name': 'cruise' })).toMatchObject({ 'pitch.1.kw': expect.stringContaining('power'), 'pitch.1.rpm': expect.stringContaining('speed') })
    const read = formToScenario(form({ 'pitch.2.name': 'cruise', 'pitch.2.kw': '40', 'pitch.2.rpm': '2600' }), 'metric')
    expect(read.ok && read.input.sheet.propeller.pitches.map((pitch) => pitch.name)).toEqual(['climb', 'cruise'])
  })
  test('what can be built but should not be is read: backup first, threshold above idle', () => {
    expect(formToScenario(form({ 'backup.fixed.deg': '40', 'primary.retardBelowRpm': '900' }), 'metric').ok).toBe(true)
  })
  test.each([
    ['backup.fixed.deg', 'twenty', /Advance/],
    ['backup.fixed.deg', '28 deg before', /plain number/],
    ['backup.fixed.deg', '90', /at most 60°/],
    ['backup.fixed.deg', '3 ms', /time/],
    ['primary.table', '2200 27\n1000 25', /must rise/],
    ['primary.table', '1000 25', /two lines/],
    ['primary.table', '', /two lines/],
    ['primary.table', '1000 25\n2000', /Line 2/],
    ['primary.retardBelowRpm', '', /speed below which/],
    ['primary.retardHysteresisRpm', '500', /smaller than/],
    ['pitch.0.name', '', /name/],
    ['pitch.0.kw', '-3', /at least/],
    ['mbtDeg', '', /MBT/],
    ['runUpRpm', '1e9', /at most/],
    ['title', ' ', /name/],
    ['distribution', 'telepathy', /choose one/],
  ])('%s “%s” is refused at its place', (name, value, sentence) => {
    expect(errorsOf({ [name]: value })[name]).toMatch(sentence)
  })
  test('a map needs its pressures to rise', () => {
    expect(errorsOf({ 'primary.kind': 'map', 'primary.map': '\t98\t40\n800\t20\t30\n2400\t26\t35' })['primary.map']).toMatch(/rise/)
  })
})
