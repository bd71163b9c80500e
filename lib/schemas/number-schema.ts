import { z } from 'zod'
import { fieldIndex, type FieldDef } from './field'

/** Number schemas that take their range from a field table, so that form, action and route share one range. */
export function numbersOf(fields: readonly FieldDef[]) {
  const index = fieldIndex(fields)
  return (name: string) => {
    const field = index.get(name)
    if (!field || field.min === undefined || field.max === undefined) throw new Error(`no range for field ${name}`)
    const schema = z.number().min(field.min).max(field.max)
    return field.integer ? schema.int() : schema
  }
}

/** True where every value is greater than the one before. */
export const isAscending = (values: readonly number[]) => values.every((value, i) => i === 0 || value > (values[i - 1] ?? Infinity))
