import { takeOptionalNumber } from '../validate/number'
import { finiteResult } from '../validate/result'
import { membersOf } from '../validate/shape'
import { normalUpperQuantile } from './normal-quantile'
import { cpkOf, takeCapability } from './process-capability'
import { coverageRule } from './rules'

export interface CpkIntervalInput {
  readonly lower: number
  readonly upper: number
  readonly coverage?: number
}

export interface CpkInterval { readonly cpk: number, readonly lower: number, readonly upper: number }

/**
 * Capability index with the interval that its number of values leaves it: `{ cpk, lower, upper }`, without unit.
 *
 * cpk as `processCapability`; bounds cpk ∓ z·√(1/(9n) + cpk²/(2(n − 1))), z the normal value at (1 + coverage)/2
 *
 * Validity: an approximation for normally spread values, good from about 25 of them; rough below.
 * Source: bissell-1990, normal approximation of the interval (memory)
 *
 * @param values two at least that differ, in any one unit, any finite numbers
 * @param limits.lower lower limit, in the unit of the values, any finite number
 * @param limits.upper upper limit, in the unit of the values, > lower
 * @param limits.coverage share of cases the interval shall cover, without unit, > 0 and < 1, 0.95 when left out
 * @throws CalcError on `values` (fewer than two, or all equal), `values.i`, `lower`, `upper` or `coverage`
 * @example
 * cpkInterval([14, 16, 18, 15, 17], { lower: 8, upper: 20, coverage: 0.9 }) // → { cpk: 0.843274, lower: 0.294990, upper: 1.391559 }
 */
export const cpkInterval = (values: readonly number[], limits: CpkIntervalInput): CpkInterval => {
  const taken = takeCapability(values, limits)
  const coverage = takeOptionalNumber(membersOf(limits).coverage, 'coverage', coverageRule, 0.95)
  const count = taken.values.length
  const cpk = finiteResult(cpkOf(taken), 'values', values)
  const reach = normalUpperQuantile((1 - coverage) / 2) * Math.hypot(1 / (3 * Math.sqrt(count)), cpk / Math.sqrt(2 * (count - 1)))
  return { cpk, lower: finiteResult(cpk - reach, 'values', values), upper: finiteResult(cpk + reach, 'values', values) }
}
