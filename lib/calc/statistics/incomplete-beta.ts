/** ln(Γ(a + ½)/Γ(a)), a > 0: a series in 1/a where that is small, reached from below by Γ(a + 1) = a·Γ(a). No difference of large logarithms is taken. */
export const logHalfStepOfGamma = (a: number): number => {
  let shifted = a
  let product = 1
  while (shifted < 20) {
    product *= shifted / (shifted + 0.5)
    shifted += 1
  }
  const inverse = 1 / shifted
  const square = inverse * inverse
  const series = inverse * (-1 / 8 + square * (1 / 192 + square * (-1 / 640 + square * (17 / 14336 + square * (-31 / 18432)))))
  return Math.log(product) + 0.5 * Math.log(shifted) + series
}

/** Far more than any case needs: about the square root of the larger parameter. */
const mostTerms = 10_000
const tiny = 1e-300

/**
 * Continued fraction of the regularised incomplete beta function, by Lentz: I_x(a, b) = x^a·(1 − x)^b/(a·B(a, b)) · fraction.
 * Converges fast for x < (a + 1)/(a + b + 2); beyond it the caller asks for 1 − I_(1−x)(b, a).
 */
export const betaFraction = (a: number, b: number, x: number): number => {
  const kept = (value: number): number => (Math.abs(value) < tiny ? tiny : value)
  let above = 1
  let below = 1 / kept(1 - ((a + b) * x) / (a + 1))
  let fraction = below
  for (let m = 1; m <= mostTerms; m += 1) {
    const even = (m * (b - m) * x) / ((a + 2 * m - 1) * (a + 2 * m))
    below = 1 / kept(1 + even * below)
    above = kept(1 + even / above)
    fraction *= below * above
    const odd = (-(a + m) * (a + b + m) * x) / ((a + 2 * m) * (a + 2 * m + 1))
    below = 1 / kept(1 + odd * below)
    above = kept(1 + odd / above)
    const step = below * above
    fraction *= step
    if (Math.abs(step - 1) < 1e-16) break
  }
  return fraction
}
