import { describe, expect, test } from 'vitest'
import '@/lib/calc/index'
import { defaultLimits } from '@/lib/calc/limits'
import { evaluateScenario } from '@/lib/calc/scenario/evaluate-scenario'
import { flaggedFields } from '@/lib/workbench/flagged-fields'
import { editLive, startLive } from '@/lib/workbench/live-evaluation'
import { scenarioToForm } from '@/lib/schemas/scenario-form'
import { sampleEngine, sampleSheet } from '@/tests/support/samples'

const context = { engine: sampleEngine(), limits: defaultLimits, system: 'metric' as const, base: sampleSheet() }
const opened = startLive(scenarioToForm('Climb', context.base, 'metric'), context.base, evaluateScenario({ engine: context.engine, sheet: context.base }), context)

describe('inputs that are judged against each other', () => {
  test('half a reference setting is asked for, and the rest goes on being computed', () => {
    const half = editLive(opened, { 'reference.sparkDeg': '24' }, context)
    expect(Object.keys(half.errors).sort()).toEqual(['reference.marginDeg', 'reference.octane', 'reference.rpm'])
    const other = editLive(half, { runUpRpm: '1500', 'airframe.massKg': '450' }, context)
    expect(other.sheet).toMatchObject({ runUpRpm: 1500, airframe: { massKg: 450 }, reference: null })
    const whole = editLive(other, { 'reference.rpm': '2600', 'reference.octane': '94', 'reference.marginDeg': '2' }, context)
    expect(whole.errors).toEqual({})
    expect(whole.sheet.reference).toEqual({ sparkDeg: 24, rpm: 2600, octane: 94, marginDeg: 2 })
  })

  test('a planned fuel below the worse one keeps the last pair, and the rest goes on', () => {
    const low = editLive(opened, { 'fuel.octane': '88' }, context)
    expect(Object.keys(low.errors)).toEqual(['fuel.worseOctane'])
    const other = editLive(low, { 'airframe.massKg': '450' }, context)
    expect(other.sheet).toMatchObject({ airframe: { massKg: 450 }, fuel: { octane: 95, worseOctane: 91 } })
    expect(editLive(other, { 'fuel.worseOctane': '87' }, context).sheet.fuel).toEqual({ scale: 'ron', octane: 88, worseOctane: 87 })
  })
})

test('what drives a finding of a coil is flagged at its own channel', () => {
  const long = editLive(opened, { 'coils.backup.dwellMs': '6.8' }, context)
  const names = flaggedFields(long.result.findings, long.values)
  expect(names).toContain('coils.backup.dwellMs')
  expect(names).not.toContain('coils.primary.dwellMs')
})
