import { CalcError } from '../calc-error'
import { rootBetween } from '../shared/root-between'
import { takeNumber, takeOptionalNumber } from '../validate/number'
import { membersOf } from '../validate/shape'
import { checkCycle } from './check-cycle'
import type { CycleInput } from './cycle-types'
import { bestOnGrid } from './find-mbt'
import type { BurnAngles } from './scale-burn'
import { sparkGrid } from './spark-grid'
import { burnOf, compress, searchedFromDeg, searchedToDeg, sweepSparks, type SparkSweep } from './spark-sweep'

export interface CalibrateBurnTarget { readonly mbtDeg: number, readonly delayShare?: number }

/** Delay and duration together, crank degrees, that are tried. */
const shortestDeg = 30
const longestDeg = 140

/** Slope of the work over the spark at the target, J/degree, from four sparks beside it: above zero while the best spark lies beyond. */
const slopeAt = ({ at, fromDeg, toDeg }: SparkSweep, sparkDeg: number): number => {
  const h = Math.min(1.5, (sparkDeg - fromDeg) / 2, (toDeg - sparkDeg) / 2)
  const work = (i: number) => at(sparkDeg + i * h).workJ
  return (work(-2) - 8 * work(-1) + 8 * work(1) - work(2)) / (12 * h)
}

/**
 * Delay and duration whose spark of best torque lies where it is wanted, `{ delayDeg, durationDeg }` in crank degrees.
 *
 * delay + duration in 30 … 140° with delay/(delay + duration) held, such that `findMbt` gives mbtDeg to 0.01°
 *
 * Validity: as in `simulateCycle`: it makes the model agree with one known angle; what the burn really looks like stays unknown.
 * Source: common practice, no published source (a root of the slope of work over the spark).
 *
 * @param input as in `simulateCycle`; `burn` may not be `null`
 * @param target.mbtDeg wanted spark of best torque, crank degrees BTDC, above −20 and below 60
 * @param target.delayShare delay/(delay + duration), 0 … below 1; that of `burn` unless given
 * @throws CalcError on what `simulateCycle` refuses, on `burn` when motored, on `delayShare`, and on `mbtDeg` when no total of 30 … 140° gives it
 * @example
 * calibrateBurn({ engine: { boreMm: 90, strokeMm: 80, rodMm: 140, compressionRatio: 8, ivcDeg: -120, evoDeg: 120 }, rpm: 2500, charge: { pressureKpa: 100, temperatureK: 370, residualFraction: 0.05, airFuelRatio: 13 }, burn: { sparkDeg: 20, delayDeg: 10, durationDeg: 60, efficiency: 0.85 }, gamma: 1.3, heatLoss: null }, { mbtDeg: 30 }).durationDeg // → 43.81
 */
export const calibrateBurn = (input: CycleInput, target: CalibrateBurnTarget): BurnAngles => {
  const checked = checkCycle(input)
  const burn = burnOf(checked)
  const members = membersOf(target)
  const mbtDeg = takeNumber(members.mbtDeg, 'mbtDeg', { name: 'The spark of best torque', unit: 'deg', above: searchedFromDeg, below: searchedToDeg })
  const delayShare = takeOptionalNumber(members.delayShare, 'delayShare', { name: 'The share of the delay', unit: '', min: 0, below: 1 }, burn.delayDeg / (burn.delayDeg + burn.durationDeg))
  const refuse = () => new CalcError({
    field: 'mbtDeg', value: mbtDeg, limit: `a best spark that a burn of ${shortestDeg} … ${longestDeg} deg gives`, unit: 'deg',
    message: `No burn of ${shortestDeg} to ${longestDeg} deg from spark to end has its best torque at ${mbtDeg} deg before top dead centre in this engine.`,
  })
  const compression = compress(checked)
  const anglesOf = (totalDeg: number): BurnAngles => ({ delayDeg: delayShare * totalDeg, durationDeg: (1 - delayShare) * totalDeg })
  const sweepOf = (totalDeg: number) => sweepSparks(compression, { ...burn, ...anglesOf(totalDeg) })
  const slope = (totalDeg: number): number => {
    const sweep = sweepOf(totalDeg)
    // Burning would have to start before inlet closing or after exhaust opening.
    if (mbtDeg <= sweep.fromDeg || mbtDeg >= sweep.toDeg) throw refuse()
    return slopeAt(sweep, mbtDeg)
  }
  const givesMbt = (totalDeg: number): boolean => {
    const sweep = sweepOf(totalDeg)
    const best = bestOnGrid(sweep, sparkGrid(sweep))
    return best !== null && Math.abs(best.sparkDeg - mbtDeg) <= 0.01
  }
  const [atLow, atHigh] = [slope(shortestDeg), slope(longestDeg)]
  // A longer burn wants an earlier spark: the slope rises with the total. At an end itself its sign is rounding.
  if (!(atLow < 0 && atHigh > 0)) {
    const end = atLow < 0 ? longestDeg : shortestDeg
    if (givesMbt(end)) return anglesOf(end)
    throw refuse()
  }
  const totalDeg = rootBetween(slope, shortestDeg, longestDeg, 1e-4, { atFrom: atLow, atTo: atHigh })
  if (!givesMbt(totalDeg)) throw refuse()
  return anglesOf(totalDeg)
}
