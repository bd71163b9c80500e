import type { Calls } from '../valid-calls'
import { sampleCycle } from './cycles'

const coarse = sampleCycle({ stepDeg: 4 })
const { engine, charge, burn } = coarse
const six = [1, 6, 2, 4, 3, 5].map((cylinder, i) => ({ cylinder, atDeg: i * 120 }))

export const cycleCalls: Calls = {
  simulateCycle: [[{ ...sampleCycle(), arrays: false }], [sampleCycle({ burn: null, gamma: 1.35, heatLoss: null, stepDeg: 20 / 3 })]],
  findMbt: [[coarse]],
  knockLimitedSpark: [[coarse]],
  sparkMap: [[{ ...coarse, rpm: [2000], pressureKpa: [100], burnScaling: { reference: { rpm: 2650, pressureKpa: 112 }, speedExponent: 0.3, pressureExponent: -0.2 } }]],
  manifoldKpaFromCharge: [[{ chargeKpa: 60, fullChargeKpa: 110, fullManifoldKpa: 98 }]],
  chargeKpaFromManifold: [[{ manifoldKpa: 60, fullChargeKpa: 110, fullManifoldKpa: 98 }]],
  scaleBurn: [[{ reference: { rpm: 2500, pressureKpa: 100, delayDeg: 9, durationDeg: 67 }, rpm: 1800, pressureKpa: 80, speedExponent: 0.3, pressureExponent: -0.2 }]],
  calibrateBurn: [[coarse, { mbtDeg: 32, delayShare: 0.12 }]],
  crankTorque: [[{ input: coarse, firingSchedule: six, dead: [2], reciprocatingMassKg: 0.6, exhaustKpa: 105, crankcaseKpa: 101, intakeKpa: 90 }]],
  combustionEfficiency: [[12.8]],
  chargePressureFromVolumetricEfficiency: [[{ engine, volumetricEfficiency: 0.75, ambientDensityKgM3: 1.2, temperatureK: charge.temperatureK, residualFraction: 0.05, airFuelRatio: 13 }]],
  autoignitionDelayMs: [[{ octane: 95, pressureKpa: 4000, temperatureK: 800 }]],
  wallHeatTransfer: [[{ boreMm: 94, pressureKpa: 3000, temperatureK: 2000, gasMps: 20 }]],
  burnedFraction: [[{ share: 0.4, a: burn?.a ?? 5, m: 2 }]],
}
