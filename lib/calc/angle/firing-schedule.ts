import { CalcError } from '../calc-error'
import { takeNumbers } from '../validate/numbers'
import { membersOf, takeList } from '../validate/shape'

export interface FiringScheduleInput {
  readonly firingOrder: readonly number[]
  readonly intervalsDeg?: readonly number[]
}

export interface Firing {
  readonly cylinder: number
  /** Crank degrees after the first firing, 0 ≤ atDeg < 720. */
  readonly atDeg: number
}

/** Crank degrees of one four-stroke cycle. */
const cycleDeg = 720
const sumToleranceDeg = 1e-6

const takeFiringOrder = (value: unknown): readonly number[] => {
  const list = takeList(value, 'firingOrder', 'The firing order', 1)
  const count = list.length
  const order = takeNumbers(list, 'firingOrder', { unit: '', min: 1, max: count, integer: true }, (i) => `The cylinder in place ${i + 1} of the firing order`)
  const seen = new Set<number>()
  order.forEach((cylinder, i) => {
    if (seen.has(cylinder)) {
      throw new CalcError({
        field: `firingOrder.${i}`, value: cylinder, limit: `each of 1 … ${count} once`, unit: '',
        message: `The firing order names cylinder ${cylinder} twice: give each cylinder of 1 to ${count} once.`,
      })
    }
    seen.add(cylinder)
  })
  return order
}

const takeIntervals = (value: unknown, count: number): readonly number[] => {
  const list = takeList(value, 'intervalsDeg', 'The list of firing intervals', 1)
  if (list.length !== count) {
    throw new CalcError({
      field: 'intervalsDeg', value, limit: `${count} intervals`, unit: 'deg',
      message: `There must be one firing interval per cylinder, ${count} in all; ${list.length} were given.`,
    })
  }
  const intervals = takeNumbers(list, 'intervalsDeg', { unit: 'deg', above: 0 }, (i) => `Firing interval ${i + 1}`)
  const sum = intervals.reduce((total, interval) => total + interval, 0)
  if (!(Math.abs(sum - cycleDeg) <= sumToleranceDeg)) {
    throw new CalcError({
      field: 'intervalsDeg', value, limit: 'a sum of 720 within 1e-6', unit: 'deg',
      message: `The firing intervals must sum to 720 crank degrees, one four-stroke cycle; these sum to ${Number(sum.toPrecision(10))}.`,
    })
  }
  return intervals
}

/**
 * When each cylinder fires within one cycle: a list of `{ cylinder, atDeg }` in firing order, in crank degrees after the first firing.
 *
 * atDeg of the first = 0; atDeg[i + 1] = atDeg[i] + intervalsDeg[i]
 *
 * Validity: four-stroke engines, one firing a cylinder in 720 crank degrees.
 * Source: common practice, no published source.
 *
 * @param input.firingOrder cylinder numbers in the order they fire: each of 1 … N once, N ≥ 1
 * @param input.intervalsDeg crank degrees from firing i to i + 1, the last back to the first: N entries, each > 0, sum 720 within 1e-6; 720/N each when left out
 * @throws CalcError on `firingOrder`, `firingOrder.i`, `intervalsDeg` or `intervalsDeg.i`
 * @example
 * firingSchedule({ firingOrder: [1, 3, 2] }) // → [{ cylinder: 1, atDeg: 0 }, { cylinder: 3, atDeg: 240 }, { cylinder: 2, atDeg: 480 }]
 * firingSchedule({ firingOrder: [1, 2], intervalsDeg: [180, 540] })[1].atDeg // → 180
 */
export const firingSchedule = (input: FiringScheduleInput): Firing[] => {
  const members = membersOf(input)
  const order = takeFiringOrder(members.firingOrder)
  const count = order.length
  if (members.intervalsDeg === undefined) return order.map((cylinder, i) => ({ cylinder, atDeg: (cycleDeg * i) / count }))
  const intervals = takeIntervals(members.intervalsDeg, count)
  let atDeg = 0
  return order.map((cylinder, i) => {
    const firing = { cylinder, atDeg }
    atDeg += intervals[i] ?? 0
    return firing
  })
}
