import { takeNumber } from '../validate/number'
import { finiteResult } from '../validate/result'
import { anySpeed } from '../validate/rules'
import { membersOf, takeRecord } from '../validate/shape'
import type { AdvanceAt, Channel } from './advance-types'
import { advanceAt, prepareChannel, takeMapKpa, takeTrend } from './prepare-channel'

/**
 * Advance at which a channel fires, in crank degrees before top dead centre.
 *
 * advance = schedule(rpm, mapKpa) − crank retard − 6e-6 · rpm · latencyUs.
 * The crank retard is subtracted while rpm < belowRpm; with `trend` 'falling' only while rpm < belowRpm − hysteresisRpm.
 *
 * Validity: steady speed; what the channel's maker states about it decides whether the schedule is what the unit does.
 * Source: common practice, no published source.
 *
 * @param channel `{ schedule, crankRetard?, latencyUs? }`; schedule degrees are crank degrees, any finite number, its speeds in rpm ≥ 0 and strictly ascending,
 *   its pressures in kPa > 0 and strictly ascending; crankRetard `{ belowRpm > 0, byDeg ≥ 0, 0 ≤ hysteresisRpm < belowRpm }`; latencyUs in microseconds, ≥ 0
 * @param at.rpm engine speed, rpm, ≥ 0
 * @param at.mapKpa manifold pressure, kPa, > 0; required by a map, and by a formula in which `map` stands
 * @param at.trend 'rising' (default), or 'falling': has been above belowRpm since the last start
 * @throws CalcError below `channel`, on `rpm`, `mapKpa` or `trend`; a formula without a finite real value on `channel.schedule.expression`
 * @example
 * sparkAdvanceDeg({ schedule: { kind: 'mechanical', initialDeg: 8, startRpm: 700, fullRpm: 1900, fullDeg: 26 } }, { rpm: 1300 }) // → 17
 * sparkAdvanceDeg({ schedule: { kind: 'fixed', deg: 26.5 }, crankRetard: { belowRpm: 480, byDeg: 12 }, latencyUs: 50 }, { rpm: 200 }) // → 14.44
 * sparkAdvanceDeg({ schedule: { kind: 'formula', expression: 'rpm < 900 ? 12 : min(26, 12 + 0.01 * (rpm - 900))' } }, { rpm: 1500 }) // → 18
 */
export const sparkAdvanceDeg = (channel: Channel, at: AdvanceAt): number => {
  const prepared = prepareChannel(channel, 'channel')
  const members = membersOf(at)
  const rpm = takeNumber(members.rpm, 'rpm', anySpeed)
  const mapKpa = takeMapKpa(members.mapKpa, 'mapKpa', [prepared])
  return advanceAt(prepared, rpm, mapKpa, takeTrend(members.trend, 'trend'))
}

/**
 * Stagger of two channels at one speed, in crank degrees: positive when the backup fires later.
 *
 * stagger = advance of the primary − advance of the backup
 *
 * Validity: as `sparkAdvanceDeg`.
 * Source: common practice, no published source.
 *
 * @param primary channel A, as in `sparkAdvanceDeg`
 * @param backup channel B, as in `sparkAdvanceDeg`
 * @param at `{ rpm, mapKpa?, trend? }`: rpm ≥ 0, kPa > 0, 'rising' (default) or 'falling'
 * @throws CalcError below `primary`, `backup` or `at`
 * @example
 * staggerDeg({ schedule: { kind: 'fixed', deg: 26.5 } }, { schedule: { kind: 'fixed', deg: 17 } }, { rpm: 2780 }) // → 9.5
 */
export const staggerDeg = (primary: Channel, backup: Channel, at: AdvanceAt): number => {
  const a = prepareChannel(primary, 'primary')
  const b = prepareChannel(backup, 'backup')
  const members = takeRecord(at, 'at', 'The speed at which to compare')
  const rpm = takeNumber(members.rpm, 'at.rpm', anySpeed)
  const mapKpa = takeMapKpa(members.mapKpa, 'at.mapKpa', [a, b])
  const trend = takeTrend(members.trend, 'at.trend')
  return finiteResult(advanceAt(a, rpm, mapKpa, trend) - advanceAt(b, rpm, mapKpa, trend), 'primary.schedule', primary, 'deg')
}
