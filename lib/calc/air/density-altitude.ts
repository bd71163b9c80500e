import { CalcError } from '../calc-error'
import { takeNumber } from '../validate/number'
import { membersOf } from '../validate/shape'
import { altitudeOfLogTemperatureRatio, logTemperatureRatio, pressureExponent, seaLevelK } from './troposphere'

export interface DensityAltitudeInput { readonly pressureAltitudeM: number, readonly temperatureK: number }

const lowestM = -5000
const highestM = 11_000
/** Air of the standard itself at an end of the range may miss it by rounding. */
const roundingM = 1e-6

/**
 * Density altitude: the height in the standard atmosphere at which its air is as dense as this, m.
 *
 * h_d = (T₀/L)·(1 − σ^(1/(g₀/(R·L) − 1))), σ = (T_std/T₀)^(g₀/(R·L))·T₀/T, T_std the standard temperature at the pressure altitude
 *
 * Validity: dry air; the lowest layer of the standard.
 * Source: us-standard-atmosphere-1976, lowest layer (read).
 *
 * @param input.pressureAltitudeM altitude at which the standard has the pressure of this air, m, −1000 … 11000
 * @param input.temperatureK temperature of the air, K, > 0
 * @throws CalcError on `pressureAltitudeM`, on `temperatureK`, also where the density altitude lies beyond −5000 … 11000 m
 * @example
 * densityAltitudeM({ pressureAltitudeM: 1000, temperatureK: 281.65 }) // → 1000.0000000
 * densityAltitudeM({ pressureAltitudeM: 0, temperatureK: 303.15 }) // → 525.46
 */
export const densityAltitudeM = (input: DensityAltitudeInput): number => {
  const members = membersOf(input)
  const pressureAltitudeM = takeNumber(members.pressureAltitudeM, 'pressureAltitudeM', { name: 'The pressure altitude', unit: 'm', min: -1000, max: highestM })
  const temperatureK = takeNumber(members.temperatureK, 'temperatureK', { name: 'The temperature of the air', unit: 'K', above: 0 })
  const logDensityRatio = pressureExponent * logTemperatureRatio(pressureAltitudeM) - Math.log1p((temperatureK - seaLevelK) / seaLevelK)
  const altitudeM = altitudeOfLogTemperatureRatio(logDensityRatio / (pressureExponent - 1)) + 0
  if (!(altitudeM >= lowestM - roundingM && altitudeM <= highestM + roundingM)) {
    throw new CalcError({
      field: 'temperatureK', value: temperatureK, limit: 'a density altitude of −5000 … 11000 m', unit: 'K',
      message: `Air of ${temperatureK} K at a pressure altitude of ${pressureAltitudeM} m is ${altitudeM > 0 ? 'thinner than the standard at 11000' : 'denser than the standard at −5000'} m: no density altitude is given beyond.`,
    })
  }
  return Math.min(highestM, Math.max(lowestM, altitudeM))
}
