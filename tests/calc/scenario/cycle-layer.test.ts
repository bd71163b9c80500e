import { describe, expect, test } from 'vitest'
import {
  addCycleLayer, arcMm, bestClimb, chargePressureFromVolumetricEfficiency, coilHeat, combineUncertainty, combustionEfficiency, cycleParts, defaultLimits, densityAltitudeM, evaluateClosedForms, evaluateScenario,
  findMbt, knockLimitedSpark, mepFromPower, powerAtDensityRatio, scaleBurn, simulateCycle, sparkDemandKv, sparkEnergyMj, sparkMargin, standardAtmosphere,
  type CycleInput, type Engine, type Part, type Scenario, type ScenarioSheet,
} from '@/lib/calc'
import { cycleModel } from '@/lib/calc/scenario/cycle-model'
import { readyScenario } from '@/lib/calc/scenario/ready-scenario'
import { displacementCc, frictionPowerAt } from '@/lib/calc/scenario/power-parts'
import { deepFreeze } from '@/tests/support/deep-freeze'
import { expectClose } from '@/tests/support/expect-close'
import { sampleEngine, sampleSheet } from '@/tests/support/samples'

const scenario = (engine: Partial<Engine> = {}, sheet: Partial<ScenarioSheet> = {}): Scenario => deepFreeze({ engine: sampleEngine(engine), sheet: sampleSheet(sheet) })
const got = <T extends object>(part: Part<T>): T => {
  if (!part.ok) throw new Error(JSON.stringify(part.error))
  return part
}
const codeOf = (part: Part<object>) => (part.ok ? null : part.error.code)
const { cycle, coils } = sampleSheet()
const fixed = (deg: number) => ({ schedule: { kind: 'fixed' as const, deg }, latencyUs: 0 })

/** One cylinder of the sample at full power, as the library's own functions take it. */
const fullThrottle = (of: Scenario, octane: number, changes: { hotterK?: number, denserKpa?: number } = {}): CycleInput => {
  const charge = got(evaluateScenario(of).parts.charge)
  const { engine, sheet } = of
  return {
    engine: { boreMm: engine.boreMm, strokeMm: engine.strokeMm, rodMm: engine.rodMm, compressionRatio: engine.compressionRatio, ivcDeg: sheet.cycle.ivcDeg, evoDeg: sheet.cycle.evoDeg },
    rpm: engine.maxRpm, gamma: 'temperature', heatLoss: { wallK: sheet.cycle.wallK, headAreaFactor: sheet.cycle.headAreaFactor }, octane,
    charge: { pressureKpa: charge.pressureKpa + (changes.denserKpa ?? 0), temperatureK: sheet.cycle.chargeK + (changes.hotterK ?? 0), residualFraction: sheet.cycle.residualFraction, airFuelRatio: sheet.cycle.airFuelRatio },
    burn: {
      sparkDeg: engine.powerTimingDeg, efficiency: combustionEfficiency(sheet.cycle.airFuelRatio),
      ...scaleBurn({ reference: { rpm: charge.rpm, pressureKpa: charge.pressureKpa, delayDeg: charge.delayDeg, durationDeg: charge.durationDeg }, rpm: engine.maxRpm, pressureKpa: charge.pressureKpa + (changes.denserKpa ?? 0) }),
    },
  }
}

