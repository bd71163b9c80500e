import { crankDegFromMs } from '../angle/crank-time'
import { bestPhasingDeg } from '../rotor/best-phasing'
import { rotorRegister } from '../rotor/rotor-register'
import { withheld } from './part'
import type { ChannelName, CurvePoint, PerChannel, RegisterRow } from './result-types'
import type { ReadyScenario } from './ready-scenario'
import type { Scenario } from './scenario-types'
import { perChannel } from './speed-points'

const isEven = (intervalsDeg: number[] | null) => !intervalsDeg || intervalsDeg.every((value) => Math.abs(value - (intervalsDeg[0] ?? 0)) < 1e-6)

/**
 * Crank degrees by which a mechanical advance has turned a channel's rotor at a speed: the rotor goes with its trigger,
 * so a spark at advance a finds it as if it came at a minus this. On a shared cap the primary's mechanism turns the one rotor.
 */
function carriedDeg({ sheet }: Scenario, channel: ChannelName, rpm: number): number {
  if (!sheet.rotor.mechanicalCarriesRotor) return 0
  const carriers: ChannelName[] = sheet.distribution === 'sharedCap' ? ['primary', 'backup'] : [channel]
  for (const carrier of carriers) {
    const { schedule } = sheet[carrier]
    if (schedule.kind !== 'mechanical') continue
    const way = Math.min(1, Math.max(0, (rpm - schedule.startRpm) / (schedule.fullRpm - schedule.startRpm)))
    return (schedule.fullDeg - schedule.initialDeg) * way
  }
  return 0
}

/** Register of rotor and terminal from the spark's start to its end, at the worst speed of each channel. Distributor degrees. */
export function registerPart(scenario: ReadyScenario, curves: PerChannel<CurvePoint[]>[]): { worst: PerChannel<RegisterRow>; bestPhasingDeg: PerChannel<number> } {
  const { engine, sheet } = scenario
  if (sheet.distribution === 'directCoils') throw withheld('noRotor', 'sheet.distribution', 'Direct coils have no rotor.')
  if (!isEven(engine.intervalsDeg)) throw withheld('unevenCap', 'engine.intervalsDeg', 'The register is worked out for terminals spaced evenly round the cap; this engine fires unevenly.')
  const { rotor } = sheet
  const sparksOf = (channel: ChannelName) => {
    const atPressures = [sheet.manifold.idleKpa, sheet.manifold.runUpKpa]
      .map((kpa, i) => ({ rpm: i === 0 ? engine.idleRpm : sheet.runUpRpm, kpa }))
      .map(({ rpm, kpa }) => ({ rpm, deg: scenario.advance(channel, rpm, kpa) }))
    return [...curves.flatMap((curve) => curve[channel]), ...atPressures].map(({ rpm, deg }) => {
      const start = deg - carriedDeg(scenario, channel, rpm)
      return { rpm, advanceDeg: deg, start, end: start - crankDegFromMs(rotor.sparkDurationMs, rpm) }
    })
  }
  // The offset is largest at the earliest start or the latest end of a spark: the ones between cannot be worse.
  const extremes = perChannel((channel) => {
    const sparks = sparksOf(channel)
    return [
      sparks.reduce((earliest, spark) => (spark.start > earliest.start + 1e-12 ? spark : earliest)),
      sparks.reduce((latest, spark) => (spark.end < latest.end - 1e-12 ? spark : latest)),
    ]
  })
  const phasedAtDeg = (channel: ChannelName) => (channel === 'backup' && sheet.distribution === 'capEach' ? rotor.backupPhasedAtDeg : rotor.phasedAtDeg)
  const worstOf = (channel: ChannelName): RegisterRow => {
    const rows = rotorRegister({
      cylinders: engine.cylinders, terminalWidthDeg: rotor.terminalWidthDeg, rotorWidthDeg: rotor.rotorWidthDeg, phasedAtDeg: phasedAtDeg(channel),
      advancesDeg: extremes[channel].flatMap(({ start, end }) => [start, end]),
    })
    let worst: RegisterRow | null = null
    extremes[channel].forEach(({ rpm, advanceDeg }, i) => {
      const start = rows[2 * i]
      const end = rows[2 * i + 1]
      if (!start || !end) return
      const registerDeg = Math.min(start.registerDeg, end.registerDeg)
      if (worst && registerDeg >= worst.registerDeg) return
      worst = { rpm, advanceDeg, startOffsetDeg: start.offsetDeg, endOffsetDeg: end.offsetDeg, registerDeg, freeDeg: Math.min(start.freeDeg, end.freeDeg) }
    })
    if (!worst) throw withheld('noRotor', 'sheet.rotor', 'No spark to judge.')
    return worst
  }
  const best = (channels: ChannelName[]) => bestPhasingDeg(channels.flatMap((channel) => extremes[channel].flatMap(({ start, end }) => [start, end])))
  return {
    worst: perChannel(worstOf),
    bestPhasingDeg: perChannel((channel) => best(sheet.distribution === 'sharedCap' ? ['primary', 'backup'] : [channel])),
  }
}

/** Leads on the cap against the firing order, in the rotor's direction of rotation. */
export function leadsPart({ engine, sheet }: Scenario): { expected: number[]; actual: number[]; outOfPlace: number } {
  if (sheet.distribution === 'directCoils') throw withheld('noRotor', 'sheet.distribution', 'Direct coils have no cap.')
  const { firingOrder, capTerminals, distributorRotation } = engine
  const start = capTerminals.indexOf(firingOrder[0] ?? 0)
  const count = capTerminals.length
  const step = distributorRotation === 'clockwise' ? 1 : count - 1
  const actual = Array.from({ length: count }, (_, i) => capTerminals[(start + i * step) % count] ?? 0)
  return { expected: firingOrder, actual, outOfPlace: actual.filter((cylinder, i) => cylinder !== firingOrder[i]).length }
}
