import { takeNumber, type NumberRule } from '../validate/number'
import { finiteResult } from '../validate/result'
import { membersOf } from '../validate/shape'

export interface BreakdownInput {
  readonly gapMm: number
  readonly pressureKpa: number
  readonly temperatureK: number
}

const gapRule: NumberRule = { name: 'The gap', unit: 'mm', above: 0 }
export const takeGap = (value: unknown): number => takeNumber(value, 'gapMm', gapRule)

/** Breakdown voltage, kV; not finite where the arguments are far out. */
export const breakdownOf = (gapMm: number, pressureKpa: number, temperatureK: number): number => {
  // Relative density of the gas times the gap, cm.
  const x = (pressureKpa / 101.325) * (293.15 / temperatureK) * (gapMm / 10)
  return 24.22 * x + 6.08 * Math.sqrt(x)
}

/**
 * Voltage at which a gap in air breaks down, kV.
 *
 * 24.22·δ·d + 6.08·√(δ·d), d the gap in cm, δ = (p/101.325)·(293.15/T)
 *
 * Validity: a uniform field between cold, clean electrodes, gaps of about 0.1 mm and more in air; sharp hot electrodes need less, worn or fouled plugs more.
 * Source: wadhwa, Ex. 4.1 (read).
 *
 * @param input.gapMm gap, mm, > 0
 * @param input.pressureKpa pressure of the gas p, kPa, > 0
 * @param input.temperatureK temperature of the gas T, K, > 0
 * @throws CalcError on any of these by its name
 * @example
 * breakdownKv({ gapMm: 15, pressureKpa: 101.325, temperatureK: 293.15 }) // → 43.7764
 */
export const breakdownKv = (input: BreakdownInput): number => {
  const members = membersOf(input)
  const gapMm = takeGap(members.gapMm)
  const pressureKpa = takeNumber(members.pressureKpa, 'pressureKpa', { name: 'The pressure of the gas', unit: 'kPa', above: 0 })
  const temperatureK = takeNumber(members.temperatureK, 'temperatureK', { name: 'The temperature of the gas', unit: 'K', above: 0 })
  return finiteResult(breakdownOf(gapMm, pressureKpa, temperatureK), 'gapMm', gapMm, 'mm')
}
