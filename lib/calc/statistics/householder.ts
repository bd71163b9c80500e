/** Orthogonal factors of a tall matrix, for solving against many right sides. Built by Householder reflections with column pivoting. */
export interface Factors {
  /** Column that stands at each place of R. */
  readonly order: readonly number[]
  /** R, upper triangle, by rows. */
  readonly upper: readonly (readonly number[])[]
  /** Least squares of a right side, in the order of the columns given. */
  readonly solve: (side: readonly number[]) => number[]
}

const dotFrom = (a: readonly number[], b: readonly number[], from: number): number => {
  let sum = 0
  for (let i = from; i < a.length; i += 1) sum += (a[i] ?? 0) * (b[i] ?? 0)
  return sum
}

/** side − 2·v(v·side)/(v·v), from a row on. */
const reflect = (side: number[], v: readonly number[], vv: number, from: number): void => {
  const share = (2 * dotFrom(v, side, from)) / vv
  for (let i = from; i < side.length; i += 1) side[i] = (side[i] ?? 0) - share * (v[i] ?? 0)
}

const longestFrom = (columns: readonly number[][], k: number): number => {
  let best = k
  let length = -1
  for (let j = k; j < columns.length; j += 1) {
    const column = columns[j] ?? []
    const squares = dotFrom(column, column, k)
    if (squares > length) {
      best = j
      length = squares
    }
  }
  return best
}

/** `null` when a column is, to rounding, a combination of the others. Columns of about one length, of n numbers each, n ≥ their count. */
export const factorise = (given: readonly (readonly number[])[], leastShare: number): Factors | null => {
  const columns = given.map((column) => [...column])
  const order = columns.map((_, j) => j)
  const reflectors: { v: number[], vv: number }[] = []
  const upper: number[][] = []
  let first = 0
  for (let k = 0; k < columns.length; k += 1) {
    const pick = longestFrom(columns, k)
    columns.splice(k, 0, ...columns.splice(pick, 1))
    order.splice(k, 0, ...order.splice(pick, 1))
    const column = columns[k] ?? []
    const length = Math.sqrt(dotFrom(column, column, k))
    if (k === 0) first = length
    if (!(length > leastShare * first)) return null
    const v = column.map((entry, i) => (i < k ? 0 : entry))
    v[k] = (v[k] ?? 0) + (Math.sign(v[k] ?? 0) || 1) * length
    const vv = dotFrom(v, v, k)
    for (let j = k; j < columns.length; j += 1) reflect(columns[j] ?? [], v, vv, k)
    reflectors.push({ v, vv })
  }
  for (let k = 0; k < columns.length; k += 1) upper.push(columns.map((column, j) => (j < k ? 0 : column[k] ?? 0)))

  const solve = (side: readonly number[]): number[] => {
    const rest = [...side]
    reflectors.forEach(({ v, vv }, k) => reflect(rest, v, vv, k))
    const solution = columns.map(() => 0)
    for (let k = columns.length - 1; k >= 0; k -= 1) {
      let sum = rest[k] ?? 0
      for (let j = k + 1; j < columns.length; j += 1) sum -= (upper[k]?.[j] ?? 0) * (solution[order[j] ?? 0] ?? 0)
      solution[order[k] ?? 0] = sum / (upper[k]?.[k] ?? 1)
    }
    return solution
  }
  return { order, upper, solve }
}

/** √ of the diagonal of (RᵀR)⁻¹, in the order of the columns given: the length of each row of R⁻¹. */
export const inverseRowLengths = ({ order, upper }: Factors): number[] => {
  const count = order.length
  const squares = new Array<number>(count).fill(0)
  for (let c = 0; c < count; c += 1) {
    const column = new Array<number>(count).fill(0)
    for (let k = c; k >= 0; k -= 1) {
      let sum = k === c ? 1 : 0
      for (let j = k + 1; j <= c; j += 1) sum -= (upper[k]?.[j] ?? 0) * (column[j] ?? 0)
      column[k] = sum / (upper[k]?.[k] ?? 1)
      squares[order[k] ?? 0] = (squares[order[k] ?? 0] ?? 0) + (column[k] ?? 0) ** 2
    }
  }
  return squares.map(Math.sqrt)
}
