import { takeNumber } from '../validate/number'
import { probabilityRule } from './rules'

/** Coefficients from the constant term up: numerator and denominator of Wichura's three rational functions. */
const central = {
  over: [3.3871328727963666080, 133.14166789178437745, 1971.5909503065514427, 13731.693765509461125, 45921.953931549871457, 67265.770927008700853, 33430.575583588128105, 2509.0809287301226727],
  under: [1, 42.313330701600911252, 687.18700749205790830, 5394.1960214247511077, 21213.794301586595867, 39307.895800092710610, 28729.085735721942674, 5226.4952788528545610],
}
const middle = {
  over: [1.42343711074968357734, 4.63033784615654529590, 5.76949722146069140550, 3.64784832476320460504, 1.27045825245236838258, 2.41780725177450611770e-1, 2.27238449892691845833e-2, 7.74545014278341407640e-4],
  under: [1, 2.05319162663775882187, 1.67638483018380384940, 6.89767334985100004550e-1, 1.48103976427480074590e-1, 1.51986665636164571966e-2, 5.47593808499534494600e-4, 1.05075007164441684324e-9],
}
const far = {
  over: [6.65790464350110377720, 5.46378491116411436990, 1.78482653991729133580, 2.96560571828504891230e-1, 2.65321895265761230930e-2, 1.24266094738807843860e-3, 2.71155556874348757815e-5, 2.01033439929228813265e-7],
  under: [1, 5.99832206555887937690e-1, 1.36929880922735805310e-1, 1.48753612908506148525e-2, 7.86869131145613259100e-4, 1.84631831751005468180e-5, 1.42151175831644588870e-7, 2.04426310338993978564e-15],
}

const polynomial = (coefficients: readonly number[], x: number): number => coefficients.reduceRight((sum, coefficient) => sum * x + coefficient, 0)
const ratio = ({ over, under }: typeof central, x: number): number => polynomial(over, x) / polynomial(under, x)

/** Normal value that is exceeded with the probability `tail`, 0 < tail ≤ 0.5. Asked by the tail, nothing is lost of a small one. */
export const normalUpperQuantile = (tail: number): number => {
  const off = 0.5 - tail
  if (off <= 0.425) return off * ratio(central, 0.180625 - off * off)
  const depth = Math.sqrt(-Math.log(tail))
  return depth <= 5 ? ratio(middle, depth - 1.6) : ratio(far, depth - 5)
}

/**
 * Value of the standard normal distribution that is not exceeded with the given probability, without unit.
 *
 * z with Φ(z) = probability, by rational functions in ½ − tail or √(−ln tail).
 *
 * Validity: 1e-14 relative over all probabilities; a probability within 1e-16 of 1 cannot be written as a number.
 * Source: wichura-1988, algorithm AS 241 (memory)
 *
 * @param probability chance that the value is not exceeded, without unit, > 0 and < 1
 * @throws CalcError on `probability`
 * @example
 * normalQuantile(0.975) // → 1.959963984540
 * normalQuantile(0.5) // → 0
 */
export const normalQuantile = (probability: number): number => {
  const share = takeNumber(probability, 'probability', probabilityRule)
  return share < 0.5 ? -normalUpperQuantile(share) : normalUpperQuantile(1 - share) + 0
}
