import { proofSpeedRpm } from '../advance/proof-speed'
import { forChannel } from './part'
import type { ChannelName, PerChannel } from './result-types'
import type { ReadyScenario } from './ready-scenario'
import { dependsOnPressure, perChannel } from './speed-points'

/**
 * Lowest speed at which a timing light proves each channel's full timing, rpm, or null. A schedule that follows the manifold
 * pressure is proved at idle only when idle pressure gives full timing too: a timing light sees the engine throttled.
 */
export function proofPart(scenario: ReadyScenario): { rpm: PerChannel<number | null>; toleranceDeg: number } {
  const { engine, sheet } = scenario
  const toleranceDeg = sheet.tolerances.timingCheckDeg
  const provedAt = (channel: ChannelName): number | null => {
    const { idleKpa, fullKpa } = sheet.manifold
    if (dependsOnPressure(sheet[channel])) {
      const full = scenario.advance(channel, engine.maxRpm, fullKpa)
      const throttled = scenario.advance(channel, engine.idleRpm, idleKpa)
      if (Math.abs(throttled - full) > toleranceDeg) return null
    }
    return forChannel(channel, () => proofSpeedRpm(sheet[channel], { idleRpm: engine.idleRpm, maxRpm: engine.maxRpm, toleranceDeg, mapKpa: fullKpa }))
  }
  return { rpm: perChannel(provedAt), toleranceDeg }
}
