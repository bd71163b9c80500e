import { takeNumber } from '../validate/number'
import { finiteResult } from '../validate/result'
import { membersOf } from '../validate/shape'

export interface BrakeRatioInput {
  readonly indicatedRatio: number
  readonly imepKpa: number
  readonly fmepKpa: number
}

/**
 * Ratio of brake torques that goes with a ratio of indicated ones. It may be negative, and is reported as it is.
 *
 * brake ratio = (r · imep − fmep)/(imep − fmep): friction stays, so it weighs more at part throttle
 *
 * Validity: friction the same in both states.
 * Source: common practice, no published source (brake = indicated − friction).
 *
 * @param input.indicatedRatio indicated torque over indicated torque of the reference, ≥ 0
 * @param input.imepKpa indicated mean effective pressure of the reference, kPa, > 0 and > fmepKpa
 * @param input.fmepKpa friction mean effective pressure, kPa, ≥ 0 (0: an engine without friction), < imepKpa
 * @throws CalcError on `indicatedRatio`, `imepKpa` or `fmepKpa`
 * @example
 * brakeRatioFromIndicated({ indicatedRatio: 0.9, imepKpa: 500, fmepKpa: 150 }) // → 0.857143
 */
export const brakeRatioFromIndicated = (input: BrakeRatioInput): number => {
  const members = membersOf(input)
  const indicatedRatio = takeNumber(members.indicatedRatio, 'indicatedRatio', { name: 'The indicated ratio', unit: '', min: 0 })
  const imepKpa = takeNumber(members.imepKpa, 'imepKpa', { name: 'The indicated mean effective pressure', unit: 'kPa', above: 0 })
  const fmepKpa = takeNumber(members.fmepKpa, 'fmepKpa', { name: 'The friction mean effective pressure', unit: 'kPa', min: 0, below: imepKpa })
  return finiteResult((indicatedRatio * imepKpa - fmepKpa) / (imepKpa - fmepKpa), 'indicatedRatio', indicatedRatio)
}
