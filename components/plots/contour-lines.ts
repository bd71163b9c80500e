import { contours } from 'd3-contour'

/** Values over two axes whose lines rise, `values[i][j]` at `x[i]`, `y[j]`; null where there is none. */
export interface PlotGrid {
  x: readonly number[]
  y: readonly number[]
  values: readonly (readonly (number | null)[])[]
}

export interface PlotXY { x: number, y: number }

export interface ContourLine {
  level: number
  points: PlotXY[]
}

type Pair = readonly [number, number]

/** Closed rings around all that reaches the level, through the middles of the edges between places; half a place is 0.5. */
const ringsOf = (values: readonly number[], columns: number, rows: number, level: number): Pair[][] =>
  contours().size([columns, rows]).smooth(false).contour([...values], level).coordinates.flat().map((ring) => ring.map(([x = 0, y = 0]): Pair => [x, y]))

/** The runs of a ring's points that are joined by kept edges. */
function runsOf(ring: readonly Pair[], isKept: (from: Pair, to: Pair) => boolean): Pair[][] {
  const edges = ring.slice(1).map((to, k) => ({ from: ring[k] ?? to, to }))
  const firstGap = edges.findIndex(({ from, to }) => !isKept(from, to))
  if (firstGap < 0) return [[...ring]]
  const runs: Pair[][] = []
  let run: Pair[] = []
  // Begun behind a gap, no run is cut in two by where the ring happens to start.
  for (const { from, to } of [...edges.slice(firstGap + 1), ...edges.slice(0, firstGap + 1)]) {
    if (isKept(from, to)) run = run.length === 0 ? [from, to] : [...run, to]
    else {
      if (run.length > 0) runs.push(run)
      run = []
    }
  }
  return run.length > 0 ? [...runs, run] : runs
}

const flat = ({ x, y }: PlotGrid, at: (i: number, j: number) => number): number[] => y.flatMap((_, j) => x.map((__, i) => at(i, j)))

/** Lines of equal value, each as runs of points; they end at the frame and beside places without a value. */
export function contourLines(grid: PlotGrid, levels: readonly number[]): ContourLine[] {
  const { x, y, values } = grid
  const at = (i: number, j: number): number => values[i]?.[j] ?? -Infinity
  const known = (i: number, j: number) => Number.isFinite(at(i, j))
  const isKept = (from: Pair, to: Pair): boolean => {
    // The cell between four places that this piece runs through.
    const i = Math.floor((from[0] + to[0]) / 2 - 0.5)
    const j = Math.floor((from[1] + to[1]) / 2 - 0.5)
    return known(i, j) && known(i + 1, j) && known(i, j + 1) && known(i + 1, j + 1)
  }
  return levels.flatMap((level) => {
    const share = (low: number, high: number) => (high === low ? 0.5 : Math.min(1, Math.max(0, (level - low) / (high - low))))
    const pointOf = ([px, py]: Pair): PlotXY => {
      const i = Math.floor(px - 0.5)
      const j = Math.floor(py - 0.5)
      // A whole number in x: on the edge between two places of one row.
      if (Number.isInteger(px)) return { x: along(x, i, share(at(i, j), at(i + 1, j))), y: y[j] ?? 0 }
      return { x: x[i] ?? 0, y: along(y, j, share(at(i, j), at(i, j + 1))) }
    }
    return ringsOf(flat(grid, at), x.length, y.length, level).flatMap((ring) => runsOf(ring, isKept)).map((run) => ({ level, points: run.map(pointOf) }))
  })
}

const along = (axis: readonly number[], i: number, share: number): number => {
  const low = axis[i] ?? 0
  return low + share * ((axis[i + 1] ?? low) - low)
}

/** Outlines of the places that are in: halfway to those that are not, and to the frame. */
export function regionOutlines({ x, y }: Pick<PlotGrid, 'x' | 'y'>, isIn: (i: number, j: number) => boolean): PlotXY[][] {
  const inside = (value: number, count: number) => Math.min(count - 1, Math.max(0, value - 0.5))
  const on = (axis: readonly number[], value: number) => along(axis, Math.floor(inside(value, axis.length)), inside(value, axis.length) % 1)
  return ringsOf(flat({ x, y, values: [] }, (i, j) => (isIn(i, j) ? 1 : 0)), x.length, y.length, 0.5)
    .map((ring) => ring.map(([px, py]) => ({ x: on(x, px), y: on(y, py) })))
}
