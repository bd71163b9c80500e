import type { Channel } from '../advance/advance-types'
import { advanceAt, prepareChannel, takeMapKpa, type PreparedChannel } from '../advance/prepare-channel'
import { isWithin } from '../shared/within'
import { takeNumber } from '../validate/number'
import { finiteResult } from '../validate/result'
import { anySpeed } from '../validate/rules'
import { membersOf } from '../validate/shape'

export interface TimingCheckInput {
  readonly channel: Channel
  readonly rpm: number
  readonly readDeg: number
  readonly toleranceDeg: number
  readonly idleRpm: number
  readonly mapKpa?: number
}

export interface TimingCheck {
  readonly planDeg: number
  /** Read − planned: positive is early. */
  readonly deviationDeg: number
  readonly verdict: 'within' | 'early' | 'late'
  /** Where it is not `null`, the reading says nothing about running timing: it can be neither passed nor signed. */
  readonly warning: null | 'crankRetard' | 'hysteresis'
  readonly aboveIdle: boolean
}

const warningAt = ({ crankRetard }: PreparedChannel, rpm: number): TimingCheck['warning'] => {
  if (!crankRetard || rpm >= crankRetard.belowRpm) return null
  return rpm < crankRetard.belowRpm - crankRetard.hysteresisRpm ? 'crankRetard' : 'hysteresis'
}

/**
 * A reading with a timing light against the plan of one channel: `{ planDeg, deviationDeg, verdict, warning, aboveIdle }`, angles in crank degrees.
 *
 * planDeg as `sparkAdvanceDeg` with rising speed; deviationDeg = readDeg − planDeg; 'within' where |deviationDeg| ≤ toleranceDeg + 1e-9, else 'early' (above
 * the plan) or 'late'. warning: 'crankRetard' where rpm < belowRpm − hysteresisRpm; 'hysteresis' from there up to, not at, belowRpm; `null` elsewhere.
 * aboveIdle: rpm > idleRpm.
 *
 * Validity: a steady speed. With a warning the reading says nothing about running timing: a unit set by it would run early by the crank retard.
 * Source: common practice, no published source.
 *
 * @param input.channel the channel that was read, as in `sparkAdvanceDeg`
 * @param input.rpm engine speed at the reading, rpm, ≥ 0
 * @param input.readDeg advance read, crank degrees BTDC, any finite number
 * @param input.toleranceDeg deviation allowed to either side, crank degrees, ≥ 0
 * @param input.idleRpm idle speed, rpm, > 0
 * @param input.mapKpa manifold pressure, kPa, > 0, where the channel needs it
 * @throws CalcError below `channel`, on `rpm`, `readDeg`, `toleranceDeg`, `idleRpm` or `mapKpa`
 * @example
 * evaluateTimingCheck({ channel: { schedule: { kind: 'fixed', deg: 26 } }, rpm: 800, readDeg: 27.5, toleranceDeg: 1, idleRpm: 800 }) // → { planDeg: 26, deviationDeg: 1.5, verdict: 'early', warning: null, aboveIdle: false }
 * evaluateTimingCheck({ channel: { schedule: { kind: 'fixed', deg: 26 }, crankRetard: { belowRpm: 480, byDeg: 12, hysteresisRpm: 40 } }, rpm: 460, readDeg: 14, toleranceDeg: 1, idleRpm: 450 }).warning // → 'hysteresis'
 */
export const evaluateTimingCheck = (input: TimingCheckInput): TimingCheck => {
  const members = membersOf(input)
  const prepared = prepareChannel(members.channel, 'channel')
  const rpm = takeNumber(members.rpm, 'rpm', anySpeed)
  const readDeg = takeNumber(members.readDeg, 'readDeg', { name: 'The advance read', unit: 'deg' })
  const toleranceDeg = takeNumber(members.toleranceDeg, 'toleranceDeg', { name: 'The tolerance', unit: 'deg', min: 0 })
  const idleRpm = takeNumber(members.idleRpm, 'idleRpm', { name: 'The idle speed', unit: 'rpm', above: 0 })
  const planDeg = advanceAt(prepared, rpm, takeMapKpa(members.mapKpa, 'mapKpa', [prepared]), 'rising')
  const deviationDeg = finiteResult(readDeg - planDeg, 'readDeg', readDeg, 'deg')
  return {
    planDeg, deviationDeg,
    verdict: isWithin(deviationDeg, toleranceDeg) ? 'within' : deviationDeg > 0 ? 'early' : 'late',
    warning: warningAt(prepared, rpm),
    aboveIdle: rpm > idleRpm,
  }
}
