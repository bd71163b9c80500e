import { takeNumber } from '../validate/number'
import { logHalfStepOfGamma } from './incomplete-beta'
import { normalRange } from './normal-range'

export interface ControlChartFactors {
  readonly d2: number
  readonly d3: number
  readonly c4: number
  /** Limits of a mean: ∓ this many mean ranges (A2), or mean standard deviations (A3). */
  readonly meanByRange: number
  readonly meanBySd: number
  /** Limits of a standard deviation over its mean (B3, B4). */
  readonly sdLower: number
  readonly sdUpper: number
  /** Limits of a range over its mean (D3, D4). */
  readonly rangeLower: number
  readonly rangeUpper: number
}

/**
 * Factors of a control chart of groups of normal values: `{ d2, d3, c4, meanByRange, meanBySd, sdLower, sdUpper, rangeLower, rangeUpper }`, without unit.
 *
 * d2, d3: mean and standard deviation of the range over the standard deviation; c4 = √(2/(n − 1))·Γ(n/2)/Γ((n − 1)/2), the same of the sample standard deviation's mean;
 * meanByRange = 3/(d2·√n) (A2); meanBySd = 3/(c4·√n) (A3); sdLower, sdUpper = 1 ∓ 3·√(1 − c4²)/c4 (B3, B4); rangeLower, rangeUpper = 1 ∓ 3·d3/d2 (D3, D4); lower ones not below 0.
 *
 * Validity: independent, normally spread values; to about 1e-7.
 * Source: chart-constants, definitions of the factors (read)
 *
 * @param count number of values in a group n, a whole number, 2 … 100
 * @throws CalcError on `count`
 * @example
 * controlChartFactors(5).d2 // → 2.325929
 * controlChartFactors(5).sdUpper // → 2.088998
 */
export const controlChartFactors = (count: number): ControlChartFactors => {
  const n = takeNumber(count, 'count', { name: 'The number of values in a group', unit: '', min: 2, max: 100, integer: true })
  const { mean: d2, sd: d3 } = normalRange(n)
  const c4 = Math.sqrt(2 / (n - 1)) * Math.exp(logHalfStepOfGamma((n - 1) / 2))
  const sdReach = (3 * Math.sqrt(1 - c4 * c4)) / c4
  const rangeReach = (3 * d3) / d2
  return {
    d2, d3, c4,
    meanByRange: 3 / (d2 * Math.sqrt(n)), meanBySd: 3 / (c4 * Math.sqrt(n)),
    sdLower: Math.max(0, 1 - sdReach), sdUpper: 1 + sdReach,
    rangeLower: Math.max(0, 1 - rangeReach), rangeUpper: 1 + rangeReach,
  }
}
