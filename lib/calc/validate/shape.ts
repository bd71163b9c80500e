import { CalcError } from '../calc-error'
import { describeValue } from './describe'

export const isRecord = (value: unknown): value is Record<string, unknown> =>
  typeof value === 'object' && value !== null && !Array.isArray(value)

/**
 * Members of an argument written in braces. Anything that is not an object counts as one without members,
 * so that the error falls on its first missing member, which has a name, and not on the argument, which has none.
 */
export const membersOf = (value: unknown): Record<string, unknown> => (isRecord(value) ? value : {})

/** Members of a named argument or of a nested object; a CalcError on `field` when it is not an object. */
export const takeRecord = (value: unknown, field: string, name: string): Record<string, unknown> => {
  if (isRecord(value)) return value
  throw new CalcError({
    field, value, limit: 'an object', unit: '',
    message: value === undefined || value === null ? `${name} is missing.` : `${name} must be an object; ${describeValue(value)} was given.`,
  })
}

/** A list with at least `least` entries. The entries are for the caller to check. */
export const takeList = (value: unknown, field: string, name: string, least: number): readonly unknown[] => {
  const limit = `a list of at least ${least} ${least === 1 ? 'entry' : 'entries'}`
  if (Array.isArray(value) && value.length >= least) return value
  const given = Array.isArray(value) ? `a list of ${value.length}` : describeValue(value)
  throw new CalcError({
    field, value, limit, unit: '',
    message: value === undefined || value === null ? `${name} is missing: give ${limit}.` : `${name} must be ${limit}; ${given} was given.`,
  })
}

/** One of a few words. */
export const takeChoice = <T extends string>(value: unknown, field: string, name: string, choices: readonly T[]): T => {
  const found = choices.find((choice) => choice === value)
  if (found !== undefined) return found
  const limit = `one of ${choices.join(', ')}`
  throw new CalcError({ field, value, limit, unit: '', message: `${name} must be ${limit}; ${describeValue(value)} was given.` })
}
