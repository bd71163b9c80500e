import { takeNumber, takeOptionalNumber } from '../validate/number'
import { finiteResult } from '../validate/result'
import { membersOf } from '../validate/shape'

export interface SparkMarginInput {
  readonly demandKv: number
  readonly energyMj: number
  readonly secondaryPf: number
  readonly transferEfficiency: number
  readonly clampKv?: number
}

export interface SparkMargin {
  readonly offeredKv: number
  /** Offered − demanded. */
  readonly marginKv: number
  /** Offered over demanded. */
  readonly ratio: number
}

/**
 * What the coil offers against what the plug asks for: `{ offeredKv, marginKv, ratio }`; kV, kV offered − demanded, and offered over demanded.
 *
 * offered = √(2·η·E/C), at most the clamp: all of the energy that arrives charges the secondary's capacitance
 *
 * Validity: no load on the secondary but its capacitance; a fouled plug leaks part of it away.
 * Source: common practice, no published source (energy of a capacitor).
 *
 * @param input.demandKv voltage that the plug asks for, kV, > 0
 * @param input.energyMj energy stored in the primary E, mJ, ≥ 0
 * @param input.secondaryPf capacitance of secondary, lead and plug C, pF, > 0
 * @param input.transferEfficiency share of the energy that arrives η, > 0 and ≤ 1; about half
 * @param input.clampKv highest voltage that coil and driver allow, kV, > 0; none unless given
 * @throws CalcError on any of these by its name
 * @example
 * sparkMargin({ demandKv: 8, energyMj: 40, secondaryPf: 100, transferEfficiency: 0.5 }) // → { offeredKv: 20, marginKv: 12, ratio: 2.5 }
 */
export const sparkMargin = (input: SparkMarginInput): SparkMargin => {
  const members = membersOf(input)
  const demandKv = takeNumber(members.demandKv, 'demandKv', { name: 'The voltage demanded', unit: 'kV', above: 0 })
  const energyMj = takeNumber(members.energyMj, 'energyMj', { name: 'The stored energy', unit: 'mJ', min: 0 })
  const secondaryPf = takeNumber(members.secondaryPf, 'secondaryPf', { name: 'The capacitance of the secondary', unit: 'pF', above: 0 })
  const efficiency = takeNumber(members.transferEfficiency, 'transferEfficiency', { name: 'The share of the energy that arrives', unit: '', above: 0, max: 1 })
  const clampKv = takeOptionalNumber(members.clampKv, 'clampKv', { name: 'The highest voltage allowed', unit: 'kV', above: 0 }, Infinity)
  // mJ over pF is 10⁹ V².
  const offeredKv = finiteResult(Math.min(clampKv, Math.sqrt((2000 * efficiency * energyMj) / secondaryPf)), 'energyMj', energyMj, 'mJ')
  return { offeredKv, marginKv: finiteResult(offeredKv - demandKv, 'demandKv', demandKv, 'kV'), ratio: finiteResult(offeredKv / demandKv, 'demandKv', demandKv, 'kV') }
}
