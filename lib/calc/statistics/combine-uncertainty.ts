import { takeNumber, takeOptionalNumber } from '../validate/number'
import { finiteResult } from '../validate/result'
import { membersOf, takeChoice, takeList, takeRecord } from '../validate/shape'
import { coverageRule, degreesOfFreedom } from './rules'
import { coverageFactorOf } from './student-t-quantile'

export type Distribution = 'normal' | 'rectangular' | 'triangular'

export interface UncertaintyContribution {
  /** Standard deviation of a normal contribution, half-width of the others; in the unit of what varies, ≥ 0. */
  readonly value: number
  readonly distribution: Distribution
  /** Change of the result for one unit of this contribution; 1 when left out. */
  readonly sensitivity?: number
  /** Degrees of freedom behind `value`; without end when left out. */
  readonly dof?: number
}

export interface CoverageInput { readonly coverage?: number }

export interface CombinedUncertainty {
  readonly standard: number
  /** Real, not cut to a whole number; `null` where it has no end. */
  readonly effectiveDof: number | null
  readonly coverageFactor: number
  readonly expanded: number
  /** All contributions at their ends at once, a normal one at three standard deviations. */
  readonly worstCase: number
}

const distributions: readonly Distribution[] = ['normal', 'rectangular', 'triangular']
/** Standard deviation over half-width. */
const standardShare: Readonly<Record<Distribution, number>> = { normal: 1, rectangular: 1 / Math.sqrt(3), triangular: 1 / Math.sqrt(6) }
const endShare: Readonly<Record<Distribution, number>> = { normal: 3, rectangular: 1, triangular: 1 }

interface Part { readonly standard: number, readonly end: number, readonly dof: number | null }

const takePart = (given: unknown, i: number): Part => {
  const field = `contributions.${i}`
  const members = takeRecord(given, field, `Contribution ${i + 1}`)
  const value = takeNumber(members.value, `${field}.value`, { name: `The size of contribution ${i + 1}`, unit: '', min: 0 })
  const distribution = takeChoice(members.distribution, `${field}.distribution`, `The distribution of contribution ${i + 1}`, distributions)
  const sensitivity = takeOptionalNumber(members.sensitivity, `${field}.sensitivity`, { name: `The sensitivity to contribution ${i + 1}`, unit: '' }, 1)
  const dof = takeOptionalNumber(members.dof, `${field}.dof`, { ...degreesOfFreedom, name: `The number of degrees of freedom of contribution ${i + 1}` }, null)
  const reach = Math.abs(sensitivity) * value
  return { standard: finiteResult(reach * standardShare[distribution], `${field}.value`, value), end: finiteResult(reach * endShare[distribution], `${field}.value`, value), dof }
}

/** ν with (Σu²)²/ν = Σ(u⁴/νᵢ); shares of the whole are taken first, so that no fourth power overflows. */
const welchSatterthwaite = (parts: readonly Part[], standard: number): number | null => {
  if (standard === 0) return null
  let sum = 0
  for (const part of parts) if (part.dof !== null) sum += (part.standard / standard) ** 4 / part.dof
  const dof = 1 / sum
  return Number.isFinite(dof) ? dof : null
}

/**
 * Combined uncertainty of independent contributions: `{ standard, effectiveDof, coverageFactor, expanded, worstCase }`;
 * standard, expanded and worstCase in the unit of the result, the others without unit.
 *
 * u = |c|·σ (normal), |c|·a/√3 (rectangular), |c|·a/√6 (triangular); standard = √Σu²; effectiveDof = standard⁴/Σ(u⁴/ν), not cut to a whole number,
 * `null` where nothing limits it; coverageFactor = Student's t at (1 + coverage)/2 for effectiveDof, the normal value without;
 * expanded = coverageFactor·standard; worstCase = Σ|c|·a, a normal contribution counted at 3σ.
 *
 * Validity: contributions that do not depend on each other, small enough that the result follows them in a straight line.
 * With correlation the result differs, to either side.
 * Source: gum-2008, 5.1.2, 4.3.7, 4.3.9 and G.4 (read)
 *
 * @param contributions one at least, each `{ value, distribution, sensitivity, dof }`: value the standard deviation of a 'normal' one, the half-width a of a
 *   'rectangular' or 'triangular' one, in its own unit, ≥ 0; sensitivity c in units of the result for one of its own, any finite number, 1 when left out;
 *   dof ν ≥ 0.001, without end when left out
 * @param options.coverage share of cases the expanded uncertainty shall cover, without unit, > 0 and < 1, 0.95 when left out
 * @throws CalcError on `contributions`, below it (`contributions.i.value`), or on `coverage`; on `coverage` also where its factor is beyond what a number can hold
 * @example
 * combineUncertainty([{ value: 0.3, distribution: 'normal' }, { value: 0.6, distribution: 'rectangular', sensitivity: 2 }]).standard // → 0.75498344
 * combineUncertainty([{ value: 1, distribution: 'normal', dof: 20 }]) // → { standard: 1, effectiveDof: 20, coverageFactor: 2.08596345, expanded: 2.08596345, worstCase: 3 }
 */
export const combineUncertainty = (contributions: readonly UncertaintyContribution[], options: CoverageInput = {}): CombinedUncertainty => {
  const list = takeList(contributions, 'contributions', 'The list of contributions', 1)
  const parts: Part[] = []
  for (let i = 0; i < list.length; i += 1) parts.push(takePart(list[i], i))
  const coverage = takeOptionalNumber(membersOf(options).coverage, 'coverage', coverageRule, 0.95)

  let largest = 0
  let worst = 0
  for (const { standard, end } of parts) {
    largest = Math.max(largest, standard)
    worst += end
  }
  let squares = 0
  if (largest > 0) for (const part of parts) squares += (part.standard / largest) ** 2
  const standard = finiteResult(largest * Math.sqrt(squares), 'contributions', contributions)
  const effectiveDof = welchSatterthwaite(parts, standard)
  const coverageFactor = finiteResult(coverageFactorOf(coverage, effectiveDof), 'coverage', coverage)
  return {
    standard, effectiveDof, coverageFactor,
    expanded: finiteResult(coverageFactor * standard, 'contributions', contributions),
    worstCase: finiteResult(worst, 'contributions', contributions),
  }
}
