import type { CoilSetup, ScenarioSheet } from '../calc/live'

/** Part of the sheet that no engine decides: what a new sheet starts with, and what an older one is given. */
export type StatedDefaults = Pick<ScenarioSheet, 'cycle' | 'fuel' | 'worse' | 'reference' | 'coils' | 'plugGapMm' | 'airframe' | 'conditions' | 'redundancy'>
  & { tolerances: Pick<ScenarioSheet['tolerances'], 'markDeg' | 'scatterDeg'> }

const coil: CoilSetup = {
  ohm: 0.7, mh: 4.5, limitA: 7, dwellMs: 3.5, supplyV: 13.5, crankingV: 8.5, wastedSpark: false,
  ambientK: 333.15, thermalResistanceKPerW: 4, secondaryPf: 100, transferEfficiency: 0.5, clampKv: null,
}

/** Where each comes from stands in `default-sources.ts`. */
export const statedDefaults = (): StatedDefaults => ({
  cycle: {
    ivcDeg: -122, evoDeg: 116, chargeK: 370, residualFraction: 0.06, airFuelRatio: 12.8, volumetricEfficiency: null,
    delayShare: 0.12, wallK: 470, headAreaFactor: 1.2,
  },
  fuel: { scale: 'ron', octane: 95, worseOctane: 91 },
  worse: { hotterK: 15, denserKpa: 3 },
  reference: null,
  coils: { primary: { ...coil }, backup: { ...coil } },
  plugGapMm: 0.7,
  airframe: { massKg: 500, wingAreaM2: 11, cd0: 0.032, inducedK: 0.055, propEfficiency: 0.68, minSpeedMps: 32 },
  conditions: { pressureAltitudeM: 0, temperatureK: 288.15 },
  redundancy: {
    ratesPerH: { supply: 2e-6, switch: 1e-6, trigger: 2e-5, module: 4e-5, coil: 3e-5, cap: 2e-6, plug: 1e-5 },
    hotK: 358.15, referenceK: 333.15, activationEv: 0.5, sharedSupply: true, sharedCoil: false, flightHours: 1, checkIntervalHours: 25,
  },
  tolerances: { markDeg: 0.5, scatterDeg: 0.3 },
})
