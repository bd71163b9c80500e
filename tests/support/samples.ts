import type { CoilSetup, Engine, ScenarioSheet } from '@/lib/calc/scenario/scenario-types'

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

/** An invented coil with its drive. */
export const sampleCoil = (change: Partial<CoilSetup> = {}): CoilSetup => ({
  ohm: 0.7, mh: 4.5, limitA: 7, dwellMs: 4, supplyV: 13.5, crankingV: 8.5, wastedSpark: false,
  ambientK: 333, thermalResistanceKPerW: 4, secondaryPf: 100, transferEfficiency: 0.5, clampKv: null,
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
  tolerances: { timingCheckDeg: 1, benchDeg: 0.5, markDeg: 0.5, scatterDeg: 0.3 },
  cycle: {
    ivcDeg: -122, evoDeg: 116, chargeK: 370, residualFraction: 0.06, airFuelRatio: 12.8, volumetricEfficiency: null,
    delayShare: 0.12, wallK: 470, headAreaFactor: 1.2,
  },
  fuel: { scale: 'ron', octane: 95, worseOctane: 91 },
  worse: { hotterK: 15, denserKpa: 3 },
  reference: null,
  coils: { primary: sampleCoil(), backup: sampleCoil() },
  plugGapMm: 0.7,
  airframe: { massKg: 500, wingAreaM2: 11, cd0: 0.032, inducedK: 0.055, propEfficiency: 0.68, minSpeedMps: 32 },
  conditions: { pressureAltitudeM: 300, temperatureK: 293.15 },
  redundancy: {
    ratesPerH: { supply: 2e-6, switch: 1e-6, trigger: 2e-5, module: 4e-5, coil: 3e-5, cap: 2e-6, plug: 1e-5 },
    hotK: 358, referenceK: 333, activationEv: 0.5, sharedSupply: true, sharedCoil: false, flightHours: 1, checkIntervalHours: 25,
  },
  notes: '',
  ...change,
})
