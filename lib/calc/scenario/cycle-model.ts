import { CalcError } from '../calc-error'
import { calibrateBurn } from '../cycle/calibrate-burn'
import { chargePressureFromVolumetricEfficiency } from '../cycle/charge-pressure'
import { combustionEfficiency } from '../cycle/combustion-efficiency'
import type { CycleInput } from '../cycle/cycle-types'
import { scaleBurn, type BurnAngles } from '../cycle/scale-burn'
import { simulateCycle } from '../cycle/simulate-cycle'
import { rootBetween } from '../shared/root-between'
import type { CycleEngine } from '../geometry/cycle-engine'
import { mepFromPower, powerFromMep } from '../dead-cylinder/mean-effective-pressure'
import { withheld } from './part'
import { curvePowerKw, displacementCc, frictionPowerAt, fullThrottleCurve, refuseTwoPlugs } from './power-parts'
import { pitchLoadKw } from './propeller-parts'
import type { ReadyScenario } from './ready-scenario'

/** Standard sea level, where power is rated: kg/m³. */
const seaLevelKgM3 = 1.225
/** Charge pressures in which the one that makes the power is looked for, kPa. */
const thinnestKpa = 5
const densestKpa = 500
/** Burn a calibration starts from, spark to end, crank degrees. */
const firstTotalDeg = 76
/** Steps of the layer: best spark and knock limit stay within 0.01° of fine steps. */
const stepDeg = 2

/** What the engine carries at one speed, and the charge at inlet closing that makes it. */
export interface CarriedPoint {
  readonly rpm: number
  readonly powerKw: number
  readonly pressureKpa: number
  readonly burn: BurnAngles
}

/** A scenario's engine as the closed cycle sees it, its burn calibrated to the best torque stated. */
export interface CycleModel {
  readonly engine: CycleEngine
  /** The closed cycle of one cylinder at a speed, charge pressure and spark; the burn follows speed and pressure. */
  readonly inputAt: (rpm: number, pressureKpa: number, sparkDeg: number, changes?: { hotterK?: number, octane?: number }) => CycleInput
  /** Full throttle, or the propeller's load where that is smaller. */
  readonly carriedAt: (rpm: number, throttle?: 'asFlown' | 'full') => CarriedPoint
  /** Full throttle at full-power speed: where the burn was calibrated. */
  readonly full: CarriedPoint
  readonly volumetricEfficiency: number
  /** Power of the charge over the power carried, less 1; not zero where the charge was typed. */
  readonly mismatch: number
  readonly fmepKpa: (rpm: number) => number
}

/**
 * The charge at each speed is solved, so that closed mean effective pressure less friction makes the power carried there: a charge guessed too thin
 * would hide detonation. A volumetric efficiency that was typed overrides it. The burn is calibrated where full power was measured, and follows
 * speed and charge from there.
 */
