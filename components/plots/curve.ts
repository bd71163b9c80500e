export interface CurvePoint { rpm: number, deg: number }

/** Value of a curve at a speed: linear between points, the later of two points of one speed, null beyond the ends. */
export function degAt(points: readonly CurvePoint[], rpm: number): number | null {
  let low = 0
  let high = points.length
  // First point beyond the speed, by halves: the curve is asked at every move of the handle.
  while (low < high) {
    const middle = (low + high) >> 1
    if ((points[middle]?.rpm ?? Infinity) <= rpm) low = middle + 1
    else high = middle
  }
  const before = points[low - 1]
  const after = points[low]
  if (!before) return null
  if (!after) return before.rpm === rpm ? before.deg : null
  return before.deg + ((after.deg - before.deg) * (rpm - before.rpm)) / (after.rpm - before.rpm)
}

/** The jumps of a curve: speeds that carry two points. */
export const jumpsOf = (points: readonly CurvePoint[]): number[] => points.flatMap((point, index) => (points[index + 1]?.rpm === point.rpm ? [point.rpm] : []))

/** Where the falling trend leaves the rising one: runs of points that differ, with the points they start and end at. */
export function fallingRuns(rising: readonly CurvePoint[], falling: readonly CurvePoint[]): CurvePoint[][] {
  // At a jump the rising curve has two values: either is on it.
  const near = (one: number | null, other: number) => one !== null && Math.abs(one - other) < 1e-6
  const differs = falling.map(({ rpm, deg }) => !near(degAt(rising, rpm), deg) && !rising.some((point) => point.rpm === rpm && near(point.deg, deg)))
  const runs: CurvePoint[][] = []
  let run: CurvePoint[] = []
  falling.forEach((point, index) => {
    if (differs[index]) {
      const previous = falling[index - 1]
      if (run.length === 0 && previous) run.push(previous)
      run.push(point)
    } else if (run.length > 0) {
      runs.push([...run, point])
      run = []
    }
  })
  return run.length > 1 ? [...runs, run] : runs
}
