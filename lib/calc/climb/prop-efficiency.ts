import { CalcError } from '../calc-error'
import { describeValue } from '../validate/describe'
import { isAllowed, takeNumber } from '../validate/number'

/** Thrust power over shaft power: one number, or a function of true airspeed in m/s. */
export type PropEfficiency = number | ((speedMps: number) => number)

export interface PreparedEfficiency { readonly constant: number | null, readonly at: (speedMps: number) => number }

/**
 * The efficiency as a function, each of its values checked. A number must lie in 0 … 1; a function may fall below 0,
 * as a propeller does beyond the speed at which it gives no thrust, but never pass 1.
 */
export const takePropEfficiency = (value: unknown): PreparedEfficiency => {
  if (typeof value !== 'function') {
    const constant = takeNumber(value, 'propEfficiency', { name: 'The efficiency of the propeller', unit: '', min: 0, max: 1 })
    return { constant, at: () => constant }
  }
  const at = (speedMps: number): number => {
    const efficiency: unknown = (value as (speedMps: number) => unknown)(speedMps)
    if (isAllowed(efficiency, { unit: '', max: 1 })) return efficiency
    throw new CalcError({
      field: 'propEfficiency', value: efficiency, limit: 'a finite number, ≤ 1, at every speed', unit: '',
      message: `The efficiency of the propeller must be a number of at most 1 at every speed; at ${Number(speedMps.toPrecision(8))} m/s ${describeValue(efficiency)} came out.`,
    })
  }
  return { constant: null, at }
}

/** A speed flown with a propeller that brakes there is no answer. */
export const mustPull = (efficiency: number, speedMps: number): void => {
  if (efficiency >= 0) return
  throw new CalcError({
    field: 'propEfficiency', value: efficiency, limit: '≥ 0 at the speed flown', unit: '',
    message: `The efficiency of the propeller must be at least 0 at the speed flown; at ${Number(speedMps.toPrecision(8))} m/s it is ${describeValue(efficiency)}.`,
  })
}
