import { takeNumber, takeOptionalNumber } from '../validate/number'
import { finiteResult } from '../validate/result'
import { membersOf } from '../validate/shape'
import type { Channel, Trend } from './advance-types'
import { advanceAt, prepareChannel, takeMapKpa, takeTrend, thresholdRpm, type PreparedChannel } from './prepare-channel'
import { checkSampleCount } from './sampling'

export interface StaggerReportInput {
  readonly crankingRpm: number
  readonly idleRpm: number
  readonly maxRpm: number
  readonly mapKpa?: number
  readonly plateRadiusMm?: number
  readonly trend?: Trend
}

export interface StaggerPoint {
  readonly rpm: number
  /** Crank degrees, positive when the backup fires later. */
  readonly staggerDeg: number
  readonly staggerMs: number
  readonly staggerDistributorDeg: number
  /** On the trigger plate at its radius, mm; `null` without a radius. */
  readonly plateArcMm: number | null
}

export interface StaggerReport {
  readonly atCranking: StaggerPoint
  readonly atIdle: StaggerPoint
  readonly atMax: StaggerPoint
  readonly smallest: StaggerPoint
  readonly largest: StaggerPoint
  readonly backupEverFirst: boolean
}

interface Sample { readonly rpm: number, readonly deg: number }

/** Interpolated advances carry rounding of about 1e-14°: values this close are one value, at its lowest speed. */
const sameDeg = 1e-11
/** Rounding alone must not accuse the backup of firing first. */
const firstByDeg = 1e-9

/** The lowest speed at which the extreme stands. `sign` 1 looks for the largest, −1 for the smallest. */
const extreme = (samples: readonly Sample[], sign: 1 | -1): Sample => {
  let best = -Infinity
  for (const { deg } of samples) best = Math.max(best, sign * deg)
  const tolerance = sameDeg * Math.max(1, Math.abs(best))
  return samples.find(({ deg }) => sign * deg >= best - tolerance) ?? { rpm: 0, deg: sign * best }
}

/** Speeds where the stagger can turn: ends, breakpoints of both, and each 1 rpm when a formula is among them. */
const turningSpeeds = (channels: readonly PreparedChannel[], fromRpm: number, toRpm: number): number[] => {
  const speeds = new Set([fromRpm, toRpm])
  for (const { schedule } of channels) {
    for (const rpm of schedule.breakpointsRpm) if (rpm > fromRpm && rpm < toRpm) speeds.add(rpm)
  }
  if (channels.some(({ schedule }) => schedule.isSampled)) {
    checkSampleCount(fromRpm, toRpm, 'maxRpm')
    for (let k = 1; fromRpm + k < toRpm; k += 1) speeds.add(fromRpm + k)
  }
  return [...speeds]
}

