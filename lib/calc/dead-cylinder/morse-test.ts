import { CalcError } from '../calc-error'
import { takeNumber } from '../validate/number'
import { takeNumbers } from '../validate/numbers'
import { finiteResult } from '../validate/result'
import { membersOf, takeList } from '../validate/shape'

export interface MorseTestInput {
  readonly allFiringKw: number
  readonly cutOutKw: readonly number[]
}

export interface MorseTestResult {
  readonly indicatedKw: number[]
  readonly indicatedTotalKw: number
  readonly mechanicalEfficiency: number
  readonly frictionPowerKw: number
  /** Counted from 1; the lowest number on a tie. */
  readonly weakest: number
}

/** Differences of measured powers carry rounding: a total this close to the brake power is an engine without friction, not a contradiction. */
const rounding = 1e-12

/**
 * Indicated power of each cylinder from a Morse test: `{ indicatedKw, indicatedTotalKw, mechanicalEfficiency, frictionPowerKw, weakest }`,
 * kW, in the order of `cutOutKw`; `weakest` counted from 1, the lowest on a tie.
 *
 * IP_i = all − cut_i; total = Σ IP_i; ηm = all/total; friction = total − all
 *
 * Validity: one speed and one throttle throughout; the cut cylinder's friction is taken as unchanged.
 * Source: joel, Ex. 17.4 (read).
 *
 * @param input.allFiringKw brake power with all cylinders firing, kW, > 0
 * @param input.cutOutKw brake power with each cylinder cut in turn, kW, two cylinders at least, each at most allFiringKw
 * @throws CalcError on `allFiringKw`, `cutOutKw`, or `cutOutKw.i` when cutting a cylinder raised the power; on `cutOutKw` when the indicated total is below the brake power
 * @example
 * morseTest({ allFiringKw: 80, cutOutKw: [55, 56, 54, 57] }).mechanicalEfficiency // → 0.816327
 * morseTest({ allFiringKw: 80, cutOutKw: [55, 56, 54, 57] }).weakest // → 4
 */
export const morseTest = (input: MorseTestInput): MorseTestResult => {
  const members = membersOf(input)
  const allFiringKw = takeNumber(members.allFiringKw, 'allFiringKw', { name: 'The brake power with all cylinders firing', unit: 'kW', above: 0 })
  const list = takeList(members.cutOutKw, 'cutOutKw', 'The list of powers with one cylinder cut', 2)
  const cutOutKw = takeNumbers(list, 'cutOutKw', { unit: 'kW', max: allFiringKw }, (i) => `The power with cylinder ${i + 1} cut`)

  const indicatedKw = cutOutKw.map((cut, i) => finiteResult(allFiringKw - cut, `cutOutKw.${i}`, cut, 'kW'))
  const sum = finiteResult(indicatedKw.reduce((total, kw) => total + kw, 0), 'cutOutKw', input.cutOutKw, 'kW')
  if (sum < allFiringKw * (1 - rounding)) {
    throw new CalcError({
      field: 'cutOutKw', value: input.cutOutKw, limit: `a sum of losses of at least ${allFiringKw}`, unit: 'kW',
      message: `The losses of the cut cylinders must sum to at least the brake power, ${allFiringKw} kW; these sum to ${Number(sum.toPrecision(6))} kW. Look for readings that are too high.`,
    })
  }
  const indicatedTotalKw = Math.max(sum, allFiringKw)
  let weakest = 0
  indicatedKw.forEach((kw, i) => {
    if (kw < (indicatedKw[weakest] ?? Infinity)) weakest = i
  })
  return {
    indicatedKw, indicatedTotalKw,
    mechanicalEfficiency: allFiringKw / indicatedTotalKw,
    frictionPowerKw: indicatedTotalKw - allFiringKw,
    weakest: weakest + 1,
  }
}
