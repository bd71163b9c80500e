import { meanOf, sampleSd } from '../shared/moments'
import { finiteResult } from '../validate/result'
import { channelNames, type ChannelName } from './bench-types'

export interface BenchRow {
  readonly rpm: number
  readonly channel: ChannelName
  readonly cylinder: number | null
  readonly planDeg: number
  readonly readDeg: number
  /** Read − planned: positive is early. */
  readonly deviationDeg: number
  readonly pass: boolean
  readonly reason: null | 'early' | 'late'
}

export interface BenchStagger {
  readonly rpm: number
  /** Mean of the primary − mean of the backup: positive when the backup fires later. */
  readonly staggerDeg: number
  readonly planDeg: number
  readonly deviationDeg: number
}

export interface BenchScatter {
  readonly rpm: number
  readonly channel: ChannelName
  readonly rangeDeg: number
  readonly sdDeg: number
}

type Rows = readonly BenchRow[]

/** Rows of one channel by nominal speed, speeds ascending. */
const bySpeed = (rows: Rows, channel: ChannelName): Map<number, BenchRow[]> => {
  const groups = new Map<number, BenchRow[]>()
  for (const row of rows) {
    if (row.channel !== channel) continue
    const group = groups.get(row.rpm)
    if (group) group.push(row)
    else groups.set(row.rpm, [row])
  }
  return new Map([...groups].sort(([a], [b]) => a - b))
}

/** Stagger at each speed at which both channels were read. */
export const staggersOf = (rows: Rows, given: unknown): BenchStagger[] => {
  const backups = bySpeed(rows, 'backup')
  const mean = (group: Rows, member: 'readDeg' | 'planDeg'): number => meanOf(group.map((row) => row[member]))
  return [...bySpeed(rows, 'primary')].flatMap(([rpm, primary]) => {
    const backup = backups.get(rpm)
    if (!backup) return []
    const of = (result: number): number => finiteResult(result, 'readings', given, 'deg')
    const staggerDeg = of(mean(primary, 'readDeg') - mean(backup, 'readDeg'))
    const planDeg = of(mean(primary, 'planDeg') - mean(backup, 'planDeg'))
    return [{ rpm, staggerDeg, planDeg, deviationDeg: of(staggerDeg - planDeg) }]
  })
}

/**
 * Scatter at each speed and channel at which two cylinders or more were read. Taken of the deviations: where readings of one speed differ
 * by plan, in trend or pressure, that is no scatter.
 */
export const scattersOf = (rows: Rows, given: unknown): BenchScatter[] => {
  const ofCylinders = rows.filter(({ cylinder }) => cylinder !== null)
  return channelNames.flatMap((channel) => [...bySpeed(ofCylinders, channel)].flatMap(([rpm, group]) => {
    if (new Set(group.map(({ cylinder }) => cylinder)).size < 2) return []
    let low = Infinity
    let high = -Infinity
    for (const { deviationDeg } of group) {
      low = Math.min(low, deviationDeg)
      high = Math.max(high, deviationDeg)
    }
    const rangeDeg = finiteResult(high - low, 'readings', given, 'deg')
    return [{ rpm, channel, rangeDeg, sdDeg: finiteResult(sampleSd(group.map(({ deviationDeg }) => deviationDeg)), 'readings', given, 'deg') }]
  }))
}
