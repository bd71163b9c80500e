import { arcMm } from '../angle/arc'
import { msFromCrankDeg } from '../angle/crank-time'
import { distributorDegFromCrank } from '../angle/distributor'
import { advanceCurve } from '../advance/advance-curve'
import type { Channel } from '../advance/advance-types'
import { forChannel, part } from './part'
import type { ChannelName, CurvePoint, MarkedSpeed, PerChannel, SpeedPoint, StaggerPoint } from './result-types'
import { readyScenario, type ReadyScenario } from './ready-scenario'
import type { Scenario } from './scenario-types'

export const channelNames = ['primary', 'backup'] as const satisfies readonly ChannelName[]

/** Samples of a drawn curve over the whole speed range; jumps come on top. */
export const curveSamples = 121

export const perChannel = <T>(compute: (channel: ChannelName) => T): PerChannel<T> => ({ primary: compute('primary'), backup: compute('backup') })

/** True where the timing asks for the manifold pressure. */
export const dependsOnPressure = ({ schedule }: Channel): boolean =>
  schedule.kind === 'map' || (schedule.kind === 'formula' && /\bmap\b/.test(schedule.expression))

/** A stagger in all its units; the arc stands at the trigger plate's radius over distributor degrees. */
export function staggerPoint({ sheet }: Scenario, rpm: number, staggerDeg: number): StaggerPoint {
  const staggerDistributorDeg = distributorDegFromCrank(staggerDeg)
  const radius = sheet.rotor.plateRadiusMm
  return {
    rpm, staggerDeg,
    staggerMs: msFromCrankDeg(staggerDeg, rpm),
    staggerDistributorDeg,
    plateArcMm: radius === null ? null : arcMm(2 * radius, staggerDistributorDeg),
  }
}

/** Where both channels fire at one speed, at full-throttle pressure unless told otherwise, engine speeding up. */
export const speedPointAt = (scenario: Scenario, rpm: number, mapKpa = scenario.sheet.manifold.fullKpa): SpeedPoint =>
  speedPoint(readyScenario(scenario), rpm, mapKpa)

/** The same, or null where a channel cannot be computed at this speed. */
export function findSpeedPoint(scenario: Scenario, rpm: number): SpeedPoint | null {
  const found = part(() => speedPointAt(scenario, rpm))
  return found.ok ? found : null
}

function speedPoint(scenario: ReadyScenario, rpm: number, mapKpa: number): SpeedPoint {
  const primaryDeg = scenario.advance('primary', rpm, mapKpa)
  const backupDeg = scenario.advance('backup', rpm, mapKpa)
  return { ...staggerPoint(scenario, rpm, primaryDeg - backupDeg), primaryDeg, backupDeg }
}

/** The four marked speeds, each at its own manifold pressure (cranking with the throttle cracked: full pressure). */
export function markedPoints(scenario: ReadyScenario): Record<MarkedSpeed, SpeedPoint> {
  const { engine, sheet } = scenario
  const { idleKpa, runUpKpa, fullKpa } = sheet.manifold
  return {
    cranking: speedPoint(scenario, engine.crankingRpm, fullKpa),
    idle: speedPoint(scenario, engine.idleRpm, idleKpa),
    runUp: speedPoint(scenario, sheet.runUpRpm, runUpKpa),
    full: speedPoint(scenario, engine.maxRpm, fullKpa),
  }
}

/** Advance curves from the slowest cranking to full power; the falling one only where hysteresis sets it apart. */
export function advanceCurves(scenario: Scenario): { rising: PerChannel<CurvePoint[]>; falling: PerChannel<CurvePoint[] | null> } {
  const { engine, sheet } = scenario
  const curve = (channel: ChannelName, trend: 'rising' | 'falling') => forChannel(channel, () => advanceCurve(sheet[channel], {
    fromRpm: engine.crankingSlowestRpm, toRpm: engine.maxRpm, points: curveSamples, mapKpa: sheet.manifold.fullKpa, trend,
  }))
  const hasHysteresis = (channel: ChannelName) => {
    const retard = sheet[channel].crankRetard
    return retard !== undefined && retard.byDeg > 0 && (retard.hysteresisRpm ?? 0) > 0
  }
  return {
    rising: perChannel((channel) => curve(channel, 'rising')),
    falling: perChannel((channel) => (hasHysteresis(channel) ? curve(channel, 'falling') : null)),
  }
}

/** Stagger along two curves; a jump of either channel gives two points of one speed. */
export function staggerCurve(scenario: ReadyScenario, rising: PerChannel<CurvePoint[]>): StaggerPoint[] {
  const speeds = [...new Set([...rising.primary, ...rising.backup].map((point) => point.rpm))].sort((left, right) => left - right)
  const sidesOf = (channel: ChannelName) => {
    const byRpm = new Map<number, number[]>()
    for (const { rpm, deg } of rising[channel]) byRpm.set(rpm, [...(byRpm.get(rpm) ?? []), deg])
    return (rpm: number): number[] => byRpm.get(rpm) ?? [scenario.advance(channel, rpm, scenario.sheet.manifold.fullKpa)]
  }
  const primary = sidesOf('primary')
  const backup = sidesOf('backup')
  return speeds.flatMap((rpm) => {
    const a = primary(rpm)
    const b = backup(rpm)
    const sides = Math.max(a.length, b.length)
    return Array.from({ length: sides }, (_, side) => staggerPoint(scenario, rpm, (a[side] ?? a[0] ?? 0) - (b[side] ?? b[0] ?? 0)))
  })
}
