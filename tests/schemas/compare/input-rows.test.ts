import { describe, expect, it } from 'vitest'
import { inputRows } from '@/lib/compare/input-rows'
import { startingSheet } from '@/lib/schemas/scenario-defaults'
import { scenarioFields } from '@/lib/schemas/scenario-fields'
import { scenarioToForm } from '@/lib/schemas/scenario-form'
import type { UnitSystem } from '@/lib/units'
import { sampleEngine } from '@/tests/support/sample-engine'

const base = scenarioToForm('Climb', startingSheet(sampleEngine), 'metric')
const rows = (changes: Record<string, string>, from: Record<string, string> = {}, system: UnitSystem = 'metric') =>
  inputRows(scenarioFields, { ...base, ...from }, { ...base, ...changes }, system).filter((row) => !row.isSame)

describe('differences of two forms', () => {
  it('finds nothing between a form and itself, and lists every filled field', () => {
    expect(rows({})).toEqual([])
    const all = inputRows(scenarioFields, base, base, 'metric')
    expect(all.map((row) => row.key)).toContain('mbtDeg')
    expect(all.map((row) => row.key)).not.toContain('primary.table')
    expect(all.every((row) => row.difference === null)).toBe(true)
  })

  it('gives both figures, the unit and the signed step with as many decimals as the figures', () => {
    expect(rows({ 'primary.fixed.deg': '24.5' })).toEqual([{
      key: 'primary.fixed.deg', label: 'Advance', channel: 'primary', left: '26', right: '24.5',
      unit: { symbol: '°', joined: true }, isSame: false, difference: '−1.5', layout: 'line',
    }])
  })

  it('reads a typed unit, and takes two ways of writing one length as the same', () => {
    const [row] = rows({ 'rotor.plateRadiusMm': '2 in' }, { 'rotor.plateRadiusMm': '50' })
    expect(row).toMatchObject({ left: '50', right: '2 in', difference: '+1' })
    expect(rows({ 'rotor.plateRadiusMm': '50 mm' }, { 'rotor.plateRadiusMm': '50.0' })).toEqual([])
  })

  it('calls an empty side by a word and gives no step', () => {
    expect(rows({ 'primary.retardDeg': '8' })[0]).toMatchObject({ label: 'Crank retard', left: 'none', right: '8', difference: null })
  })

  it('shows choices and ticks in words', () => {
    expect(rows({ distribution: 'directCoils' })[0]).toMatchObject({ left: 'one shared cap', right: 'direct coils', unit: null, difference: null })
    expect(rows({ 'rotor.mechanicalCarriesRotor': '' })[0]).toMatchObject({ left: 'yes', right: 'no' })
  })

  it('takes a table apart, speed by speed', () => {
    const table = { 'primary.kind': 'table', 'primary.table': '1000\t27.8\n2200\t29.4' }
    const changed = rows({ ...table, 'primary.table': '1000\t26.4\n2200\t29.4\n3000\t29' }, table)
    expect(changed.map(({ label, left, right, difference }) => [label, left, right, difference])).toEqual([
      ['Speed and advance, at 1000\u00a0rpm', '27.8', '26.4', '−1.4'],
      ['Speed and advance, at 3000\u00a0rpm', 'none', '29.0', null],
    ])
  })

  it('leaves a table that cannot be read as it was typed', () => {
    const changed = rows({ 'primary.table': '1000 twelve' }, { 'primary.table': '1000\t12\n2000\t20' })
    expect(changed[0]).toMatchObject({ key: 'primary.table', right: '1000 twelve', layout: 'block', difference: null })
  })

  it('counts the cells in which two maps differ', () => {
    const map = (cell: string) => ({ 'backup.map': `\t40\t90\n1000\t20\t${cell}\n2000\t24\t22` })
    expect(rows(map('15'), map('18'))[0]).toMatchObject({ difference: '1 of 4 cells, at most −3.0°', layout: 'block', channel: 'backup' })
    expect(rows(map('15'), { 'backup.map': '\t40\t95\n1000\t20\t15\n2000\t24\t22' })[0]?.difference).toBe('other speeds or pressures')
  })

  it('takes a step between temperatures as a difference, in either system', () => {
    expect(rows({ 'cycle.chargeK': '110 °C' }, { 'cycle.chargeK': '95' })[0]).toMatchObject({ left: '95', right: '110 °C', difference: '+15', unit: { symbol: '°C', joined: false } })
    expect(rows({ 'cycle.chargeK': '220' }, { 'cycle.chargeK': '202' }, 'us')[0]).toMatchObject({ difference: '+18', unit: { symbol: '°F', joined: false } })
  })

  it('tells the coils of the channels apart, and a rate by its power of ten', () => {
    expect(rows({ 'coils.backup.dwellMs': '4.5' }, { 'coils.backup.dwellMs': '3.5' })[0]).toMatchObject({ channel: 'backup', label: 'Dwell', difference: '+1.0' })
    expect(rows({ 'coils.primary.limitA': '' })[0]).toMatchObject({ channel: 'primary', label: 'Coil current limited to', left: '7', right: 'none', difference: null })
    expect(rows({ 'redundancy.ratesPerH.coil': '0.00004' }, { 'redundancy.ratesPerH.coil': '3e-5' })[0]).toMatchObject({ difference: '+1.0·10⁻⁵' })
    expect(rows({ 'coils.primary.wastedSpark': 'on' })[0]).toMatchObject({ left: 'no', right: 'yes', label: 'Coil fires two cylinders at a time' })
  })

  it('speaks in the units of the system', () => {
    const [from, to] = [120, 130].map((plateRadiusMm) => scenarioToForm('Climb', { ...startingSheet(sampleEngine), rotor: { ...startingSheet(sampleEngine).rotor, plateRadiusMm } }, 'us'))
    const [row] = inputRows(scenarioFields, from ?? {}, to ?? {}, 'us').filter((one) => !one.isSame)
    expect(row).toMatchObject({ unit: { symbol: 'in', joined: false }, left: '4.72441', right: '5.11811', difference: '+0.39370' })
  })
})