describe('charge and power belong together', () => {
  const plain = scenario()
  test('the charge solved makes the power stated, friction taken off', () => {
    const { engine } = plain
    const { imepKpa } = simulateCycle(fullThrottle(plain, 95))
    const cc = displacementCc(engine)
    expectClose(imepKpa - mepFromPower({ powerKw: frictionPowerAt(engine, engine.maxRpm), displacementCc: cc, rpm: engine.maxRpm }), mepFromPower({ powerKw: 50, displacementCc: cc, rpm: engine.maxRpm }), { rel: 1e-5 })
    expect(got(evaluateScenario(plain).parts.charge)).toMatchObject({ from: 'power', mismatch: 0, powerKw: 50 })
  })

  test('below full power the charge is the propeller’s: its coarsest pitch known, all there is where that is not', () => {
    const pitches = [{ name: 'low stop', rpm: 2780, kw: 40 }, { name: 'high stop', rpm: 2400, kw: 60 }]
    const at = (kind: 'fixedPitch' | 'constantSpeed', known: typeof pitches) => cycleModel(readyScenario(scenario({}, { propeller: { kind, governedRpm: 2600, pitches: known } }))).carriedAt(1600).powerKw
    expectClose(at('fixedPitch', pitches.slice(0, 1)), 40 * (1600 / 2780) ** 3, { rel: 1e-12 })
    expectClose(at('constantSpeed', pitches), 60 * (1600 / 2400) ** 3, { rel: 1e-12 })
    expectClose(at('constantSpeed', pitches.slice(0, 1)), 20 + (12.5 * 400) / 600, { rel: 1e-12 })
    expectClose(cycleModel(readyScenario(scenario())).carriedAt(1600, 'full').powerKw, 20 + (12.5 * 400) / 600, { rel: 1e-12 })
  })

  test('the burn is calibrated: the cycle’s own best spark is the one stated', () => {
    expectClose(findMbt(fullThrottle(plain, 95)).mbtDeg, plain.sheet.mbt.deg, { abs: 0.02 })
  })

  test('an engine whose stated power needs a denser charge has the smaller margin', () => {
    const strong = scenario({ ratedPowerKw: 56, powerCurve: [{ rpm: 1200, kw: 22 }, { rpm: 2780, kw: 56 }, { rpm: 3200, kw: 60 }] })
    const [weaker, stronger] = [evaluateScenario(plain), evaluateScenario(strong)]
    expect(got(stronger.parts.charge).pressureKpa).toBeGreaterThan(got(weaker.parts.charge).pressureKpa + 5)
    for (const channel of ['primary', 'backup'] as const) {
      expect(got(stronger.parts.detonation)[channel].worse.marginDeg ?? NaN).toBeLessThan((got(weaker.parts.detonation)[channel].worse.marginDeg ?? NaN) - 1)
    }
  })

  test('a charge typed too thin to make the power is said, and no margin is shown for it', () => {
    const result = evaluateScenario(scenario({}, { cycle: { ...cycle, volumetricEfficiency: 0.63 } }))
    const charge = got(result.parts.charge)
    expect(charge.from).toBe('typed')
    expect(charge.mismatch).toBeLessThan(-0.05)
    expect(codeOf(result.parts.detonation)).toBe('chargeMismatch')
    expect(result.findings.some(({ limitId }) => limitId === 'detonationDeg')).toBe(false)
  })

  test('a typed efficiency that makes the power is used as it stands', () => {
    const { volumetricEfficiency, pressureKpa } = got(evaluateScenario(plain).parts.charge)
    const result = evaluateScenario(scenario({}, { cycle: { ...cycle, volumetricEfficiency } }))
    expectClose(got(result.parts.charge).pressureKpa, pressureKpa, { rel: 1e-3 })
    expect(Math.abs(got(result.parts.charge).mismatch)).toBeLessThan(0.05)
    expect(codeOf(result.parts.detonation)).toBeNull()
    expect(result.notices.map(({ code }) => code)).toContain('chargeTyped')
    const { engine, rpm: _rpm, charge } = fullThrottle(plain, 95)
    expectClose(chargePressureFromVolumetricEfficiency({ engine, volumetricEfficiency, ambientDensityKgM3: 1.225, ...charge }), pressureKpa, { rel: 1e-9 })
  })

  test('a power no charge makes, and a best spark no burn gives, are withheld with their reasons', () => {
    const impossible = evaluateScenario(scenario({ boreMm: 50, strokeMm: 40, rodMm: 90 }))
    expect(codeOf(impossible.parts.charge)).toBe('chargeUnsolved')
    expect(codeOf(impossible.parts.spark)).toBe('chargeUnsolved')
    const odd = evaluateScenario(scenario({}, { mbt: { ...sampleSheet().mbt, deg: 4 } }))
    expect(codeOf(odd.parts.detonation)).toBe('burnUncalibrated')
    expect(codeOf(odd.parts.speeds)).toBeNull()
  })
})

