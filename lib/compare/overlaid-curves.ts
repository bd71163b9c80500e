import type { CurvePoint, ScenarioResult } from '../calc/live'

export interface OverlaidCurve {
  channel: 'A' | 'B'
  /** Digit at the line's end; null: the same on both sides. */
  digit: 1 | 2 | null
  points: CurvePoint[]
}

/** Drawn curves that stay nearer than this are one line, crank degrees. */
const sameWithinDeg = 1e-9

const isSame = (one: readonly CurvePoint[], other: readonly CurvePoint[]) =>
  one.length === other.length && one.every(({ rpm, deg }, i) => rpm === other[i]?.rpm && Math.abs(deg - (other[i]?.deg ?? Infinity)) <= sameWithinDeg)

/** Advance curves of two results, engine speeding up: one line for a channel that is the same in both. */
export function overlaidCurves(left: Pick<ScenarioResult, 'parts'>, right: Pick<ScenarioResult, 'parts'>): OverlaidCurve[] {
  return ([['A', 'primary'], ['B', 'backup']] as const).flatMap(([channel, name]): OverlaidCurve[] => {
    const [from, to] = [left, right].map(({ parts }) => (parts.curves.ok ? parts.curves.rising[name] : []))
    if (!from || !to) return []
    if (from.length > 0 && isSame(from, to)) return [{ channel, digit: null, points: from }]
    return [{ channel, digit: 1 as const, points: from }, { channel, digit: 2 as const, points: to }].filter(({ points }) => points.length > 0)
  })
}
