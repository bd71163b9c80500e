import type { Channel, Trend } from '../advance/advance-types'

export type ChannelName = 'primary' | 'backup'
export const channelNames: readonly ChannelName[] = ['primary', 'backup']

/** What two channels are meant to do. */
export interface BenchPlan { readonly primary: Channel, readonly backup: Channel }

/** One advance read on a bench or an engine. */
export interface BenchReading {
  /** Nominal speed: readings are grouped by it. */
  readonly rpm: number
  readonly channel: ChannelName
  /** Crank degrees of advance; before `benchReadingsToAdvance`, degrees of the wheel. */
  readonly readDeg: number
  /** Counted from 1; left out where the reading belongs to no one cylinder. */
  readonly cylinder?: number
  readonly mapKpa?: number
  /** Which way the speed was reached; 'rising' when left out. */
  readonly trend?: Trend
}
