import type { Calls } from '../valid-calls'

const engine = { boreMm: 94, strokeMm: 76, rodMm: 128, compressionRatio: 8.6, ivcDeg: -125, evoDeg: 120 }

export const sparkCalls: Calls = {
  breakdownKv: [[{ gapMm: 0.7, pressureKpa: 900, temperatureK: 600 }]],
  sparkDemandKv: [[{ engine, charge: { pressureKpa: 98, temperatureK: 350 }, sparkDeg: 24, gapMm: 0.7, polytropicExponent: 1.32 }]],
  sparkMargin: [[{ demandKv: 11, energyMj: 60, secondaryPf: 90, transferEfficiency: 0.5, clampKv: 32 }]],
}
