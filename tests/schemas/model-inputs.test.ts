import { describe, expect, test } from 'vitest'
import type { ScenarioSheet } from '@/lib/calc/scenario/scenario-types'
import { defaultOrigins, defaultWords } from '@/lib/schemas/default-sources'
import { defaultNote } from '@/lib/schemas/default-texts'
import { modelFieldOf, modelFields } from '@/lib/schemas/model-fields'
import { scenarioSheet } from '@/lib/schemas/scenario'
import { startingSheet } from '@/lib/schemas/scenario-defaults'
import { fieldOfScenarioPath, formToScenario, scenarioToForm } from '@/lib/schemas/scenario-form'
import { scenarioFieldsBySection } from '@/lib/schemas/scenario-fields'
import type { QuantityKind } from '@/lib/units'
import { sources } from '@/lib/calc/sources'
import { someCases } from '@/tests/support/cases'
import { sampleEngine, sampleSheet } from '@/tests/support/samples'

const reference = { sparkDeg: 25.1234567891, rpm: 2600.3333333333, octane: 93.7777777777, marginDeg: 2.2222222222 }
const form = (change: Record<string, string> = {}, from: ScenarioSheet = sampleSheet()) => ({ ...scenarioToForm('Climb', from, 'metric'), ...change })
const errorsOf = (change: Record<string, string>, from?: ScenarioSheet) => {
  const read = formToScenario(form(change, from), 'metric')
  return read.ok ? {} : read.errors
}
const sheetOf = (change: Record<string, string>, from?: ScenarioSheet) => {
  const read = formToScenario(form(change, from), 'metric')
  return read.ok ? read.input.sheet : expect.fail(JSON.stringify(read.errors))
}
const newTolerances = scenarioFieldsBySection.tolerances.filter(({ name }) => name === 'tolerances.markDeg' || name === 'tolerances.scatterDeg')
const newFields = [...modelFields, ...newTolerances]
const numbers = newFields.filter((field) => field.kind === 'number')

/** Units of the ranges, where the field shows another one. */
const baseUnit: Partial<Record<QuantityKind, string>> = { temperature: ' K', airspeed: ' m/s' }

/** Every number of the new groups turned to one that six digits cannot hold. */
const awkward = (value: unknown): unknown => {
  if (typeof value === 'number') return value * 1.000000012345
  if (typeof value !== 'object' || value === null) return value
  return Object.fromEntries(Object.entries(value).map(([key, inner]) => [key, awkward(inner)]))
}

describe('round trips', () => {
  test.each(someCases([['metric', null], ['us', null], ['metric', reference], ['us', reference]] as const))('untouched in %s, every figure keeps its last digit', (system, known) => {
    const { cycle, worse, coils, airframe, conditions, redundancy, plugGapMm, tolerances } = sampleSheet()
    const sheet = scenarioSheet.parse({ ...sampleSheet({ reference: known }), ...(awkward({ cycle, worse, coils, airframe, conditions, redundancy, plugGapMm, tolerances }) as object) })
    expect(formToScenario(scenarioToForm('Climb', sheet, system), system, sheet)).toEqual({ ok: true, input: { title: 'Climb', sheet } })
  })

  test('figures are read in the person’s units, and typed units are taken', () => {
    const texts = scenarioToForm('Climb', sampleSheet(), 'us')
    expect(texts).toMatchObject({ 'airframe.massKg': '1102.31', 'airframe.wingAreaM2': '118.403', 'conditions.pressureAltitudeM': '984.252', 'worse.hotterK': '27', plugGapMm: '0.0275591' })
    const sheet = sheetOf({ 'coils.primary.ohm': '650 mΩ', 'coils.backup.clampKv': '28000 V', 'redundancy.ratesPerH.coil': '3·10⁻⁵ /h', 'airframe.wingAreaM2': '120 sq ft', 'cycle.chargeK': '100 °C' })
    expect(sheet.coils.primary.ohm).toBe(0.65)
    expect(sheet.coils.backup.clampKv).toBe(28)
    expect(sheet.redundancy.ratesPerH.coil).toBe(3e-5)
    expect(sheet.cycle.chargeK).toBe(373.15)
    expect(sheet.airframe.wingAreaM2).toBeGreaterThan(11.1)
  })

  test('rates stand as powers of ten in their fields', () => {
    expect(form()['redundancy.ratesPerH.module']).toBe('4e-5')
  })

  test('ticks and choices', () => {
    expect(sheetOf({ 'coils.primary.wastedSpark': 'on', 'redundancy.sharedSupply': '', 'redundancy.sharedCoil': 'on', 'fuel.scale': 'aki' })).toMatchObject({
      coils: { primary: { wastedSpark: true }, backup: { wastedSpark: false } }, redundancy: { sharedSupply: false, sharedCoil: true }, fuel: { scale: 'aki' },
    })
  })
})

