import { deadCylinderPower } from '../dead-cylinder/dead-cylinder-power'
import { frictionMepKpa } from '../dead-cylinder/friction-mep'
import { mepFromPower, powerFromMep } from '../dead-cylinder/mean-effective-pressure'
import { timingTorqueRatio } from '../power/timing-torque'
import { withheld } from './part'
import type { ChannelName, DeadCylinderRow, PowerPoint } from './result-types'
import type { ReadyScenario } from './ready-scenario'
import type { Engine, Scenario } from './scenario-types'
import { channelNames, curveSamples, perChannel } from './speed-points'

export const displacementCc = ({ cylinders, boreMm, strokeMm }: Pick<Engine, 'cylinders' | 'boreMm' | 'strokeMm'>): number => (cylinders * Math.PI * boreMm ** 2 * strokeMm) / 4000

/** kW to Nm at a speed: 60 000 / (2π). */
const nmPerKwRpm = 30_000 / Math.PI

/** The full-throttle power curve; where none was given, constant torque through the rated power, up to a fifth beyond full power. */
export function fullThrottleCurve(engine: Engine): { points: { rpm: number; kw: number }[]; assumed: boolean } {
  if (engine.powerCurve.length > 1) return { points: engine.powerCurve, assumed: false }
  const at = (rpm: number) => ({ rpm, kw: (engine.ratedPowerKw * rpm) / engine.ratedRpm })
  return { points: [at(engine.idleSlowestRpm), at(engine.maxRpm * 1.2)], assumed: true }
}

/** Power on the curve at a speed, linear between points, null outside it. */
export function curvePowerKw(points: readonly { rpm: number; kw: number }[], rpm: number): number | null {
  const after = points.findIndex((point) => point.rpm >= rpm)
  const high = points[after]
  if (!high) return null
  if (high.rpm === rpm) return high.kw
  const low = points[after - 1]
  return low ? low.kw + ((high.kw - low.kw) * (rpm - low.rpm)) / (high.rpm - low.rpm) : null
}

/** Friction power in kW at a speed: the engine's own at rated power, carried to other speeds along Heywood's curve. */
export function frictionPowerAt(engine: Engine, rpm: number): number {
  const rated = engine.friction.kind === 'power'
    ? engine.friction.frictionPowerKw
    : engine.ratedPowerKw * (1 / engine.friction.mechanicalEfficiency - 1)
  if (rated === 0 || rpm === engine.ratedRpm) return rated
  const cc = displacementCc(engine)
  const ratedMep = mepFromPower({ powerKw: rated, displacementCc: cc, rpm: engine.ratedRpm })
  return powerFromMep({ mepKpa: ratedMep * (frictionMepKpa({ rpm }) / frictionMepKpa({ rpm: engine.ratedRpm })), displacementCc: cc, rpm })
}

/** Torque at a channel's timing over the torque at the timing the power was measured with, by speed, full throttle. */
export function timingRatioOf(scenario: ReadyScenario): (channel: ChannelName, rpm: number) => number {
  const { engine, sheet } = scenario
  const mbt = { mbtDeg: sheet.mbt.deg, curvaturePerDeg2: sheet.mbt.curvaturePerDeg2 }
  const reference = timingTorqueRatio(mbt, engine.powerTimingDeg)
  if (reference <= 0) throw withheld('noTorque', 'engine.powerTimingDeg', 'With this best-torque timing and loss the engine makes no torque at the timing its power was measured with.', engine.powerTimingDeg)
  return (channel, rpm) => timingTorqueRatio(mbt, scenario.advance(channel, rpm, sheet.manifold.fullKpa)) / reference
}

export function refuseTwoPlugs({ sheet }: Scenario): void {
  if (sheet.plugsPerCylinder === 2)
    throw withheld('twoPlugs', 'sheet.plugsPerCylinder', 'With two plugs in a cylinder both channels burn the charge together; these models hold for one plug.', 2)
}

/** Full-throttle power and torque at each channel's timing. */
export function powerPart(scenario: ReadyScenario) {
  refuseTwoPlugs(scenario)
  const { engine, sheet } = scenario
  const { points, assumed } = fullThrottleCurve(engine)
  const ratioOf = timingRatioOf(scenario)
  const powerAt = (rpm: number): PowerPoint | null => {
    const kw = curvePowerKw(points, rpm)
    if (kw === null) return null
    const primaryKw = kw * ratioOf('primary', rpm)
    const backupKw = kw * ratioOf('backup', rpm)
    return { rpm, primaryKw, backupKw, primaryNm: (primaryKw * nmPerKwRpm) / rpm, backupNm: (backupKw * nmPerKwRpm) / rpm }
  }
  const from = Math.max(engine.idleRpm, points[0]?.rpm ?? 0)
  const curve = Array.from({ length: curveSamples }, (_, i) => powerAt(from + ((engine.maxRpm - from) * i) / (curveSamples - 1)))
    .filter((point) => point !== null)
  const atMax = powerAt(engine.maxRpm)
  if (!atMax) throw withheld('noTorque', 'engine.powerCurve', 'The power curve does not reach the full-power speed.', engine.maxRpm)
  const ratio = perChannel((channel) => ratioOf(channel, engine.maxRpm))
  if (ratio.primary <= 0) throw withheld('noTorque', 'sheet.primary.schedule', 'At this timing the primary leaves no torque at full power.')
  return {
    curve, atMax, curveAssumed: assumed,
    backupToPrimary: ratio.backup / ratio.primary,
    shortOfMbtDeg: perChannel((channel) => sheet.mbt.deg - scenario.advance(channel, engine.maxRpm, sheet.manifold.fullKpa)),
  }
}

/** Power left with 0…N dead cylinders on either channel, full throttle at full-power speed. */
export function deadCylindersPart(scenario: ReadyScenario) {
  refuseTwoPlugs(scenario)
  const { engine } = scenario
  const rpm = engine.maxRpm
  const brakePowerKw = curvePowerKw(fullThrottleCurve(engine).points, rpm)
  if (brakePowerKw === null) throw withheld('noTorque', 'engine.powerCurve', 'The power curve does not reach the full-power speed.', rpm)
  const frictionPowerKw = frictionPowerAt(engine, rpm)
  const ratioOf = timingRatioOf(scenario)
  const ratio = perChannel((channel) => ratioOf(channel, rpm))
  const rows = Array.from({ length: engine.cylinders + 1 }, (_, dead): DeadCylinderRow => {
    const [primary, backup] = channelNames.map((channel) => {
      const left = deadCylinderPower({ cylinders: engine.cylinders, dead, brakePowerKw, frictionPowerKw, timingRatio: ratio[channel] })
      return { kw: left.brakePowerKw, fraction: left.fraction }
    })
    return { dead, primary: primary ?? { kw: 0, fraction: 0 }, backup: backup ?? { kw: 0, fraction: 0 } }
  })
  return { rpm, frictionPowerKw, rows }
}
