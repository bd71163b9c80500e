import { describe, expect, test } from 'vitest'
import {
  combustionEfficiency, evaluateScenario, findMbt, knockLimitedSpark, mepFromPower, scaleBurn, simulateCycle, sparkAdvanceDeg, sparkDemandKv, sparkEnergyMj, sparkMargin,
  type CycleInput, type Engine, type Part, type Scenario, type ScenarioSheet,
} from '@/lib/calc'
import { addCycleLayer } from '@/lib/calc/scenario/cycle-layer'
import { displacementCc, frictionPowerAt } from '@/lib/calc/scenario/power-parts'
import { deepFreeze } from '@/tests/support/deep-freeze'
import { expectClose } from '@/tests/support/expect-close'
import { sampleEngine, sampleSheet } from '@/tests/support/samples'

const scenario = (engine: Partial<Engine> = {}, sheet: Partial<ScenarioSheet> = {}): Scenario => deepFreeze({ engine: sampleEngine(engine), sheet: sampleSheet(sheet) })
const got = <T extends object>(part: Part<T>): T => {
  if (!part.ok) throw new Error(JSON.stringify(part.error))
  return part
}
const { cycle, mbt } = sampleSheet()

/** One cylinder of a scenario at any of its speeds and charges, as the library's own functions take it. */
const cylinder = ({ engine, sheet }: Scenario, at: { rpm: number, pressureKpa: number, sparkDeg: number, hotterK?: number, octane: number }, charge: { rpm: number, pressureKpa: number, delayDeg: number, durationDeg: number }): CycleInput => ({
  engine: { boreMm: engine.boreMm, strokeMm: engine.strokeMm, rodMm: engine.rodMm, compressionRatio: engine.compressionRatio, ivcDeg: sheet.cycle.ivcDeg, evoDeg: sheet.cycle.evoDeg },
  rpm: at.rpm, gamma: 'temperature', heatLoss: { wallK: sheet.cycle.wallK, headAreaFactor: sheet.cycle.headAreaFactor }, octane: at.octane,
  charge: { pressureKpa: at.pressureKpa, temperatureK: sheet.cycle.chargeK + (at.hotterK ?? 0), residualFraction: sheet.cycle.residualFraction, airFuelRatio: sheet.cycle.airFuelRatio },
  burn: { sparkDeg: at.sparkDeg, efficiency: combustionEfficiency(sheet.cycle.airFuelRatio), ...scaleBurn({ reference: charge, rpm: at.rpm, pressureKpa: at.pressureKpa }) },
})

describe('charge', () => {
  const plain = scenario()
  const { volumetricEfficiency } = got(evaluateScenario(plain).parts.charge)

  test('a typed charge may miss the power by 5 %: at 3 % the margin stands, at 8 % it does not, to either side', () => {
    // Power goes with the charge, steeper than in proportion: friction stays.
    for (const [share, code] of [[1.02, null], [0.98, null], [1.06, 'chargeMismatch'], [0.94, 'chargeMismatch']] as const) {
      const { charge, detonation } = evaluateScenario(scenario({}, { cycle: { ...cycle, volumetricEfficiency: volumetricEfficiency * share } })).parts
      expect(Math.abs(got(charge).mismatch) > 0.05, String(share)).toBe(code !== null)
      expect(Math.abs(got(charge).mismatch)).toBeLessThan(0.1)
      expect(detonation.ok ? null : detonation.error.code).toBe(code)
    }
  })

  test('where the propeller takes less than full throttle gives, the charge makes its load on the primary’s own spark', () => {
    // So much advance at middle speeds that detonation is nearest there.
    const bumped = scenario({}, { primary: { schedule: { kind: 'table', points: [{ rpm: 1300, deg: 20 }, { rpm: 2224, deg: 52 }, { rpm: 2700, deg: 20 }] }, latencyUs: 0 } })
    const { charge, detonation } = evaluateScenario(bumped).parts
    const { planned } = got(detonation).primary
    expect(planned.rpm).toBeLessThan(2700)
    const loadKw = 49.3 * (planned.rpm / 2780) ** 3
    expectClose(planned.powerKw, loadKw, { rel: 1e-12 })
    const sparkDeg = sparkAdvanceDeg(bumped.sheet.primary, { rpm: planned.rpm })
    const { imepKpa } = simulateCycle(cylinder(bumped, { rpm: planned.rpm, pressureKpa: planned.pressureKpa, sparkDeg, octane: 95 }, got(charge)))
    const cc = displacementCc(bumped.engine)
    expectClose(imepKpa, mepFromPower({ powerKw: loadKw + frictionPowerAt(bumped.engine, planned.rpm), displacementCc: cc, rpm: planned.rpm }), { rel: 1e-5 })
  })
})

