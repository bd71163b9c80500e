import { CalcError } from '../calc-error'
import { describeValue } from './describe'

/** Yes or no; no where nothing was given. */
export const takeOptionalFlag = (value: unknown, field: string, name: string): boolean => {
  if (value === undefined) return false
  if (typeof value === 'boolean') return value
  throw new CalcError({ field, value, limit: 'true or false', unit: '', message: `${name} must be true or false; ${describeValue(value)} was given.` })
}
