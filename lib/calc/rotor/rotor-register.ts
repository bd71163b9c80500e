import { takeNumber } from '../validate/number'
import { takeNumbers } from '../validate/numbers'
import { finiteResult } from '../validate/result'
import { cylinderCount } from '../validate/rules'
import { membersOf, takeList } from '../validate/shape'

export interface RotorRegisterInput {
  readonly cylinders: number
  readonly terminalWidthDeg: number
  readonly rotorWidthDeg: number
  readonly phasedAtDeg: number
  readonly advancesDeg: readonly number[]
}

export interface RotorRegister {
  /** Crank degrees, as given. */
  readonly advanceDeg: number
  /** Distributor degrees past the centre of the terminal when the spark starts, signed. */
  readonly offsetDeg: number
  /** Distributor degrees left before the edges part; negative when they have. */
  readonly registerDeg: number
  /** Distributor degrees to the edge of the next terminal. */
  readonly freeDeg: number
}

/**
 * How the rotor faces its terminal at each advance: a list of `{ advanceDeg, offsetDeg, registerDeg, freeDeg }`; advanceDeg in crank degrees, the rest in distributor degrees.
 *
 * offset = (phasedAtDeg − advance)/2, signed, past centre; register = (rotorWidth + terminalWidth)/2 − |offset|;
 * free = 360/N − |offset| − (rotorWidth + terminalWidth)/2
 *
 * Validity: terminals evenly spaced, the rotor at half crank speed. The rotor turns on while the spark burns: look at the spark's end too.
 * Source: common practice, no published source (geometry).
 *
 * @param input.cylinders number of cylinders N, a whole number ≥ 1
 * @param input.terminalWidthDeg width of a terminal, distributor degrees, > 0 and < 360/N
 * @param input.rotorWidthDeg width of the rotor's tip, distributor degrees, > 0 and < 360
 * @param input.phasedAtDeg advance at which the rotor is centred on its terminal, crank degrees, any finite number
 * @param input.advancesDeg advances to look at, crank degrees, one at least, any finite numbers
 * @throws CalcError on any of these by its name, `advancesDeg.i` for one of the list
 * @example
 * rotorRegister({ cylinders: 6, terminalWidthDeg: 8, rotorWidthDeg: 20, phasedAtDeg: 22, advancesDeg: [27] }) // → [{ advanceDeg: 27, offsetDeg: -2.5, registerDeg: 11.5, freeDeg: 43.5 }]
 */
export const rotorRegister = (input: RotorRegisterInput): RotorRegister[] => {
  const members = membersOf(input)
  const cylinders = takeNumber(members.cylinders, 'cylinders', cylinderCount)
  const spacingDeg = 360 / cylinders
  const terminalWidthDeg = takeNumber(members.terminalWidthDeg, 'terminalWidthDeg', { name: 'The width of a terminal', unit: 'deg', above: 0, below: spacingDeg })
  const rotorWidthDeg = takeNumber(members.rotorWidthDeg, 'rotorWidthDeg', { name: 'The width of the rotor', unit: 'deg', above: 0, below: 360 })
  const phasedAtDeg = takeNumber(members.phasedAtDeg, 'phasedAtDeg', { name: 'The advance at which the rotor is centred', unit: 'deg' })
  const list = takeList(members.advancesDeg, 'advancesDeg', 'The list of advances', 1)
  const halfWidths = (rotorWidthDeg + terminalWidthDeg) / 2
  return takeNumbers(list, 'advancesDeg', { unit: 'deg' }, (i) => `Advance ${i + 1}`).map((advanceDeg, i) => {
    const offsetDeg = finiteResult((phasedAtDeg - advanceDeg) / 2, `advancesDeg.${i}`, advanceDeg, 'deg')
    const off = Math.abs(offsetDeg)
    return { advanceDeg, offsetDeg, registerDeg: halfWidths - off, freeDeg: spacingDeg - off - halfWidths }
  })
}
