import { CalcError } from '../calc-error'
import { meanOf, squaresAbout } from '../shared/moments'
import { takeOptionalNumber } from '../validate/number'
import { takePairs } from '../validate/pairs'
import { finiteResult } from '../validate/result'
import { membersOf, takeList } from '../validate/shape'
import { coverageRule } from './rules'
import { coverageFactorOf } from './student-t-quantile'

export interface TrendPoint { readonly hours: number, readonly value: number }

export interface LinearTrendInput {
  readonly limit?: number
  readonly atHours?: number
  readonly coverage?: number
}

export interface TrendPrediction {
  readonly hours: number
  readonly value: number
  readonly lower: number
  readonly upper: number
}

export interface LinearTrend {
  readonly slopePerH: number
  readonly intercept: number
  readonly slopeSe: number
  readonly interceptSe: number
  readonly residualSd: number
  /** For one further reading at `atHours`; `null` when none was asked for. */
  readonly prediction: TrendPrediction | null
  /** From the latest point on; `null` where no limit was given, none is approached for certain, or it lies behind. */
  readonly hoursToLimit: number | null
}

const takePoints = (points: unknown): [number[], number[]] => {
  const [hours, values] = takePairs(
    takeList(points, 'points', 'The list of points', 3), 'points', 'Point',
    { key: 'hours', unit: 'h', nameOf: (n) => `The hours of point ${n}` }, { key: 'value', unit: '', nameOf: (n) => `The value of point ${n}` },
  )
  if (hours.every((entry) => entry === hours[0])) {
    throw new CalcError({ field: 'points', value: points, limit: 'two different hours', unit: 'h', message: 'The points must lie at two different hours at least: one moment has no trend.' })
  }
  return [hours, values]
}

/**
 * Straight line through readings over the hours: `{ slopePerH, intercept, slopeSe, interceptSe, residualSd, prediction, hoursToLimit }`;
 * slopePerH and slopeSe in the unit of the value per hour, intercept (at hour 0), interceptSe and residualSd in the unit of the value, hoursToLimit in hours.
 *
 * slope = Σ(h − h̄)(v − v̄)/Σ(h − h̄)²; intercept = v̄ − slope·h̄; s = √(Σ residual²/(n − 2)); slopeSe = s/√Σ(h − h̄)²; interceptSe = s·√(1/n + h̄²/Σ(h − h̄)²);
 * prediction `{ hours, value, lower, upper }`: value = intercept + slope·hours, bounds value ∓ t·s·√(1 + 1/n + (hours − h̄)²/Σ(h − h̄)²), for one further reading,
 * t Student's at (1 + coverage)/2 with n − 2 degrees of freedom; hoursToLimit = (limit − intercept)/slope − the latest hours.
 *
 * Validity: readings that scatter evenly about a straight line; wear that quickens is not one. `hoursToLimit` is `null` when |slope| ≤ t·slopeSe (no trend is
 * certain) or when the line is past the limit or leads away from it.
 * Source: common practice, no published source (least squares).
 *
 * @param points three at least, each `{ hours, value }`: hours in hours, any finite numbers, two of them different, in any order; value in any one unit
 * @param options.limit value to reach, in the unit of the values, any finite number; left out when there is none
 * @param options.atHours hours to predict a reading at, any finite number; left out when none is asked for
 * @param options.coverage share of cases the bounds shall cover, without unit, > 0 and < 1, 0.95 when left out
 * @throws CalcError on `points`, `points.i.hours`, `points.i.value`, `limit`, `atHours` or `coverage`
 * @example
 * linearTrend([{ hours: 0, value: 1 }, { hours: 10, value: 3 }, { hours: 20, value: 5 }], { limit: 8 }).hoursToLimit // → 15.000000
 * linearTrend([{ hours: 0, value: 1 }, { hours: 10, value: 2 }, { hours: 20, value: 2 }]) // → { slopePerH: 0.050000, intercept: 1.166667, slopeSe: 0.028868, interceptSe: 0.372678, residualSd: 0.408248, prediction: null, hoursToLimit: null }
 */
export const linearTrend = (points: readonly TrendPoint[], options: LinearTrendInput = {}): LinearTrend => {
  const [hours, values] = takePoints(points)
  const members = membersOf(options)
  const limit = takeOptionalNumber(members.limit, 'limit', { name: 'The limit', unit: '' }, null)
  const atHours = takeOptionalNumber(members.atHours, 'atHours', { name: 'The hours to predict at', unit: 'h' }, null)
  const coverage = takeOptionalNumber(members.coverage, 'coverage', coverageRule, 0.95)

  const count = hours.length
  const meanHours = meanOf(hours)
  const meanValue = meanOf(values)
  // Hours and values as shares of their widest deviation: squares stay within a number's range, and the line goes through (0, level).
  const { largest: span } = squaresAbout(hours, meanHours)
  const { largest: height } = squaresAbout(values, meanValue)
  const scale = height === 0 ? 1 : height
  const u = hours.map((entry) => (entry - meanHours) / span)
  const v = values.map((value) => (value - meanValue) / scale)
  let uu = 0
  let uv = 0
  for (let i = 0; i < count; i += 1) {
    const x = u[i] ?? 0
    uu += x * x
    uv += x * (v[i] ?? 0)
  }
  const lean = uv / uu
  let squares = 0
  for (let i = 0; i < count; i += 1) squares += ((v[i] ?? 0) - lean * (u[i] ?? 0)) ** 2
  const spread = Math.sqrt(squares / (count - 2))
  const leanSe = spread / Math.sqrt(uu)
  const of = (result: number): number => finiteResult(result, 'points', points)
  const slopePerH = of(scale * (lean / span))
  const residualSd = of(scale * spread)
  const intercept = of(meanValue - scale * lean * (meanHours / span))
  const slopeSe = of(scale * (leanSe / span))
  const interceptSe = of(residualSd * Math.sqrt(1 / count + (meanHours / span) ** 2 / uu))
  const t = finiteResult(coverageFactorOf(coverage, count - 2), 'coverage', coverage)

  const predictAt = (at: number): TrendPrediction => {
    const x = (at - meanHours) / span
    const bound = (result: number): number => finiteResult(result, 'atHours', at, 'h')
    const value = bound(meanValue + scale * lean * x)
    const reach = t * residualSd * Math.sqrt(1 + 1 / count + (x * x) / uu)
    return { hours: at, value, lower: bound(value - reach), upper: bound(value + reach) }
  }
  const hoursTo = (goal: number): number | null => {
    if (Math.abs(lean) <= t * leanSe) return null
    let latest = -Infinity
    for (const x of u) latest = Math.max(latest, x)
    const ahead = finiteResult(span * ((goal - meanValue) / scale / lean - latest), 'limit', goal)
    return ahead < 0 ? null : ahead
  }
  return {
    slopePerH, intercept, slopeSe, interceptSe, residualSd,
    prediction: atHours === null ? null : predictAt(atHours),
    hoursToLimit: limit === null ? null : hoursTo(limit),
  }
}