describe('detonation', () => {
  const plain = scenario()
  const detonation = got(evaluateScenario(plain).parts.detonation)

  test('limit and margin are those of the library at the same charge and fuel', () => {
    for (const [name, octane, changes] of [['planned', 95, {}], ['worse', 91, plain.sheet.worse]] as const) {
      const { limitDeg } = knockLimitedSpark(fullThrottle(plain, octane, changes))
      const point = detonation.primary[name]
      expect(point.rpm).toBe(2780)
      expectClose(point.limitDeg, limitDeg ?? NaN, { abs: 0.02 })
      expectClose(point.marginDeg, (limitDeg ?? NaN) - point.sparkDeg, { abs: 0.02 })
      expectClose(point.lowDeg, (knockLimitedSpark(fullThrottle(plain, octane - 5, changes)).limitDeg ?? NaN) - point.sparkDeg, { abs: 0.02 })
      expectClose(point.octaneRequired, simulateCycle({ ...fullThrottle(plain, octane, changes), burn: { ...fullThrottle(plain, octane, changes).burn, sparkDeg: point.sparkDeg } as NonNullable<CycleInput['burn']> }).knock?.octaneRequired ?? NaN, { rel: 1e-4 })
    }
  })

  test('worse fuel, heat and density take margin; altitude gives some; a degree of octane, 10 K and 10 kPa each have their price', () => {
    const { planned, worse, altitude, perOctaneDeg, per10KDeg, per10KpaDeg } = detonation.primary
    expect(worse.marginDeg ?? NaN).toBeLessThan(planned.marginDeg ?? NaN)
    expect(altitude.marginDeg ?? NaN).toBeGreaterThan(planned.marginDeg ?? NaN)
    for (const price of [perOctaneDeg, per10KDeg, per10KpaDeg]) expect(price ?? NaN).toBeGreaterThan(0)
    const once = knockLimitedSpark(fullThrottle(plain, 91, plain.sheet.worse)).limitDeg ?? NaN
    expectClose(perOctaneDeg, once - (knockLimitedSpark(fullThrottle(plain, 90, plain.sheet.worse)).limitDeg ?? NaN), { abs: 0.02 })
  })

  test('going to the backup gains its stagger in degrees, and octane', () => {
    expectClose(detonation.gainDeg, detonation.primary.worse.sparkDeg - detonation.backup.worse.sparkDeg, { abs: 1e-9 })
    expect(detonation.gainOctane).toBeGreaterThan(5)
  })

  test('an anchor shifts the octane scale so that its setting has its margin, and narrows the uncertainty', () => {
    const reference = { sparkDeg: 26, rpm: 2780, octane: 95, marginDeg: 2 }
    const anchored = evaluateScenario(scenario({}, { primary: fixed(26), reference }))
    const { primary, octaneUncertainty, anchored: isAnchored, octaneShift } = got(anchored.parts.detonation)
    expect([octaneUncertainty, isAnchored]).toEqual([1, true])
    expectClose(primary.planned.marginDeg, 2, { abs: 0.01 })
    expect(octaneShift).toBeGreaterThan(5)
    expectClose(primary.planned.octaneRequired, 95 - 2 * 1.5, { abs: 2.5 })
    const width = (point: { lowDeg: number | null, highDeg: number | null }) => (point.highDeg ?? NaN) - (point.lowDeg ?? NaN)
    expect(width(primary.planned)).toBeLessThan(width(detonation.primary.planned) / 3)
  })

  test('outside when the nominal margin is short of the limit, close when only its low end is', () => {
    const verdictAt = (deg: number) => evaluateScenario(scenario({}, { primary: fixed(deg) })).findings.find(({ id }) => id === 'detonationDeg.primary')
    const near = verdictAt(26.4)
    expect(near?.value).toBeGreaterThan(3)
    expect(near?.data.lowDeg).toBeLessThan(3)
    expect(near?.verdict).toBe('close')
    expect(verdictAt(29)?.verdict).toBe('outside')
    expect(verdictAt(14)?.verdict).toBe('within')
  })

  test('a fuel that never detonates and one that always does', () => {
    const fuel = (octane: number) => evaluateScenario(scenario({}, { fuel: { scale: 'ron', octane, worseOctane: octane } }))
    const never = got(fuel(130).parts.detonation).primary.worse
    expect([never.state, never.limitDeg]).toEqual(['never', null])
    expectClose(never.marginDeg, 60 - never.sparkDeg, { abs: 1e-9 })
    const always = fuel(30).findings.find(({ id }) => id === 'detonationDeg.primary')
    expect([always?.value, always?.verdict]).toEqual([null, 'outside'])
  })
})

