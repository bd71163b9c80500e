import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import '@/lib/calc/index'
import { deadCylinderPower, fixedPitchOperatingPoint, runUpDrop, brakeRatioFromIndicated, mepFromPower, sparkAdvanceDeg, timingTorqueRatio } from '@/lib/calc/index'
import { defaultLimits } from '@/lib/calc/limits'
import { evaluateScenario, inputErrors } from '@/lib/calc/scenario/evaluate-scenario'
import { displacementCc } from '@/lib/calc/scenario/power-parts'
import type { Engine, Scenario, ScenarioSheet } from '@/lib/calc/scenario/scenario-types'
import { storedResult } from '@/lib/calc/scenario/stored-result'
import { sampleEngine, sampleSheet } from '@/tests/support/samples'
import { deepFreeze } from '@/tests/support/deep-freeze'
import { expectClose } from '@/tests/support/expect-close'

const scenario = (engine: Partial<Engine> = {}, sheet: Partial<ScenarioSheet> = {}): Scenario => deepFreeze({ engine: sampleEngine(engine), sheet: sampleSheet(sheet) })
const fixed = (deg: number) => ({ schedule: { kind: 'fixed' as const, deg } })
const part = <T extends { ok: boolean }>(value: T) => {
  if (!value.ok) throw new Error(JSON.stringify(value))
  return value as Extract<T, { ok: true }>
}
const find = (result: ReturnType<typeof evaluateScenario>, id: string) => {
  const finding = result.findings.find((each) => each.id === id)
  if (!finding) throw new Error(`no finding ${id}`)
  return finding
}

describe('common practice, no published source', () => {
  const result = evaluateScenario(scenario(
    { powerTimingDeg: 28, friction: { kind: 'efficiency', mechanicalEfficiency: 0.8 }, idleSlowestRpm: 480, idleRpm: 500 },
    { primary: { ...fixed(28), crankRetard: { byDeg: 10, belowRpm: 400 } }, backup: fixed(18), mbt: { deg: 34, curvaturePerDeg2: 3.9e-4, provenance: 'guess', note: '' } },
  ))
  test('both crank at 18°, 10° apart from idle up', () => {
    expectClose(find(result, 'crankingAdvanceDeg.primary').value, 18, { abs: 1e-12 })
    expectClose(find(result, 'crankingAdvanceDeg.backup').value, 18, { abs: 1e-12 })
    const { points } = part(result.parts.speeds)
    expectClose(points.cranking.staggerDeg, 0, { abs: 1e-12 })
    for (const mark of ['idle', 'runUp', 'full'] as const) expectClose(points[mark].staggerDeg, 10, { abs: 1e-12 })
  })
  test('0.91 of the power on the backup, 79 % with one dead cylinder', () => {
    expectClose(part(result.parts.power).backupToPrimary, (1 - 3.9e-4 * 256) / (1 - 3.9e-4 * 36), { rel: 1e-12 })
    expectClose(part(result.parts.deadCylinders).rows[1]?.primary.fraction, (1.25 * 5) / 6 - 0.25, { rel: 1e-12 })
  })
  test('a check at idle proves both channels', () => {
    expect(part(result.parts.proof).rpm).toEqual({ primary: 500, backup: 500 })
    expect(find(result, 'proofAboveIdleRpm.primary').verdict).toBe('within')
  })
})

