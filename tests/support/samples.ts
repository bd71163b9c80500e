import type { Engine, ScenarioSheet } from '@/lib/calc/scenario/scenario-types'

/** An invented flat six, as a shop would type it. */
export const sampleEngine = (change: Partial<Engine> = {}): Engine => ({
  cylinders: 6, firingOrder: [1, 4, 5, 2, 3, 6], intervalsDeg: null,
  boreMm: 90, strokeMm: 68, rodMm: 133, compressionRatio: 8.2,
  ratedPowerKw: 50, ratedRpm: 2780, powerTimingDeg: 26,
  powerCurve: [{ rpm: 1200, kw: 20 }, { rpm: 1800, kw: 32.5 }, { rpm: 2400, kw: 44 }, { rpm: 2780, kw: 50 }, { rpm: 3200, kw: 54 }],
  friction: { kind: 'efficiency', mechanicalEfficiency: 0.82 },
  crankingSlowestRpm: 160, crankingRpm: 190, crankingFastestRpm: 240, idleSlowestRpm: 760, idleRpm: 820, maxRpm: 2780,
  damperDiameterMm: 170, damperEnd: 'accessory', crankRotation: 'clockwise',
  distributorRotation: 'anticlockwise', capTerminals: [1, 6, 3, 2, 5, 4],
  ...change,
})

export const sampleSheet = (change: Partial<ScenarioSheet> = {}): ScenarioSheet => ({
  distribution: 'sharedCap', plugsPerCylinder: 1, selection: 'oneAtATime',
  primary: {
    schedule: { kind: 'table', points: [{ rpm: 1000, deg: 25.8 }, { rpm: 2200, deg: 27.4 }] },
    crankRetard: { byDeg: 8, belowRpm: 450, hysteresisRpm: 40 }, latencyUs: 55,
  },
  backup: { schedule: { kind: 'fixed', deg: 17 }, latencyUs: 0 },
  mbt: { deg: 36, curvaturePerDeg2: 3e-4, provenance: 'measured', note: 'own dynamometer' },
  propeller: { kind: 'fixedPitch', governedRpm: null, pitches: [{ name: 'climb', rpm: 2780, kw: 49.3 }] },
  runUpRpm: 1700,
  manifold: { idleKpa: 40, runUpKpa: 65, fullKpa: 98 },
  rotor: { terminalWidthDeg: 12, rotorWidthDeg: 24, phasedAtDeg: 16, backupPhasedAtDeg: 11, sparkDurationMs: 1.5, mechanicalCarriesRotor: true, plateRadiusMm: 32 },
  tolerances: { timingCheckDeg: 1, benchDeg: 0.5 },
  notes: '',
  ...change,
})