describe('what is left empty', () => {
  test('means not limited, not typed, none known', () => {
    const sheet = sheetOf({ 'cycle.volumetricEfficiency': '', 'coils.primary.limitA': ' ', 'coils.backup.clampKv': '' })
    expect([sheet.cycle.volumetricEfficiency, sheet.coils.primary.limitA, sheet.coils.backup.clampKv, sheet.reference]).toEqual([null, null, null, null])
  })

  const full = { 'reference.sparkDeg': '25', 'reference.rpm': '2600', 'reference.octane': '94', 'reference.marginDeg': '0' }
  test('a reference setting is whole', () => {
    expect(sheetOf(full).reference).toEqual({ sparkDeg: 25, rpm: 2600, octane: 94, marginDeg: 0 })
    expect(sheetOf({ 'reference.sparkDeg': '', 'reference.rpm': '', 'reference.octane': '', 'reference.marginDeg': ' ' }, sampleSheet({ reference })).reference).toBeNull()
  })

  test.each(someCases(Object.keys(full)))('without %s it is asked for there, and nowhere else', (missing) => {
    const errors = errorsOf({ ...full, [missing]: '' })
    expect(Object.keys(errors)).toEqual([missing])
    expect(errors[missing]).toMatch(/is empty\. A reference setting needs all four/)
  })
})

describe('what cannot be', () => {
  test.each(someCases(numbers.map((field) => [field.name, field] as const)))('%s says what is wrong at its place', (name, field) => {
    const from = sampleSheet({ reference })
    expect(errorsOf({ [name]: 'twelve' }, from)).toEqual({ [name]: expect.stringMatching(/holds no number/) })
    for (const off of [(field.min ?? 0) - 1, (field.max ?? 0) + 1]) {
      const errors = errorsOf({ [name]: `${off}${baseUnit[field.quantity ?? 'plain'] ?? ''}` }, from)
      expect(errors[name], `${name} ${off}`).toMatch(/must be at least .+ and at most .+\.$/)
    }
    if (!field.optional) expect(errorsOf({ [name]: '' }, from)[name]).toMatch(/is empty/)
  })

  test('a worse fuel that is better', () => {
    expect(errorsOf({ 'fuel.worseOctane': '95.5' })).toEqual({ 'fuel.worseOctane': 'The worse fuel must not have more octane than the planned one.' })
    expect(sheetOf({ 'fuel.worseOctane': '95' }).fuel.worseOctane).toBe(95)
  })

  test('a scale that is none', () => {
    expect(errorsOf({ 'fuel.scale': 'smell' })['fuel.scale']).toMatch(/choose one/)
  })
})

describe('the place of a fault', () => {
  test('is the field of that name, or the first of its group', () => {
    for (const { name } of modelFields) expect(fieldOfScenarioPath(`sheet.${name}`, {})).toBe(name)
    for (const [path, field] of someCases([
      ['sheet.cycle', 'cycle.chargeK'], ['sheet.coils.backup', 'coils.backup.dwellMs'], ['sheet.coils', 'coils.primary.dwellMs'], ['sheet.reference', 'reference.sparkDeg'],
      ['sheet.redundancy.ratesPerH', 'redundancy.ratesPerH.supply'], ['sheet.coils.backup.limitA.deeper', 'coils.backup.limitA'], ['sheet.coils.backup.unknown', 'coils.backup.dwellMs'],
      ['sheet.plugGapMm', 'plugGapMm'], ['sheet.tolerances.scatterDeg', 'tolerances.scatterDeg'],
    ])) expect(fieldOfScenarioPath(path ?? '', {}), path).toBe(field)
    expect(modelFieldOf(['mbt', 'deg'])).toBeNull()
  })
})

describe('defaults', () => {
  test('each new field says where its default comes from, and nothing else does', () => {
    expect(Object.keys(defaultOrigins).sort()).toEqual(newFields.map((field) => field.name).sort())
    for (const origin of Object.values(defaultOrigins)) expect(origin === 'guess' || sources[origin] !== undefined, origin).toBe(true)
    expect(defaultWords('cycle.chargeK')).toBe('Default: common practice, no published source.')
    expect(defaultWords('airframe.massKg')).toBe('Default: a guess.')
    expect(defaultWords('conditions.temperatureK')).toMatch(/^Default: NOAA.* 1976\.$/)
    expect(defaultWords('mbtDeg')).toBeNull()
  })

  test.each(someCases(['metric', 'us'] as const))('a field that stands at its default says so in %s, one that was typed does not', (system) => {
    const texts = scenarioToForm('Climb', startingSheet(sampleEngine()), system)
    for (const { name } of newFields) {
      const isFilled = (texts[name] ?? '') !== ''
      expect(defaultNote(name, texts[name] ?? '', system), name).toBe(isFilled ? defaultWords(name) : undefined)
    }
    expect(defaultNote('airframe.massKg', '521', system)).toBeUndefined()
  })

  test('lie within every range, whatever the engine', () => {
    for (const change of someCases([{}, { maxRpm: 5800, ratedRpm: 5800, powerCurve: [], powerTimingDeg: -10 }, { powerTimingDeg: 60 }])) {
      const sheet = startingSheet(sampleEngine(change))
      expect(scenarioSheet.safeParse(sheet).success).toBe(true)
    }
  })

  test('two sheets share nothing that could be written to', () => {
    const [one, other] = [startingSheet(sampleEngine()), startingSheet(sampleEngine())]
    expect(one.coils.primary).not.toBe(other.coils.primary)
    expect(one.coils.primary).not.toBe(one.coils.backup)
  })
})
