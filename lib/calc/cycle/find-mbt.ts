import { CalcError } from '../calc-error'
import { displacementM3 } from '../geometry/slider-crank'
import { checkCycle } from './check-cycle'
import type { CycleInput } from './cycle-types'
import { sparkGrid } from './spark-grid'
import { burnOf, compress, sweepSparks, type SparkPoint, type SparkSweep } from './spark-sweep'

export interface BestTorqueSpark {
  readonly mbtDeg: number
  readonly workJ: number
  readonly imepKpa: number
}

/** Half the width of the five sparks that settle the top, degrees. */
const settleDeg = 3

/** Top of the quartic through five values at −2, −1, 0, 1, 2, found from `from` by Newton's method. */
const quarticTop = ([a = 0, b = 0, c = 0, d = 0, e = 0]: readonly number[], from: number): number => {
  const first = (a - 8 * b + 8 * d - e) / 12
  const second = (-a + 16 * b - 30 * c + 16 * d - e) / 24
  const third = (-a + 2 * b - 2 * d + e) / 12
  const fourth = (a - 4 * b + 6 * c - 4 * d + e) / 24
  let x = from
  for (let i = 0; i < 20; i += 1) {
    const bend = 2 * second + 6 * third * x + 12 * fourth * x * x
    if (!(bend < 0)) return from
    x = Math.max(-2, Math.min(2, x - (first + 2 * second * x + 3 * third * x * x + 4 * fourth * x ** 3) / bend))
  }
  return x
}

/** Best spark and its work from a grid, settled by five sparks close to it; `null` when the greatest work lies at an end. */
export const bestOnGrid = (sweep: SparkSweep, grid: readonly SparkPoint[]): SparkPoint | null => {
  const most = grid.reduce((best, point, i) => (point.workJ > (grid[best]?.workJ ?? -Infinity) ? i : best), 0)
  if (most === 0 || most === grid.length - 1) return null
  const works = (centreDeg: number, pitchDeg: number) => [-2, -1, 0, 1, 2].map((i) => sweep.at(centreDeg + i * pitchDeg).workJ)
  const spacing = (sweep.toDeg - sweep.fromDeg) / (grid.length - 1)
  const [left, middle, right] = [grid[most - 1], grid[most], grid[most + 1]].map((point) => point?.workJ ?? 0)
  const bend = (left ?? 0) - 2 * (middle ?? 0) + (right ?? 0)
  let centreDeg = (grid[most]?.sparkDeg ?? 0) + (bend < 0 ? (((left ?? 0) - (right ?? 0)) / (2 * bend)) * spacing : 0)
  // A second round where the first centre was a poor guess.
  for (let round = 0; round < 3; round += 1) {
    const pitch = Math.min(settleDeg / 2, (centreDeg - sweep.fromDeg) / 2, (sweep.toDeg - centreDeg) / 2)
    if (!(pitch > 0)) return null
    const off = quarticTop(works(centreDeg, pitch), 0)
    centreDeg += off * pitch
    if (Math.abs(off) < 1) break
  }
  return sweep.at(centreDeg)
}

/**
 * Spark of best torque of one charge, `{ mbtDeg, workJ, imepKpa }`: crank degrees BTDC, work J and mean effective pressure kPa of the closed cycle there.
 *
 * The spark of greatest closed-cycle work in −20 … 60° BTDC (less where burning would start outside the closed cycle), to 0.01°: a grid of 4°, then the top of the quartic through five sparks close to it.
 *
 * Validity: as in `simulateCycle`. The burn's angles are held while the spark moves. With 2° steps within 0.01° of 0.5° steps.
 * Source: common practice, no published source (a search over `simulateCycle`).
 *
 * @param input as in `simulateCycle`; `burn` may not be `null`, its sparkDeg is not used but must be possible
 * @throws CalcError on what `simulateCycle` refuses, and on `burn` when motored or when the greatest work lies at an end of the range
 * @example
 * findMbt({ engine: { boreMm: 90, strokeMm: 80, rodMm: 140, compressionRatio: 8, ivcDeg: -120, evoDeg: 120 }, rpm: 2500, charge: { pressureKpa: 100, temperatureK: 370, residualFraction: 0.05, airFuelRatio: 13 }, burn: { sparkDeg: 20, delayDeg: 9, durationDeg: 60, efficiency: 0.85 }, gamma: 1.3, heatLoss: null }).mbtDeg // → 40.0721
 */
export const findMbt = (input: CycleInput): BestTorqueSpark => {
  const checked = checkCycle(input)
  burnOf(checked)
  const sweep = sweepSparks(compress(checked))
  const best = bestOnGrid(sweep, sparkGrid(sweep))
  if (!best) throw noBestSpark(input.burn, sweep)
  return { mbtDeg: best.sparkDeg, workJ: best.workJ, imepKpa: best.workJ / 1000 / displacementM3(checked.engine) }
}

export const noBestSpark = (burn: unknown, { fromDeg, toDeg }: SparkSweep, where = ''): CalcError => new CalcError({
  field: 'burn', value: burn, limit: `a burn whose best spark lies inside ${fromDeg} … ${toDeg} deg`, unit: '',
  message: `The work is greatest at an end of the sparks searched, ${fromDeg} to ${toDeg} deg before top dead centre${where}: this burn is too long or too short for them.`,
})
