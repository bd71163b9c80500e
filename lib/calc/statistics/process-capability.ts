import { CalcError } from '../calc-error'
import { meanOf, sampleSd } from '../shared/moments'
import { takeNumber, takeOptionalNumber } from '../validate/number'
import { takeNumbers } from '../validate/numbers'
import { finiteResult } from '../validate/result'
import { membersOf, takeList } from '../validate/shape'

export interface CapabilityLimits {
  readonly lower: number
  readonly upper: number
  readonly target?: number
}

export interface ProcessCapability {
  readonly mean: number
  readonly sd: number
  readonly cp: number
  readonly cpk: number
  readonly cpm: number
}

/** Mean and sample standard deviation of values that vary, and the limits they are held against. */
export const takeCapability = (values: unknown, limits: unknown): { values: number[], mean: number, sd: number, lower: number, upper: number } => {
  const taken = takeNumbers(takeList(values, 'values', 'The list of values', 2), 'values', { unit: '' }, (i) => `Value ${i + 1}`)
  const members = membersOf(limits)
  const lower = takeNumber(members.lower, 'lower', { name: 'The lower limit', unit: '' })
  const upper = takeNumber(members.upper, 'upper', { name: 'The upper limit', unit: '', above: lower })
  const mean = finiteResult(meanOf(taken), 'values', values)
  const sd = finiteResult(sampleSd(taken, mean), 'values', values)
  if (sd === 0) throw new CalcError({ field: 'values', value: values, limit: 'values that differ', unit: '', message: 'The values must differ: without any scatter there is no capability to state.' })
  return { values: taken, mean, sd, lower, upper }
}

/** The nearer limit's distance from the mean over three standard deviations; negative when the mean is outside. */
export const cpkOf = ({ mean, sd, lower, upper }: { readonly mean: number, readonly sd: number, readonly lower: number, readonly upper: number }): number =>
  Math.min(upper - mean, mean - lower) / sd / 3

/**
 * How well values fit between two limits: `{ mean, sd, cp, cpk, cpm }`; mean and sd in the unit of the values, the others without unit.
 *
 * sd with divisor n − 1; cp = (upper − lower)/(6·sd); cpk = min(upper − mean, mean − lower)/(3·sd); cpm = (upper − lower)/(6·√(sd² + (mean − target)²))
 *
 * Validity: values about normally spread, of one unchanging process. From a few values the indices are rough: see `cpkInterval`.
 * Source: common practice, no published source.
 *
 * @param values two at least that differ, in any one unit, any finite numbers
 * @param limits.lower lower limit, in the unit of the values, any finite number
 * @param limits.upper upper limit, in the unit of the values, > lower
 * @param limits.target value aimed at, in the unit of the values, any finite number, the middle of the limits when left out
 * @throws CalcError on `values` (fewer than two, or all equal), `values.i`, `lower`, `upper` or `target`
 * @example
 * processCapability([14, 16, 18], { lower: 8, upper: 20 }) // → { mean: 16, sd: 2, cp: 1, cpk: 0.666667, cpm: 0.707107 }
 */
export const processCapability = (values: readonly number[], limits: CapabilityLimits): ProcessCapability => {
  const taken = takeCapability(values, limits)
  const { mean, sd, lower, upper } = taken
  const target = takeOptionalNumber(membersOf(limits).target, 'target', { name: 'The target', unit: '' }, lower / 2 + upper / 2)
  const width = finiteResult(upper - lower, 'upper', upper)
  return {
    mean, sd,
    cp: finiteResult(width / sd / 6, 'values', values),
    cpk: finiteResult(cpkOf(taken), 'values', values),
    cpm: finiteResult(width / Math.hypot(sd, mean - target) / 6, 'values', values),
  }
}
