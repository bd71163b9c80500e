import type { SparkPoint, SparkSweep } from './spark-sweep'

/** Degrees between the sparks first looked at: work and the logarithm of the knock integral bend on a scale of tens of degrees. */
const gridDeg = 4

/** Evenly spaced sparks over the whole range searched, both ends included. */
export const sparkGrid = (sweep: SparkSweep): SparkPoint[] => {
  const { fromDeg, toDeg, at } = sweep
  const pieces = Math.max(4, Math.ceil((toDeg - fromDeg) / gridDeg))
  return Array.from({ length: pieces + 1 }, (_, i) => at(i === pieces ? toDeg : fromDeg + ((toDeg - fromDeg) * i) / pieces))
}
