import { takeNumber } from '../validate/number'
import { finiteResult } from '../validate/result'
import { anySpeed } from '../validate/rules'
import { membersOf } from '../validate/shape'

export interface FrictionMepInput { readonly rpm: number }

/**
 * Friction mean effective pressure of a four-stroke spark-ignition engine at wide-open throttle, its pumping included, in kPa.
 *
 * fmep = 97 + 15·(rpm/1000) + 5·(rpm/1000)²
 *
 * Validity: motored automotive engines of 0.8 … 1.9 litres; elsewhere it gives the class, not the engine.
 * Source: heywood-1988, friction correlation (memory).
 *
 * @param input.rpm engine speed, rpm, ≥ 0
 * @throws CalcError on `rpm`
 * @example
 * frictionMepKpa({ rpm: 2780 }) // → 177.342
 */
export const frictionMepKpa = (input: FrictionMepInput): number => {
  const rpm = takeNumber(membersOf(input).rpm, 'rpm', anySpeed)
  const thousands = rpm / 1000
  return finiteResult(97 + 15 * thousands + 5 * thousands ** 2, 'rpm', rpm, 'rpm')
}
