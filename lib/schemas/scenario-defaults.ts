import type { Engine, ScenarioSheet } from '../calc/live'
import { statedDefaults } from './stated-defaults'

/** Middle of the published curvatures (1.8e-4 to 4e-4 per degree²). */
const defaultCurvature = 3e-4

/** Least advance that can be typed anywhere. */
const lowestDeg = -20

const roundTo = (value: number, step: number) => Math.round(value / step) * step

/**
 * The sheet a new scenario starts with: nothing in it is claimed of the engine. Both channels fixed, the primary at the timing the
 * power was measured with, the backup 8° later; best torque a guess 8° before planned timing, as for engines held short of it by detonation.
 */
export function startingSheet(engine: Engine): ScenarioSheet {
  const primaryDeg = engine.powerTimingDeg
  const backupDeg = Math.max(lowestDeg, primaryDeg - 8)
  const phased = (deg: number) => Math.max(lowestDeg, roundTo(deg - 6, 1))
  const { tolerances, ...others } = statedDefaults()
  return {
    ...others,
    distribution: 'sharedCap',
    plugsPerCylinder: 1,
    selection: 'oneAtATime',
    primary: { schedule: { kind: 'fixed', deg: primaryDeg }, latencyUs: 0 },
    backup: { schedule: { kind: 'fixed', deg: backupDeg }, latencyUs: 0 },
    mbt: { deg: Math.min(60, Math.max(0, primaryDeg + 8)), curvaturePerDeg2: defaultCurvature, provenance: 'guess', note: '' },
    propeller: { kind: 'fixedPitch', governedRpm: null, pitches: [{ name: 'as fitted', rpm: engine.maxRpm, kw: roundTo(engine.ratedPowerKw, 0.1) }] },
    runUpRpm: roundTo(engine.idleRpm + (engine.maxRpm - engine.idleRpm) * 0.45, 50),
    manifold: { idleKpa: 40, runUpKpa: 65, fullKpa: 98 },
    rotor: {
      terminalWidthDeg: 12, rotorWidthDeg: 24, phasedAtDeg: phased((primaryDeg + backupDeg) / 2), backupPhasedAtDeg: phased(backupDeg),
      sparkDurationMs: 1.5, mechanicalCarriesRotor: true, plateRadiusMm: null,
    },
    tolerances: { timingCheckDeg: 1, benchDeg: 0.5, ...tolerances },
    notes: '',
  }
}
