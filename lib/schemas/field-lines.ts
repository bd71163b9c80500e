import type { QuantityKind } from '../units'
import type { FieldDef } from './field'

/** A line of a field table for a number; the name is its path in the sheet. */
export const numberField = (
  name: string, label: string, quantity: QuantityKind, [min, max]: readonly [number, number], help?: string, more: Partial<FieldDef> = {},
): FieldDef => ({ name, label, kind: 'number', quantity, min, max, help, ...more })

/** The same, left empty where nothing is known or limited. */
export const optionalField = (...line: Parameters<typeof numberField>): FieldDef => ({ ...numberField(...line), optional: true })
