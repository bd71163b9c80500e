import { CalcError } from '../calc-error'
import { takeNumber, takeOptionalNumber } from '../validate/number'
import { manifoldPressure } from '../validate/rules'
import { takeChoice, takeRecord } from '../validate/shape'
import { trends, type Trend } from './advance-types'
import { prepareSchedule, type PreparedSchedule } from './prepare-schedule'

/** A channel checked once, for evaluating many times. */
export interface PreparedChannel {
  /** The argument's name, first segment of every error path. */
  readonly field: string
  readonly given: unknown
  readonly schedule: PreparedSchedule
  readonly crankRetard: { readonly belowRpm: number, readonly byDeg: number, readonly hysteresisRpm: number } | null
  readonly latencyUs: number
}

/** One microsecond at one rpm is 0.006 · 0.001 crank degrees. */
const degPerRpmUs = 6e-6

const takeCrankRetard = (value: unknown, field: string): PreparedChannel['crankRetard'] => {
  if (value === undefined) return null
  const members = takeRecord(value, field, 'The crank retard')
  const belowRpm = takeNumber(members.belowRpm, `${field}.belowRpm`, { name: 'The speed below which the crank retard acts', unit: 'rpm', above: 0 })
  const byDeg = takeNumber(members.byDeg, `${field}.byDeg`, { name: 'The crank retard', unit: 'deg', min: 0 })
  const hysteresisRpm = takeOptionalNumber(members.hysteresisRpm, `${field}.hysteresisRpm`, { name: 'The hysteresis of the crank retard', unit: 'rpm', min: 0, below: belowRpm }, 0)
  return { belowRpm, byDeg, hysteresisRpm }
}

export const prepareChannel = (channel: unknown, field: string): PreparedChannel => {
  const members = takeRecord(channel, field, 'The channel')
  return {
    field, given: channel,
    schedule: prepareSchedule(members.schedule, `${field}.schedule`),
    crankRetard: takeCrankRetard(members.crankRetard, `${field}.crankRetard`),
    latencyUs: takeOptionalNumber(members.latencyUs, `${field}.latencyUs`, { name: 'The electronic delay', unit: 'µs', min: 0 }, 0),
  }
}

export const takeTrend = (value: unknown, field: string): Trend =>
  value === undefined ? 'rising' : takeChoice(value, field, 'The trend of the speed', trends)

/** The manifold pressure, kPa; checked whenever given, missed only where one of the channels needs it (then NaN, which nothing reads). */
export const takeMapKpa = (value: unknown, field: string, channels: readonly PreparedChannel[]): number => {
  if (value === undefined && !channels.some(({ schedule }) => schedule.usesMap)) return Number.NaN
  return takeNumber(value, field, manifoldPressure)
}

/** Speed of the crank-retard step, rpm: retarded strictly below it. `null` without a crank retard. */
export const thresholdRpm = ({ crankRetard }: PreparedChannel, trend: Trend): number | null => {
  if (!crankRetard) return null
  return trend === 'rising' ? crankRetard.belowRpm : crankRetard.belowRpm - crankRetard.hysteresisRpm
}

const noValue = ({ field, given, schedule, latencyUs }: PreparedChannel, bare: number, rpm: number): CalcError => {
  if (schedule.isSampled && !Number.isFinite(bare)) {
    const expression: unknown = (given as { schedule?: { expression?: unknown } }).schedule?.expression
    return new CalcError({
      field: `${field}.schedule.expression`, value: expression, limit: 'a finite real number at every speed', unit: 'deg',
      message: `The formula has no finite real value at ${Number(rpm.toPrecision(8))} rpm: look for a division by zero or a root of a negative number.`,
    })
  }
  return new CalcError({
    field: Number.isFinite(bare) ? `${field}.latencyUs` : `${field}.schedule`, value: Number.isFinite(bare) ? latencyUs : given,
    limit: 'a value whose result is a finite number', unit: Number.isFinite(bare) ? 'µs' : 'deg',
    message: 'The advance is beyond what a number can hold: one of the values is far too large.',
  })
}

/** Advance in crank degrees at a speed, with or without the crank retard as the caller says. */
export const advanceWith = (channel: PreparedChannel, rpm: number, mapKpa: number, isRetarded: boolean): number => {
  const bare = channel.schedule.degAt(rpm, mapKpa)
  const deg = bare - (isRetarded ? channel.crankRetard?.byDeg ?? 0 : 0) - degPerRpmUs * rpm * channel.latencyUs
  if (!Number.isFinite(deg)) throw noValue(channel, bare, rpm)
  return deg + 0
}

/**
 * Advance at a speed. At the threshold itself the retard is released; `side` 'below' gives the value
 * that the advance has just under it, for the two ends of the step.
 */
export const advanceAt = (channel: PreparedChannel, rpm: number, mapKpa: number, trend: Trend, side: 'at' | 'below' = 'at'): number => {
  const threshold = thresholdRpm(channel, trend)
  return advanceWith(channel, rpm, mapKpa, threshold !== null && (side === 'at' ? rpm < threshold : rpm <= threshold))
}
