/** Splits a double into two halves whose products are exact (Dekker). */
const splitter = 2 ** 27 + 1

/**
 * start − Σ a·b as if in twice the digits: every product and sum carries its rounding error along.
 * Meant for values of moderate size: beyond about 1e300 the splitting overflows.
 */
export const startMinusProducts = (start: number, a: readonly number[], b: readonly number[]): number => {
  let sum = start
  let lost = 0
  const add = (term: number): void => {
    const next = sum + term
    const back = next - sum
    lost += (sum - (next - back)) + (term - back)
    sum = next
  }
  for (let i = 0; i < a.length; i += 1) {
    const x = -(a[i] ?? 0)
    const y = b[i] ?? 0
    const product = x * y
    const xBig = x * splitter
    const xHigh = xBig - (xBig - x)
    const yBig = y * splitter
    const yHigh = yBig - (yBig - y)
    const xLow = x - xHigh
    const yLow = y - yHigh
    lost += xLow * yLow - (((product - xHigh * yHigh) - xLow * yHigh) - xHigh * yLow)
    add(product)
  }
  return sum + lost
}
