import { describe, expect, test } from 'vitest'
import '@/lib/calc/index'
import { defaultLimits } from '@/lib/calc/limits'
import { evaluateScenario } from '@/lib/calc/scenario/evaluate-scenario'
import { scenarioToForm } from '@/lib/schemas/scenario-form'
import { cycleParts } from '@/lib/calc/scenario/result-types'
import { cycleLimits } from '@/lib/workbench/cycle-answer'
import { editLive, startLive, turnUnits } from '@/lib/workbench/live-evaluation'
import { flaggedFields } from '@/lib/workbench/flagged-fields'
import { sampleEngine, sampleSheet } from '@/tests/support/samples'

const context = { engine: sampleEngine(), limits: defaultLimits, system: 'metric' as const, base: sampleSheet() }
const start = () => startLive(scenarioToForm('Climb', context.base, 'metric'), context.base, evaluateScenario({ engine: context.engine, sheet: context.base }), context)
const value = (state: ReturnType<typeof start>, id: string) => state.result.findings.find((finding) => finding.id === id)?.value

describe('typing into the sheet', () => {
  test('an edit is computed at once', () => {
    const next = editLive(start(), { 'backup.fixed.deg': '20' }, context)
    expect(next.errors).toEqual({})
    const whole = evaluateScenario({ engine: context.engine, sheet: { ...context.base, backup: { schedule: { kind: 'fixed', deg: 20 }, latencyUs: 0 } } })
    const closed = (parts: typeof whole.parts) => Object.entries(parts).filter(([name]) => !cycleParts.some((cycle) => cycle === name))
    expect(closed(next.result.parts)).toEqual(closed(whole.parts))
    expect(next.result.findings.filter(({ limitId }) => !cycleLimits.has(limitId))).toEqual(whole.findings.filter(({ limitId }) => !cycleLimits.has(limitId)))
  })
  test('half typed: what stands on the field keeps its last figures and is marked, the rest goes on', () => {
    const before = start()
    const half = editLive(before, { 'backup.fixed.deg': '2 0 x' }, context)
    expect(half.errors['backup.fixed.deg']).toMatch(/Advance/)
    expect(half.values['backup.fixed.deg']).toBe('2 0 x')
    expect(half.stale).toContain('power')
    expect(half.stale).not.toContain('leads')
    expect(half.staleFindings).toContain('backupPowerRatio.backup')
    expect(value(half, 'backupPowerRatio.backup')).toBe(value(before, 'backupPowerRatio.backup'))
    const other = editLive(half, { runUpRpm: '1500' }, context)
    expect(other.result.parts.runUp).toMatchObject({ ok: true, rows: [{ primary: { rpm: 1500 } }] })
    const mended = editLive(other, { 'backup.fixed.deg': '20' }, context)
    expect(mended.errors).toEqual({})
    expect(mended.stale.size + mended.staleFindings.size).toBe(0)
  })
  test('a schedule kind just chosen and still empty keeps the figures of the last one', () => {
    const before = start()
    const empty = editLive(before, { 'backup.kind': 'table' }, context)
    expect(empty.errors['backup.table']).toMatch(/two lines/)
    expect(value(empty, 'backupPowerRatio.backup')).toBe(value(before, 'backupPowerRatio.backup'))
    expect(editLive(empty, { 'backup.table': '1000 15\n2500 18' }, context).errors).toEqual({})
  })
  test('a formula’s fault is placed at its character, and the last figures stay', () => {
    const chosen = editLive(start(), { 'backup.kind': 'formula', 'backup.formula': '12 + rpm / 500' }, context)
    expect(chosen.errors).toEqual({})
    const faulty = editLive(chosen, { 'backup.formula': '12 + evil / 500' }, context)
    expect(faulty.errors['backup.formula']).toMatch(/evil/)
    expect(faulty.faultAt['backup.formula']).toBe(5)
    expect(value(faulty, 'backupPowerRatio.backup')).toBe(value(chosen, 'backupPowerRatio.backup'))
    expect(faulty.result.counts).toEqual(chosen.result.counts)
  })
  test('turning the units keeps what was typed, exact where it could be read, as typed where not', () => {
    const typed = editLive(editLive(start(), { 'rotor.plateRadiusMm': '33.3333333' }, context), { mbtDeg: 'thirty' }, context)
    const { state, context: turned } = turnUnits(typed, context, 'us')
    expect(state.values['rotor.plateRadiusMm']).toBe('1.31234')
    expect(state.values.mbtDeg).toBe('thirty')
    expect(state.errors.mbtDeg).toMatch(/MBT/)
    expect(state.sheet.rotor.plateRadiusMm).toBe(33.3333333)
    expect(turnUnits(state, turned, 'metric').state.values['rotor.plateRadiusMm']).toBe('33.3333')
  })
  test('fields that drive a finding outside its limit are flagged where they are typed', () => {
    const late = editLive(start(), { 'backup.fixed.deg': '2', 'primary.retardBelowRpm': '760' }, context)
    const names = flaggedFields(late.result.findings, late.values)
    expect(names).toContain('backup.fixed.deg')
    expect(names).toContain('primary.retardBelowRpm')
    expect(flaggedFields(start().result.findings, start().values).size).toBe(0)
  })
})
