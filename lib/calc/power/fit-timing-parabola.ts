import { CalcError } from '../calc-error'
import { takePairs } from '../validate/pairs'
import { takeList } from '../validate/shape'

export interface TorquePoint { readonly sparkDeg: number, readonly torque: number }

export interface TimingFit {
  readonly mbtDeg: number
  readonly curvaturePerDeg2: number
  /** In the unit the torque was given in. */
  readonly torqueAtMbt: number
  readonly rSquared: number
  /** Measured − fitted, in the order given. */
  readonly residuals: number[]
  /** True when MBT lies outside the angles measured. */
  readonly extrapolated: boolean
  /** Standard error of mbtDeg; `null` with three points, which leave nothing to judge by. */
  readonly mbtSeDeg: number | null
}

const takePoints = (points: unknown): [number[], number[]] => takePairs(
  takeList(points, 'points', 'The list of torque readings', 3), 'points', 'Torque reading',
  { key: 'sparkDeg', unit: 'deg', nameOf: (n) => `The spark of reading ${n}` }, { key: 'torque', unit: '', nameOf: (n) => `The torque of reading ${n}` },
)

const refuse = (points: unknown, limit: string, message: string): CalcError => new CalcError({ field: 'points', value: points, limit, unit: '', message })

const sum = (values: readonly number[]): number => values.reduce((total, value) => total + value, 0)
const mean = (values: readonly number[]): number => sum(values) / values.length
const dot = (a: readonly number[], b: readonly number[]): number => a.reduce((total, value, i) => total + value * (b[i] ?? 0), 0)

/**
 * Parabola of torque against spark timing by least squares:
 * `{ mbtDeg, curvaturePerDeg2, torqueAtMbt, rSquared, residuals, extrapolated, mbtSeDeg }` in crank degrees, per squared crank degree,
 * and the unit of the torque; residual = measured − fitted in the order given.
 *
 * torque = c₀ + c₁·x + c₂·x², x = spark − mean spark; mbtDeg = mean − c₁/(2c₂); torqueAtMbt = c₀ − c₁²/(4c₂);
 * curvaturePerDeg2 = −c₂/torqueAtMbt; rSquared = 1 − SSE/SST; mbtSeDeg by the first-order propagation of the coefficients' covariance,
 * `null` when there are three points only.
 *
 * Validity: readings within about 20° of MBT; `extrapolated` says that MBT lies outside the readings.
 * Source: common practice, no published source (least squares).
 *
 * @param points `{ sparkDeg, torque }[]`: crank degrees BTDC and torque in any one unit, any finite numbers; at least three distinct angles
 * @throws CalcError on `points.i.sparkDeg`, `points.i.torque`, or on `points` when there are fewer than three distinct angles, unless −c₂·span² > 1e-9·max|torque| (the curve has a top), or unless torqueAtMbt > 0
 * @example
 * fitTimingParabola([{ sparkDeg: 20, torque: 194 }, { sparkDeg: 30, torque: 200 }, { sparkDeg: 40, torque: 194 }]).mbtDeg // → 30
 * fitTimingParabola([{ sparkDeg: 20, torque: 194 }, { sparkDeg: 30, torque: 200 }, { sparkDeg: 40, torque: 194 }]).curvaturePerDeg2 // → 0.00030000
 */
export const fitTimingParabola = (points: readonly TorquePoint[]): TimingFit => {
  const [sparks, torques] = takePoints(points)
  const count = sparks.length
  if (new Set(sparks).size < 3) throw refuse(points, 'three distinct angles', 'The torque readings must lie at three different spark angles at least: fewer do not make a parabola.')

  let low = Infinity
  let high = -Infinity
  let largest = 0
  for (const spark of sparks) {
    low = Math.min(low, spark)
    high = Math.max(high, spark)
  }
  for (const torque of torques) largest = Math.max(largest, Math.abs(torque))
  const half = high / 2 - low / 2

  // u runs over about −1 … 1. 1, u and q are orthogonal over the readings, so each coefficient stands alone and no normal equations are solved.
  // Torques are taken as shares of the largest, so that their squares stay within a number's range.
  const centre = mean(sparks)
  const rough = sparks.map((spark) => (spark - centre) / half)
  const off = mean(rough)
  const u = rough.map((value) => value - off)
  const uu = dot(u, u)
  const lean = dot(u.map((value) => value * value), u) / uu
  const q = u.map((value) => value * value - lean * value - uu / count)
  const qq = dot(q, q)
  const shares = torques.map((torque) => torque / largest)
  const level = mean(shares)
  const rest = shares.map((share) => share - level)
  const d1 = dot(u, rest) / uu
  const d2 = dot(q, rest) / qq
  if (!(-4 * d2 > 1e-9)) {
    throw refuse(points, '−c₂·span² > 1e-9·max|torque|', 'These torque readings have no top: the torque must fall off to both sides of a best spark, if only by extrapolation.')
  }
  const c1 = d1 - lean * d2
  const top = level - (d2 * uu) / count - c1 ** 2 / (4 * d2)
  if (!(top > 0)) throw refuse(points, 'a torque above 0 at its best', 'The torque at its best spark must be above 0: give torque as a positive number.')

  const residualShares = rest.map((share, i) => share - d1 * (u[i] ?? 0) - d2 * (q[i] ?? 0))
  const sse = dot(residualShares, residualShares)
  const freedom = count - 3
  const mbtSeDeg = freedom === 0 ? null : half * Math.sqrt((sse / freedom) * (1 / (4 * d2 ** 2 * uu) + d1 ** 2 / (4 * d2 ** 4 * qq)))
  const mbtDeg = centre + half * (off - c1 / (2 * d2)) + 0
  const curvaturePerDeg2 = -d2 / half ** 2 / top
  const torqueAtMbt = largest * top
  const rSquared = 1 - sse / dot(rest, rest)
  const residuals = residualShares.map((share) => share * largest + 0)
  if (![mbtDeg, curvaturePerDeg2, torqueAtMbt, rSquared, mbtSeDeg ?? 0].every(Number.isFinite) || !residuals.every(Number.isFinite)) {
    throw refuse(points, 'readings whose fit is a finite number', 'The fit is beyond what a number can hold: some of the readings are far too large, or their angles far too close.')
  }
  return { mbtDeg, curvaturePerDeg2, torqueAtMbt, rSquared, residuals, extrapolated: mbtDeg < low || mbtDeg > high, mbtSeDeg }
}
