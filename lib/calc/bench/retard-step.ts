import { advanceWith, type PreparedChannel } from '../advance/prepare-channel'
import { meanOf } from '../shared/moments'
import { finiteResult } from '../validate/result'
import type { BenchReading, ChannelName } from './bench-types'

export interface BenchCrankRetard {
  readonly channel: ChannelName
  /** The retard was still in here: it ends above this speed … */
  readonly aboveRpm: number
  /** … and at this speed at the latest. */
  readonly atMostRpm: number
  /** Mean deviation from the plan without retard where it is out, less that where it is in. */
  readonly stepDeg: number
}

/** Where readings with rising speed show the crank retard of one channel to end; `null` when they do not show it. */
export const retardStepOf = (channel: ChannelName, plan: PreparedChannel, readings: readonly BenchReading[], given: unknown): BenchCrankRetard | null => {
  const byDeg = plan.crankRetard?.byDeg ?? 0
  if (byDeg === 0) return null
  const retarded: number[] = []
  const other: number[] = []
  let aboveRpm = -Infinity
  let atMostRpm = Infinity
  for (const reading of readings) {
    if (reading.channel !== channel || reading.trend === 'falling') continue
    const { rpm, readDeg, mapKpa = Number.NaN } = reading
    const off = finiteResult(readDeg - advanceWith(plan, rpm, mapKpa, false), 'readings', given, 'deg')
    if (off < -byDeg / 2) {
      retarded.push(off)
      aboveRpm = Math.max(aboveRpm, rpm)
    } else {
      other.push(off)
      atMostRpm = Math.min(atMostRpm, rpm)
    }
  }
  if (retarded.length === 0 || other.length === 0 || aboveRpm >= atMostRpm) return null
  return { channel, aboveRpm, atMostRpm, stepDeg: finiteResult(meanOf(other) - meanOf(retarded), 'readings', given, 'deg') }
}
