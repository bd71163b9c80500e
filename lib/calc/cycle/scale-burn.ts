import { takeNumber, takeOptionalNumber } from '../validate/number'
import { finiteResult } from '../validate/result'
import { turningSpeed } from '../validate/rules'
import { membersOf, takeRecord } from '../validate/shape'

/** A burn known at one speed and charge pressure. */
export interface BurnReference {
  readonly rpm: number
  readonly pressureKpa: number
  readonly delayDeg: number
  readonly durationDeg: number
}

export interface ScaleBurnInput {
  readonly reference: BurnReference
  readonly rpm: number
  readonly pressureKpa: number
  readonly speedExponent?: number
  readonly pressureExponent?: number
}

export interface BurnAngles { readonly delayDeg: number, readonly durationDeg: number }

const pressureRule = { name: 'The charge pressure', unit: 'kPa', above: 0 }
const exponentRule = (name: string) => ({ name, unit: '', min: -10, max: 10 })

/**
 * Delay and duration of a burn at another speed and charge pressure, `{ delayDeg, durationDeg }` in crank degrees.
 *
 * both angles × (rpm/rpm_ref)^speedExponent · (p/p_ref)^pressureExponent
 *
 * Validity: one engine with one mixture; without it the best spark hardly moves with speed and no advance curve comes out.
 * Source: hires-1978, the exponents (memory)
 *
 * @param input.reference `{ rpm, pressureKpa, delayDeg, durationDeg }` where the burn is known: rpm > 0, kPa > 0, crank degrees ≥ 0 and > 0
 * @param input.rpm engine speed, rpm > 0
 * @param input.pressureKpa charge pressure at inlet closing, kPa > 0
 * @param input.speedExponent −10 … 10, 1/3 unless given
 * @param input.pressureExponent −10 … 10, −0.25 unless given
 * @throws CalcError on any of these by its path
 * @example
 * scaleBurn({ reference: { rpm: 1000, pressureKpa: 100, delayDeg: 8, durationDeg: 60 }, rpm: 8000, pressureKpa: 100 }) // → { delayDeg: 16, durationDeg: 120 }
 */
export const scaleBurn = (input: ScaleBurnInput): BurnAngles => {
  const members = membersOf(input)
  const reference = takeRecord(members.reference, 'reference', 'The reference of the burn')
  const fromRpm = takeNumber(reference.rpm, 'reference.rpm', turningSpeed)
  const fromKpa = takeNumber(reference.pressureKpa, 'reference.pressureKpa', pressureRule)
  const delayDeg = takeNumber(reference.delayDeg, 'reference.delayDeg', { name: 'The delay', unit: 'deg', min: 0 })
  const durationDeg = takeNumber(reference.durationDeg, 'reference.durationDeg', { name: 'The duration', unit: 'deg', above: 0 })
  const rpm = takeNumber(members.rpm, 'rpm', turningSpeed)
  const pressureKpa = takeNumber(members.pressureKpa, 'pressureKpa', pressureRule)
  const speedExponent = takeOptionalNumber(members.speedExponent, 'speedExponent', exponentRule('The exponent of the speed'), 1 / 3)
  const pressureExponent = takeOptionalNumber(members.pressureExponent, 'pressureExponent', exponentRule('The exponent of the pressure'), -0.25)
  const bySpeed = finiteResult((rpm / fromRpm) ** speedExponent, 'rpm', rpm, 'rpm')
  const byPressure = finiteResult((pressureKpa / fromKpa) ** pressureExponent, 'pressureKpa', pressureKpa, 'kPa')
  const scale = finiteResult(bySpeed * byPressure, 'rpm', rpm, 'rpm')
  return {
    delayDeg: finiteResult(delayDeg * scale, 'reference.delayDeg', delayDeg, 'deg'),
    durationDeg: finiteResult(durationDeg * scale, 'reference.durationDeg', durationDeg, 'deg'),
  }
}
