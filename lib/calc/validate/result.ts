import { CalcError } from '../calc-error'

/**
 * Lets a finite result pass and turns an overflow into a CalcError on the argument that caused it.
 * Adding 0 turns −0 into 0: a difference that vanishes has no sign.
 */
export const finiteResult = (result: number, field: string, value: unknown, unit = ''): number => {
  if (Number.isFinite(result)) return result + 0
  throw new CalcError({
    field, value, limit: 'a value whose result is a finite number', unit,
    message: 'The result is beyond what a number can hold: one of the values is far too large or far too small.',
  })
}
