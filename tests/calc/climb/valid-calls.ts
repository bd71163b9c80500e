import type { Calls } from '../valid-calls'

const aeroplane = { massKg: 620, wingAreaM2: 11.5, cd0: 0.034, inducedK: 0.062 }

export const climbCalls: Calls = {
  powerRequiredKw: [[{ ...aeroplane, densityKgM3: 1.1, speedMps: 38 }]],
  climbRateMps: [[{ ...aeroplane, densityKgM3: 1.1, brakePowerKw: 60, propEfficiency: 0.7, speedMps: 38 }]],
  bestClimb: [
    [{ ...aeroplane, densityKgM3: 1.1, brakePowerKw: 60, propEfficiency: 0.7, minSpeedMps: 30 }],
    [{ ...aeroplane, densityKgM3: 1.1, brakePowerKw: 60, propEfficiency: (mps) => 0.8 - ((mps - 50) / 100) ** 2 }],
  ],
  outcome: [
    [{ ...aeroplane, propEfficiency: 0.7, seaLevelPowerKw: 50, densityAltitudeM: 900, levelBandMps: 0.3, minSpeedMps: 30 }],
    [{ ...aeroplane, propEfficiency: (mps) => 0.8 - ((mps - 50) / 100) ** 2, seaLevelPowerKw: 50, densityAltitudeM: 900 }],
  ],
}
