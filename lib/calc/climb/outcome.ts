import { powerAtDensityRatio } from '../air/lapsed-power'
import { seaLevelKgM3, standardDensityRatio } from '../air/troposphere'
import { rootBetween } from '../shared/root-between'
import { takeNumber, takeOptionalNumber } from '../validate/number'
import { membersOf } from '../validate/shape'
import { takePolar } from './aeroplane'
import { bestClimbOf, takeLowestSpeed, type BestClimb } from './best-climb'
import { takeBrakePowerW } from './climb-rate'
import { takePropEfficiency, type PropEfficiency } from './prop-efficiency'

export interface OutcomeInput {
  readonly massKg: number
  readonly wingAreaM2: number
  readonly cd0: number
  readonly inducedK: number
  readonly propEfficiency: PropEfficiency
  readonly seaLevelPowerKw: number
  readonly densityAltitudeM: number
  readonly levelBandMps?: number
  readonly minSpeedMps?: number
}

export interface Outcome extends BestClimb {
  readonly verdict: 'climbs' | 'level' | 'descends'
  /** Density altitude of zero climb, m; `null` when it lies outside −1000 … 11000 m. */
  readonly ceilingM: number | null
  /** Where the ceiling lies: in that range, above it (climbs everywhere in it) or below it (climbs nowhere in it). */
  readonly ceiling: 'inRange' | 'aboveRange' | 'belowRange'
}

const lowestM = -1000
const highestM = 11_000

/**
 * What becomes of a flight with the power that is left: `{ speedMps, climbMps, gradient, verdict, ceilingM, ceiling }`; m/s, m/s, climb over speed,
 * 'climbs' above the level band, 'descends' below it, the density altitude of zero climb in m or null, and on which side it lies.
 *
 * best climb as in `bestClimb` with P = seaLevelPowerKw·(1.132·σ − 0.132) and ρ = 1.225·σ of the standard atmosphere; ceilingM where that climb is 0
 *
 * Validity: a naturally aspirated engine whose whole brake power lapses with density; with dead cylinders the friction does not lapse, and that chain is to be solved
 * with `bestClimb` at each altitude. The lowest speed is a true airspeed and stays what it is at every altitude.
 * Source: gagg-ferrar-1934, the straight line (read).
 *
 * @param input.massKg mass, kg, > 0
 * @param input.wingAreaM2 wing area, m², > 0
 * @param input.cd0 drag coefficient without lift, > 0
 * @param input.inducedK induced drag factor, > 0
 * @param input.propEfficiency efficiency of the propeller: a number 0 … 1, or a function of the true airspeed in m/s that gives numbers of at most 1
 * @param input.seaLevelPowerKw brake power at sea level in the standard atmosphere, kW, ≥ 0
 * @param input.densityAltitudeM density altitude of the flight, m, −5000 … 11000
 * @param input.levelBandMps a climb or descent of at most this counts as level, m/s, ≥ 0; 0.25 unless given
 * @param input.minSpeedMps lowest true airspeed to fly, m/s, > 0; any speed unless given
 * @throws CalcError on any of these by its name
 * @example
 * outcome({ massKg: 1000, wingAreaM2: 16, cd0: 0.03, inducedK: 0.06, propEfficiency: 0.75, seaLevelPowerKw: 80, densityAltitudeM: 0, minSpeedMps: 32 }).verdict // → 'climbs'
 * outcome({ massKg: 1000, wingAreaM2: 16, cd0: 0.03, inducedK: 0.06, propEfficiency: 0.75, seaLevelPowerKw: 80, densityAltitudeM: 0, minSpeedMps: 32 }).ceilingM // → 4602.219
 */
export const outcome = (input: OutcomeInput): Outcome => {
  const members = membersOf(input)
  const polarAt = takePolar(members, { above: 0 })
  const efficiency = takePropEfficiency(members.propEfficiency)
  const seaLevelW = takeBrakePowerW(members.seaLevelPowerKw, 'seaLevelPowerKw')
  const densityAltitudeM = takeNumber(members.densityAltitudeM, 'densityAltitudeM', { name: 'The density altitude', unit: 'm', min: -5000, max: highestM })
  const levelBandMps = takeOptionalNumber(members.levelBandMps, 'levelBandMps', { name: 'The band that counts as level', unit: 'm/s', min: 0 }, 0.25)
  const lowestMps = takeLowestSpeed(members.minSpeedMps)

  const climbAt = (altitudeM: number): BestClimb => {
    const ratio = standardDensityRatio(altitudeM)
    return bestClimbOf(polarAt(seaLevelKgM3 * ratio), seaLevelW * powerAtDensityRatio(ratio), efficiency, lowestMps, 'seaLevelPowerKw')
  }
  const best = climbAt(densityAltitudeM)
  const verdict = best.climbMps > levelBandMps ? 'climbs' : best.climbMps < -levelBandMps ? 'descends' : 'level'
  return { ...best, verdict, ...ceilingOf((altitudeM) => climbAt(altitudeM).climbMps) }
}

/**
 * Where a climb passes 0. It does so once: at any one speed the excess power is a·σ − b − c/σ with b, c > 0, so that where it is 0 or more
 * it grows with σ, and the best speed can only do better.
 */
const ceilingOf = (climbMps: (altitudeM: number) => number): Pick<Outcome, 'ceilingM' | 'ceiling'> => {
  if (climbMps(lowestM) < 0) return { ceilingM: null, ceiling: 'belowRange' }
  if (climbMps(highestM) > 0) return { ceilingM: null, ceiling: 'aboveRange' }
  return { ceilingM: rootBetween(climbMps, lowestM, highestM, 1e-9), ceiling: 'inRange' }
}
