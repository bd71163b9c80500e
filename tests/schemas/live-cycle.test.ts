import { beforeAll, describe, expect, test } from 'vitest'
import '@/lib/calc/index'
import { defaultLimits } from '@/lib/calc/limits'
import { evaluateClosedForms, evaluateScenario } from '@/lib/calc/scenario/evaluate-scenario'
import { cycleParts, type ScenarioResult } from '@/lib/calc/scenario/result-types'
import { scenarioToForm } from '@/lib/schemas/scenario-form'
import { computeCycle } from '@/lib/workbench/compute-cycle'
import { cycleAnswerOf, cycleLimits, failedAnswer } from '@/lib/workbench/cycle-answer'
import { editLive, startLive, takeCycle, takeOver, turnUnits, type LiveState } from '@/lib/workbench/live-evaluation'
import { sampleEngine, sampleSheet } from '@/tests/support/samples'

const context = { engine: sampleEngine(), limits: defaultLimits, system: 'metric' as const, base: sampleSheet() }
const scenario = { engine: context.engine, sheet: context.base }
let opened: ScenarioResult
beforeAll(() => { opened = evaluateScenario(scenario) })
const start = () => startLive(scenarioToForm('Climb', context.base, 'metric'), context.base, opened, context)
const cycleOf = (result: ScenarioResult) => cycleAnswerOf(result).parts
const answered = async (state: LiveState) => {
  if (!state.due) throw new Error('nothing is due')
  return takeCycle(state, state.due.key, await computeCycle(state.due), context)
}

describe('the simulated cycle beside the sheet', () => {
  test('opened with both layers, nothing is due', () => {
    const state = start()
    expect([state.due, state.pending.size, state.pendingFindings.size]).toEqual([null, 0, 0])
    expect(state.result.parts.detonation.ok).toBe(true)
  })

  test('opened without the cycle, it is due at once', () => {
    const state = startLive(scenarioToForm('Climb', context.base, 'metric'), context.base, evaluateClosedForms(scenario), context)
    expect(state.due?.scenario.sheet).toEqual(context.base)
    expect([...state.pending]).toEqual([...cycleParts])
  })

  test('an edit keeps the old figures, marked, until the new ones come', async () => {
    const before = start()
    const edited = editLive(before, { 'backup.fixed.deg': '20' }, context)
    expect(cycleOf(edited.result)).toEqual(cycleOf(before.result))
    expect([...edited.pending]).toEqual([...cycleParts])
    expect([...edited.pendingFindings].sort()).toEqual(opened.findings.filter(({ limitId }) => cycleLimits.has(limitId)).map(({ id }) => id).sort())
    expect(edited.result.counts).toEqual({ ...edited.result.counts, outside: edited.result.findings.filter(({ verdict }) => verdict === 'outside').length })
    const done = await answered(edited)
    const whole = evaluateScenario({ engine: context.engine, sheet: edited.sheet })
    expect(done.result).toEqual(whole)
    expect([done.due, done.pending.size, done.pendingFindings.size]).toEqual([null, 0, 0])
  })

  test('typing back to what was computed needs no run', () => {
    const there = editLive(start(), { 'backup.fixed.deg': '20' }, context)
    const back = editLive(there, { 'backup.fixed.deg': '17' }, context)
    expect(back.due).toBeNull()
    expect(cycleOf(back.result)).toEqual(cycleOf(opened))
  })

  test('title and notes are no reason to compute; one that is due stays the same run', () => {
    expect(editLive(start(), { title: 'Another', notes: 'seen' }, context).due).toBeNull()
    const edited = editLive(start(), { 'backup.fixed.deg': '20' }, context)
    expect(editLive(edited, { title: 'Another' }, context).due).toBe(edited.due)
  })

  test('an answer for another sheet is never shown', async () => {
    const first = editLive(start(), { 'backup.fixed.deg': '20' }, context)
    const second = editLive(first, { 'backup.fixed.deg': '22' }, context)
    if (!first.due) throw new Error('nothing is due')
    const late = takeCycle(second, first.due.key, await computeCycle(first.due), context)
    expect(late).toBe(second)
    expect(takeCycle(start(), first.due.key, failedAnswer(), context).result).toEqual(opened)
  })

  test('another revision that is taken over is due, and does not pass for computed', () => {
    const sheet = sampleSheet({ backup: { schedule: { kind: 'fixed', deg: 24 }, latencyUs: 0 } })
    const taken = takeOver(start(), scenarioToForm('Older', sheet, 'metric'), { ...context, base: sheet })
    expect(taken.sheet.backup).toEqual(sheet.backup)
    expect(taken.errors).toEqual({})
    expect(taken.due?.scenario.sheet).toEqual(taken.sheet)
    expect(taken.pending.has('detonation')).toBe(true)
  })

  test('a run of what can be computed goes on while a field is half typed', async () => {
    const half = editLive(start(), { 'backup.fixed.deg': '2 0 x' }, context)
    expect(half.due).toBeNull()
    expect(half.stale.has('detonation')).toBe(true)
    const other = await answered(editLive(half, { mbtDeg: '34' }, context))
    expect(other.result.parts.charge).toMatchObject({ ok: true, mbtDeg: 34 })
    expect(other.stale.has('detonation')).toBe(true)
    expect(other.pending.size).toBe(0)
  })

  test('a new engine is computed, other units are not', () => {
    expect(editLive(start(), {}, { ...context, engine: sampleEngine({ compressionRatio: 9 }) }).due).not.toBeNull()
    expect(turnUnits(start(), context, 'us').state.due).toBeNull()
  })

  test('where it could not be computed nothing old stands in its place', () => {
    const edited = editLive(start(), { 'backup.fixed.deg': '20' }, context)
    const failed = takeCycle(edited, edited.due?.key ?? '', failedAnswer(), context)
    expect(failed.result.parts.detonation).toMatchObject({ ok: false, error: { code: 'notComputed', value: 'failed' } })
    expect(failed.result.findings.some(({ limitId }) => cycleLimits.has(limitId))).toBe(false)
    expect(failed.errors).toEqual({})
  })

  test('findings and notices of the cycle are those it adds to the closed forms', () => {
    const typed = { engine: context.engine, sheet: sampleSheet({ cycle: { ...context.base.cycle, volumetricEfficiency: 0.8 } }) }
    for (const each of [scenario, typed]) {
      const [closed, whole] = [evaluateClosedForms(each), evaluateScenario(each)]
      const added = whole.findings.filter(({ id }) => !closed.findings.some((finding) => finding.id === id))
      expect(cycleAnswerOf(whole).findings).toEqual(added)
      expect(cycleAnswerOf(whole).notices).toEqual(whole.notices.filter(({ code }) => !closed.notices.some((notice) => notice.code === code)))
    }
    expect(evaluateScenario(typed).notices.length).toBeGreaterThan(evaluateScenario(scenario).notices.length)
  })
})
