import type { Calls } from '../valid-calls'

const coil = { supplyV: 13, ohm: 0.6, mh: 4, limitA: 7 }
const free = { supplyV: 13, ohm: 0.6, mh: 4 }
const served = { cylinders: 3, rpm: 2700, wastedSpark: true }

export const coilCalls: Calls = {
  coilCurrentA: [[coil, 3], [free, 3]],
  stalledCurrentA: [[coil]],
  dwellForCurrentMs: [[coil, 6], [free, 6]],
  sparkEnergyMj: [[coil, 3]],
  sparksPerSecond: [[served]],
  dwellAvailableMs: [[{ ...served, dutyLimit: 0.8 }]],
  sparkPeriodShare: [[{ ...served, dwellMs: 3, sparkDurationMs: 1.2 }]],
  coilHeat: [
    [{ coil, ...served, dwellMs: 3, ambientK: 325, thermalResistanceKPerW: 3, refK: 298.15, maxWindingK: 470 }],
    [{ coil: free, cylinders: 1, rpm: 2700, dwellMs: 3, ambientK: 325, thermalResistanceKPerW: 3 }],
  ],
}
