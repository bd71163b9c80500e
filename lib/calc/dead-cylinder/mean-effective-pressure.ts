import { takeNumber, type NumberRule } from '../validate/number'
import { finiteResult } from '../validate/result'
import { turningSpeed } from '../validate/rules'
import { membersOf } from '../validate/shape'

export interface MepFromPowerInput { readonly powerKw: number, readonly displacementCc: number, readonly rpm: number }
export interface PowerFromMepInput { readonly mepKpa: number, readonly displacementCc: number, readonly rpm: number }

/** A four-stroke sweeps its displacement rpm/120 times a second: 120 · 1e6 cc per m³, kPa per kW/(m³/s). */
const factor = 1.2e8
const displacement: NumberRule = { name: 'The displacement', unit: 'cc', above: 0 }

/**
 * Mean effective pressure that makes a power, in kPa: brake, indicated or friction, as the power is.
 *
 * mep = 1.2e8 · kW/(cc · rpm)
 *
 * Validity: four-stroke engines.
 * Source: common practice, no published source (definition).
 *
 * @param input.powerKw power, kW, signed, any finite number
 * @param input.displacementCc displacement of the whole engine, cc, > 0
 * @param input.rpm engine speed, rpm, > 0
 * @throws CalcError on `powerKw`, `displacementCc` or `rpm`
 * @example
 * mepFromPower({ powerKw: 65, displacementCc: 2600, rpm: 3000 }) // → 1000
 */
export const mepFromPower = (input: MepFromPowerInput): number => {
  const members = membersOf(input)
  const powerKw = takeNumber(members.powerKw, 'powerKw', { name: 'The power', unit: 'kW' })
  const displacementCc = takeNumber(members.displacementCc, 'displacementCc', displacement)
  const rpm = takeNumber(members.rpm, 'rpm', turningSpeed)
  return finiteResult((factor * powerKw) / displacementCc / rpm, 'powerKw', powerKw, 'kW')
}

/**
 * Power that a mean effective pressure makes, in kW.
 *
 * kW = mep · cc · rpm/1.2e8
 *
 * Validity: four-stroke engines.
 * Source: common practice, no published source (definition).
 *
 * @param input.mepKpa mean effective pressure, kPa, > 0
 * @param input.displacementCc displacement of the whole engine, cc, > 0
 * @param input.rpm engine speed, rpm, > 0
 * @throws CalcError on `mepKpa`, `displacementCc` or `rpm`
 * @example
 * powerFromMep({ mepKpa: 1000, displacementCc: 2600, rpm: 3000 }) // → 65
 */
export const powerFromMep = (input: PowerFromMepInput): number => {
  const members = membersOf(input)
  const mepKpa = takeNumber(members.mepKpa, 'mepKpa', { name: 'The mean effective pressure', unit: 'kPa', above: 0 })
  const displacementCc = takeNumber(members.displacementCc, 'displacementCc', displacement)
  const rpm = takeNumber(members.rpm, 'rpm', turningSpeed)
  return finiteResult((mepKpa * displacementCc * rpm) / factor, 'mepKpa', mepKpa, 'kPa')
}
