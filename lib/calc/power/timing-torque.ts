import { CalcError } from '../calc-error'
import { takeNumber } from '../validate/number'
import { finiteResult } from '../validate/result'
import { membersOf } from '../validate/shape'

/** Torque against spark timing as a parabola about the spark of best torque (MBT). */
export interface TimingParabola {
  /** Spark of best torque, crank degrees before top dead centre. */
  readonly mbtDeg: number
  /** Share of the torque lost per squared crank degree from MBT, ≥ 0. */
  readonly curvaturePerDeg2: number
}

export interface CurvaturePoint {
  readonly mbtDeg: number
  readonly sparkDeg: number
  readonly ratio: number
}

const mbtRule = { name: 'The spark of best torque', unit: 'deg' }
const sparkRule = { name: 'The spark', unit: 'deg' }

/**
 * Brake torque at a spark timing over brake torque at best timing, a ratio of 0 … 1, as a dynamometer gives it.
 *
 * ratio = 1 − c · (spark − MBT)², not below 0
 *
 * Validity: a parabola holds within about 20° of MBT. Planned timing is not MBT: many engines are timed short of it because of detonation.
 * Source: heywood-1988, class of curve of fig. 15-3 (memory).
 *
 * @param parabola `{ mbtDeg, curvaturePerDeg2 }`: spark of best torque in crank degrees BTDC, any finite number; curvature per squared crank degree, ≥ 0, published 1.8e-4 … 4e-4
 * @param sparkDeg spark in crank degrees BTDC, any finite number
 * @throws CalcError on `mbtDeg`, `curvaturePerDeg2` or `sparkDeg`
 * @example
 * timingTorqueRatio({ mbtDeg: 31, curvaturePerDeg2: 3e-4 }, 21) // → 0.97
 */
export const timingTorqueRatio = (parabola: TimingParabola, sparkDeg: number): number => {
  const members = membersOf(parabola)
  const mbtDeg = takeNumber(members.mbtDeg, 'mbtDeg', mbtRule)
  const curvature = takeNumber(members.curvaturePerDeg2, 'curvaturePerDeg2', { name: 'The curvature', unit: '1/deg²', min: 0 })
  const off = takeNumber(sparkDeg, 'sparkDeg', sparkRule) - mbtDeg
  const loss = curvature * off ** 2
  // An infinite loss is a ratio of 0; only 0 · ∞ has no value.
  return Number.isNaN(loss) ? finiteResult(loss, 'sparkDeg', sparkDeg, 'deg') : Math.max(0, 1 - loss)
}

/**
 * Curvature of a torque parabola through one known point, per squared crank degree.
 *
 * c = (1 − ratio)/(spark − MBT)²
 *
 * Validity: as `timingTorqueRatio`; a curvature fitted as if the planned timing were MBT comes out far too steep.
 * Source: heywood-1988, class of curve of fig. 15-3 (memory).
 *
 * @param point.mbtDeg spark of best torque, crank degrees BTDC, any finite number
 * @param point.sparkDeg spark of the known point, crank degrees BTDC, other than mbtDeg
 * @param point.ratio brake torque there over brake torque at MBT, 0 … 1
 * @throws CalcError on `mbtDeg`, `sparkDeg` or `ratio`
 * @example
 * curvatureFromPoint({ mbtDeg: 31, sparkDeg: 21, ratio: 0.97 }) // → 0.00030000
 */
export const curvatureFromPoint = (point: CurvaturePoint): number => {
  const members = membersOf(point)
  const mbtDeg = takeNumber(members.mbtDeg, 'mbtDeg', mbtRule)
  const sparkDeg = takeNumber(members.sparkDeg, 'sparkDeg', sparkRule)
  const ratio = takeNumber(members.ratio, 'ratio', { name: 'The torque ratio', unit: '', min: 0, max: 1 })
  if (sparkDeg === mbtDeg) {
    throw new CalcError({
      field: 'sparkDeg', value: sparkDeg, limit: `other than ${mbtDeg}`, unit: 'deg',
      message: `The spark must differ from the spark of best torque, ${mbtDeg} deg: at it the torque says nothing about the curvature.`,
    })
  }
  return finiteResult((1 - ratio) / (sparkDeg - mbtDeg) ** 2, 'sparkDeg', sparkDeg, 'deg')
}
