import { finiteResult } from '../validate/result'
import type { LoadLine, PreparedCurve } from './power-curve'

export interface CrossingSearch {
  readonly curve: PreparedCurve
  readonly fraction: { readonly constant: number | null, readonly at: (rpm: number) => number }
  readonly load: LoadLine
  /** Part of the curve to search, rpm. */
  readonly fromRpm: number
  readonly toRpm: number
}

/** Load − engine this small a share of the load is rounding: a load stated through the last point of the curve meets it there. */
const rounding = 1e-12
/** Between points of the curve a fraction that varies is looked at in steps of this many rpm at most. */
const stepRpm = 10
const mostSteps = 20_000

export const enginePowerAt = ({ curve, fraction }: Pick<CrossingSearch, 'curve' | 'fraction'>, rpm: number): number =>
  finiteResult(fraction.at(rpm) * curve.kwAt(rpm), 'fraction', rpm)

/**
 * Root of a function that is negative at `low` and not at `high`: regula falsi (Illinois) with a bisection every third time,
 * which also brings a jump down to one speed. Stops when load and engine agree to the last digits.
 */
const rootBetween = (f: (rpm: number) => number, load: LoadLine, lowRpm: number, highRpm: number): number => {
  let low = lowRpm
  let high = highRpm
  let atLow = f(low)
  let atHigh = f(high)
  let movedLast: 'low' | 'high' | null = null
  for (let i = 1; atHigh !== 0; i += 1) {
    const middle = low + (high - low) / 2
    if (!(middle > low && middle < high)) break
    const chord = high - (atHigh * (high - low)) / (atHigh - atLow)
    const rpm = i % 3 !== 0 && chord > low && chord < high ? chord : middle
    const value = f(rpm)
    if (Math.abs(value) <= 4 * Number.EPSILON * load(rpm)) return rpm
    if (value < 0) {
      low = rpm
      atLow = value
      // The end that stays twice running gives way: its weight is halved, or the chord would creep up on the root from one side.
      if (movedLast === 'low') atHigh /= 2
      movedLast = 'low'
    } else {
      high = rpm
      atHigh = value
      if (movedLast === 'high') atLow /= 2
      movedLast = 'high'
    }
  }
  return high
}

/** Speeds at which to look, descending: points of the curve, and steps between them where the fraction varies. */
function* speedsDown({ curve, fraction, fromRpm, toRpm }: CrossingSearch): Generator<number> {
  const knots = [fromRpm, ...curve.rpm.filter((rpm) => rpm > fromRpm && rpm < toRpm), toRpm]
  const step = Math.max(stepRpm, (toRpm - fromRpm) / mostSteps)
  for (let i = knots.length - 1; i > 0; i -= 1) {
    const high = knots[i] ?? 0
    const low = knots[i - 1] ?? 0
    const parts = fraction.constant === null ? Math.max(1, Math.ceil((high - low) / step)) : 1
    for (let part = 0; part < parts; part += 1) yield high - ((high - low) * part) / parts
  }
  yield fromRpm
}

/**
 * Highest speed at which load − engine turns from negative to ≥ 0, ends included; `null` when there is none.
 * With a constant fraction each piece of the curve is a cubic minus a line, convex, so its lowest point decides whether the load dips
 * below the engine inside it; with a varying one, pieces of 10 rpm stand for it.
 */
export const highestCrossing = (search: CrossingSearch): number | null => {
  const { curve, fraction, load, fromRpm, toRpm } = search
  const f = (rpm: number): number => load(rpm) - enginePowerAt(search, rpm)
  const isRounding = (rpm: number, value: number): boolean => Math.abs(value) <= rounding * load(rpm)

  /** Inside a piece with ends ≥ 0: the lowest point of the cubic minus the line, where that is negative. */
  const dipIn = (low: number, high: number): number | null => {
    if (fraction.constant === null) return null
    const slope = (fraction.constant * (curve.kwAt(high) - curve.kwAt(low))) / (high - low)
    // Load = K·n³ with K = load(high)/high³; its slope 3·K·n² equals the engine's at the lowest point.
    const lowest = high * Math.sqrt((slope * high) / (3 * load(high)))
    return lowest > low && lowest < high && f(lowest) < 0 ? lowest : null
  }

  let high = toRpm
  let atHigh = f(toRpm)
  let isLastPieceAbove = false
  if (atHigh < 0 && isRounding(toRpm, atHigh)) atHigh = 0
  for (const low of speedsDown(search)) {
    if (low === toRpm) continue
    const atLow = f(low)
    isLastPieceAbove = atHigh >= 0
    if (isLastPieceAbove) {
      const below = atLow < 0 ? low : dipIn(low, high)
      if (below !== null) return atHigh === 0 ? high : rootBetween(f, load, below, high)
    }
    high = low
    atHigh = atLow
  }
  // The lower end counts where the load starts on the engine's line and stays above it; a stopped engine is no operating point.
  return isLastPieceAbove && fromRpm > 0 && isRounding(fromRpm, atHigh) ? fromRpm : null
}
