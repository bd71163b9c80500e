import { takeNumber } from '../validate/number'
import { finiteResult } from '../validate/result'
import { membersOf } from '../validate/shape'

/** The one pair of pressures known to belong together: full throttle. */
export interface FullThrottlePressures {
  /** Charge at inlet closing, kPa > 0. */
  readonly fullChargeKpa: number
  /** In the manifold, kPa > 0. */
  readonly fullManifoldKpa: number
}

export interface ManifoldFromChargeInput extends FullThrottlePressures {
  readonly chargeKpa: number
}

export interface ChargeFromManifoldInput extends FullThrottlePressures {
  readonly manifoldKpa: number
}

const take = (value: unknown, field: string, name: string): number => takeNumber(value, field, { name, unit: 'kPa', above: 0 })

/**
 * Manifold pressure that a charge pressure at inlet closing stands for, kPa.
 *
 * p_manifold = p_charge·p_manifold,full/p_charge,full: a straight line through zero and full throttle
 *
 * Validity: right at full throttle where both are known; elsewhere it takes heating, residual gas and the waves of the inlet to be what they are there.
 * Source: common practice, no published source (proportion).
 *
 * @param input.chargeKpa charge pressure at inlet closing, kPa > 0
 * @param input.fullChargeKpa the same at full throttle, kPa > 0
 * @param input.fullManifoldKpa manifold pressure at full throttle, kPa > 0
 * @throws CalcError on any of these by its name
 * @example
 * manifoldKpaFromCharge({ chargeKpa: 55, fullChargeKpa: 110, fullManifoldKpa: 98 }) // → 49
 */
export const manifoldKpaFromCharge = (input: ManifoldFromChargeInput): number => {
  const members = membersOf(input)
  const chargeKpa = take(members.chargeKpa, 'chargeKpa', 'The charge pressure')
  const fullChargeKpa = take(members.fullChargeKpa, 'fullChargeKpa', 'The charge pressure at full throttle')
  const fullManifoldKpa = take(members.fullManifoldKpa, 'fullManifoldKpa', 'The manifold pressure at full throttle')
  return finiteResult((chargeKpa / fullChargeKpa) * fullManifoldKpa, 'chargeKpa', chargeKpa, 'kPa')
}

/**
 * Charge pressure at inlet closing that a manifold pressure stands for, kPa: `manifoldKpaFromCharge` turned round.
 *
 * p_charge = p_manifold·p_charge,full/p_manifold,full
 *
 * Validity: that of `manifoldKpaFromCharge`.
 * Source: common practice, no published source (proportion).
 *
 * @param input.manifoldKpa manifold pressure, kPa > 0
 * @param input.fullChargeKpa charge pressure at inlet closing at full throttle, kPa > 0
 * @param input.fullManifoldKpa manifold pressure at full throttle, kPa > 0
 * @throws CalcError on any of these by its name
 * @example
 * chargeKpaFromManifold({ manifoldKpa: 49, fullChargeKpa: 110, fullManifoldKpa: 98 }) // → 55
 */
export const chargeKpaFromManifold = (input: ChargeFromManifoldInput): number => {
  const members = membersOf(input)
  const manifoldKpa = take(members.manifoldKpa, 'manifoldKpa', 'The manifold pressure')
  const fullChargeKpa = take(members.fullChargeKpa, 'fullChargeKpa', 'The charge pressure at full throttle')
  const fullManifoldKpa = take(members.fullManifoldKpa, 'fullManifoldKpa', 'The manifold pressure at full throttle')
  return finiteResult((manifoldKpa / fullManifoldKpa) * fullChargeKpa, 'manifoldKpa', manifoldKpa, 'kPa')
}