describe('detonation', () => {
  test('the price of 10 K and of 10 kPa is the limit lost to each at the worst point', () => {
    const plain = scenario()
    const { charge, detonation } = evaluateScenario(plain).parts
    const { worse, per10KDeg, per10KpaDeg } = got(detonation).primary
    const limit = (more: { hotterK?: number, denserKpa?: number }) => knockLimitedSpark(cylinder(plain, {
      rpm: worse.rpm, pressureKpa: worse.pressureKpa + (more.denserKpa ?? 0), sparkDeg: worse.sparkDeg, hotterK: plain.sheet.worse.hotterK + (more.hotterK ?? 0), octane: 91,
    }, got(charge))).limitDeg ?? NaN
    expectClose(per10KDeg, limit({}) - limit({ hotterK: 10 }), { abs: 0.02 })
    expectClose(per10KpaDeg, limit({}) - limit({ denserKpa: 10 }), { abs: 0.02 })
  })

  test('the worst speed is looked for between half and full speed, each channel on its own', () => {
    const bumped = scenario({}, {
      propeller: { kind: 'constantSpeed', governedRpm: 2700, pitches: [{ name: 'fine', rpm: 2780, kw: 30 }] },
      primary: { schedule: { kind: 'table', points: [{ rpm: 1390, deg: 22 }, { rpm: 1946, deg: 33 }, { rpm: 2502, deg: 22 }] }, latencyUs: 0 },
    })
    const { primary, backup } = got(evaluateScenario(bumped).parts.detonation)
    expectClose(primary.worse.rpm, 1946, { rel: 1e-12 })
    expect(backup.worse.rpm).not.toBe(primary.worse.rpm)
    expect(primary.worse.powerKw).toBeGreaterThan(30 * (1946 / 2780) ** 3)
  })
})

test('a top of the schedule between the even speeds is looked at: the margin is least there', () => {
  const peakAt = (rpm: number) => ({ schedule: { kind: 'table' as const, points: [{ rpm: rpm - 120, deg: 14 }, { rpm, deg: 27 }, { rpm: rpm + 120, deg: 14 }] }, latencyUs: 0 })
  const held: ScenarioSheet['propeller'] = { kind: 'constantSpeed', governedRpm: 2700, pitches: [{ name: 'fine', rpm: 2780, kw: 49.3 }] }
  // 1946 and 2224 are even speeds, 2085 and 2641 lie between. A fixed pitch leaves the engine throttled but near full speed.
  for (const [rpm, propeller] of [[1946, held], [2085, held], [2641, sampleSheet().propeller]] as const) {
    const { primary, backup } = got(evaluateScenario(scenario({}, { propeller, primary: peakAt(rpm) })).parts.detonation)
    expectClose(primary.worse.rpm, rpm, { abs: 10 })
    expectClose(primary.worse.sparkDeg, 27, { abs: 1.1 })
    expect(Math.abs(backup.worse.rpm - rpm)).toBeGreaterThan(100)
  }
  // The charge of a throttled engine follows the primary; at full throttle it is the same for both.
  const margin = (sheet: Partial<ScenarioSheet>, channel: 'primary' | 'backup') => got(evaluateScenario(scenario({}, { propeller: held, ...sheet })).parts.detonation)[channel].worse.marginDeg ?? NaN
  expectClose(margin({ backup: peakAt(2085) }, 'backup'), margin({ primary: peakAt(2085) }, 'primary'), { abs: 1e-9 })
})

