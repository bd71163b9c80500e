import { advanceAt, prepareChannel, takeMapKpa } from '../advance/prepare-channel'
import { isWithin } from '../shared/within'
import { takeNumber } from '../validate/number'
import { finiteResult } from '../validate/result'
import { cylinderCount } from '../validate/rules'
import { membersOf, takeRecord } from '../validate/shape'
import { scattersOf, staggersOf, type BenchRow, type BenchScatter, type BenchStagger } from './bench-groups'
import { channelNames, type BenchPlan, type BenchReading } from './bench-types'
import { retardStepOf, type BenchCrankRetard } from './retard-step'
import { takeReadings } from './take-readings'

export interface BenchRunInput {
  readonly plan: BenchPlan
  readonly readings: readonly BenchReading[]
  readonly toleranceDeg: number
  readonly cylinders: number
}

export interface BenchRun {
  /** In the order of the readings. */
  readonly rows: BenchRow[]
  readonly stagger: BenchStagger[]
  readonly scatter: BenchScatter[]
  readonly crankRetard: BenchCrankRetard[]
  /** True when every row passes. */
  readonly pass: boolean
}

/**
 * Readings of a unit on a bench against its plan: `{ rows, stagger, scatter, crankRetard, pass }`, speeds in rpm, angles in crank degrees.
 *
 * rows: deviationDeg = readDeg − planDeg; pass where |deviationDeg| ≤ toleranceDeg + 1e-9, else 'early' (above the plan) or 'late'; planDeg as `sparkAdvanceDeg`
 * at the reading's speed, pressure and trend. stagger, ascending: mean of the primary − mean of the backup at equal nominal rpm, against the same of their plans.
 * scatter, primary first, speeds ascending: range and sample standard deviation of the deviations where two cylinders or more were read.
 * crankRetard, primary first: e = readDeg − planDeg without retard over rising readings; retarded where e < −byDeg/2; found when every retarded
 * speed lies below every other: it ends above aboveRpm and at atMostRpm at the latest; stepDeg = mean e of the others − mean e of the retarded.
 *
 * Validity: steady speeds, readings in crank degrees of advance (see `benchReadingsToAdvance`). A bench proves shape and step; timing is proved on the engine.
 * Source: common practice, no published source.
 *
 * @param input.plan `{ primary, backup }`: two channels as in `sparkAdvanceDeg`
 * @param input.readings one at least, each `{ rpm, channel, readDeg, cylinder, mapKpa, trend }`: rpm nominal, ≥ 0; channel 'primary' or 'backup';
 *   readDeg in crank degrees of advance, any finite number; cylinder 1 … cylinders or left out; mapKpa in kPa, > 0, where the channel needs it; trend 'rising' (when left out) or 'falling'
 * @param input.toleranceDeg deviation allowed to either side, crank degrees, ≥ 0
 * @param input.cylinders number of cylinders, a whole number ≥ 1
 * @throws CalcError below `plan.primary`, `plan.backup` or `readings`, on `toleranceDeg` or `cylinders`
 * @example
 * evaluateBenchRun({ plan: { primary: { schedule: { kind: 'fixed', deg: 26 } }, backup: { schedule: { kind: 'fixed', deg: 17 } } }, readings: [{ rpm: 1500, channel: 'primary', readDeg: 26.4 }, { rpm: 1500, channel: 'backup', readDeg: 16.2 }], toleranceDeg: 0.5, cylinders: 6 }).stagger // → [{ rpm: 1500, staggerDeg: 10.2, planDeg: 9, deviationDeg: 1.2 }]
 */
export const evaluateBenchRun = (input: BenchRunInput): BenchRun => {
  const members = membersOf(input)
  const plan = takeRecord(members.plan, 'plan', 'The plan')
  const channels = { primary: prepareChannel(plan.primary, 'plan.primary'), backup: prepareChannel(plan.backup, 'plan.backup') }
  const cylinders = takeNumber(members.cylinders, 'cylinders', cylinderCount)
  const toleranceDeg = takeNumber(members.toleranceDeg, 'toleranceDeg', { name: 'The tolerance', unit: 'deg', min: 0 })
  const readings = takeReadings(members.readings, cylinders)

  const rows = readings.map(({ rpm, channel, readDeg, cylinder, mapKpa, trend = 'rising' }, i): BenchRow => {
    const prepared = channels[channel]
    const planDeg = advanceAt(prepared, rpm, takeMapKpa(mapKpa, `readings.${i}.mapKpa`, [prepared]), trend)
    const deviationDeg = finiteResult(readDeg - planDeg, `readings.${i}.readDeg`, readDeg, 'deg')
    const pass = isWithin(deviationDeg, toleranceDeg)
    return { rpm, channel, cylinder: cylinder ?? null, planDeg, readDeg, deviationDeg, pass, reason: pass ? null : deviationDeg > 0 ? 'early' : 'late' }
  })
  return {
    rows,
    stagger: staggersOf(rows, members.readings),
    scatter: scattersOf(rows, members.readings),
    crankRetard: channelNames.flatMap((name) => retardStepOf(name, channels[name], readings, members.readings) ?? []),
    pass: rows.every(({ pass }) => pass),
  }
}
