import type { z } from 'zod'
import { keepUntouched, quantityErrorSentence, rangeSentence, type UnitSystem } from '../units'
import type { FieldDef, FieldErrors, FormValues } from './field'

/** What was read from a form: numbers in base units, trimmed texts, flags; nothing where the text could not be read. */
export interface ReadFields {
  number: (name: string) => number | null
  text: (name: string) => string
  check: (name: string) => boolean
  /** Whole numbers or decimals parted by spaces, commas or hyphens. */
  list: (name: string) => number[] | null
  errors: FieldErrors
}

/** A list such as 1-4-5-2-3-6, 1 4 5 2 3 6 or 1, 4, 5, 2, 3, 6; null when something in it is not a number. */
export function parseNumberList(text: string): number[] | null {
  const parts = text.trim().split(/[\s,;–-]+/).filter((part) => part !== '')
  const numbers = parts.map((part) => (/^\d+(\.\d+)?$/.test(part) ? Number(part) : NaN))
  return numbers.some(Number.isNaN) ? null : numbers
}

export const formatNumberList = (values: readonly number[]) => values.join(' ')

/**
 * Reads form texts by their field table. A field that nobody touched since it was filled from `baseValues` keeps its exact
 * stored value, so that showing six digits never wears a number down.
 */
export function fieldReader(index: Map<string, FieldDef>, values: FormValues, system: UnitSystem, baseNumbers: Record<string, number | null> = {}): ReadFields {
  const errors: FieldErrors = {}
  const textOf = (name: string) => (values[name] ?? '').trim()
  const labelOf = (name: string) => index.get(name)?.label ?? name
  return {
    errors,
    text: textOf,
    check: (name) => textOf(name) !== '' && textOf(name) !== 'off',
    number: (name) => {
      const field = index.get(name)
      const quantity = field?.quantity ?? 'plain'
      if (field?.optional && textOf(name) === '') return null
      const read = keepUntouched(textOf(name), quantity, system, baseNumbers[name])
      if (read.ok) return read.value
      errors[name] = quantityErrorSentence(read, labelOf(name), quantity, system)
      return null
    },
    list: (name) => {
      if (textOf(name) === '') {
        if (!index.get(name)?.optional) errors[name] = `${labelOf(name)} is empty. ${index.get(name)?.help ?? ''}`.trim()
        return null
      }
      const list = parseNumberList(textOf(name))
      if (!list) errors[name] = `${labelOf(name)} holds something that is not a number. ${index.get(name)?.help ?? ''}`.trim()
      return list
    },
  }
}

/** Sentence of a schema issue at a field: the schema's own for what it made up itself, the range in the person's units else. */
function issueSentence(issue: z.core.$ZodIssue, field: FieldDef | undefined, system: UnitSystem): string {
  const label = field?.label ?? 'This'
  if (issue.code === 'custom') return issue.message
  if ((issue.code === 'too_small' || issue.code === 'too_big') && issue.origin === 'number' && field?.min !== undefined)
    return rangeSentence(label, field.quantity ?? 'plain', system, { min: field.min, max: field.max })
  if (issue.code === 'invalid_type' && field?.integer) return `${label} must be a whole number.`
  if (issue.code === 'invalid_type') return `${label} is missing.`
  if (issue.code === 'invalid_value' || issue.code === 'invalid_union') return `${label}: choose one of the list.`
  return issue.message
}

/** Puts schema issues at their fields; a field that could not even be read keeps that sentence. */
export function placeIssues(
  issues: readonly z.core.$ZodIssue[], errors: FieldErrors, index: Map<string, FieldDef>,
  nameOf: (path: readonly PropertyKey[]) => string, system: UnitSystem,
): FieldErrors {
  const placed = { ...errors }
  for (const issue of issues) {
    const name = nameOf(issue.path)
    placed[name] ??= issueSentence(issue, index.get(name), system)
  }
  return placed
}
