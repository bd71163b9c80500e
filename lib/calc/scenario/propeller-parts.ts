import { CalcError } from '../calc-error'
import { deadCylinderPower } from '../dead-cylinder/dead-cylinder-power'
import { frictionMepKpa } from '../dead-cylinder/friction-mep'
import { mepFromPower } from '../dead-cylinder/mean-effective-pressure'
import { brakeRatioFromIndicated } from '../power/brake-ratio'
import { timingTorqueRatio } from '../power/timing-torque'
import { constantSpeedOperatingPoint } from '../propeller/constant-speed'
import { fixedPitchOperatingPoint } from '../propeller/fixed-pitch'
import { runUpDrop } from '../propeller/run-up'
import { withheld } from './part'
import { curvePowerKw, displacementCc, frictionPowerAt, fullThrottleCurve, refuseTwoPlugs, timingRatioOf } from './power-parts'
import type { ChannelName, PropellerPoint, PropellerRow, RunUpExpectation } from './result-types'
import type { ReadyScenario } from './ready-scenario'
import type { Pitch, Scenario } from './scenario-types'
import { perChannel } from './speed-points'

/** Exponents of engine torque against speed at fixed throttle: the expected one and both ends of the band. */
const expectedExponent = -0.5
const bandExponents = [0, expectedExponent, -1]
/** Best torque at run-up comes up to this much earlier than at full throttle: a thin charge burns slower. */
const mostMbtShiftDeg = 10

/** Power a fixed pitch takes at a speed, kW: the cube law through the named point. */
export const pitchLoadKw = (pitch: Pitch, rpm: number) => pitch.kw * (rpm / pitch.rpm) ** 3

/**
 * Expected run-up speed on each channel. Full-load torque ratio → indicated ratio with the mechanical efficiency at full
 * power → brake ratio at the propeller's load at run-up, where friction weighs more → drop.
 */
export function runUpPart(scenario: ReadyScenario) {
  refuseTwoPlugs(scenario)
  const { engine, sheet } = scenario
  const rpm = sheet.runUpRpm
  if (rpm < engine.idleRpm || rpm > engine.maxRpm)
    throw withheld('runUpOutside', 'sheet.runUpRpm', `The run-up speed must lie between idle, ${engine.idleRpm} rpm, and full power, ${engine.maxRpm} rpm.`, rpm, `${engine.idleRpm} … ${engine.maxRpm}`)
  const { points } = fullThrottleCurve(engine)
  const fullKw = curvePowerKw(points, engine.maxRpm)
  if (fullKw === null || fullKw <= 0) throw withheld('noTorque', 'engine.powerCurve', 'The power curve does not reach the full-power speed.', engine.maxRpm)
  const mechanicalEfficiency = fullKw / (fullKw + frictionPowerAt(engine, engine.maxRpm))
  const advance = perChannel((channel) => scenario.advance(channel, rpm, sheet.manifold.runUpKpa))
  const base = sheet.selection === 'both' ? Math.max(advance.primary, advance.backup) : advance.primary
  const fullLoadRatio = (channel: ChannelName, shiftDeg: number) => {
    const mbt = { mbtDeg: sheet.mbt.deg + shiftDeg, curvaturePerDeg2: sheet.mbt.curvaturePerDeg2 }
    const reference = timingTorqueRatio(mbt, base)
    if (reference <= 0) throw withheld('noTorque', 'sheet.mbt', 'At the run-up timing this best-torque timing and loss leave no torque.', base)
    return timingTorqueRatio(mbt, advance[channel]) / reference
  }
  const cc = displacementCc(engine)
  const ratedFrictionMep = mepFromPower({ powerKw: frictionPowerAt(engine, engine.ratedRpm), displacementCc: cc, rpm: engine.ratedRpm })
  const fmepKpa = ratedFrictionMep * (frictionMepKpa({ rpm }) / frictionMepKpa({ rpm: engine.ratedRpm }))
  const expectation = (channel: ChannelName, loadKw: number): RunUpExpectation => {
    const imepKpa = mepFromPower({ powerKw: loadKw, displacementCc: cc, rpm }) + fmepKpa
    const at = (shiftDeg: number, torqueExponent: number) => {
      const indicatedRatio = 1 - (1 - fullLoadRatio(channel, shiftDeg)) * mechanicalEfficiency
      return runUpDrop({ rpm, torqueRatio: brakeRatioFromIndicated({ indicatedRatio, imepKpa, fmepKpa }), torqueExponent })
    }
    const band = Array.from({ length: mostMbtShiftDeg + 1 }, (_, shift) => bandExponents.map((exponent) => at(shift, exponent).rpm)).flat()
    return { ...at(0, expectedExponent), lowRpm: Math.min(...band), highRpm: Math.max(...band) }
  }
  return {
    torqueRatio: perChannel((channel) => fullLoadRatio(channel, 0)),
    rows: sheet.propeller.pitches.map((pitch) => {
      const loadKw = pitchLoadKw(pitch, rpm)
      return { pitch: pitch.name, loadKw, ...perChannel((channel) => expectation(channel, loadKw)) }
    }),
  }
}