describe('parts are what the library says one by one', () => {
  const { engine, sheet } = scenario()
  const result = evaluateScenario({ engine, sheet })
  test('advance at the marked speeds, each at its own manifold pressure', () => {
    const mapped = scenario({}, { primary: { schedule: { kind: 'map', rpm: [500, 3000], mapKpa: [30, 100], deg: [[20, 10], [40, 25]] } } })
    const { points } = part(evaluateScenario(mapped).parts.speeds)
    expectClose(points.idle.primaryDeg, sparkAdvanceDeg(mapped.sheet.primary, { rpm: 820, mapKpa: 40 }), { rel: 1e-12 })
    expectClose(points.runUp.primaryDeg, sparkAdvanceDeg(mapped.sheet.primary, { rpm: 1700, mapKpa: 65 }), { rel: 1e-12 })
    expectClose(points.full.primaryDeg, sparkAdvanceDeg(mapped.sheet.primary, { rpm: 2780, mapKpa: 98 }), { rel: 1e-12 })
  })
  test('power at each timing is the curve times the torque ratio over that of the measured timing', () => {
    const parabola = { mbtDeg: 36, curvaturePerDeg2: 3e-4 }
    const a = sparkAdvanceDeg(sheet.primary, { rpm: 2780 })
    expectClose(part(result.parts.power).atMax.primaryKw, (50 * timingTorqueRatio(parabola, a)) / timingTorqueRatio(parabola, 26), { rel: 1e-12 })
    expectClose(part(result.parts.power).atMax.primaryNm, (part(result.parts.power).atMax.primaryKw * 60_000) / (2 * Math.PI * 2780), { rel: 1e-12 })
  })
  test('dead cylinders: the timing’s ratio goes in before friction comes off', () => {
    const parabola = { mbtDeg: 36, curvaturePerDeg2: 3e-4 }
    const timingRatio = timingTorqueRatio(parabola, 17) / timingTorqueRatio(parabola, 26)
    const expected = deadCylinderPower({ cylinders: 6, dead: 2, brakePowerKw: 50, mechanicalEfficiency: 0.82, timingRatio })
    expectClose(part(result.parts.deadCylinders).rows[2]?.backup.kw, expected.brakePowerKw, { rel: 1e-12 })
    expectClose(part(result.parts.deadCylinders).rows[6]?.primary.kw, -part(result.parts.deadCylinders).frictionPowerKw, { rel: 1e-12 })
  })
  test('run-up: full-load ratio, indicated, back to brake at the propeller’s load, then the drop; the band holds it', () => {
    const parabola = { mbtDeg: 36, curvaturePerDeg2: 3e-4 }
    const primary = sparkAdvanceDeg(sheet.primary, { rpm: 1700 })
    const brake = timingTorqueRatio(parabola, 17) / timingTorqueRatio(parabola, primary)
    const cc = displacementCc(engine)
    const frictionMep = (rpm: number) => 97 + 15 * (rpm / 1000) + 5 * (rpm / 1000) ** 2
    const fmepKpa = (mepFromPower({ powerKw: 50 * (1 / 0.82 - 1), displacementCc: cc, rpm: 2780 }) * frictionMep(1700)) / frictionMep(2780)
    const imepKpa = mepFromPower({ powerKw: 49.3 * (1700 / 2780) ** 3, displacementCc: cc, rpm: 1700 }) + fmepKpa
    const torqueRatio = brakeRatioFromIndicated({ indicatedRatio: 1 - (1 - brake) * 0.82, imepKpa, fmepKpa })
    const row = part(result.parts.runUp).rows[0]
    expectClose(row?.backup.dropRpm, runUpDrop({ rpm: 1700, torqueRatio, torqueExponent: -0.5 }).dropRpm, { rel: 1e-10 })
    expect(row?.backup.lowRpm).toBeLessThan(row?.backup.rpm ?? 0)
    expect(row?.backup.highRpm).toBeGreaterThan(row?.backup.rpm ?? Infinity)
    expect(row?.primary).toEqual({ rpm: 1700, dropRpm: 0, lowRpm: 1700, highRpm: 1700 })
  })
  test('with both channels live the earlier spark is the one both drops are counted from', () => {
    const both = part(evaluateScenario(scenario({}, { selection: 'both', backup: fixed(30), primary: fixed(20) })).parts.runUp)
    expect(both.rows[0]?.backup.dropRpm).toBe(0)
    expect(both.rows[0]?.primary.dropRpm).toBeGreaterThan(1)
  })
  test('the propeller turns slower on the backup, slower still with one cold', () => {
    const row = part(result.parts.propeller).rows[0]
    const healthy = fixedPitchOperatingPoint({ powerCurve: engine.powerCurve, fraction: 1, load: { rpm: 2780, kw: 49.3, densityRatio: 1 }, densityRatio: 1 })
    expect(Math.abs((row?.primary?.rpm ?? 0) - healthy.rpm)).toBeLessThan(15)
    expect(row?.backup?.rpm ?? Infinity).toBeLessThan(row?.primary?.rpm ?? 0)
    expect(row?.oneCold?.rpm ?? Infinity).toBeLessThan(row?.backup?.rpm ?? 0)
  })
})

