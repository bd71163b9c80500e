import type { CycleInput } from '@/lib/calc'

/** An air-cooled six's cylinder at full throttle. */
export const sampleCycle = (changes: Partial<CycleInput> = {}): CycleInput => ({
  engine: { boreMm: 94, strokeMm: 82, rodMm: 136, compressionRatio: 8.4, ivcDeg: -122, evoDeg: 116 },
  rpm: 2650,
  charge: { pressureKpa: 112, temperatureK: 370, residualFraction: 0.06, airFuelRatio: 12.8 },
  burn: { sparkDeg: 27, delayDeg: 9, durationDeg: 67, efficiency: 0.85 },
  gamma: 'temperature',
  heatLoss: { wallK: 470, headAreaFactor: 1.2 },
  octane: 92,
  ...changes,
})
