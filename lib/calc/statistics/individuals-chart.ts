import { meanOf } from '../shared/moments'
import { takeNumbers } from '../validate/numbers'
import { finiteResult } from '../validate/result'
import { takeList } from '../validate/shape'

export interface IndividualsChart {
  readonly mean: number
  readonly meanMovingRange: number
  readonly lower: number
  readonly upper: number
  readonly movingRangeUpper: number
  /** Places of the values beyond a limit, counted from 0. */
  readonly outside: number[]
  /** Places of the values whose step from the one before is beyond its limit, counted from 0. */
  readonly movingRangeOutside: number[]
}

/** Mean range of two normal values over their standard deviation, and the upper limit of such a range over its mean, as the tables print them. */
const d2 = 1.128
const d4 = 3.267

/**
 * Control chart of single values in the order they were taken: `{ mean, meanMovingRange, lower, upper, movingRangeUpper, outside, movingRangeOutside }`;
 * limits in the unit of the values, the last two lists of places counted from 0.
 *
 * MR = mean of |value − the one before|; lower, upper = mean ∓ 3·MR/1.128; movingRangeUpper = 3.267·MR; outside: beyond lower or upper;
 * movingRangeOutside: |value − the one before| beyond movingRangeUpper
 *
 * Validity: values of one process, in order, about normally spread; the limits of fewer than about 20 values are rough.
 * Source: chart-constants, d2 and D4 for two values (read)
 *
 * @param values two at least, in the order they were taken, in any one unit, any finite numbers
 * @throws CalcError on `values` or `values.i`
 * @example
 * individualsChart([5, 7, 6, 8, 4]) // → { mean: 6, meanMovingRange: 2.25, lower: 0.015957, upper: 11.984043, movingRangeUpper: 7.35075, outside: [], movingRangeOutside: [] }
 */
export const individualsChart = (values: readonly number[]): IndividualsChart => {
  const taken = takeNumbers(takeList(values, 'values', 'The list of values', 2), 'values', { unit: '' }, (i) => `Value ${i + 1}`)
  const of = (result: number): number => finiteResult(result, 'values', values)
  const mean = of(meanOf(taken))
  const ranges = taken.slice(1).map((value, i) => of(Math.abs(value - (taken[i] ?? 0))))
  const meanMovingRange = of(meanOf(ranges))
  const reach = of((3 * meanMovingRange) / d2)
  const lower = of(mean - reach)
  const upper = of(mean + reach)
  const movingRangeUpper = of(d4 * meanMovingRange)
  const placesWhere = (isOut: (i: number) => boolean): number[] => [...taken.keys()].filter(isOut)
  return {
    mean, meanMovingRange, lower, upper, movingRangeUpper,
    outside: placesWhere((i) => (taken[i] ?? 0) < lower || (taken[i] ?? 0) > upper),
    movingRangeOutside: placesWhere((i) => i > 0 && (ranges[i - 1] ?? 0) > movingRangeUpper),
  }
}