describe('findings', () => {
  test('backup first is found where it is, with its speed', () => {
    const finding = find(evaluateScenario(scenario({}, { backup: { schedule: { kind: 'table', points: [{ rpm: 1000, deg: 17 }, { rpm: 2700, deg: 29 }] } } })), 'backupFirstDeg')
    expect(finding.verdict).toBe('outside')
    expect(finding.value).toBeLessThan(0)
    // The delay of the primary takes a little more at each higher speed.
    expect(finding.data.rpm).toBe(2780)
  })
  test('a threshold above idle is outside, one too near to cranking too, hysteresis counted', () => {
    const high = evaluateScenario(scenario({}, { primary: { ...fixed(26), crankRetard: { byDeg: 8, belowRpm: 800 } } }))
    expectClose(find(high, 'retardBelowIdleRpm.primary').value, -40, { abs: 1e-12 })
    expect(find(high, 'retardBelowIdleRpm.primary').verdict).toBe('outside')
    const low = evaluateScenario(scenario({}, { primary: { ...fixed(26), crankRetard: { byDeg: 8, belowRpm: 400, hysteresisRpm: 100 } } }))
    expectClose(find(low, 'retardAboveCrankingRpm.primary').value, 60, { abs: 1e-12 })
    expect(find(low, 'retardAboveCrankingRpm.primary').verdict).toBe('outside')
  })
  test('cranking is judged at the slowest speed, and after a first fire when hysteresis lets the full advance through', () => {
    const delayed = evaluateScenario(scenario({}, { primary: { ...fixed(20.5), latencyUs: 1000 } }))
    expectClose(find(delayed, 'crankingAdvanceDeg.primary').value, 20.5 - 0.006 * 160, { rel: 1e-12 })
    const released = evaluateScenario(scenario({ crankingFastestRpm: 300 }, { primary: { ...fixed(26), crankRetard: { byDeg: 8, belowRpm: 350, hysteresisRpm: 100 } } }))
    expectClose(find(released, 'crankingAdvanceDeg.primary').value, 26, { abs: 1e-12 })
    expect(find(released, 'crankingAdvanceDeg.primary').data).toMatchObject({ released: true })
  })
  test('a schedule that follows the manifold pressure cannot be proved on the ground', () => {
    const mapped = evaluateScenario(scenario({}, { primary: { schedule: { kind: 'map', rpm: [500, 3000], mapKpa: [30, 100], deg: [[36, 26], [36, 26]] } } }))
    expect(find(mapped, 'proofAboveIdleRpm.primary')).toMatchObject({ value: null, verdict: 'outside', data: { followsPressure: true } })
  })
  test('leads are read in the rotor’s direction', () => {
    expect(find(evaluateScenario(scenario({ distributorRotation: 'anticlockwise', capTerminals: [3, 2, 5, 4, 1, 6] })), 'leadsOutOfPlace').value).toBe(0)
    expect(find(evaluateScenario(scenario({ distributorRotation: 'clockwise', capTerminals: [3, 2, 5, 4, 1, 6] })), 'leadsOutOfPlace').value).toBe(4)
  })
  test('a mechanical advance that carries the rotor leaves the register where it is', () => {
    const mechanical = { schedule: { kind: 'mechanical' as const, initialDeg: 8, startRpm: 600, fullRpm: 2000, fullDeg: 26 } }
    const worst = (mechanicalCarriesRotor: boolean) => part(evaluateScenario(scenario({}, { distribution: 'capEach', primary: mechanical, rotor: { ...sampleSheet().rotor, phasedAtDeg: 8, sparkDurationMs: 0, mechanicalCarriesRotor } })).parts.register).worst.primary
    expectClose(worst(true).startOffsetDeg, 0, { abs: 1e-9 })
    expectClose(worst(false).startOffsetDeg, -9, { abs: 1e-9 })
  })
  test('judged by the limits given, ranked worst first, counted', () => {
    const limits = { ...defaultLimits, backupPowerRatio: { ...defaultLimits.backupPowerRatio, value: 0.99 } }
    const result = evaluateScenario(scenario(), limits)
    expect(result.findings[0]).toMatchObject({ id: 'backupPowerRatio.backup', verdict: 'outside', limit: 0.99 })
    expect(result.counts.outside + result.counts.close + result.counts.within).toBe(result.findings.length)
    const order = result.findings.map((finding) => ['outside', 'close', 'within'].indexOf(finding.verdict))
    expect(order).toEqual([...order].sort())
  })
})

