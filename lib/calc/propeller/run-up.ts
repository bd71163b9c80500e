import { takeNumber, type NumberRule } from '../validate/number'
import { finiteResult } from '../validate/result'
import { turningSpeed } from '../validate/rules'
import { membersOf } from '../validate/shape'

export interface RunUpDropInput { readonly rpm: number, readonly torqueRatio: number, readonly torqueExponent: number }
export interface RunUpDrop { readonly rpm: number, readonly dropRpm: number }
export interface TorqueRatioInput { readonly rpm: number, readonly dropRpm: number, readonly torqueExponent: number }

const exponent: NumberRule = { name: 'The exponent of engine torque against speed', unit: '', below: 2 }

/**
 * Speed at run-up after a loss of engine torque at fixed throttle: `{ rpm, dropRpm }`, rpm. A gain of torque gives a negative drop.
 *
 * n₂/n₁ = ratio^(1/(2 − m)): load torque ∝ n², engine torque at fixed throttle ∝ n^m
 *
 * Validity: a fixed-pitch propeller standing still; m of −0.5 with a band of 0 … −1 (a near-choked throttle holds air per minute: −1).
 * Source: common practice, no published source.
 *
 * @param input.rpm speed before, rpm, > 0
 * @param input.torqueRatio brake torque after over before at one speed, > 0
 * @param input.torqueExponent exponent m, < 2
 * @throws CalcError on `rpm`, `torqueRatio` or `torqueExponent`
 * @example
 * runUpDrop({ rpm: 1800, torqueRatio: 0.9, torqueExponent: 0 }).dropRpm // → 92.3701
 */
export const runUpDrop = (input: RunUpDropInput): RunUpDrop => {
  const members = membersOf(input)
  const before = takeNumber(members.rpm, 'rpm', turningSpeed)
  const torqueRatio = takeNumber(members.torqueRatio, 'torqueRatio', { name: 'The torque ratio', unit: '', above: 0 })
  const m = takeNumber(members.torqueExponent, 'torqueExponent', exponent)
  // expm1 keeps the digits of a small drop, which a difference of two near speeds would lose.
  const power = Math.log(torqueRatio) / (2 - m)
  const dropRpm = finiteResult(-before * Math.expm1(power), 'torqueRatio', torqueRatio)
  return { rpm: finiteResult(before * Math.exp(power), 'torqueRatio', torqueRatio), dropRpm }
}

/**
 * Ratio of engine torques behind a drop of speed at run-up: the inverse of `runUpDrop`.
 *
 * ratio = ((n₁ − drop)/n₁)^(2 − m)
 *
 * Validity: as `runUpDrop`.
 * Source: common practice, no published source.
 *
 * @param input.rpm speed before, rpm, > 0
 * @param input.dropRpm fall of the speed, rpm, signed, < rpm
 * @param input.torqueExponent exponent m, < 2
 * @throws CalcError on `rpm`, `dropRpm` or `torqueExponent`
 * @example
 * torqueRatioFromDrop({ rpm: 1800, dropRpm: 90, torqueExponent: 0 }) // → 0.9025
 */
export const torqueRatioFromDrop = (input: TorqueRatioInput): number => {
  const members = membersOf(input)
  const before = takeNumber(members.rpm, 'rpm', turningSpeed)
  const dropRpm = takeNumber(members.dropRpm, 'dropRpm', { name: 'The drop of the speed', unit: 'rpm', below: before })
  const m = takeNumber(members.torqueExponent, 'torqueExponent', exponent)
  return finiteResult(Math.exp((2 - m) * Math.log1p(-dropRpm / before)), 'dropRpm', dropRpm, 'rpm')
}
