import { describe, expect, it } from 'vitest'
import { evaluateScenario, findMbt, sparkMap, sparkMapOf, type Scenario, type ScenarioSheet, type SparkMapChoice } from '@/lib/calc'
import { someCases } from '@/tests/support/cases'
import { deepFreeze } from '@/tests/support/deep-freeze'
import { expectClose } from '@/tests/support/expect-close'
import { sampleEngine, sampleSheet } from '@/tests/support/samples'

const scenarioOf = (change: Partial<ScenarioSheet> = {}): Scenario => deepFreeze({ engine: sampleEngine(), sheet: sampleSheet(change) })
const setupOf = (scenario: Scenario, choice: Partial<SparkMapChoice> = {}) => {
  const setup = sparkMapOf(scenario, { rpm: [2780], manifoldKpa: [98], day: 'planned', ...choice })
  return setup.ok ? setup : expect.fail(setup.error.message)
}
const reference = { sparkDeg: 26, rpm: 2780, octane: 95, marginDeg: 1 }

describe('the map of a scenario', () => {
  it('has at full power the best torque that was stated', async () => {
    const { input, pressures } = setupOf(scenarioOf())
    expect(pressures.fullManifoldKpa).toBe(98)
    expect(input.pressureKpa).toEqual([pressures.fullChargeKpa])
    const { mbtDeg } = await sparkMap(input)
    expectClose(mbtDeg[0]?.[0] ?? NaN, 36, { abs: 0.02 })
  })

  it.each(someCases([{ day: 'planned', reference: null }, { day: 'worse', reference: null }, { day: 'worse', reference }] as const))('has the limit of the detonation part: $day', async (given) => {
    // No denser charge: the part's point then lies on the map.
    const scenario = scenarioOf({ reference: given.reference, worse: { hotterK: 15, denserKpa: 0 } })
    const { detonation } = evaluateScenario(scenario).parts
    if (!detonation.ok) return expect.fail(detonation.error.message)
    const { rpm, limitDeg, pressureKpa } = detonation.primary[given.day]
    const { input, pressures } = setupOf(scenario, { rpm: [rpm], day: given.day })
    const { knockLimitDeg } = await sparkMap({ ...input, pressureKpa: [pressureKpa] })
    expect(pressures.fullChargeKpa).toBeGreaterThan(100)
    expectClose(knockLimitDeg[0]?.[0] ?? NaN, limitDeg ?? NaN, { abs: 0.011 })
  })

  it('turns manifold pressures into charge pressures in proportion, and burns there as scaled', async () => {
    const scenario = scenarioOf()
    const { input, pressures } = setupOf(scenario, { rpm: [1400], manifoldKpa: [49, 98] })
    expectClose(input.pressureKpa[0] ?? NaN, pressures.fullChargeKpa / 2, { rel: 1e-12 })
    const { mbtDeg } = await sparkMap(input)
    const total = (1400 / 2780) ** (1 / 3) * 0.5 ** -0.25
    const { delayDeg = 0, durationDeg } = input.burn ?? { durationDeg: NaN }
    const scaled = { ...input, rpm: 1400, charge: { ...input.charge, pressureKpa: pressures.fullChargeKpa / 2 }, burn: input.burn && { ...input.burn, delayDeg: delayDeg * total, durationDeg: durationDeg * total } }
    expectClose(mbtDeg[0]?.[0] ?? NaN, findMbt(scaled).mbtDeg, { abs: 0.011 })
  })

  it.each(someCases([
    ['twoPlugs', { plugsPerCylinder: 2 }],
    ['chargeMismatch', { cycle: { ...sampleSheet().cycle, volumetricEfficiency: 0.5 } }],
    ['burnUncalibrated', { mbt: { ...sampleSheet().mbt, deg: 2 } }],
    ['runUpOutside', { reference: { ...reference, rpm: 5000 } }],
  ] as const))('is withheld as the detonation part is: %s', (code, change) => {
    const scenario = scenarioOf(change)
    const setup = sparkMapOf(scenario, { rpm: [2780], manifoldKpa: [98], day: 'planned' })
    const { detonation } = evaluateScenario(scenario).parts
    expect(setup).toEqual(detonation)
    expect(setup.ok ? null : setup.error.code).toBe(code)
  })

  it('says which manifold pressure is none', () => {
    const setup = sparkMapOf(scenarioOf(), { rpm: [2780], manifoldKpa: [-1], day: 'planned' })
    expect(setup.ok ? null : [setup.error.code, setup.error.field]).toEqual(['input', 'manifoldKpa'])
  })
})