describe('the other parts are what the library says one by one', () => {
  const plain = scenario()
  const { engine, sheet } = plain
  const { parts, findings } = evaluateScenario(plain)

  test('coils', () => {
    const row = got(parts.coils).primary
    const coil = { supplyV: 13.5, ohm: 0.7, mh: 4.5, limitA: 7 }
    expectClose(row.windingK, coilHeat({ coil, dwellMs: 4, cylinders: 6, rpm: 2780, ambientK: 333, thermalResistanceKPerW: 4 }).windingK, { rel: 1e-12 })
    expectClose(row.crankingEnergyMj, sparkEnergyMj({ ...coil, supplyV: 8.5 }, 4), { rel: 1e-12 })
    expectClose(row.periodShare, (4 + 1.5) / (120_000 / (6 * 2780)), { rel: 1e-12 })
    const hot = evaluateClosedForms(scenario({}, { coils: { ...coils, primary: { ...coils.primary, dwellMs: 9 } } }))
    expect(got(hot.parts.coils).primary.windingK).toBeNull()
    expect(hot.findings.find(({ id }) => id === 'windingK.primary')?.verdict).toBe('outside')
    const direct = evaluateClosedForms(scenario({}, { distribution: 'directCoils' }))
    expectClose(got(direct.parts.coils).primary.periodShare, row.periodShare / 6, { rel: 1e-12 })
  })

  test('spark demand and offer', () => {
    const row = got(parts.spark).backup
    const { pressureKpa } = got(parts.charge)
    const geometry = fullThrottle(plain, 95).engine
    const demandKv = sparkDemandKv({ engine: geometry, charge: { pressureKpa: pressureKpa + sheet.worse.denserKpa, temperatureK: cycle.chargeK }, sparkDeg: 17, gapMm: sheet.plugGapMm })
    expectClose(row.demandKv, demandKv, { rel: 1e-12 })
    expectClose(row.ratio, sparkMargin({ demandKv, energyMj: got(parts.coils).backup.energyMj, secondaryPf: 100, transferEfficiency: 0.5 }).ratio, { rel: 1e-12 })
    expect(findings.find(({ id }) => id === 'sparkVoltageRatio.backup')?.value).toBe(Math.min(row.ratio, row.crankingRatio))
  })

  test('climb: power lapses first, friction does not; the ceiling is where the climb ends', () => {
    const climb = got(parts.climb)
    expectClose(climb.densityAltitudeM, densityAltitudeM(sheet.conditions), { rel: 1e-12 })
    const primary = climb.rows.find(({ state }) => state === 'primary')
    const { densityKgM3, densityRatio } = standardAtmosphere({ altitudeM: climb.densityAltitudeM })
    const { minSpeedMps, ...aeroplane } = sheet.airframe
    expectClose(primary?.climbMps, bestClimb({ ...aeroplane, densityKgM3, brakePowerKw: primary?.powerKw ?? NaN, minSpeedMps: minSpeedMps / Math.sqrt(densityRatio) }).climbMps, { rel: 1e-12 })
    expect(powerAtDensityRatio(densityRatio)).toBeLessThan(1)
    const cold = climb.rows.find(({ state }) => state === 'oneCold')
    const there = evaluateClosedForms(scenario({}, { conditions: { pressureAltitudeM: cold?.ceilingM ?? NaN, temperatureK: standardAtmosphere({ altitudeM: cold?.ceilingM ?? NaN }).temperatureK } }))
    expectClose(got(there.parts.climb).rows.find(({ state }) => state === 'oneCold')?.climbMps, 0, { abs: 1e-3 })
  })

  test('a shared coil is a single point that heat shortens; checks before each flight make all spark likelier to stay', () => {
    const shared = evaluateClosedForms(scenario({}, { redundancy: { ...sheet.redundancy, sharedCoil: true } }))
    expect(got(shared.parts.redundancy).singlePoints).toContainEqual({ id: 'coil', heatSensitive: true })
    expect(got(parts.redundancy).singlePoints.map(({ id }) => id)).toEqual(['cap', 'supply', 'switch'])
    const chance = (checkIntervalHours: number) => got(evaluateClosedForms(scenario({}, { redundancy: { ...sheet.redundancy, sharedSupply: false, checkIntervalHours } })).parts.redundancy).losses[0]?.perHour ?? NaN
    expect(chance(1)).toBeLessThan(chance(100))
    const { losses } = got(parts.redundancy)
    for (const { lowPerHour, perHour, highPerHour } of losses) expect(lowPerHour < perHour && perHour < highPerHour).toBe(true)
  })

  test('the stack is that of the tolerances, and stands with the angles it may carry over their limits', () => {
    const stack = got(parts.stack)
    const evenly = (value: number) => ({ value, distribution: 'rectangular' as const })
    const { timingCheckDeg, benchDeg, markDeg, scatterDeg } = sheet.tolerances
    expectClose(stack.expandedDeg, combineUncertainty([evenly(timingCheckDeg), evenly(benchDeg), evenly(markDeg), { value: scatterDeg, distribution: 'normal' }]).expanded, { rel: 1e-12 })
    expect(findings.find(({ id }) => id === 'crankingAdvanceDeg.primary')?.data.stackDeg).toBe(stack.expandedDeg)
    expect(findings.find(({ id }) => id === 'backupFirstDeg')?.data.stackDeg).toBe(stack.staggerExpandedDeg)
    expect(arcMm(engine.damperDiameterMm, 1)).toBeGreaterThan(1)
  })
})

