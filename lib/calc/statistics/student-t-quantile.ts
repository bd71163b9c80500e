import { takeNumber } from '../validate/number'
import { finiteResult } from '../validate/result'
import { betaFraction, logHalfStepOfGamma } from './incomplete-beta'
import { normalUpperQuantile } from './normal-quantile'
import { degreesOfFreedom, probabilityRule } from './rules'

/** From here on two terms of Hill's expansion are exact to rounding, down to the smallest tail a number can hold. */
const manyDegrees = 1e5
/** Beyond this the distribution cannot be told from the normal one. */
const endlessDegrees = 1e18
/** Logarithms of the smallest and the largest number. */
const lowestLog = -745
const highestLog = 709.78

const softPlus = (x: number): number => (x > 0 ? x + Math.log1p(Math.exp(-x)) : Math.log1p(Math.exp(x)))

/** P(T > t), P(0 < T < t) and t·density at ln t: everything in logarithms, so that neither t² nor a power of it overflows. */
const sharesAt = (logT: number, dof: number, logFront: number): { tail: number, centre: number, slope: number } => {
  const half = dof / 2
  const logSquare = 2 * logT - Math.log(dof)
  const logX = -softPlus(logSquare)
  const logY = -softPlus(-logSquare)
  const x = Math.exp(logX)
  // x^half · √y / B(half, ½): the factor before both fractions, and t times the density.
  const slope = Math.exp(half * logX + 0.5 * logY + logFront)
  if (x < (half + 1) / (half + 2.5)) {
    const tail = (slope / dof) * betaFraction(half, 0.5, x)
    return { tail, centre: 0.5 - tail, slope }
  }
  const centre = slope * betaFraction(0.5, half, Math.exp(logY))
  return { tail: 0.5 - centre, centre, slope }
}

/** Newton in logarithms of value and share, kept within a shrinking bracket. */
const solve = (tail: number, dof: number): number => {
  const logFront = logHalfStepOfGamma(dof / 2) - 0.5 * Math.log(Math.PI)
  const byTail = tail <= 0.25
  const wanted = byTail ? tail : 0.5 - tail
  const missAt = (logT: number): { miss: number, newton: number } => {
    const { tail: above, centre, slope } = sharesAt(logT, dof, logFront)
    const share = byTail ? above : centre
    const off = Math.log(share / wanted)
    return byTail ? { miss: off, newton: (off * share) / slope } : { miss: -off, newton: (-off * share) / slope }
  }
  if (missAt(highestLog).miss > 0) return Infinity
  let low = lowestLog
  let high = highestLog
  let logT = Math.log(normalUpperQuantile(tail))
  for (let i = 0; i < 200; i += 1) {
    const { miss, newton } = missAt(logT)
    if (miss === 0) break
    if (miss > 0) low = logT
    else high = logT
    const next = logT + newton
    const isInside = next > low && next < high
    const step = (isInside ? next : (low + high) / 2) - logT
    logT += step
    if (Math.abs(step) <= 4e-16 * Math.max(1, Math.abs(logT))) break
  }
  return Math.exp(logT)
}

/** z of the normal distribution → t of many degrees of freedom. Hill gives z = w·(1 + c(w²)) with w² = (ν − ½)·ln(1 + t²/ν); c is small, so w follows by repetition. */
const fromNormal = (z: number, dof: number): number => {
  const a = dof - 0.5
  const b = 48 * a * a
  let w = z
  for (let i = 0; i < 6; i += 1) {
    w = z / (1 + (w * w + 3) / b)
  }
  return Math.sqrt(dof * Math.expm1((w * w) / a))
}

/** Value of Student's distribution that is exceeded with the probability `tail`, 0 < tail ≤ 0.5. Infinity where no number can hold it. */
export const studentTUpperQuantile = (tail: number, dof: number): number => {
  if (tail === 0.5) return 0
  if (dof >= endlessDegrees) return normalUpperQuantile(tail)
  return dof >= manyDegrees ? fromNormal(normalUpperQuantile(tail), dof) : solve(tail, dof)
}

/**
 * Value of Student's t distribution that is not exceeded with the given probability, without unit.
 *
 * t with 1 − ½·I_x(ν/2, ½) = probability, x = ν/(ν + t²) (I: regularised incomplete beta function), for t ≥ 0 and by symmetry below;
 * from 100 000 degrees of freedom by Hill's expansion about the normal value.
 *
 * Validity: 1e-12 relative; ν need not be whole.
 * Source: hill-1970, expansion for many degrees of freedom (memory)
 *
 * @param probability chance that the value is not exceeded, without unit, > 0 and < 1
 * @param dof degrees of freedom ν, without unit, ≥ 0.001
 * @throws CalcError on `probability` or `dof`; on `dof` also where so few degrees put the value beyond what a number can hold
 * @example
 * studentTQuantile(0.975, 20) // → 2.0859634473
 * studentTQuantile(0.025, 1) // → -12.7062047362
 */
export const studentTQuantile = (probability: number, dof: number): number => {
  const share = takeNumber(probability, 'probability', probabilityRule)
  const degrees = takeNumber(dof, 'dof', { ...degreesOfFreedom, name: 'The number of degrees of freedom' })
  const t = share < 0.5 ? -studentTUpperQuantile(share, degrees) : studentTUpperQuantile(1 - share, degrees)
  return finiteResult(t, 'dof', dof)
}

/** Factor k that covers the given share to both sides: Student's t, or the normal value without degrees of freedom. */
export const coverageFactorOf = (coverage: number, dof: number | null): number => {
  const tail = (1 - coverage) / 2
  return dof === null ? normalUpperQuantile(tail) : studentTUpperQuantile(tail, dof)
}
