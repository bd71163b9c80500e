import type { EngineInput } from '@/lib/schemas/engine'

/** Engines of the demo shops. Invented: no figure is that of an engine anybody makes. */

export const flatSix: EngineInput = {
  name: 'Flat six 2.6 litres',
  code: 'J260',
  spec: {
    cylinders: 6, firingOrder: [1, 4, 5, 2, 3, 6], intervalsDeg: null,
    boreMm: 90, strokeMm: 68, rodMm: 133, compressionRatio: 8.2,
    ratedPowerKw: 50, ratedRpm: 2780, powerTimingDeg: 26,
    powerCurve: [
      { rpm: 1200, kw: 19.4 }, { rpm: 1600, kw: 27.1 }, { rpm: 2000, kw: 35 }, { rpm: 2400, kw: 43 },
      { rpm: 2780, kw: 50 }, { rpm: 3000, kw: 52.7 }, { rpm: 3200, kw: 54.1 },
    ],
    friction: { kind: 'efficiency', mechanicalEfficiency: 0.82 },
    crankingSlowestRpm: 160, crankingRpm: 190, crankingFastestRpm: 240,
    idleSlowestRpm: 760, idleRpm: 820, maxRpm: 2780,
    damperDiameterMm: 170, damperEnd: 'accessory', crankRotation: 'clockwise',
    // Anticlockwise past terminals named clockwise: the firing order read backwards.
    distributorRotation: 'anticlockwise', capTerminals: [1, 6, 3, 2, 5, 4],
  },
}

export const flatFour: EngineInput = {
  name: 'Flat four 2.0 litres',
  code: 'J200',
  spec: {
    cylinders: 4, firingOrder: [1, 4, 3, 2], intervalsDeg: null,
    boreMm: 93, strokeMm: 73, rodMm: 137, compressionRatio: 8,
    ratedPowerKw: 41, ratedRpm: 2950, powerTimingDeg: 25,
    powerCurve: [{ rpm: 1200, kw: 14.6 }, { rpm: 1800, kw: 24.1 }, { rpm: 2400, kw: 33.4 }, { rpm: 2950, kw: 41 }, { rpm: 3300, kw: 44.2 }],
    friction: { kind: 'power', frictionPowerKw: 9.4 },
    crankingSlowestRpm: 150, crankingRpm: 200, crankingFastestRpm: 260,
    idleSlowestRpm: 780, idleRpm: 850, maxRpm: 2950,
    damperDiameterMm: 152, damperEnd: 'accessory', crankRotation: 'clockwise',
    distributorRotation: 'clockwise', capTerminals: [1, 4, 3, 2],
  },
}

export const flatEight: EngineInput = {
  name: 'Flat eight 3.6 litres',
  code: 'J360',
  spec: {
    cylinders: 8, firingOrder: [1, 6, 3, 8, 2, 5, 4, 7], intervalsDeg: null,
    boreMm: 92, strokeMm: 68, rodMm: 133, compressionRatio: 8.4,
    ratedPowerKw: 72, ratedRpm: 2850, powerTimingDeg: 25,
    powerCurve: [],
    friction: { kind: 'efficiency', mechanicalEfficiency: 0.83 },
    crankingSlowestRpm: 140, crankingRpm: 170, crankingFastestRpm: 220,
    idleSlowestRpm: 700, idleRpm: 780, maxRpm: 2850,
    damperDiameterMm: 186, damperEnd: 'propeller', crankRotation: 'anticlockwise',
    distributorRotation: 'clockwise', capTerminals: [1, 6, 3, 8, 2, 5, 4, 7],
  },
}

/** Of the second shop: whatever is in the first, this shop sees only this. */
export const neighboursSix: EngineInput = {
  name: 'Six, 2.4 litres',
  code: 'SA24',
  spec: {
    ...flatSix.spec, boreMm: 87, strokeMm: 67.3, ratedPowerKw: 44, ratedRpm: 2700, maxRpm: 2700, powerTimingDeg: 25, powerCurve: [],
    damperDiameterMm: 160,
  },
}
