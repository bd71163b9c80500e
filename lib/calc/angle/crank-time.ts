import { takeNumber } from '../validate/number'
import { finiteResult } from '../validate/result'
import { anyAngle, anySpeed, turningSpeed } from '../validate/rules'

/** One turn is 360° and one minute 60 000 ms. */
const degPerRpmMs = 0.006

/**
 * Crank angle turned in a time, in crank degrees.
 *
 * deg = 0.006 · rpm · ms
 *
 * Validity: exact at constant speed.
 * Source: common practice, no published source (follows from the units).
 *
 * @param ms time in milliseconds, a difference: signed, any finite number
 * @param rpm engine speed, rpm, ≥ 0
 * @throws CalcError on `ms` or `rpm`
 * @example
 * crankDegFromMs(1.5, 2780) // → 25.02
 * crankDegFromMs(1000, 2100) // → 12600
 */
export const crankDegFromMs = (ms: number, rpm: number): number => {
  takeNumber(ms, 'ms', { name: 'The time', unit: 'ms' })
  takeNumber(rpm, 'rpm', anySpeed)
  return finiteResult(degPerRpmMs * rpm * ms, 'ms', ms, 'ms')
}

/**
 * Time in which the crank turns through an angle, in milliseconds.
 *
 * ms = deg / (0.006 · rpm)
 *
 * Validity: exact at constant speed.
 * Source: common practice, no published source (follows from the units).
 *
 * @param deg crank angle in degrees, a difference: signed, any finite number
 * @param rpm engine speed, rpm, > 0
 * @throws CalcError on `deg` or `rpm`
 * @example
 * msFromCrankDeg(180, 3000) // → 10
 */
export const msFromCrankDeg = (deg: number, rpm: number): number => {
  takeNumber(deg, 'deg', anyAngle)
  takeNumber(rpm, 'rpm', turningSpeed)
  return finiteResult(deg / (degPerRpmMs * rpm), 'rpm', rpm, 'rpm')
}