describe('spark and pressure', () => {
  const plain = scenario()
  const { charge, spark, pressure } = evaluateScenario(plain).parts

  test('while the starter turns the coil has the voltage of the starter, the cylinder outside air, the spark its cranking advance', () => {
    const row = got(spark).primary
    const { engine } = cylinder(plain, { rpm: 190, pressureKpa: 101.325, sparkDeg: 0, octane: 95 }, got(charge))
    const sparkDeg = sparkAdvanceDeg(plain.sheet.primary, { rpm: 190 })
    const demandKv = sparkDemandKv({ engine, charge: { pressureKpa: 101.325, temperatureK: 288.15 }, sparkDeg, gapMm: plain.sheet.plugGapMm })
    expectClose(row.crankingDemandKv, demandKv, { rel: 1e-12 })
    const energyMj = sparkEnergyMj({ supplyV: 8.5, ohm: 0.7, mh: 4.5, limitA: 7 }, 4)
    expectClose(row.crankingOfferedKv, sparkMargin({ demandKv, energyMj, secondaryPf: 100, transferEfficiency: 0.5 }).offeredKv, { rel: 1e-12 })
    expect(row.crankingOfferedKv).toBeLessThan(row.offeredKv)
  })

  test('a clamp on the drive holds the voltage offered', () => {
    const coils = plain.sheet.coils
    const clamped = scenario({}, { coils: { ...coils, backup: { ...coils.backup, clampKv: 9 } } })
    const rows = got(evaluateScenario(clamped).parts.spark)
    expect([rows.backup.offeredKv, rows.backup.crankingOfferedKv, rows.primary.offeredKv > 9]).toEqual([9, 9, true])
  })

  test('torque over that at the best spark, friction taken off both', () => {
    const { rpm, backup } = got(pressure)
    const { pressureKpa } = got(charge)
    const fmepKpa = mepFromPower({ powerKw: frictionPowerAt(plain.engine, rpm), displacementCc: displacementCc(plain.engine), rpm })
    const at = (sparkDeg: number) => cylinder(plain, { rpm, pressureKpa, sparkDeg, octane: 95 }, got(charge))
    const best = findMbt(at(30)).imepKpa
    expectClose(backup.torqueRatio, (simulateCycle(at(17)).imepKpa - fmepKpa) / (best - fmepKpa), { rel: 1e-5 })
  })
})

describe('notices', () => {
  const hot: Partial<ScenarioSheet> = {
    mbt: { ...mbt, deg: 30 }, cycle: { ...cycle, airFuelRatio: 14.6, residualFraction: 0, chargeK: 500, wallK: 700, headAreaFactor: 0.5 },
    primary: { schedule: { kind: 'fixed', deg: 50 } },
  }
  test('a charge hotter than the fit of its specific heats is said, once, with the hottest of both channels', () => {
    const result = evaluateScenario(scenario({ compressionRatio: 10 }, hot))
    const notices = result.notices.filter(({ code }) => code === 'gammaOutsideFit')
    expect(notices).toHaveLength(1)
    const charge = got(result.parts.charge)
    const of = scenario({ compressionRatio: 10 }, hot)
    const { peakTemperatureK } = simulateCycle(cylinder(of, { rpm: charge.rpm, pressureKpa: charge.pressureKpa, sparkDeg: 50, octane: 95 }, charge))
    expectClose(notices[0]?.value ?? NaN, peakTemperatureK, { rel: 1e-9 })
    expect(evaluateScenario(scenario()).notices.map(({ code }) => code)).not.toContain('gammaOutsideFit')
  })

  test('computing the layer again says nothing twice', () => {
    const typed = scenario({ compressionRatio: 10 }, { ...hot, cycle: { ...cycle, ...hot.cycle, volumetricEfficiency: 0.9 } })
    const once = evaluateScenario(typed)
    expect(addCycleLayer(typed, once)).toEqual(once)
    expect(once.notices.map(({ code }) => code)).toContain('chargeTyped')
  })
})
