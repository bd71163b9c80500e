import { CalcError } from '../calc-error'
import { rootBetween } from '../shared/root-between'
import { takeNumber, takeOptionalNumber, type NumberRule } from '../validate/number'
import { finiteResult } from '../validate/result'
import { membersOf } from '../validate/shape'
import { takeCoil, type Coil } from './coil'
import { takeSparkPeriodMs } from './spark-period'
import { finalCurrentA, windingLossMj } from './winding-loss'

export interface CoilHeatInput {
  readonly coil: Coil
  readonly dwellMs: number
  readonly cylinders: number
  readonly rpm: number
  readonly wastedSpark?: boolean
  readonly ambientK: number
  readonly thermalResistanceKPerW: number
  readonly refK?: number
  readonly maxWindingK?: number
}

export interface CoilHeat {
  readonly windingK: number
  /** Of the warm winding. */
  readonly resistanceOhm: number
  /** Averaged over the spark period. */
  readonly powerW: number
  /** At the end of the dwell, with the warm winding. */
  readonly finalCurrentA: number
}

/** Temperature coefficient of copper's resistance at 293.15 K, 1/K, and the temperature where its straight line reaches 0. */
const copperPerK = 0.00393
const copperK = 293.15
const noResistanceK = copperK - 1 / copperPerK
/** A dwell that fills the period may miss it by rounding. */
const rounding = 1e-12

/** Just above the line's zero, in a number that can be read. */
const temperatureRule = (name: string): NumberRule => ({ name, unit: 'K', above: 38.7 })

/**
 * How warm the primary gets at a steady speed: `{ windingK, resistanceOhm, powerW, finalCurrentA }`; K, Ω, W averaged over the spark period, A at the end of the dwell.
 *
 * windingK = the lowest T with T = ambientK + R_th·P(T); P = sparks a second · ∫i²·R dt over the dwell, i = min(limitA, (V/R)·(1 − e^(−R·t/L)));
 * up to the limit ∫ = (V²·L/R²)·(x − u − u²/2), x = R·t/L, u = 1 − e^(−x), then R·limitA²·t;
 * R(T) = ohm·(1 + 0.00393·(T − 293.15))/(1 + 0.00393·(refK − 293.15))
 *
 * Validity: a copper winding at one temperature, heated by its own resistance alone (driver outside the coil, core losses and the secondary left out), at rest in temperature.
 * Source: copper-resistance, coefficient at 20 °C (memory).
 *
 * @param input.coil `{ supplyV, ohm, mh, limitA? }` as in `coilCurrentA`; `ohm` at refK
 * @param input.dwellMs dwell, ms, ≥ 0 and not longer than the spark period
 * @param input.cylinders cylinders that the coil serves, a whole number ≥ 1
 * @param input.rpm engine speed, rpm, > 0
 * @param input.wastedSpark as in `sparksPerSecond`; false unless given
 * @param input.ambientK temperature around the coil, K, > 38.7
 * @param input.thermalResistanceKPerW rise of the winding above it for each watt R_th, K/W, ≥ 0
 * @param input.refK temperature at which `ohm` was measured, K, > 38.7; 293.15 unless given
 * @param input.maxWindingK no balance is looked for above this, K, > 38.7; 453.15 unless given
 * @throws CalcError on any of these by its name or below `coil`; on `maxWindingK` when there is no balance up to it (the heat runs away, or the coil is far too small)
 * @example
 * coilHeat({ coil: { supplyV: 13.5, ohm: 0.5, mh: 3, limitA: 8 }, dwellMs: 3, cylinders: 6, rpm: 2700, ambientK: 330, thermalResistanceKPerW: 4 }) // → { windingK: 365.51575, resistanceOhm: 0.64220, powerW: 8.87894, finalCurrentA: 8 }
 */
export const coilHeat = (input: CoilHeatInput): CoilHeat => {
  const members = membersOf(input)
  const coil = takeCoil(members.coil, 'coil')
  const dwellMs = takeNumber(members.dwellMs, 'dwellMs', { name: 'The dwell', unit: 'ms', min: 0 })
  const periodMs = takeSparkPeriodMs(members)
  if (dwellMs > periodMs * (1 + rounding)) {
    throw new CalcError({
      field: 'dwellMs', value: dwellMs, limit: `≤ ${periodMs}, the time between sparks`, unit: 'ms',
      message: `The dwell must fit into the time between sparks, ${Number(periodMs.toPrecision(6))} ms at this speed; ${dwellMs} ms was given.`,
    })
  }
  const ambientK = takeNumber(members.ambientK, 'ambientK', temperatureRule('The temperature around the coil'))
  const resistanceKPerW = takeNumber(members.thermalResistanceKPerW, 'thermalResistanceKPerW', { name: 'The thermal resistance', unit: 'K/W', min: 0 })
  const refK = takeOptionalNumber(members.refK, 'refK', temperatureRule('The temperature of the resistance'), copperK)
  const maxWindingK = takeOptionalNumber(members.maxWindingK, 'maxWindingK', temperatureRule('The highest temperature to look for'), 453.15)

  const at = (windingK: number): CoilHeat => {
    const resistanceOhm = finiteResult((coil.ohm * (windingK - noResistanceK)) / (refK - noResistanceK), 'coil.ohm', coil.ohm, 'Ω')
    finiteResult(1 / resistanceOhm, 'coil.ohm', coil.ohm, 'Ω')
    const warm = { ...coil, ohm: resistanceOhm }
    const powerW = finiteResult(windingLossMj(warm, dwellMs) / periodMs, 'coil.supplyV', coil.supplyV, 'V')
    return { windingK, resistanceOhm, powerW, finalCurrentA: finiteResult(finalCurrentA(warm, dwellMs), 'coil.supplyV', coil.supplyV, 'V') }
  }
  // The loss rises with temperature less and less steeply, then falls: what is missing to balance changes sign once at most,
  // so its sign at the upper end tells whether there is a balance at all.
  const surplusK = (windingK: number): number =>
    finiteResult(windingK - ambientK - resistanceKPerW * at(windingK).powerW, 'thermalResistanceKPerW', resistanceKPerW, 'K/W')
  if (surplusK(maxWindingK) < 0) {
    throw new CalcError({
      field: 'maxWindingK', value: maxWindingK, limit: `a winding that stays below ${maxWindingK} K`, unit: 'K',
      message: `The winding finds no balance up to ${maxWindingK} K: it gets too hot or runs away. Shorten the dwell, limit the current, or cool the coil.`,
    })
  }
  return at(rootBetween(surplusK, ambientK, maxWindingK, 1e-11))
}
