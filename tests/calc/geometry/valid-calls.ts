import type { Calls } from '../valid-calls'

const engine = { boreMm: 94, strokeMm: 76, rodMm: 128, compressionRatio: 8.6 }

export const geometryCalls: Calls = {
  pistonTravelMm: [[{ strokeMm: 76, rodMm: 128, thetaDeg: 35 }]],
  cylinderVolumeCc: [[{ engine, thetaDeg: 35 }]],
}
