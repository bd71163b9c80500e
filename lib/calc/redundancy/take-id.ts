import { CalcError } from '../calc-error'
import { describeValue } from '../validate/describe'

/** A text that names something: not empty. */
export const takeId = (value: unknown, field: string, name: string): string => {
  if (typeof value === 'string' && value !== '') return value
  throw new CalcError({
    field, value, limit: 'a text that is not empty', unit: '',
    message: value === undefined || value === null || value === '' ? `${name} is missing: give a text.` : `${name} must be a text; ${describeValue(value)} was given.`,
  })
}

export const idTwice = (field: string, id: string, hint = ''): CalcError => new CalcError({
  field, value: id, limit: 'an id of its own', unit: '',
  message: `The id “${id.slice(0, 60)}” is given twice: each event, gate and common cause needs one of its own.${hint}`,
})