/** Where full throttle meets the propeller: on either channel, and on the primary with one cylinder cold; standard sea level. */
export function propellerPart(scenario: ReadyScenario): { rows: PropellerRow[] } {
  refuseTwoPlugs(scenario)
  const { engine, sheet } = scenario
  const { points } = fullThrottleCurve(engine)
  const ratioOf = timingRatioOf(scenario)
  const onChannel = (channel: ChannelName) => (rpm: number) => ratioOf(channel, rpm)
  const oneCold = (rpm: number) => {
    const brakePowerKw = curvePowerKw(points, rpm)
    if (brakePowerKw === null || brakePowerKw <= 0) return 0
    const left = deadCylinderPower({
      cylinders: engine.cylinders, dead: 1, brakePowerKw, frictionPowerKw: frictionPowerAt(engine, rpm), timingRatio: ratioOf('primary', rpm),
    })
    return Math.max(0, left.fraction)
  }
  const { kind, governedRpm, pitches } = sheet.propeller
  const operatingPoint = (index: number, fraction: (rpm: number) => number) => propellerPointOf(scenario, index, fraction, 1)
  const settings = kind === 'constantSpeed' && governedRpm !== null ? pitches.slice(0, 1) : pitches
  return {
    rows: settings.map((pitch, i) => ({
      pitch: pitch.name,
      primary: operatingPoint(i, onChannel('primary')),
      backup: operatingPoint(i, onChannel('backup')),
      oneCold: operatingPoint(i, oneCold),
    })),
  }
}

/** Where a share of the full-throttle power (by speed, its lapse included) meets one pitch at a density ratio; null where it never does. */
export function propellerPointOf({ engine, sheet }: Scenario, pitchIndex: number, fraction: (rpm: number) => number, densityRatio: number): PropellerPoint | null {
  const { kind, governedRpm, pitches } = sheet.propeller
  const loadAt = (index: number) => {
    const pitch = pitches[index]
    return pitch && { rpm: pitch.rpm, kw: pitch.kw, densityRatio: 1 }
  }
  const powerCurve = fullThrottleCurve(engine).points
  return orNone(() => {
    const load = loadAt(pitchIndex)
    if (!load) return null
    if (kind === 'fixedPitch' || governedRpm === null) return { ...fixedPitchOperatingPoint({ powerCurve, fraction, load, densityRatio }), governed: null }
    const high = loadAt(pitchIndex + 1)
    return constantSpeedOperatingPoint({ powerCurve, fraction, densityRatio, governedRpm, lowPitchLoad: load, ...(high ? { highPitchLoad: high } : {}) })
  })
}

/** An engine that never meets this propeller on its curve is a result, not a fault of the input. */
function orNone(compute: () => PropellerPoint | null): PropellerPoint | null {
  try {
    return compute()
  } catch (error) {
    if (error instanceof CalcError) return null
    throw error
  }
}
