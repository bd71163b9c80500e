import { densityAltitudeM } from '../air/density-altitude'
import { powerAtDensityRatio } from '../air/lapsed-power'
import { standardAtmosphere } from '../air/standard-atmosphere'
import { rootBetween } from '../shared/root-between'
import { bestClimb } from '../climb/best-climb'
import { deadCylinderPower } from '../dead-cylinder/dead-cylinder-power'
import { curvePowerKw, frictionPowerAt, fullThrottleCurve, refuseTwoPlugs, timingRatioOf } from './power-parts'
import { propellerPointOf } from './propeller-parts'
import type { ClimbRow } from './result-types'
import type { ReadyScenario } from './ready-scenario'

/** A climb or descent of at most this counts as level, m/s. */
const levelBandMps = 0.25
const lowestM = -1000
const highestM = 11_000
/** Ceilings are settled to this, m. */
const settledM = 0.5

/**
 * Climb at the planned place on either channel and with one cylinder cold. The whole chain at each density: power lapses first,
 * then the cold cylinder with its friction unlapsed, then the propeller, then the aeroplane; the ceiling solves that chain.
 */
export function climbPart(scenario: ReadyScenario): { densityAltitudeM: number; densityRatio: number; rows: ClimbRow[] } {
  refuseTwoPlugs(scenario)
  const { engine, sheet } = scenario
  const { minSpeedMps, ...aeroplane } = sheet.airframe
  const { points } = fullThrottleCurve(engine)
  const ratioOf = timingRatioOf(scenario)
  const place = densityAltitudeM(sheet.conditions)

  /** Share of the full-throttle power that is left at full density, and how fast it falls with the lapse: what is left is linear in it, friction does not lapse. */
  const lineOf = (state: ClimbRow['state'], rpm: number): { left: number; perLapse: number } => {
    const fullKw = curvePowerKw(points, rpm)
    if (fullKw === null || fullKw <= 0) return { left: 0, perLapse: 0 }
    const timingRatio = ratioOf(state === 'backup' ? 'backup' : 'primary', rpm)
    if (state !== 'oneCold') return { left: timingRatio, perLapse: timingRatio }
    const at = (brakePowerKw: number) => deadCylinderPower({ cylinders: engine.cylinders, dead: 1, brakePowerKw, frictionPowerKw: frictionPowerAt(engine, rpm), timingRatio }).brakePowerKw / fullKw
    const left = at(fullKw)
    return { left, perLapse: 2 * (left - at(fullKw / 2)) }
  }
  // The same speeds are asked for at every density.
  const lines = { primary: new Map<number, ReturnType<typeof lineOf>>(), backup: new Map<number, ReturnType<typeof lineOf>>(), oneCold: new Map<number, ReturnType<typeof lineOf>>() }
  const shareOf = (state: ClimbRow['state'], lapse: number) => (rpm: number): number => {
    let line = lines[state].get(rpm)
    if (!line) {
      line = lineOf(state, rpm)
      lines[state].set(rpm, line)
    }
    return Math.max(0, line.left - (1 - lapse) * line.perLapse)
  }
  const flightAt = (state: ClimbRow['state'], altitudeM: number) => {
    const { densityRatio, densityKgM3 } = standardAtmosphere({ altitudeM })
    const lapse = Math.max(0, powerAtDensityRatio(densityRatio))
    const met = propellerPointOf(scenario, 0, shareOf(state, lapse), densityRatio)
    const kw = Math.max(0, met?.kw ?? 0)
    // A speed above the stall is one through the air: the thinner it is, the faster.
    return { rpm: met?.rpm ?? 0, kw, ...bestClimb({ ...aeroplane, densityKgM3, brakePowerKw: kw, minSpeedMps: minSpeedMps / Math.sqrt(densityRatio) }) }
  }
  const rowOf = (state: ClimbRow['state']): ClimbRow => {
    const { rpm, kw, speedMps, climbMps } = flightAt(state, place)
    return {
      state, rpm, powerKw: kw, speedMps, climbMps,
      verdict: climbMps > levelBandMps ? 'climbs' : climbMps < -levelBandMps ? 'descends' : 'level',
      ceilingM: ceilingOf((altitudeM) => flightAt(state, altitudeM).climbMps),
    }
  }
  const { densityRatio } = standardAtmosphere({ altitudeM: place })
  return { densityAltitudeM: place, densityRatio, rows: (['primary', 'backup', 'oneCold'] as const).map(rowOf) }
}

/** Density altitude of no climb; null when it climbs or sinks at every one. */
function ceilingOf(climbAt: (altitudeM: number) => number): number | null {
  const [atLow, atHigh] = [climbAt(lowestM), climbAt(highestM)]
  if (atLow <= 0 || atHigh >= 0) return null
  return rootBetween(climbAt, lowestM, highestM, settledM, { close: 1e-4, atFrom: atLow, atTo: atHigh })
}
