import { takeNumber } from '../validate/number'
import { membersOf } from '../validate/shape'
import type { Channel, Trend } from './advance-types'
import { advanceAt, prepareChannel, takeMapKpa, takeTrend, thresholdRpm } from './prepare-channel'

export interface AdvanceCurveInput {
  readonly fromRpm: number
  readonly toRpm: number
  readonly points: number
  readonly mapKpa?: number
  readonly trend?: Trend
}

export interface CurvePoint { readonly rpm: number, readonly deg: number }

/** More than any screen has pixels; keeps a mistyped number from filling the memory. */
const mostPoints = 100_000
/** A sample this close to the step, relative to its speed, falls on it: evenly spaced speeds carry rounding. */
const sameSpeed = 1e-12

const sampleSpeeds = (fromRpm: number, toRpm: number, points: number): number[] =>
  Array.from({ length: points }, (_, i) => (i === points - 1 ? toRpm : fromRpm + ((toRpm - fromRpm) * i) / (points - 1)))

/**
 * Advance curve of a channel: a list of `{ rpm, deg }` in rpm and crank degrees before top dead centre, speeds ascending.
 *
 * rpm[i] = fromRpm + i · (toRpm − fromRpm)/(points − 1), deg as `sparkAdvanceDeg`. Where the crank-retard step lies in the range
 * it adds two points of one speed, first the value from below, then from above; a sample that falls on the step is replaced by the two.
 * With `trend` 'falling' the step lies at belowRpm − hysteresisRpm.
 *
 * Validity: as `sparkAdvanceDeg`; between samples the curve of a table or formula may bend.
 * Source: common practice, no published source.
 *
 * @param channel as in `sparkAdvanceDeg`
 * @param range.fromRpm first speed, rpm, ≥ 0
 * @param range.toRpm last speed, rpm, > fromRpm
 * @param range.points number of evenly spaced samples, both ends included: a whole number, 2 … 100 000
 * @param range.mapKpa manifold pressure, kPa, > 0, where the channel needs it
 * @param range.trend 'rising' (default) or 'falling'
 * @throws CalcError below `channel`, on `fromRpm`, `toRpm`, `points`, `mapKpa` or `trend`
 * @example
 * advanceCurve({ schedule: { kind: 'fixed', deg: 20 }, crankRetard: { belowRpm: 500, byDeg: 8 } }, { fromRpm: 0, toRpm: 1000, points: 3 }) // → [{ rpm: 0, deg: 12 }, { rpm: 500, deg: 12 }, { rpm: 500, deg: 20 }, { rpm: 1000, deg: 20 }]
 */
export const advanceCurve = (channel: Channel, range: AdvanceCurveInput): CurvePoint[] => {
  const prepared = prepareChannel(channel, 'channel')
  const members = membersOf(range)
  const fromRpm = takeNumber(members.fromRpm, 'fromRpm', { name: 'The first speed of the curve', unit: 'rpm', min: 0 })
  const toRpm = takeNumber(members.toRpm, 'toRpm', { name: 'The last speed of the curve', unit: 'rpm', above: fromRpm })
  const points = takeNumber(members.points, 'points', { name: 'The number of points of the curve', unit: '', min: 2, max: mostPoints, integer: true })
  const mapKpa = takeMapKpa(members.mapKpa, 'mapKpa', [prepared])
  const trend = takeTrend(members.trend, 'trend')
  const step = thresholdRpm(prepared, trend)

  const curve: CurvePoint[] = []
  let isStepDone = step === null || step < fromRpm || step > toRpm
  const addStep = (rpm: number) => {
    curve.push({ rpm, deg: advanceAt(prepared, rpm, mapKpa, trend, 'below') }, { rpm, deg: advanceAt(prepared, rpm, mapKpa, trend) })
    isStepDone = true
  }
  for (const rpm of sampleSpeeds(fromRpm, toRpm, points)) {
    const isOnStep = step !== null && !isStepDone && Math.abs(rpm - step) <= sameSpeed * step
    if (step !== null && !isStepDone && (isOnStep || rpm > step)) addStep(step)
    if (!isOnStep) curve.push({ rpm, deg: advanceAt(prepared, rpm, mapKpa, trend) })
  }
  return curve
}
