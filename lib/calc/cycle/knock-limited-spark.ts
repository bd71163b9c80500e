import { CalcError } from '../calc-error'
import { rootBetween } from '../shared/root-between'
import { checkCycle, type CheckedCycle } from './check-cycle'
import type { CycleInput } from './cycle-types'
import { sparkGrid } from './spark-grid'
import { burnOf, compress, sweepSparks, type SparkPoint, type SparkSweep } from './spark-sweep'

export interface KnockLimit {
  /** Crank degrees BTDC; `null` when there is no limit in the range searched, or when every spark knocks. */
  readonly limitDeg: number | null
  readonly marginDeg: number | null
  readonly state: 'limited' | 'never' | 'always'
}

export const takeOctane = (checked: CheckedCycle): number => {
  if (checked.octane !== null) return checked.octane
  throw new CalcError({ field: 'octane', value: undefined, limit: '> 0', unit: '', message: 'The octane number is missing: detonation cannot be judged without the fuel.' })
}

const level = (knock: number): number => Math.log(knock)

/** Where f passes 0 between two sparks, f(low) < 0 ≤ f(high), to a thousandth of a degree. */
const settle = (f: (sparkDeg: number) => number, lowDeg: number, fLow: number, highDeg: number, fHigh: number): number =>
  rootBetween(f, lowDeg, highDeg, 1e-3, { close: 1e-9, atFrom: fLow, atTo: fHigh })

/**
 * The first spark, coming from the late end, at which knock·scale passes 1. The integral turns down again beyond about 45°: between two samples below 1
 * its top may still lie above, so each top is looked at.
 */
export const firstKnock = (sweep: SparkSweep, grid: readonly SparkPoint[], scale: number): { readonly state: KnockLimit['state'], readonly limitDeg: number | null } => {
  const f = (sparkDeg: number) => level(sweep.at(sparkDeg).knock * scale)
  const levels = grid.map(({ knock }) => level(knock * scale))
  if ((levels[0] ?? 0) >= 0) return { state: 'always', limitDeg: null }
  for (let i = 1; i < grid.length; i += 1) {
    const [low, high] = [grid[i - 1]?.sparkDeg ?? 0, grid[i]?.sparkDeg ?? 0]
    const [fLow, fHigh] = [levels[i - 1] ?? 0, levels[i] ?? 0]
    if (fHigh >= 0) return { state: 'limited', limitDeg: settle(f, low, fLow, high, fHigh) }
    const before = levels[i - 2] ?? -Infinity
    const isTop = fLow >= fHigh && fLow > before
    if (!isTop) continue
    // The top lies between the neighbours of sample i − 1; golden-section search finds it.
    const top = topBetween(f, grid[i - 2]?.sparkDeg ?? low, high)
    if (top.value >= 0) return { state: 'limited', limitDeg: settle(f, grid[i - 2]?.sparkDeg ?? low, Math.min(before, -1e-12), top.at, top.value) }
  }
  // A top inside the last stretch has no sample beyond it to show it; it lies hardly above the last one.
  const [before, last] = [grid.length - 2, grid.length - 1]
  const [fBefore, fLast] = [levels[before] ?? 0, levels[last] ?? 0]
  if (fLast > fBefore && fLast > -nearOne) {
    const lowDeg = grid[before]?.sparkDeg ?? sweep.fromDeg
    const top = topBetween(f, lowDeg, sweep.toDeg)
    if (top.value >= 0) return { state: 'limited', limitDeg: settle(f, lowDeg, fBefore, top.at, top.value) }
  }
  return { state: 'never', limitDeg: null }
}

/** Logarithm of the knock integral below which no top within one stretch of the grid reaches 1. */
const nearOne = 0.1
const golden = (Math.sqrt(5) - 1) / 2

const topBetween = (f: (x: number) => number, from: number, to: number): { at: number, value: number } => {
  let [a, b] = [from, to]
  let [x, y] = [b - golden * (b - a), a + golden * (b - a)]
  let [fx, fy] = [f(x), f(y)]
  while (b - a > 0.01 && fx < 0 && fy < 0) {
    if (fx > fy) {
      b = y
      y = x
      fy = fx
      x = b - golden * (b - a)
      fx = f(x)
    } else {
      a = x
      x = y
      fx = fy
      y = a + golden * (b - a)
      fy = f(y)
    }
  }
  return fx >= fy ? { at: x, value: fx } : { at: y, value: fy }
}

/**
 * The spark at which detonation is first expected, `{ limitDeg, marginDeg, state }`, crank degrees BTDC; marginDeg = limitDeg − burn.sparkDeg, negative when the spark lies beyond the limit.
 *
 * The first spark, coming from −20°, at which the knock integral of `simulateCycle` passes 1, to 0.01°: the integral turns down again beyond about 45°, so the most advanced spark below 1 would lie beyond a knocking band.
 * 'never': below 1 at every spark to 60°; 'always': 1 or more at −20° already; both without limit and margin.
 *
 * Validity: as in `simulateCycle`; absolute limits carry ±5 octane, differences between settings of one engine much less.
 * Source: douaud-eyzat-1978, the delay to autoignition (memory)
 *
 * @param input as in `simulateCycle`; `burn` may not be `null` and `octane` must be given
 * @throws CalcError on what `simulateCycle` refuses, on `burn` when motored, and on `octane` when it is missing
 * @example
 * knockLimitedSpark({ engine: { boreMm: 90, strokeMm: 80, rodMm: 140, compressionRatio: 8, ivcDeg: -120, evoDeg: 120 }, rpm: 2500, charge: { pressureKpa: 100, temperatureK: 370, residualFraction: 0.05, airFuelRatio: 13 }, burn: { sparkDeg: 20, delayDeg: 9, durationDeg: 60, efficiency: 0.85 }, gamma: 1.3, heatLoss: null, octane: 150 }).state // → 'never'
 */
export const knockLimitedSpark = (input: CycleInput): KnockLimit => {
  const checked = checkCycle(input)
  const { sparkDeg } = burnOf(checked)
  takeOctane(checked)
  const sweep = sweepSparks(compress(checked))
  const { state, limitDeg } = firstKnock(sweep, sparkGrid(sweep), 1)
  return { state, limitDeg, marginDeg: limitDeg === null ? null : limitDeg - sparkDeg }
}
