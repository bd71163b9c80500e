import { describe, expect, it } from 'vitest'
import { drawnResult } from '@/lib/compare/drawn-result'
import { findingChanges } from '@/lib/compare/finding-changes'
import { keyResults } from '@/lib/compare/key-results'
import { findingRows, keyRows } from '@/lib/compare/result-rows'
import { sampleRevision } from '@/tests/support/sample-revisions'
import { sampleCoil, sampleSheet } from '@/tests/support/samples'

const base = sampleRevision(1)
const hot = sampleRevision(2, { coils: { primary: { ...base.sheet.coils.primary, ambientK: base.sheet.coils.primary.ambientK + 20 }, backup: base.sheet.coils.backup } })
const worseFuel = sampleRevision(3, { fuel: { ...base.sheet.fuel, worseOctane: base.sheet.fuel.worseOctane - 4 } })
/** As the first version of the program stored it: without the parts, findings and limits that came later. */
const early = (() => {
  const { speeds, curves, stagger, power, deadCylinders, runUp, propeller, register, leads, proof, marks } = base.results.parts
  const parts: Partial<typeof base.results.parts> = { speeds, curves, stagger, power, deadCylinders, runUp, propeller, register, leads, proof, marks }
  const first = new Set(['deg', 'rpm', 'distributorDeg', 'mmPerDeg', 'count'])
  // What JSON brings back is not asked what it lacks.
  const results: typeof base.results = JSON.parse(JSON.stringify({ ...base.results, parts, findings: base.results.findings.filter(({ unit, limitId }) => first.has(unit) && limitId !== 'detonationDeg') }))
  return { ...base, results }
})()
const rows = (left: typeof base, right: typeof base, system: 'metric' | 'us' = 'metric') => [...findingRows(left.results, right.results, system), ...keyRows(left.results, right.results, system).flatMap((group) => group.rows)]
const row = (left: typeof base, right: typeof base, id: string, system: 'metric' | 'us' = 'metric') => rows(left, right, system).find((one) => one.id === id)

describe('figures of the models side by side', () => {
  it('gives every group its rows, in order', () => {
    const ids = keyResults(base.results, 'metric').map(({ id }) => id)
    expect(ids).toEqual(expect.arrayContaining(['detonation', 'charge', 'pressure', 'coils', 'spark', 'climb', 'redundancy', 'stack']))
    expect(ids.at(-1)).toBe('marks')
    expect(keyResults(base.results, 'metric').filter(({ rows: own, withheld }) => own.length === 0 && withheld === null)).toEqual([])
  })

  it('never gives a margin or a chance without its spread', () => {
    const uncertain = rows(base, worseFuel).filter(({ id }) => /^(margin|octane|detonationDeg|loss|noSparkPerH)/.test(id))
    expect(uncertain.length).toBeGreaterThan(12)
    for (const { id, left, right } of uncertain) expect([left?.spread, right?.spread].every((spread) => /\d|none/.test(spread ?? '')), id).toBe(true)
    expect(row(base, base, 'loss.noSpark')?.left).toMatchObject({ text: expect.stringMatching(/·10⁻/), spread: expect.stringMatching(/·10⁻.* to .*·10⁻/) })
  })

  it('worse fuel lessens the worst margin and leaves the planned one', () => {
    expect(row(base, worseFuel, 'margin.worse.primary')?.difference).toMatch(/^−/)
    expect(row(base, worseFuel, 'margin.planned.primary')?.difference).toBe('same')
  })

  it('a temperature’s difference is one, in either system', () => {
    const [metric, us] = [row(base, hot, 'winding.primary'), row(base, hot, 'winding.primary', 'us')]
    const step = Number(metric?.difference)
    expect(step).toBeGreaterThan(15)
    expect(step).toBeLessThan(40)
    expect(Math.abs(Number(us?.difference) - step * 1.8)).toBeLessThan(1.5)
    expect(row(base, hot, 'windingK.primary')?.difference).toBe(metric?.difference)
    expect(row(base, hot, 'winding.backup')?.difference).toBe('same')
  })

  it('a winding without a steady temperature is named, with no difference', () => {
    const runaway = sampleRevision(4, { coils: { primary: sampleCoil({ limitA: null, ohm: 0.2, dwellMs: 5, thermalResistanceKPerW: 12 }), backup: sampleSheet().coils.backup } })
    expect(row(base, runaway, 'winding.primary')).toMatchObject({ right: { text: 'no end' }, difference: null })
  })
})

describe('a result stored before the models were', () => {
  it('stands beside one of today with the figures it has', () => {
    expect(row(early, base, 'margin.worse.primary')).toMatchObject({ left: null, right: { text: expect.stringMatching(/\d|none/) }, difference: null })
    expect(row(early, base, 'power.primary')?.difference).toBe('same')
    expect(keyRows(early.results, early.results, 'metric').map(({ id }) => id)).not.toContain('detonation')
    expect(findingChanges(early.results, base.results).lost).toEqual([])
  })

  it('is drawn with its curves, by limits that lack the later ones', () => {
    const { crankingAdvanceDeg, beyondMbtDeg } = early.limits
    const fewer: typeof early.limits = JSON.parse(JSON.stringify({ crankingAdvanceDeg, beyondMbtDeg }))
    const drawn = drawnResult({ ...early, limits: fewer })
    expect(drawn.parts.curves).toMatchObject({ ok: true, rising: { primary: expect.arrayContaining([expect.objectContaining({ rpm: expect.any(Number) })]) } })
    expect(drawn.findings).toEqual(early.results.findings)
  })
})
