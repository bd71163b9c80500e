import { formatQuantity, type QuantityKind, type UnitSystem } from '@/lib/units'

/** A quantity as a bare number in the person's unit: for axes, tables and files. */
export const shownNumber = (value: number, kind: QuantityKind, system: UnitSystem): number =>
  Number(formatQuantity(value, kind, system, { decimals: 6 }).text.replace('\u2212', '-').replace(/\u202f/g, ''))
