import { describe, expect, it } from 'vitest'
import '@/lib/calc/index'
import { evaluateScenario, sparkMapOf, type Engine, type Scenario, type ScenarioSheet } from '@/lib/calc/live'
import { computeSparkMap } from '@/lib/workbench/spark-map/compute'
import { sparkMapPoints } from '@/lib/workbench/spark-map/points'
import { sparkMapKeyOf } from '@/lib/workbench/spark-map/request'
import { viewFinding } from '@/lib/words/spark-map-words'
import { someCases } from '@/tests/support/cases'
import { expectClose } from '@/tests/support/expect-close'
import { sampleEngine, sampleSheet } from '@/tests/support/samples'
import { smallMap } from './small-map'

const sheet = sampleSheet()
const reference = { sparkDeg: 26, rpm: 2000, octane: 95, marginDeg: 1 }
const scenarioOf = (change: Partial<ScenarioSheet> = {}, engine: Partial<Engine> = {}): Scenario => ({ engine: sampleEngine(engine), sheet: sampleSheet(change) })
const choice = { rpm: [1000, 2780], manifoldKpa: [50, 98], day: 'worse' } as const

describe('what a map stands on', () => {
  const changes: Partial<ScenarioSheet>[] = [
    { cycle: { ...sheet.cycle, wallK: 480 } }, { fuel: { ...sheet.fuel, worseOctane: 90 } }, { worse: { ...sheet.worse, hotterK: 20 } }, { mbt: { ...sheet.mbt, deg: 35 } },
    { manifold: { ...sheet.manifold, fullKpa: 95 } }, { plugsPerCylinder: 2 }, { reference },
  ]
  it.each(someCases(changes))('%o changes its key, and its input', (change) => {
    expect(sparkMapKeyOf(scenarioOf(change))).not.toBe(sparkMapKeyOf(scenarioOf()))
    expect(sparkMapOf(scenarioOf(change), choice)).not.toEqual(sparkMapOf(scenarioOf(), choice))
  })

  const others: Partial<ScenarioSheet>[] = [
    { notes: 'x' }, { backup: { schedule: { kind: 'fixed', deg: 12 } } }, { primary: { schedule: { kind: 'fixed', deg: 12 } } }, { worse: { ...sheet.worse, denserKpa: 9 } },
    { runUpRpm: 1800 }, { manifold: { ...sheet.manifold, idleKpa: 45 } }, { propeller: { ...sheet.propeller, pitches: [{ name: 'fine', rpm: 2780, kw: 30 }] } },
  ]
  it.each(someCases(others))('%o changes neither', (change) => {
    expect(sparkMapKeyOf(scenarioOf(change))).toBe(sparkMapKeyOf(scenarioOf()))
    expect(sparkMapOf(scenarioOf(change), choice)).toEqual(sparkMapOf(scenarioOf(), choice))
  })

  it('takes in the primary and the propeller where a reference below full power stands on them', () => {
    const timing: Partial<ScenarioSheet> = { primary: { schedule: { kind: 'fixed', deg: 12 } } }
    expect(sparkMapKeyOf(scenarioOf({ reference, ...timing }))).not.toBe(sparkMapKeyOf(scenarioOf({ reference })))
    const atFull = { ...reference, rpm: 2780 }
    expect(sparkMapKeyOf(scenarioOf({ reference: atFull, ...timing }))).toBe(sparkMapKeyOf(scenarioOf({ reference: atFull })))
    expect(sparkMapOf(scenarioOf({ reference: atFull, ...timing }), choice)).toEqual(sparkMapOf(scenarioOf({ reference: atFull }), choice))
  })
})

