import type { ReadyScenario } from './ready-scenario'
import { channelNames } from './speed-points'

/** Speeds evenly spaced from half of full power up. */
const evenSpeeds = 6
/** Between them the advance is looked at this often, rpm. */
const stepRpm = 10
/** An advance that rises this far above the straight line between two of them is looked at too, crank degrees. */
const bulgeDeg = 0.25

/**
 * Speeds at which detonation is looked at, ascending, full power last. A schedule may have its top between two even ones: there the margin is least,
 * so the speed at which it bulges most above the line between them stands among them, for either channel.
 */
export function lookedSpeeds({ engine, sheet, advance }: ReadyScenario): number[] {
  const fromRpm = Math.max(engine.idleRpm, engine.maxRpm / 2)
  const even = Array.from({ length: evenSpeeds }, (_, i) => (i === evenSpeeds - 1 ? engine.maxRpm : fromRpm + ((engine.maxRpm - fromRpm) * i) / (evenSpeeds - 1)))
  const tops = even.slice(1).flatMap((highRpm, i) => channelNames.flatMap((channel) => {
    const lowRpm = even[i] ?? highRpm
    const degAt = (rpm: number) => advance(channel, rpm, sheet.manifold.fullKpa)
    const [low, high] = [degAt(lowRpm), degAt(highRpm)]
    let top = { rpm: lowRpm, bulge: bulgeDeg }
    for (let rpm = lowRpm + stepRpm; rpm < highRpm; rpm += stepRpm) {
      const bulge = degAt(rpm) - low - ((high - low) * (rpm - lowRpm)) / (highRpm - lowRpm)
      if (bulge > top.bulge) top = { rpm, bulge }
    }
    return top.rpm > lowRpm ? [top.rpm] : []
  }))
  return [...new Set([...even, ...tops])].sort((left, right) => left - right)
}