export function cycleModel(scenario: ReadyScenario): CycleModel {
  refuseTwoPlugs(scenario)
  const { engine, sheet } = scenario
  const { cycle } = sheet
  const geometry: CycleEngine = {
    boreMm: engine.boreMm, strokeMm: engine.strokeMm, rodMm: engine.rodMm, compressionRatio: engine.compressionRatio, ivcDeg: cycle.ivcDeg, evoDeg: cycle.evoDeg,
  }
  const cc = displacementCc(engine)
  const { points } = fullThrottleCurve(engine)
  const fmepKpa = (rpm: number) => {
    const frictionKw = frictionPowerAt(engine, rpm)
    return frictionKw > 0 ? mepFromPower({ powerKw: frictionKw, displacementCc: cc, rpm }) : 0
  }
  const efficiency = combustionEfficiency(cycle.airFuelRatio)
  const inputWith = (burn: BurnAngles, rpm: number, pressureKpa: number, sparkDeg: number, { hotterK = 0, octane = sheet.fuel.octane }: { hotterK?: number, octane?: number } = {}): CycleInput => ({
    engine: geometry, rpm, octane, stepDeg, gamma: 'temperature',
    charge: { pressureKpa, temperatureK: cycle.chargeK + hotterK, residualFraction: cycle.residualFraction, airFuelRatio: cycle.airFuelRatio },
    burn: { sparkDeg, ...burn, efficiency },
    heatLoss: { wallK: cycle.wallK, headAreaFactor: cycle.headAreaFactor },
  })
  const imepOf = (input: CycleInput) => simulateCycle({ ...input, arrays: false }).imepKpa

  const fullKwAt = (rpm: number) => {
    const kw = curvePowerKw(points, rpm)
    if (kw === null) throw withheld('noTorque', 'engine.powerCurve', 'The power curve does not reach this speed.', rpm)
    return kw
  }
  const typedKpa = cycle.volumetricEfficiency === null ? null : chargePressureFromVolumetricEfficiency({
    engine: geometry, volumetricEfficiency: cycle.volumetricEfficiency, ambientDensityKgM3: seaLevelKgM3,
    temperatureK: cycle.chargeK, residualFraction: cycle.residualFraction, airFuelRatio: cycle.airFuelRatio,
  })
  const perEfficiencyKpa = chargePressureFromVolumetricEfficiency({
    engine: geometry, volumetricEfficiency: 1, ambientDensityKgM3: seaLevelKgM3, temperatureK: cycle.chargeK, residualFraction: cycle.residualFraction, airFuelRatio: cycle.airFuelRatio,
  })
  const solve = (rpm: number, powerKw: number, sparkDeg: number, burnAt: (pressureKpa: number) => BurnAngles): number => {
    const wanted = (powerKw > 0 ? mepFromPower({ powerKw, displacementCc: cc, rpm }) : 0) + fmepKpa(rpm)
    return solveCharge((kpa) => imepOf(inputWith(burnAt(kpa), rpm, kpa, sparkDeg)) - wanted, rpm, powerKw)
  }

  const { maxRpm, powerTimingDeg } = engine
  const fullKw = fullKwAt(maxRpm)
  let angles: BurnAngles = { delayDeg: cycle.delayShare * firstTotalDeg, durationDeg: (1 - cycle.delayShare) * firstTotalDeg }
  let fullKpa = typedKpa ?? solve(maxRpm, fullKw, powerTimingDeg, () => angles)
  // Burn and charge move each other a little; two rounds settle them.
  for (let round = 0; round < 2; round += 1) {
    angles = calibrated(inputWith(angles, maxRpm, fullKpa, powerTimingDeg), sheet.mbt.deg, cycle.delayShare)
    fullKpa = typedKpa ?? solve(maxRpm, fullKw, powerTimingDeg, () => angles)
  }
  const full: CarriedPoint = { rpm: maxRpm, powerKw: fullKw, pressureKpa: fullKpa, burn: angles }
  const burnAt = (rpm: number, pressureKpa: number): BurnAngles => scaleBurn({ reference: { rpm: maxRpm, pressureKpa: fullKpa, ...angles }, rpm, pressureKpa })
  const madeKw = powerFromMep({ mepKpa: Math.max(1e-9, imepOf(inputWith(angles, maxRpm, fullKpa, powerTimingDeg)) - fmepKpa(maxRpm)), displacementCc: cc, rpm: maxRpm })

  return {
    engine: geometry, full, fmepKpa,
    volumetricEfficiency: fullKpa / perEfficiencyKpa,
    mismatch: typedKpa === null ? 0 : madeKw / fullKw - 1,
    inputAt: (rpm, pressureKpa, sparkDeg, changes) => inputWith(burnAt(rpm, pressureKpa), rpm, pressureKpa, sparkDeg, changes),
    carriedAt: (rpm, throttle = 'asFlown') => {
      if (rpm === maxRpm) return full
      const throttleKw = fullKwAt(rpm)
      const loadKw = Math.max(...sheet.propeller.pitches.map((pitch) => pitchLoadKw(pitch, rpm)))
      // The coarsest pitch known asks for most; a constant-speed propeller whose high stop is not known may ask for all there is.
      const isThrottled = throttle === 'asFlown' && loadKw < throttleKw && (sheet.propeller.kind === 'fixedPitch' || sheet.propeller.pitches.length > 1)
      const powerKw = isThrottled ? loadKw : throttleKw
      const sparkDeg = isThrottled ? scenario.advance('primary', rpm, sheet.manifold.fullKpa) : powerTimingDeg
      const pressureKpa = typedKpa ?? solve(rpm, powerKw, sparkDeg, (kpa) => burnAt(rpm, kpa))
      return { rpm, powerKw, pressureKpa, burn: burnAt(rpm, pressureKpa) }
    },
  }
}

const calibrated = (input: CycleInput, mbtDeg: number, delayShare: number): BurnAngles => {
  try {
    return calibrateBurn(input, { mbtDeg, delayShare })
  } catch (error) {
    if (error instanceof CalcError && error.field === 'mbtDeg') throw withheld('burnUncalibrated', 'sheet.mbt.deg', error.message, mbtDeg, error.limit)
    throw error
  }
}

/** The charge pressure at which a mean effective pressure that grows with it is met. */
function solveCharge(excessAt: (kpa: number) => number, rpm: number, powerKw: number): number {
  const [atLow, atHigh] = [excessAt(thinnestKpa), excessAt(densestKpa)]
  if (!(atLow < 0 && atHigh > 0)) {
    throw withheld('chargeUnsolved', 'engine.ratedPowerKw', `No charge between ${thinnestKpa} and ${densestKpa} kPa at inlet closing makes ${powerKw.toFixed(1)} kW at ${rpm.toFixed(0)} rpm in this engine.`, powerKw)
  }
  // A ten-thousandth of a kilopascal of mean pressure is beyond any figure shown.
  return rootBetween(excessAt, thinnestKpa, densestKpa, 1e-4, { close: 1e-4, atFrom: atLow, atTo: atHigh })
}
