import { CalcError } from '../calc-error'
import { takeNumber } from '../validate/number'
import { membersOf } from '../validate/shape'
import type { Channel } from './advance-types'
import { advanceWith, prepareChannel, takeMapKpa } from './prepare-channel'
import { checkSampleCount } from './sampling'

export interface ProofSpeedInput {
  readonly idleRpm: number
  readonly maxRpm: number
  readonly toleranceDeg: number
  readonly mapKpa?: number
}

/** Rounding of an interpolated advance must not push an exact fit out of the tolerance. */
const rounding = 1e-12

interface Search {
  readonly fromRpm: number
  readonly maxRpm: number
  readonly toleranceDeg: number
  /** Advance at a speed minus that at maxRpm, crank degrees. */
  readonly deviationAt: (rpm: number) => number
  readonly isWithin: (deviationDeg: number) => boolean
}

/** Between breakpoints the deviation is a straight line, latency included: the edge of the tolerance is solved for. */
const provedOnLines = ({ fromRpm, maxRpm, toleranceDeg, deviationAt, isWithin }: Search, breakpointsRpm: readonly number[]): number => {
  let leftRpm = fromRpm
  let left = deviationAt(leftRpm)
  if (isWithin(left)) return leftRpm
  for (const rightRpm of [...breakpointsRpm.filter((rpm) => rpm > fromRpm && rpm < maxRpm), maxRpm]) {
    const right = deviationAt(rightRpm)
    const edge = left > 0 ? toleranceDeg : -toleranceDeg
    // Within at the right, or through the whole tolerance band inside the piece: either way the near edge is met first.
    if (isWithin(right) || right > 0 !== left > 0) {
      const share = (left - edge) / (left - right)
      return Math.min(rightRpm, leftRpm + (rightRpm - leftRpm) * share)
    }
    leftRpm = rightRpm
    left = right
  }
  return maxRpm
}

/** A formula is sampled each 1 rpm; inside the interval found, the edge is bisected to the last digit. */
const provedOnSamples = ({ fromRpm, maxRpm, deviationAt, isWithin }: Search): number => {
  checkSampleCount(fromRpm, maxRpm, 'maxRpm')
  let outside = fromRpm
  for (let k = 0; ; k += 1) {
    const rpm = Math.min(fromRpm + k, maxRpm)
    if (!isWithin(deviationAt(rpm)) && rpm < maxRpm) {
      outside = rpm
      continue
    }
    if (k === 0) return rpm
    let inside = rpm
    for (let middle = (outside + inside) / 2; middle > outside && middle < inside; middle = (outside + inside) / 2) {
      if (isWithin(deviationAt(middle))) inside = middle
      else outside = middle
    }
    return inside
  }
}

/**
 * Lowest speed at which a timing light proves full timing, in rpm; `null` when there is none.
 *
 * The lowest rpm ≥ idleRpm and ≥ belowRpm (clear of the crank-retard band with its hysteresis) with
 * |advance(rpm) − advance(maxRpm)| ≤ toleranceDeg. Exact for linear pieces; a formula is sampled each 1 rpm and then bisected.
 *
 * Validity: one manifold pressure for both speeds; a schedule that follows the pressure needs the throttle of maxRpm.
 * Source: common practice, no published source.
 *
 * @param channel as in `sparkAdvanceDeg`
 * @param range.idleRpm idle speed, rpm, ≥ 0
 * @param range.maxRpm speed of full power, rpm, > idleRpm; for a formula at most 100 000 rpm above idle
 * @param range.toleranceDeg what the timing light can tell apart, crank degrees, ≥ 0
 * @param range.mapKpa manifold pressure, kPa, > 0, where the channel needs it
 * @throws CalcError below `channel`, on `idleRpm`, `maxRpm`, `toleranceDeg` or `mapKpa`
 * @example
 * proofSpeedRpm({ schedule: { kind: 'mechanical', initialDeg: 8, startRpm: 700, fullRpm: 1900, fullDeg: 26 } }, { idleRpm: 750, maxRpm: 2780, toleranceDeg: 1.5 }) // → 1800
 * proofSpeedRpm({ schedule: { kind: 'fixed', deg: 26.5 }, crankRetard: { belowRpm: 3000, byDeg: 12 } }, { idleRpm: 750, maxRpm: 2780, toleranceDeg: 1 }) // → null
 */
export const proofSpeedRpm = (channel: Channel, range: ProofSpeedInput): number | null => {
  const prepared = prepareChannel(channel, 'channel')
  const members = membersOf(range)
  const idleRpm = takeNumber(members.idleRpm, 'idleRpm', { name: 'The idle speed', unit: 'rpm', min: 0 })
  const maxRpm = takeNumber(members.maxRpm, 'maxRpm', { name: 'The speed of full power', unit: 'rpm', above: idleRpm })
  const toleranceDeg = takeNumber(members.toleranceDeg, 'toleranceDeg', { name: 'The tolerance', unit: 'deg', min: 0 })
  const mapKpa = takeMapKpa(members.mapKpa, 'mapKpa', [prepared])
  const fromRpm = Math.max(idleRpm, prepared.crankRetard?.belowRpm ?? 0)
  if (fromRpm > maxRpm) return null

  const atMax = advanceWith(prepared, maxRpm, mapKpa, false)
  const allowed = toleranceDeg + rounding * Math.max(1, Math.abs(atMax))
  const deviationAt = (rpm: number): number => {
    const deviation = advanceWith(prepared, rpm, mapKpa, false) - atMax
    if (Number.isFinite(deviation)) return deviation
    throw new CalcError({ field: 'channel.schedule', value: channel.schedule, limit: 'advances whose difference is a finite number', unit: 'deg', message: 'The advances are beyond what a number can hold: one of them is far too large.' })
  }
  const search: Search = { fromRpm, maxRpm, toleranceDeg, deviationAt, isWithin: (deviation) => Math.abs(deviation) <= allowed }
  return prepared.schedule.isSampled ? provedOnSamples(search) : provedOnLines(search, prepared.schedule.breakpointsRpm)
}
