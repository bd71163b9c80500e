import { CalcError } from '../calc-error'
import { takeNumber, takeOptionalNumber, type NumberRule } from '../validate/number'
import { finiteResult } from '../validate/result'
import { membersOf } from '../validate/shape'
import { seaLevelK, seaLevelKgM3, seaLevelKpa, standardPressureKpa, standardTemperatureK } from './troposphere'

export interface StandardAtmosphereInput {
  readonly altitudeM: number
  readonly offsetK?: number
}

export interface Air {
  readonly temperatureK: number
  readonly pressureKpa: number
  readonly densityKgM3: number
  /** Density over that of the standard at sea level. */
  readonly densityRatio: number
}

const altitudeRule: NumberRule = { name: 'The altitude', unit: 'm', min: -1000, max: 11_000 }

/**
 * Air of the standard atmosphere at an altitude: `{ temperatureK, pressureKpa, densityKgM3, densityRatio }`, kelvin, kPa, kg/m³, and density over that at sea level.
 *
 * T_std = 288.15 − 0.0065·h; p = 101.325·(T_std/288.15)^(g₀/(R·L)), g₀ = 9.80665 m/s², R = 8314.32/28.9644 J/(kg K), L = 0.0065 K/m;
 * T = T_std + offset; ratio = (p/101.325)·(288.15/T); density = 1.225·ratio
 *
 * Validity: the lowest layer of the standard, dry air; a warm or cold day changes temperature and density and leaves the pressure at its altitude.
 * Source: us-standard-atmosphere-1976, lowest layer (read).
 *
 * @param input.altitudeM geopotential altitude h, m, −1000 … 11000
 * @param input.offsetK temperature above that of the standard, K, any finite number that leaves the air above 0 K; 0 unless given
 * @throws CalcError on `altitudeM` or `offsetK`
 * @example
 * standardAtmosphere({ altitudeM: 11000 }) // → { temperatureK: 216.650000, pressureKpa: 22.632064, densityKgM3: 0.363918, densityRatio: 0.297076 }
 * standardAtmosphere({ altitudeM: 0, offsetK: 15 }).densityRatio // → 0.95052
 */
export const standardAtmosphere = (input: StandardAtmosphereInput): Air => {
  const members = membersOf(input)
  const altitudeM = takeNumber(members.altitudeM, 'altitudeM', altitudeRule)
  const offsetK = takeOptionalNumber(members.offsetK, 'offsetK', { name: 'The temperature above standard', unit: 'K' }, 0)
  const temperatureK = standardTemperatureK(altitudeM) + offsetK
  if (!(temperatureK > 0)) {
    throw new CalcError({
      field: 'offsetK', value: offsetK, limit: `> ${-standardTemperatureK(altitudeM)}`.replace('-', '−'), unit: 'K',
      message: `The temperature above standard must leave the air above 0 K; ${offsetK} K at ${altitudeM} m does not.`,
    })
  }
  const pressureKpa = standardPressureKpa(altitudeM)
  const densityRatio = finiteResult((pressureKpa / seaLevelKpa) * (seaLevelK / temperatureK), 'offsetK', offsetK, 'K')
  return { temperatureK, pressureKpa, densityKgM3: seaLevelKgM3 * densityRatio, densityRatio }
}
