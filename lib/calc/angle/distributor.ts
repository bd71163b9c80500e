import { takeNumber } from '../validate/number'
import { finiteResult } from '../validate/result'
import { anyAngle } from '../validate/rules'

/**
 * Distributor angle that goes with a crank angle, in distributor degrees.
 *
 * distributor deg = crank deg / 2: a four-stroke distributor turns at half crank speed
 *
 * Validity: four-stroke engines.
 * Source: common practice, no published source.
 *
 * @param deg crank angle in degrees, signed, any finite number
 * @throws CalcError on `deg`
 * @example
 * distributorDegFromCrank(25) // → 12.5
 */
export const distributorDegFromCrank = (deg: number): number => takeNumber(deg, 'deg', anyAngle) / 2

/**
 * Crank angle that goes with a distributor angle, in crank degrees.
 *
 * crank deg = 2 · distributor deg: a four-stroke distributor turns at half crank speed
 *
 * Validity: four-stroke engines.
 * Source: common practice, no published source.
 *
 * @param deg distributor angle in degrees, signed, any finite number
 * @throws CalcError on `deg`
 * @example
 * crankDegFromDistributor(12.5) // → 25
 */
export const crankDegFromDistributor = (deg: number): number =>
  finiteResult(2 * takeNumber(deg, 'deg', anyAngle), 'deg', deg, 'deg')
