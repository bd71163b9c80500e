import type * as calc from '@/lib/calc'
import { fixed, formula, mapSchedule, mechanicalSchedule, retard, table } from './advance/channels'
import { airCalls } from './air/valid-calls'
import { benchCalls } from './bench/valid-calls'
import { checkCalls } from './checks/valid-calls'
import { climbCalls } from './climb/valid-calls'
import { coilCalls } from './coil/valid-calls'
import { cycleCalls } from './cycle/valid-calls'
import { geometryCalls } from './geometry/valid-calls'
import { redundancyCalls } from './redundancy/valid-calls'
import { sparkCalls } from './spark/valid-calls'
import { statisticsCalls } from './statistics/valid-calls'

type Functions = { [Name in keyof typeof calc as (typeof calc)[Name] extends (...args: never[]) => unknown ? Name : never]: (typeof calc)[Name] }
export type Calls = { [Name in keyof Functions]?: readonly Parameters<Functions[Name]>[] }

const full = { crankRetard: retard, latencyUs: 40 }
const powerCurve = [{ rpm: 1000, kw: 30 }, { rpm: 2000, kw: 62 }, { rpm: 3000, kw: 84 }]
const load = { rpm: 2780, kw: 80, densityRatio: 1 }

/** Calls that compute, at least one a function: the walk spoils them one value at a time. */
export const validCalls: Calls = {
  ...cycleCalls,
  crankDegFromMs: [[1, 2000]],
  msFromCrankDeg: [[20, 2000]],
  distributorDegFromCrank: [[20]],
  crankDegFromDistributor: [[10]],
  arcMm: [[150, 10]],
  degFromArcMm: [[150, 10]],
  firingSchedule: [[{ firingOrder: [1, 3, 2] }], [{ firingOrder: [1, 2], intervalsDeg: [300, 420] }]],
  sparkAdvanceDeg: [
    [fixed(20, full), { rpm: 900, trend: 'falling' }],
    [{ schedule: mechanicalSchedule }, { rpm: 900 }],
    [table([[500, 5], [2000, 25]]), { rpm: 900 }],
    [{ schedule: mapSchedule }, { rpm: 900, mapKpa: 60 }],
    [formula('max(5, 25 - map / 10) + sqrt(rpm) / 100'), { rpm: 900, mapKpa: 60 }],
  ],
  staggerDeg: [[fixed(20, full), { schedule: mapSchedule }, { rpm: 900, mapKpa: 60, trend: 'rising' }]],
  advanceCurve: [[table([[500, 5], [2000, 25]], full), { fromRpm: 100, toRpm: 2700, points: 5, mapKpa: 60, trend: 'falling' }]],
  proofSpeedRpm: [
    [{ schedule: mapSchedule, ...full }, { idleRpm: 700, maxRpm: 2700, toleranceDeg: 1, mapKpa: 60 }],
    [formula('rpm / 100', full), { idleRpm: 700, maxRpm: 2700, toleranceDeg: 1 }],
  ],
  staggerReport: [
    [fixed(20, full), { schedule: mapSchedule }, { crankingRpm: 150, idleRpm: 700, maxRpm: 2700, mapKpa: 60, plateRadiusMm: 30, trend: 'rising' }],
    [formula('rpm / 100'), fixed(5), { crankingRpm: 150, idleRpm: 700, maxRpm: 2700 }],
  ],
  timingTorqueRatio: [[{ mbtDeg: 30, curvaturePerDeg2: 3e-4 }, 20]],
  curvatureFromPoint: [[{ mbtDeg: 30, sparkDeg: 20, ratio: 0.97 }]],
  fitTimingParabola: [[[{ sparkDeg: 20, torque: 190 }, { sparkDeg: 25, torque: 200 }, { sparkDeg: 30, torque: 199 }, { sparkDeg: 35, torque: 180 }]]],
  brakeRatioFromIndicated: [[{ indicatedRatio: 0.9, imepKpa: 600, fmepKpa: 150 }]],
  deadCylinderPower: [
    [{ cylinders: 6, dead: 1, brakePowerKw: 80, mechanicalEfficiency: 0.83, extraDragKwPerDead: 1, timingRatio: 0.95 }],
    [{ cylinders: 6, dead: 1, brakePowerKw: 80, frictionPowerKw: 16 }],
  ],
  morseTest: [[{ allFiringKw: 60, cutOutKw: [40, 41, 39, 42] }]],
  frictionMepKpa: [[{ rpm: 2500 }]],
  mepFromPower: [[{ powerKw: 60, displacementCc: 2600, rpm: 2500 }]],
  powerFromMep: [[{ mepKpa: 900, displacementCc: 2600, rpm: 2500 }]],
  fixedPitchOperatingPoint: [[{ powerCurve, fraction: 0.95, load, densityRatio: 0.9 }], [{ powerCurve, fraction: (rpm) => 1 - rpm / 1e5, load, densityRatio: 1 }]],
  constantSpeedOperatingPoint: [[{ powerCurve, fraction: 0.9, densityRatio: 1, governedRpm: 2500, lowPitchLoad: { ...load, kw: 50 }, highPitchLoad: load }]],
  runUpDrop: [[{ rpm: 1800, torqueRatio: 0.95, torqueExponent: -0.5 }]],
  torqueRatioFromDrop: [[{ rpm: 1800, dropRpm: 50, torqueExponent: -0.5 }]],
  rotorRegister: [[{ cylinders: 6, terminalWidthDeg: 8, rotorWidthDeg: 20, phasedAtDeg: 20, advancesDeg: [25, 15] }]],
  bestPhasingDeg: [[[25, 15]]],
  ...geometryCalls,
  ...redundancyCalls,
  ...airCalls,
  ...climbCalls,
  ...coilCalls,
  ...sparkCalls,
  ...statisticsCalls,
  ...benchCalls,
  ...checkCalls,
}