/**
 * Stagger of two channels between cranking and full power: `{ atCranking, atIdle, atMax, smallest, largest, backupEverFirst }`,
 * each point `{ rpm, staggerDeg, staggerMs, staggerDistributorDeg, plateArcMm }` in rpm, crank degrees, milliseconds, distributor degrees
 * and millimetres on the trigger plate (`null` without a radius).
 *
 * staggerDeg = primary − backup, positive when the backup fires later; staggerMs = staggerDeg/(0.006 · rpm);
 * staggerDistributorDeg = staggerDeg/2; plateArcMm = π · 2 · plateRadiusMm · staggerDistributorDeg/360.
 * Extremes over crankingRpm … maxRpm from the ends, the breakpoints of both schedules and both sides of each crank-retard step,
 * at the lowest such speed; with a formula also each 1 rpm.
 *
 * Validity: as `sparkAdvanceDeg`; exact between breakpoints, a formula may peak between two samples.
 * Source: common practice, no published source.
 *
 * @param primary channel A, as in `sparkAdvanceDeg`
 * @param backup channel B, as in `sparkAdvanceDeg`
 * @param range.crankingRpm cranking speed, rpm, > 0
 * @param range.idleRpm idle speed, rpm, > crankingRpm
 * @param range.maxRpm speed of full power, rpm, > idleRpm; with a formula at most 100 000 rpm above cranking
 * @param range.mapKpa manifold pressure, kPa, > 0, where a channel needs it
 * @param range.plateRadiusMm radius at which the triggers sit on the plate, mm, > 0; left out when there is no plate
 * @param range.trend 'rising' (default) or 'falling'
 * @throws CalcError below `primary` or `backup`, on `crankingRpm`, `idleRpm`, `maxRpm`, `mapKpa`, `plateRadiusMm` or `trend`
 * @example
 * staggerReport({ schedule: { kind: 'fixed', deg: 26.5 }, crankRetard: { belowRpm: 480, byDeg: 12 } }, { schedule: { kind: 'fixed', deg: 17 } }, { crankingRpm: 160, idleRpm: 750, maxRpm: 2780, plateRadiusMm: 30 }).largest // → { rpm: 480, staggerDeg: 9.5, staggerMs: 3.298611, staggerDistributorDeg: 4.75, plateArcMm: 2.487094 }
 */
export const staggerReport = (primary: Channel, backup: Channel, range: StaggerReportInput): StaggerReport => {
  const a = prepareChannel(primary, 'primary')
  const b = prepareChannel(backup, 'backup')
  const members = membersOf(range)
  const crankingRpm = takeNumber(members.crankingRpm, 'crankingRpm', { name: 'The cranking speed', unit: 'rpm', above: 0 })
  const idleRpm = takeNumber(members.idleRpm, 'idleRpm', { name: 'The idle speed', unit: 'rpm', above: crankingRpm })
  const maxRpm = takeNumber(members.maxRpm, 'maxRpm', { name: 'The speed of full power', unit: 'rpm', above: idleRpm })
  const mapKpa = takeMapKpa(members.mapKpa, 'mapKpa', [a, b])
  const plateRadiusMm = takeOptionalNumber(members.plateRadiusMm, 'plateRadiusMm', { name: 'The radius of the trigger plate', unit: 'mm', above: 0 }, null)
  const trend = takeTrend(members.trend, 'trend')

  const sample = (rpm: number, side: 'at' | 'below' = 'at'): Sample => ({
    rpm,
    deg: finiteResult(advanceAt(a, rpm, mapKpa, trend, side) - advanceAt(b, rpm, mapKpa, trend, side), 'primary.schedule', primary, 'deg'),
  })
  const point = ({ rpm, deg }: Sample): StaggerPoint => ({
    rpm,
    staggerDeg: deg,
    staggerMs: finiteResult(deg / (0.006 * rpm), 'crankingRpm', crankingRpm, 'rpm'),
    staggerDistributorDeg: deg / 2,
    plateArcMm: plateRadiusMm === null ? null : finiteResult((Math.PI * plateRadiusMm * deg) / 360, 'plateRadiusMm', plateRadiusMm, 'mm'),
  })

  const samples = turningSpeeds([a, b], crankingRpm, maxRpm).map((rpm) => sample(rpm))
  for (const step of [thresholdRpm(a, trend), thresholdRpm(b, trend)]) {
    if (step === null || step < crankingRpm || step > maxRpm) continue
    // The side below a step at cranking speed itself lies outside the range.
    if (step > crankingRpm) samples.push(sample(step, 'below'))
    samples.push(sample(step))
  }
  samples.sort((left, right) => left.rpm - right.rpm)
  const smallest = point(extreme(samples, -1))
  return {
    atCranking: point(sample(crankingRpm)),
    atIdle: point(sample(idleRpm)),
    atMax: point(sample(maxRpm)),
    smallest,
    largest: point(extreme(samples, 1)),
    backupEverFirst: smallest.staggerDeg < -firstByDeg,
  }
}
