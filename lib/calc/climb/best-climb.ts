import { takeOptionalNumber } from '../validate/number'
import { finiteResult } from '../validate/result'
import { membersOf } from '../validate/shape'
import { levelPowerW, takeDensity, takePolar, type Polar } from './aeroplane'
import { bestSpeed } from './best-speed'
import { takeBrakePowerW } from './climb-rate'
import { mustPull, takePropEfficiency, type PreparedEfficiency, type PropEfficiency } from './prop-efficiency'

export interface BestClimbInput {
  readonly massKg: number
  readonly wingAreaM2: number
  readonly cd0: number
  readonly inducedK: number
  readonly densityKgM3: number
  readonly brakePowerKw: number
  readonly propEfficiency: PropEfficiency
  readonly minSpeedMps?: number
}

export interface BestClimb {
  readonly speedMps: number
  readonly climbMps: number
  /** Climb over speed. */
  readonly gradient: number
}

/** 0 where no lowest speed is given. */
export const takeLowestSpeed = (value: unknown): number =>
  takeOptionalNumber(value, 'minSpeedMps', { name: 'The lowest speed to fly', unit: 'm/s', above: 0 }, 0)

/** The best climb of an aeroplane whose arguments have been checked; `powerField` takes the blame for a power beyond reckoning. */
export const bestClimbOf = (polar: Polar, powerW: number, efficiency: PreparedEfficiency, lowestMps: number, powerField: string): BestClimb => {
  const { weightN, parasite, induced } = polar
  finiteResult(powerW, powerField, powerW, 'W')
  // Speed of least power: 3·parasite·V² = induced/V².
  const leastPowerMps = Math.sqrt(Math.sqrt(induced / 3 / parasite))
  finiteResult(1 / leastPowerMps, 'massKg', weightN, 'kg')
  const startMps = Math.max(lowestMps, finiteResult(leastPowerMps, 'massKg', weightN, 'kg'))
  finiteResult(levelPowerW(polar, startMps), lowestMps > leastPowerMps ? 'minSpeedMps' : 'massKg', startMps, 'm/s')
  const excessW = (speedMps: number): number => finiteResult(efficiency.at(speedMps) * powerW - levelPowerW(polar, speedMps), 'propEfficiency', speedMps)
  const { speedMps, watts } = efficiency.constant !== null
    ? { speedMps: startMps, watts: excessW(startMps) }
    : bestSpeed({ excessW, mostExcessW: (speed) => powerW - levelPowerW(polar, speed), startMps, lowestMps })
  mustPull(efficiency.at(speedMps), speedMps)
  const climbMps = finiteResult(watts / weightN, powerField, powerW, 'W')
  return { speedMps, climbMps, gradient: finiteResult(climbMps / speedMps, powerField, powerW, 'W') }
}

/**
 * Best rate of climb and the speed that gives it: `{ speedMps, climbMps, gradient }`, m/s, m/s, and climb over speed. A negative climb is the slowest descent.
 *
 * climb = (η(V)·P − P_level(V))/W, greatest over V ≥ minSpeed, P_level as in `powerRequiredKw`;
 * with a constant efficiency V = max(minSpeed, ⁴√(4·K·W²/(3·ρ²·S²·cd0)))
 *
 * Validity: as for the power of level flight. With a constant efficiency the best speed is that of least power, often too slow to fly:
 * give a lowest speed, or the efficiency against speed.
 * Source: lowry, lowest sink of the example aeroplane (read).
 *
 * @param input.massKg mass, kg, > 0
 * @param input.wingAreaM2 wing area, m², > 0
 * @param input.cd0 drag coefficient without lift, > 0
 * @param input.inducedK induced drag factor, > 0
 * @param input.densityKgM3 density of the air, kg/m³, > 0
 * @param input.brakePowerKw brake power there, kW, ≥ 0
 * @param input.propEfficiency efficiency of the propeller: a number 0 … 1, or a function of the true airspeed in m/s that gives numbers of at most 1
 * @param input.minSpeedMps lowest true airspeed to fly, m/s, > 0, such as 1.3 times the stall; any speed unless given
 * @throws CalcError on any of these by its name
 * @example
 * bestClimb({ massKg: 1000, wingAreaM2: 16, cd0: 0.03, inducedK: 0.06, densityKgM3: 1.225, brakePowerKw: 80, propEfficiency: 0.75, minSpeedMps: 40 }) // → { speedMps: 40.00000, climbMps: 2.69858, gradient: 0.06746 }
 * bestClimb({ massKg: 1000, wingAreaM2: 16, cd0: 0.03, inducedK: 0.06, densityKgM3: 1.225, brakePowerKw: 80, propEfficiency: 0.75 }).speedMps // → 28.5841
 */
export const bestClimb = (input: BestClimbInput): BestClimb => {
  const members = membersOf(input)
  const polarAt = takePolar(members, { above: 0 })
  const densityKgM3 = takeDensity(members.densityKgM3)
  const powerW = takeBrakePowerW(members.brakePowerKw, 'brakePowerKw')
  const efficiency = takePropEfficiency(members.propEfficiency)
  const lowestMps = takeLowestSpeed(members.minSpeedMps)
  return bestClimbOf(polarAt(densityKgM3), powerW, efficiency, lowestMps, 'brakePowerKw')
}
