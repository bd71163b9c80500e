import type { Engine } from '@/lib/calc/scenario/scenario-types'

/** An invented flat six. */
export const sampleEngine: Engine = {
  cylinders: 6, firingOrder: [1, 4, 5, 2, 3, 6], intervalsDeg: null,
  boreMm: 90, strokeMm: 68, rodMm: 133, compressionRatio: 8.2,
  ratedPowerKw: 50, ratedRpm: 2780, powerTimingDeg: 26,
  powerCurve: [{ rpm: 600, kw: 8 }, { rpm: 1600, kw: 27 }, { rpm: 2780, kw: 50 }, { rpm: 3200, kw: 54 }],
  friction: { kind: 'efficiency', mechanicalEfficiency: 0.82 },
  crankingSlowestRpm: 160, crankingRpm: 190, crankingFastestRpm: 240, idleSlowestRpm: 760, idleRpm: 820, maxRpm: 2780,
  damperDiameterMm: 170, damperEnd: 'accessory', crankRotation: 'clockwise', distributorRotation: 'anticlockwise',
  capTerminals: [1, 6, 3, 2, 5, 4],
}
