import { takeNumbers } from '../validate/numbers'
import { takeList } from '../validate/shape'

/**
 * Advance at which to centre the rotor, in crank degrees: the middle of the extremes, so that the largest offset is smallest.
 *
 * best = (smallest + largest)/2
 *
 * Validity: the advances listed are all that occur; put the spark's end among them.
 * Source: common practice, no published source (geometry).
 *
 * @param advancesDeg advances that occur, crank degrees, one at least, any finite numbers
 * @throws CalcError on `advancesDeg` or `advancesDeg.i`
 * @example
 * bestPhasingDeg([27, 15, 18]) // → 21
 */
export const bestPhasingDeg = (advancesDeg: readonly number[]): number => {
  const advances = takeNumbers(takeList(advancesDeg, 'advancesDeg', 'The list of advances', 1), 'advancesDeg', { unit: 'deg' }, (i) => `Advance ${i + 1}`)
  let low = Infinity
  let high = -Infinity
  for (const advance of advances) {
    low = Math.min(low, advance)
    high = Math.max(high, advance)
  }
  // Halved before adding: the sum of two huge numbers would overflow where their middle does not.
  return low / 2 + high / 2 + 0
}
