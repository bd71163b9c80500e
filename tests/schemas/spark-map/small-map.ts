import type { SparkMap } from '@/lib/calc/live'

/** Torque sets the thin places, detonation the dense ones; one has no limit, one always detonates. */
export const smallMap: SparkMap = {
  rpm: [1000, 2000], pressureKpa: [50, 100, 120],
  mbtDeg: [[30, 26, 25], [36, 32, 31]],
  knockLimitDeg: [[null, 20, -20], [55, 34.04, 22.06]],
  sparkDeg: [[30, 20, null], [36, 32, 22.06]],
}
