import type { CoilSetup, ScenarioSheet } from '@/lib/calc/scenario/scenario-types'

/** What the demo’s sheets say of fuel, charge, coils, aeroplane and failures. Invented, as a shop might have typed them. */
type Models = Pick<ScenarioSheet, 'tolerances' | 'cycle' | 'fuel' | 'worse' | 'reference' | 'coils' | 'plugGapMm' | 'airframe' | 'conditions' | 'redundancy'>

const canCoil: CoilSetup = {
  ohm: 0.75, mh: 5.2, limitA: 6.5, dwellMs: 3.6, supplyV: 13.6, crankingV: 8.8, wastedSpark: false,
  ambientK: 338.15, thermalResistanceKPerW: 3.8, secondaryPf: 95, transferEfficiency: 0.5, clampKv: null,
}
/** Of the backup: an older coil whose current nothing limits. */
const oldCoil: CoilSetup = { ...canCoil, ohm: 1.35, mh: 6.4, limitA: null, dwellMs: 4.2, secondaryPf: 110 }
const plugCoil: CoilSetup = {
  ohm: 0.5, mh: 2.9, limitA: 8.5, dwellMs: 2.8, supplyV: 13.6, crankingV: 8.6, wastedSpark: false,
  ambientK: 353.15, thermalResistanceKPerW: 9, secondaryPf: 60, transferEfficiency: 0.55, clampKv: 32,
}

export const clubSix: Models = {
  tolerances: { timingCheckDeg: 1, benchDeg: 0.5, markDeg: 0.5, scatterDeg: 0.25 },
  cycle: {
    ivcDeg: -124, evoDeg: 114, chargeK: 366, residualFraction: 0.06, airFuelRatio: 12.7, volumetricEfficiency: null,
    delayShare: 0.12, wallK: 465, headAreaFactor: 1.25,
  },
  fuel: { scale: 'ron', octane: 97, worseOctane: 95 },
  worse: { hotterK: 12, denserKpa: 2 },
  reference: null,
  coils: { primary: canCoil, backup: oldCoil },
  plugGapMm: 0.65,
  airframe: { massKg: 485, wingAreaM2: 12.4, cd0: 0.034, inducedK: 0.056, propEfficiency: 0.67, minSpeedMps: 29 },
  conditions: { pressureAltitudeM: 420, temperatureK: 296.15 },
  redundancy: {
    ratesPerH: { supply: 2e-6, switch: 8e-7, trigger: 1.5e-5, module: 3e-5, coil: 2.5e-5, cap: 1.5e-6, plug: 1e-5 },
    hotK: 353.15, referenceK: 333.15, activationEv: 0.5, sharedSupply: true, sharedCoil: false, flightHours: 1, checkIntervalHours: 10,
  },
}

export const smallFour: Models = {
  ...clubSix,
  coils: { primary: canCoil, backup: canCoil },
  airframe: { massKg: 430, wingAreaM2: 12.1, cd0: 0.036, inducedK: 0.052, propEfficiency: 0.66, minSpeedMps: 26 },
  redundancy: { ...clubSix.redundancy, flightHours: 1.5, checkIntervalHours: 25 },
}

export const largeEight: Models = {
  ...clubSix,
  coils: { primary: plugCoil, backup: plugCoil },
  fuel: { scale: 'lean', octane: 100, worseOctane: 100 },
  plugGapMm: 0.8,
  airframe: { massKg: 620, wingAreaM2: 12.9, cd0: 0.031, inducedK: 0.05, propEfficiency: 0.74, minSpeedMps: 31 },
  redundancy: { ...clubSix.redundancy, sharedSupply: false },
}