describe('computing', () => {
  it('gives the map with the pressures that belong together, row by row', async () => {
    const seen: number[] = []
    const answer = await computeSparkMap({ scenario: scenarioOf(), choice }, { onProgress: ({ done, total }) => seen.push(done / total) })
    if (!answer.ok) return expect.fail(answer.error.message)
    expect(seen).toEqual([0.5, 1])
    expectClose(answer.map.pressureKpa[1] ?? NaN, answer.pressures.fullChargeKpa, { rel: 1e-12 })
  })

  it('says why there is none: withheld, or a speed it cannot take', async () => {
    const withheld = await computeSparkMap({ scenario: scenarioOf({ plugsPerCylinder: 2 }), choice })
    expect(withheld.ok ? null : withheld.error.code).toBe('twoPlugs')
    const refused = await computeSparkMap({ scenario: scenarioOf(), choice: { ...choice, rpm: [0] } })
    expect(refused.ok ? null : [refused.error.code, refused.error.field]).toEqual(['input', 'rpm.0'])
  })

  it('stops for the reason it is given', async () => {
    const stop = new AbortController()
    await expect(computeSparkMap({ scenario: scenarioOf(), choice }, { onProgress: () => stop.abort('enough'), signal: stop.signal })).rejects.toBe('enough')
  })
})

describe('points of the plan', () => {
  const scenario = scenarioOf()
  const { parts } = evaluateScenario(scenario)
  const pressures = { fullChargeKpa: parts.charge.ok ? parts.charge.pressureKpa : NaN, fullManifoldKpa: 98 }

  it('stand where the manifold pressures put them; the point nearest to detonation is full power', () => {
    const points = sparkMapPoints(scenario, parts, pressures, 'worse')
    expect(points.map(({ name, rpm }) => [name, rpm])).toEqual([['idle', 820], ['run-up', 1700], ['full power', 2780]])
    expectClose(points[0]?.pressureKpa ?? NaN, pressures.fullChargeKpa * (40 / 98) + 3, { rel: 1e-12 })
    expect(points[2]?.sparks.map(({ channel }) => channel)).toEqual(['A', 'B'])
    expectClose(points[2]?.sparks[0]?.deg ?? NaN, 27.4 - 6e-6 * 2780 * 55, { abs: 1e-9 })
    if (!parts.detonation.ok) return expect.fail(parts.detonation.error.message)
    expectClose(points[2]?.pressureKpa ?? NaN, parts.detonation.primary.worse.pressureKpa, { rel: 1e-9 })
  })

  it('are as planned without the denser charge, and take in a worst point elsewhere with its channel alone', () => {
    const { detonation } = parts
    if (!detonation.ok) return expect.fail(detonation.error.message)
    const moved = { ...detonation, backup: { ...detonation.backup, planned: { ...detonation.backup.planned, rpm: 1500 } } }
    const points = sparkMapPoints(scenario, { ...parts, detonation: moved }, pressures, 'planned')
    expectClose(points[2]?.pressureKpa ?? NaN, pressures.fullChargeKpa, { rel: 1e-12 })
    expect(points[3]).toMatchObject({ name: 'nearest to detonation', rpm: 1500, sparks: [{ channel: 'B', deg: 17 }] })
    const error = { code: 'twoPlugs', field: 'sheet', value: null, limit: null, unit: null, message: 'A reason.' } as const
    expect(sparkMapPoints(scenario, { speeds: { ok: false, error }, detonation: { ok: false, error } }, pressures, 'planned')).toEqual([])
  })
})

describe('what the drawing says', () => {
  const full = { name: 'full power', rpm: 2000, pressureKpa: 120, sparks: [{ channel: 'A' as const, deg: 26 }, { channel: 'B' as const, deg: 22.05 }] }
  it('counts what sets the spark and holds the plan against it', () => {
    expect(viewFinding(smallMap, 'spark', [full], 'metric')).toBe('Of 6 places best torque sets the spark at 3, detonation at 2; at 1 it detonates at every spark. At full power it is 22.1°, set by detonation: A fires 3.9° earlier, B fires there.')
    expect(viewFinding(smallMap, 'spark', [{ ...full, pressureKpa: 100 }], 'metric')).toMatch(/At full power it is 32\.0°, set by best torque: A fires 6\.0° later/)
    expect(viewFinding(smallMap, 'spark', [{ ...full, rpm: 2500 }], 'metric')).not.toMatch(/full power/)
  })
  it('spans best torque and the limit, and counts the places without one', () => {
    expect(viewFinding(smallMap, 'mbt', [], 'metric')).toMatch(/25\.0° to 36\.0°/)
    expect(viewFinding(smallMap, 'limit', [], 'metric')).toBe('Coming from late sparks detonation begins at 20.0° to 55.0°; at 1 of 6 places no spark searched reaches it, at 1 every spark detonates.')
  })
})
