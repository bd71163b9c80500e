import { takeNumber } from '../validate/number'
import { finiteResult } from '../validate/result'

/**
 * Full-throttle brake power of a naturally aspirated engine at a density ratio, over that at sea level; dimensionless.
 *
 * P/P₀ = 1.132·σ − 0.132: indicated power goes with the density, friction stays
 *
 * Validity: naturally aspirated, full throttle, one speed, one mixture; σ from about 0.3 to 1.1. Below σ = 0.1166 the friction wins and it is negative.
 * Source: gagg-ferrar-1934, the straight line (read).
 *
 * @param ratio density of the air over that of the standard at sea level σ, > 0
 * @throws CalcError on `ratio`
 * @example
 * powerAtDensityRatio(1) // → 1.0000000
 * powerAtDensityRatio(0.78602) // → 0.75777
 */
export const powerAtDensityRatio = (ratio: number): number => {
  const sigma = takeNumber(ratio, 'ratio', { name: 'The density ratio', unit: '', above: 0 })
  return finiteResult(1.132 * sigma - 0.132, 'ratio', sigma)
}
