import type { ReadyExposure } from './take-event'

/** What an event, its independent part or a common cause comes to: a fixed probability, or λt with the way it is exposed. */
export interface Load {
  readonly kind: 'probability' | 'flight' | 'latent'
  /** The probability itself, or rate times hours of exposure. */
  readonly amount: number
}

/** λt, or the probability where there is no rate. Beyond what a number can hold it is infinite, and its probability 1. */
export const loadOf = (exposure: ReadyExposure, share = 1): Load => exposure.kind === 'probability'
  ? { kind: exposure.kind, amount: exposure.p }
  : { kind: exposure.kind, amount: exposure.ratePerH * share * exposure.hours }

/**
 * Mean of 1 − e^(−xu) over u = 0 … 1. The closed form subtracts two numbers that are nearly x; the series
 * x/2! − x²/3! + x³/4! − … does not, and up to 1 its first term leads.
 */
export const meanLatent = (x: number): number => {
  if (x > 1) return 1 + Math.expm1(-x) / x
  let term = x / 2
  let sum = term
  for (let n = 3; Math.abs(term) > 1e-18 * sum; n += 1) {
    term *= -x / n
    sum += term
  }
  return sum
}

/** Probability of a load, a latent one at its mean over the interval. */
export const meanProbability = ({ kind, amount }: Load): number => {
  if (kind === 'probability') return amount
  return kind === 'flight' ? -Math.expm1(-amount) + 0 : meanLatent(amount)
}
