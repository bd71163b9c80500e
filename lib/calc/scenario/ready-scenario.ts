import { advanceAt, prepareChannel, type PreparedChannel } from '../advance/prepare-channel'
import type { Trend } from '../advance/advance-types'
import { forChannel } from './part'
import type { ChannelName } from './result-types'
import type { Scenario } from './scenario-types'

/** A scenario whose channels are checked and compiled once and then asked at thousands of speeds. */
export interface ReadyScenario extends Scenario {
  /** Advance of one channel in crank degrees before TDC at a speed (rpm) and manifold pressure (kPa). */
  readonly advance: (channel: ChannelName, rpm: number, mapKpa: number, trend?: Trend) => number
}

/** A channel that cannot be computed with throws where it is first asked for, so that only the parts standing on it fail. */
export function readyScenario({ engine, sheet }: Scenario): ReadyScenario {
  const prepared: Partial<Record<ChannelName, PreparedChannel>> = {}
  return {
    engine, sheet,
    advance: (channel, rpm, mapKpa, trend = 'rising') => forChannel(channel, () => {
      prepared[channel] ??= prepareChannel(sheet[channel], 'channel')
      return advanceAt(prepared[channel], rpm, mapKpa, trend)
    }),
  }
}
