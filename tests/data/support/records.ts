import type { Actor } from '@/lib/auth/actor'
import type { CoilSetup, Engine, ScenarioSheet } from '@/lib/calc/scenario/scenario-types'
import { createEngine } from '@/lib/data/engines/create-engine'
import { createScenario } from '@/lib/data/scenarios/create-scenario'
import type { EngineDto } from '@/lib/schemas/engine-dto'
import type { ScenarioDto } from '@/lib/schemas/scenario-dto'

let serial = 0

/** A code no other engine of this run has. */
export const nextCode = () => `T${(serial += 1)}`

export const engineSpec: Engine = {
  cylinders: 6, firingOrder: [1, 4, 5, 2, 3, 6], intervalsDeg: null,
  boreMm: 90, strokeMm: 68, rodMm: 133, compressionRatio: 8.2,
  ratedPowerKw: 50, ratedRpm: 2780, powerTimingDeg: 26,
  powerCurve: [{ rpm: 1200, kw: 20 }, { rpm: 2000, kw: 36 }, { rpm: 2780, kw: 50 }, { rpm: 3200, kw: 54 }],
  friction: { kind: 'efficiency', mechanicalEfficiency: 0.82 },
  crankingSlowestRpm: 160, crankingRpm: 190, crankingFastestRpm: 240,
  idleSlowestRpm: 760, idleRpm: 820, maxRpm: 2780,
  damperDiameterMm: 170, damperEnd: 'accessory', crankRotation: 'clockwise',
  distributorRotation: 'anticlockwise', capTerminals: [1, 6, 3, 2, 5, 4],
}

const aCoil: CoilSetup = {
  ohm: 0.8, mh: 5, limitA: 7, dwellMs: 3.4, supplyV: 13.8, crankingV: 9, wastedSpark: false,
  ambientK: 330, thermalResistanceKPerW: 4, secondaryPf: 90, transferEfficiency: 0.5, clampKv: null,
}

/** Everything within its limits, but for what a test changes. */
export const sheet = (change: Partial<ScenarioSheet> = {}): ScenarioSheet => ({
  distribution: 'sharedCap', plugsPerCylinder: 1, selection: 'oneAtATime',
  primary: { schedule: { kind: 'fixed', deg: 26 }, crankRetard: { byDeg: 8, belowRpm: 450, hysteresisRpm: 40 }, latencyUs: 55 },
  backup: { schedule: { kind: 'fixed', deg: 17 }, latencyUs: 0 },
  mbt: { deg: 31, curvaturePerDeg2: 3e-4, provenance: 'guess', note: '' },
  propeller: { kind: 'fixedPitch', governedRpm: null, pitches: [{ name: 'climb', rpm: 2780, kw: 50 }] },
  runUpRpm: 1700,
  manifold: { idleKpa: 38, runUpKpa: 62, fullKpa: 97 },
  rotor: { terminalWidthDeg: 6, rotorWidthDeg: 14, phasedAtDeg: 12, backupPhasedAtDeg: 12, sparkDurationMs: 1.2, mechanicalCarriesRotor: true, plateRadiusMm: 36 },
  tolerances: { timingCheckDeg: 1, benchDeg: 0.5, markDeg: 0.4, scatterDeg: 0.25 },
  cycle: {
    ivcDeg: -120, evoDeg: 118, chargeK: 365, residualFraction: 0.05, airFuelRatio: 12.6, volumetricEfficiency: null,
    delayShare: 0.12, wallK: 460, headAreaFactor: 1.2,
  },
  fuel: { scale: 'ron', octane: 98, worseOctane: 96 },
  worse: { hotterK: 10, denserKpa: 2 },
  reference: { sparkDeg: 27, rpm: 2780, octane: 96, marginDeg: 5 },
  coils: { primary: aCoil, backup: aCoil },
  plugGapMm: 0.6,
  airframe: { massKg: 430, wingAreaM2: 12, cd0: 0.03, inducedK: 0.05, propEfficiency: 0.7, minSpeedMps: 28 },
  conditions: { pressureAltitudeM: 200, temperatureK: 290 },
  redundancy: {
    ratesPerH: { supply: 2e-6, switch: 1e-6, trigger: 1e-5, module: 2e-5, coil: 2e-5, cap: 2e-6, plug: 1e-5 },
    hotK: 350, referenceK: 330, activationEv: 0.4, sharedSupply: true, sharedCoil: false, flightHours: 1, checkIntervalHours: 10,
  },
  notes: '',
  ...change,
})

/** Fires while cranking far ahead of top dead centre: outside a limit. */
export const sheetOutside = (): ScenarioSheet => sheet({ backup: { schedule: { kind: 'fixed', deg: 24 }, latencyUs: 0 } })

export const anEngine = (actor: Actor, change: { name?: string, code?: string, spec?: Engine } = {}): Promise<EngineDto> =>
  createEngine(actor, { name: 'Flat six 2.6 litres', code: nextCode(), spec: engineSpec, ...change })

/** A scenario of `author` on an engine that `designer` makes, or on the one given. */
export async function aScenario(
  author: Actor, designer: Actor, { engine, title = 'Climb timing', sheet: typed = sheet() }: { engine?: EngineDto, title?: string, sheet?: ScenarioSheet } = {},
): Promise<ScenarioDto> {
  const on = engine ?? await anEngine(designer)
  return createScenario(author, { engineId: on.id, engineVersion: on.version, title, sheet: typed })
}
