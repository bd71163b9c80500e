import { takeNumber } from '../validate/number'
import { finiteResult } from '../validate/result'
import { membersOf } from '../validate/shape'
import { levelPowerW, takeDensity, takePolar, takeSpeed } from './aeroplane'
import { mustPull, takePropEfficiency, type PropEfficiency } from './prop-efficiency'

export interface ClimbRateInput {
  readonly massKg: number
  readonly wingAreaM2: number
  readonly cd0: number
  readonly inducedK: number
  readonly densityKgM3: number
  readonly brakePowerKw: number
  readonly propEfficiency: PropEfficiency
  readonly speedMps: number
}

/** Brake power of the engine, W. */
export const takeBrakePowerW = (value: unknown, field: string): number => {
  const kw = takeNumber(value, field, { name: 'The brake power', unit: 'kW', min: 0 })
  return finiteResult(kw * 1000, field, kw, 'kW')
}

/**
 * Rate of climb at one airspeed, m/s; negative is a descent.
 *
 * climb = (η·P − P_level)/W, P_level as in `powerRequiredKw`
 *
 * Validity: as for the power of level flight; a climb shallow enough that lift is close to weight.
 * Source: lowry, rate of climb of the example aeroplane (read).
 *
 * @param input.massKg mass, kg, > 0
 * @param input.wingAreaM2 wing area, m², > 0
 * @param input.cd0 drag coefficient without lift, ≥ 0
 * @param input.inducedK induced drag factor, ≥ 0
 * @param input.densityKgM3 density of the air, kg/m³, > 0
 * @param input.brakePowerKw brake power P there, kW, ≥ 0
 * @param input.propEfficiency efficiency of the propeller η: a number 0 … 1, or a function of the speed in m/s that gives one at this speed
 * @param input.speedMps true airspeed, m/s, > 0
 * @throws CalcError on any of these by its name
 * @example
 * climbRateMps({ massKg: 1000, wingAreaM2: 16, cd0: 0.03, inducedK: 0.06, densityKgM3: 1.225, brakePowerKw: 80, propEfficiency: 0.75, speedMps: 40 }) // → 2.698581
 */
export const climbRateMps = (input: ClimbRateInput): number => {
  const members = membersOf(input)
  const polarAt = takePolar(members, { min: 0 })
  const densityKgM3 = takeDensity(members.densityKgM3)
  const powerW = takeBrakePowerW(members.brakePowerKw, 'brakePowerKw')
  const efficiencyAt = takePropEfficiency(members.propEfficiency).at
  const speedMps = takeSpeed(members.speedMps)
  const polar = polarAt(densityKgM3)
  const efficiency = efficiencyAt(speedMps)
  mustPull(efficiency, speedMps)
  return finiteResult((efficiency * powerW - levelPowerW(polar, speedMps)) / polar.weightN, 'speedMps', speedMps, 'm/s')
}