describe('a part that fails leaves the others standing', () => {
  test('a faulty formula names its character and takes only what stands on that channel', () => {
    const result = evaluateScenario(scenario({}, { backup: { schedule: { kind: 'formula', expression: '12 + evil' } } }))
    expect(inputErrors(result)[0]).toMatchObject({ field: 'sheet.backup.schedule.expression', at: 5 })
    expect(result.parts.marks.ok && result.parts.leads.ok).toBe(true)
    expect(result.parts.power.ok).toBe(false)
  })
  test('two plugs withhold power, drop and dead cylinders with the reason; angles go on', () => {
    const result = evaluateScenario(scenario({}, { plugsPerCylinder: 2 }))
    for (const name of ['power', 'deadCylinders', 'runUp', 'propeller'] as const) expect(result.parts[name]).toMatchObject({ ok: false, error: { code: 'twoPlugs' } })
    expect(result.parts.speeds.ok && result.parts.stagger.ok && result.parts.register.ok).toBe(true)
    expect(inputErrors(result)).toEqual([])
    expect(result.findings.some((finding) => finding.limitId === 'backupPowerRatio')).toBe(false)
  })
  test('direct coils have no register, uneven engines no even cap, a run-up above full power no expectation', () => {
    expect(evaluateScenario(scenario({}, { distribution: 'directCoils' })).parts.register).toMatchObject({ ok: false, error: { code: 'noRotor' } })
    expect(evaluateScenario(scenario({ intervalsDeg: [100, 140, 100, 140, 100, 140] })).parts.register).toMatchObject({ ok: false, error: { code: 'unevenCap' } })
    expect(inputErrors(evaluateScenario(scenario({}, { runUpRpm: 2900 })))).toMatchObject([{ code: 'runUpOutside', field: 'sheet.runUpRpm' }])
  })
  test('an engine that never meets its propeller is a result', () => {
    expect(part(evaluateScenario(scenario({}, { propeller: { kind: 'fixedPitch', governedRpm: null, pitches: [{ name: 'flat', rpm: 2780, kw: 9 }] } })).parts.propeller).rows[0]?.primary).toBeNull()
  })
})

test('whatever the schema lets through: no throw, no number that is none, the same twice', () => {
  const angle = fc.double({ min: -20, max: 60, noNaN: true })
  const schedule = fc.oneof(
    angle.map((deg) => ({ kind: 'fixed' as const, deg })),
    fc.tuple(angle, angle, fc.integer({ min: 0, max: 2000 }), fc.integer({ min: 1, max: 3000 })).map(([initialDeg, fullDeg, startRpm, more]) => ({ kind: 'mechanical' as const, initialDeg, fullDeg, startRpm, fullRpm: startRpm + more })),
    fc.constantFrom('12', 'rpm/100', '1/(rpm-820)', 'sqrt(rpm-2000)', 'map/4', 'rpm>900?20:10').map((expression) => ({ kind: 'formula' as const, expression })),
  )
  fc.assert(fc.property(
    schedule, schedule, fc.double({ min: 0, max: 60, noNaN: true }), fc.double({ min: 1e-5, max: 5e-3, noNaN: true }), fc.integer({ min: 300, max: 6000 }), fc.constantFrom('sharedCap', 'capEach', 'directCoils'), fc.constantFrom('oneAtATime', 'both'),
    (primary, backup, deg, curvaturePerDeg2, runUpRpm, distribution, selection) => {
      const given = scenario({}, { primary: { schedule: primary, crankRetard: { byDeg: 8, belowRpm: 450, hysteresisRpm: 40 } }, backup: { schedule: backup }, mbt: { deg, curvaturePerDeg2, provenance: 'guess', note: '' }, runUpRpm, distribution, selection } as Partial<ScenarioSheet>)
      const result = evaluateScenario(given)
      const isFinite = (value: unknown): boolean => (typeof value === 'number' ? Number.isFinite(value) : !value || typeof value !== 'object' || Object.values(value).every(isFinite))
      expect(isFinite(result.parts)).toBe(true)
      expect(result.findings.every((finding) => finding.value === null || Number.isFinite(finding.value))).toBe(true)
      expect(JSON.stringify(evaluateScenario(given))).toBe(JSON.stringify(result))
      expect(JSON.parse(JSON.stringify(storedResult(result)))).toEqual(storedResult(result))
    },
  ), { numRuns: 60 })
}, 30_000)
