import { CalcError } from '../calc-error'
import { describeValue } from '../validate/describe'
import { takeNumber } from '../validate/number'
import { finiteResult } from '../validate/result'
import { rampA, rampMs, takeCoil, type Coil } from './coil'

const takeDwell = (value: unknown): number => takeNumber(value, 'ms', { name: 'The dwell', unit: 'ms', min: 0 })

/**
 * Current in the primary after a dwell, A.
 *
 * i = (V/R)·(1 − e^(−R·t/L)), at most limitA
 *
 * Validity: supply, resistance and inductance constant: below saturation of the core, the switch's drop taken off the supply.
 * Source: bird, ch. 17 (read).
 *
 * @param coil `{ supplyV, ohm, mh, limitA? }`: voltage at the coil V, V; resistance R, Ω; inductance L, mH; current limit of the driver, A; each > 0
 * @param ms dwell t, ms, ≥ 0
 * @throws CalcError on `ms`, on `coil` or below it
 * @example
 * coilCurrentA({ supplyV: 13.5, ohm: 0.5, mh: 3 }, 3) // → 10.62367
 * coilCurrentA({ supplyV: 13.5, ohm: 0.5, mh: 3, limitA: 8 }, 3) // → 8
 */
export const coilCurrentA = (coil: Coil, ms: number): number => {
  const { limitA, ...primary } = takeCoil(coil, 'coil')
  return finiteResult(Math.min(limitA, rampA(primary, takeDwell(ms))), 'coil.supplyV', primary.supplyV, 'V')
}

/**
 * Current that a stopped engine draws with its trigger closed, A: what heats coil and driver until somebody switches off.
 *
 * i = V/R, at most limitA
 *
 * Validity: a driver that does not switch off by itself; a cold winding, which draws most.
 * Source: bird, ch. 17 (read).
 *
 * @param coil `{ supplyV, ohm, mh, limitA? }` as in `coilCurrentA`
 * @throws CalcError on `coil` or below it
 * @example
 * stalledCurrentA({ supplyV: 12, ohm: 0.5, mh: 3 }) // → 24
 */
export const stalledCurrentA = (coil: Coil): number => {
  const { limitA, supplyV, ohm } = takeCoil(coil, 'coil')
  return finiteResult(Math.min(limitA, supplyV / ohm), 'coil.ohm', ohm, 'Ω')
}

/**
 * Dwell after which the primary carries a current, ms.
 *
 * t = −(L/R)·ln(1 − i·R/V)
 *
 * Validity: as in `coilCurrentA`.
 * Source: bird, ch. 17 (read).
 *
 * @param coil `{ supplyV, ohm, mh, limitA? }` as in `coilCurrentA`
 * @param amps current i, A, ≥ 0, below V/R and not above limitA
 * @throws CalcError on `amps`, also where V/R or the limit lies below it; on `coil` or below it
 * @example
 * dwellForCurrentMs({ supplyV: 13.5, ohm: 0.5, mh: 3 }, 8) // → 2.10839
 */
export const dwellForCurrentMs = (coil: Coil, amps: number): number => {
  const { limitA, ...primary } = takeCoil(coil, 'coil')
  const current = takeNumber(amps, 'amps', { name: 'The current', unit: 'A', min: 0 })
  if (current > limitA) {
    throw new CalcError({
      field: 'amps', value: current, limit: `≤ ${limitA}, the current limit`, unit: 'A',
      message: `The driver holds the current at ${limitA} A: ${describeValue(current)} A is never reached.`,
    })
  }
  if (!(current * primary.ohm < primary.supplyV)) {
    const mostA = Number((primary.supplyV / primary.ohm).toPrecision(6))
    throw new CalcError({
      field: 'amps', value: current, limit: `< ${mostA}, supply over resistance`, unit: 'A',
      message: `Through its resistance the coil draws less than ${mostA} A however long the dwell: ${describeValue(current)} A is never reached.`,
    })
  }
  return finiteResult(rampMs(primary, current), 'coil.mh', primary.mh, 'mH')
}

/**
 * Energy stored in the primary after a dwell, mJ. About half of it arrives at the plug.
 *
 * E = ½·L·i², i as in `coilCurrentA`
 *
 * Validity: as in `coilCurrentA`.
 * Source: bird, ch. 17 (read).
 *
 * @param coil `{ supplyV, ohm, mh, limitA? }` as in `coilCurrentA`
 * @param ms dwell, ms, ≥ 0
 * @throws CalcError on `ms`, on `coil` or below it
 * @example
 * sparkEnergyMj({ supplyV: 13.5, ohm: 0.5, mh: 3, limitA: 8 }, 3) // → 96
 */
export const sparkEnergyMj = (coil: Coil, ms: number): number => {
  const { limitA, ...primary } = takeCoil(coil, 'coil')
  const amps = Math.min(limitA, rampA(primary, takeDwell(ms)))
  return finiteResult(0.5 * primary.mh * amps * amps, 'coil.supplyV', primary.supplyV, 'V')
}
