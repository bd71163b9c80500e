/**
 * Mean of a list. Counted from the first value, so that equal values have exactly that mean and their deviations are exactly 0.
 * Not finite where the values are too large for a number.
 */
export const meanOf = (values: readonly number[]): number => {
  const first = values[0] ?? Number.NaN
  let sum = 0
  for (const value of values) sum += value - first
  return first + sum / values.length
}

/** Sum of squared deviations from the mean as { largest, shares }: largest² · shares. Squares stay within a number's range at any size. */
export const squaresAbout = (values: readonly number[], mean: number): { largest: number, shares: number } => {
  let largest = 0
  for (const value of values) largest = Math.max(largest, Math.abs(value - mean))
  if (largest === 0) return { largest, shares: 0 }
  let squares = 0
  let rest = 0
  for (const value of values) {
    const share = (value - mean) / largest
    squares += share * share
    rest += share
  }
  // What rounding left in the mean is taken out again.
  return { largest, shares: Math.max(0, squares - (rest * rest) / values.length) }
}

/** Standard deviation of a sample, divisor n − 1; two values at least. */
export const sampleSd = (values: readonly number[], mean: number = meanOf(values)): number => {
  const { largest, shares } = squaresAbout(values, mean)
  return largest * Math.sqrt(shares / (values.length - 1))
}
