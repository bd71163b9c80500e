import { takeNumber, takeOptionalNumber } from '../validate/number'
import { membersOf } from '../validate/shape'

export interface BurnedFractionInput {
  readonly share: number
  readonly a?: number
  readonly m?: number
}

/** Burned share at a share of the burn's duration; 0 before it. Unchecked, for the model's own use. */
export const wiebe = (share: number, a: number, m: number): number => (share > 0 ? -Math.expm1(-a * share ** (m + 1)) : 0)

/**
 * Share of the fuel burned at a share of the burn's duration, 0 … 1.
 *
 * x = 1 − exp(−a·z^(m+1)), z = (θ − θ₀)/Δθ
 *
 * Validity: one flame through one charge; the e^−a left at z = 1 is never burned.
 * Source: common practice, no published source (Wiebe's function; a 5 and m 2 are usual).
 *
 * @param input.share share of the duration z, 0 … 1
 * @param input.a > 0, 5 unless given
 * @param input.m ≥ 0, 2 unless given
 * @throws CalcError on any of these by its name
 * @example
 * burnedFraction({ share: 0.5 }) // → 0.464739
 */
export const burnedFraction = (input: BurnedFractionInput): number => {
  const members = membersOf(input)
  const share = takeNumber(members.share, 'share', { name: 'The share of the duration', unit: '', min: 0, max: 1 })
  const a = takeOptionalNumber(members.a, 'a', { name: 'The constant a of the burn', unit: '', above: 0 }, 5)
  const m = takeOptionalNumber(members.m, 'm', { name: 'The exponent m of the burn', unit: '', min: 0 }, 2)
  return wiebe(share, a, m)
}