describe('layers', () => {
  const plain = scenario()
  test('the closed forms leave the cycle’s parts open; the second layer fills them and keeps the rest', () => {
    const closed = evaluateClosedForms(plain)
    for (const name of cycleParts) expect(codeOf(closed.parts[name])).toBe('notComputed')
    const whole = addCycleLayer(plain, closed)
    expect(whole).toEqual(evaluateScenario(plain))
    expect(whole.parts.power).toEqual(closed.parts.power)
    expect(addCycleLayer(plain, whole)).toEqual(whole)
  })

  test('a channel that cannot be computed takes its parts along and leaves the charge', () => {
    const broken = scenario({}, { backup: { schedule: { kind: 'formula', expression: 'rpm +' }, latencyUs: 0 } })
    const { parts } = evaluateScenario(broken)
    expect(codeOf(parts.charge)).toBeNull()
    expect([codeOf(parts.detonation), codeOf(parts.pressure), codeOf(parts.spark)]).toEqual(['input', 'input', 'input'])
  })

  test('two plugs withhold the cycle with the reason; a fault in its own inputs is named at its field', () => {
    expect(codeOf(evaluateScenario(scenario({}, { plugsPerCylinder: 2 })).parts.detonation)).toBe('twoPlugs')
    const far = evaluateScenario(scenario({}, { reference: { sparkDeg: 26, rpm: 9000, octane: 95, marginDeg: 0 } })).parts.detonation
    expect(far.ok ? null : far.error.field).toBe('sheet.reference.rpm')
  })

  test('limits given are the limits judged by', () => {
    const limits = { ...defaultLimits, detonationDeg: { ...defaultLimits.detonationDeg, value: 25 } }
    expect(evaluateScenario(plain, limits).findings.find(({ id }) => id === 'detonationDeg.backup')?.verdict).toBe('outside')
  })
})
