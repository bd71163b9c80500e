import { takeOptionalFlag } from '../validate/flag'
import { takeNumber, type NumberRule } from '../validate/number'
import { finiteResult } from '../validate/result'
import { anySpeed, cylinderCount, turningSpeed } from '../validate/rules'
import { membersOf } from '../validate/shape'

export interface SparksPerSecondInput {
  readonly cylinders: number
  readonly rpm: number
  readonly wastedSpark?: boolean
}

export interface DwellAvailableInput {
  readonly cylinders: number
  readonly rpm: number
  readonly wastedSpark?: boolean
  readonly dutyLimit: number
}

export interface SparkPeriodShareInput {
  readonly cylinders: number
  readonly rpm: number
  readonly wastedSpark?: boolean
  readonly dwellMs: number
  readonly sparkDurationMs: number
}

const sparksPerCycle = (members: Record<string, unknown>): number => {
  const cylinders = takeNumber(members.cylinders, 'cylinders', cylinderCount)
  const isWasted = takeOptionalFlag(members.wastedSpark, 'wastedSpark', 'The choice of a wasted spark')
  return isWasted ? 2 * cylinders : cylinders
}

/** Time between sparks of one coil, ms. A cycle takes two turns. */
export const takeSparkPeriodMs = (members: Record<string, unknown>): number => {
  const sparks = sparksPerCycle(members)
  const rpm = takeNumber(members.rpm, 'rpm', turningSpeed)
  const periodMs = finiteResult(120_000 / (sparks * rpm), 'rpm', rpm, 'rpm')
  finiteResult(1 / periodMs, 'rpm', rpm, 'rpm')
  return periodMs
}

/**
 * Sparks that one coil makes in a second, 1/s.
 *
 * f = N·rpm/120, twice that with a wasted spark
 *
 * Validity: four-stroke. One coil for all N cylinders; a coil of one cylinder counts 1. A double-ended coil whose two cylinders fire together counts as one cylinder with wasted spark.
 * Source: timing-arithmetic, worked figures (read).
 *
 * @param input.cylinders cylinders that the coil serves N, a whole number ≥ 1
 * @param input.rpm engine speed, rpm, ≥ 0
 * @param input.wastedSpark whether it fires once a turn instead of once a cycle; false unless given
 * @throws CalcError on any of these by its name
 * @example
 * sparksPerSecond({ cylinders: 6, rpm: 2780 }) // → 139
 */
export const sparksPerSecond = (input: SparksPerSecondInput): number => {
  const members = membersOf(input)
  const sparks = sparksPerCycle(members)
  const rpm = takeNumber(members.rpm, 'rpm', anySpeed)
  return finiteResult((sparks * rpm) / 120, 'rpm', rpm, 'rpm')
}

/**
 * Dwell that a share of the time between sparks leaves, ms.
 *
 * t = dutyLimit·120000/(N·rpm), half of that with a wasted spark
 *
 * Validity: as in `sparksPerSecond`.
 * Source: timing-arithmetic, worked figures (read).
 *
 * @param input.cylinders cylinders that the coil serves N, a whole number ≥ 1
 * @param input.rpm engine speed, rpm, > 0
 * @param input.wastedSpark as in `sparksPerSecond`; false unless given
 * @param input.dutyLimit share of the spark period that may be dwell, > 0 and ≤ 1
 * @throws CalcError on any of these by its name
 * @example
 * dwellAvailableMs({ cylinders: 6, rpm: 2500, dutyLimit: 0.75 }) // → 6
 */
export const dwellAvailableMs = (input: DwellAvailableInput): number => {
  const members = membersOf(input)
  const periodMs = takeSparkPeriodMs(members)
  return takeNumber(members.dutyLimit, 'dutyLimit', { name: 'The share of the spark period', unit: '', above: 0, max: 1 }) * periodMs
}

const timeRule = (name: string): NumberRule => ({ name, unit: 'ms', min: 0 })

/**
 * Share of the time between sparks that dwell and the burning spark take together; dimensionless, above 1 when they do not fit.
 *
 * share = (dwell + spark duration)·N·rpm/120000, twice that with a wasted spark
 *
 * Validity: as in `sparksPerSecond`; a coil cannot be charged while its spark burns.
 * Source: timing-arithmetic, worked figures (read).
 *
 * @param input.cylinders cylinders that the coil serves N, a whole number ≥ 1
 * @param input.rpm engine speed, rpm, > 0
 * @param input.wastedSpark as in `sparksPerSecond`; false unless given
 * @param input.dwellMs dwell, ms, ≥ 0
 * @param input.sparkDurationMs time that the spark burns, ms, ≥ 0
 * @throws CalcError on any of these by its name
 * @example
 * sparkPeriodShare({ cylinders: 6, rpm: 2500, dwellMs: 4, sparkDurationMs: 1.5 }) // → 0.6875
 */
export const sparkPeriodShare = (input: SparkPeriodShareInput): number => {
  const members = membersOf(input)
  const periodMs = takeSparkPeriodMs(members)
  const dwellMs = takeNumber(members.dwellMs, 'dwellMs', timeRule('The dwell'))
  const sparkDurationMs = takeNumber(members.sparkDurationMs, 'sparkDurationMs', timeRule('The duration of the spark'))
  return finiteResult(dwellMs / periodMs + sparkDurationMs / periodMs, 'dwellMs', dwellMs, 'ms')
}
