/** A sheet as version 1 stored it: before fuel, charge, coils, aeroplane and failures. Written out, so that no later default can reach it. */
export const firstSheet = () => ({
  distribution: 'sharedCap', plugsPerCylinder: 1, selection: 'oneAtATime',
  primary: { schedule: { kind: 'table', points: [{ rpm: 600, deg: 24 }, { rpm: 2400, deg: 26.5 }] }, crankRetard: { byDeg: 7, belowRpm: 460, hysteresisRpm: 35 }, latencyUs: 60 },
  backup: { schedule: { kind: 'fixed', deg: 16 }, latencyUs: 0 },
  mbt: { deg: 32, curvaturePerDeg2: 2.8e-4, provenance: 'handbook', note: 'range for this bore' },
  propeller: { kind: 'fixedPitch', governedRpm: null, pitches: [{ name: 'as fitted', rpm: 2750, kw: 48.5 }] },
  runUpRpm: 1650,
  manifold: { idleKpa: 39, runUpKpa: 63, fullKpa: 97 },
  rotor: { terminalWidthDeg: 7, rotorWidthDeg: 15, phasedAtDeg: 13, backupPhasedAtDeg: 9, sparkDurationMs: 1.3, mechanicalCarriesRotor: true, plateRadiusMm: 34 },
  tolerances: { timingCheckDeg: 1.5, benchDeg: 0.4 },
  notes: 'laid out before',
})
