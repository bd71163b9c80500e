import type { QuantityKind } from '../units'

/** One input of a form: its name, its words, its range. Form, action, route and error sentences all read this table. */
export interface FieldDef {
  /** Form name, unique in its form. */
  name: string
  label: string
  kind: 'number' | 'text' | 'longText' | 'select' | 'check' | 'list' | 'table' | 'matrix' | 'formula'
  quantity?: QuantityKind
  /** In the library's base unit. */
  min?: number
  max?: number
  integer?: boolean
  optional?: boolean
  options?: readonly { value: string; label: string }[]
  columns?: readonly { kind: QuantityKind; label: string }[]
  /** What it is and its usual range, in one or two sentences. */
  help?: string
  /** Dotted path in the scenario whose results depend on it; the name itself unless given. */
  path?: string
  maxLength?: number
}

export type FormValues = Record<string, string>
export type FieldErrors = Record<string, string>

export const fieldIndex = (fields: readonly FieldDef[]): Map<string, FieldDef> => new Map(fields.map((field) => [field.name, field]))
