'use client'

import { memo } from 'react'
import { CheckField, InputField, SelectField, TextareaField } from '@/components/ui/field'
import type { Provenance } from '@/components/ui/provenance'
import type { FieldDef } from '@/lib/schemas/field'
import { formatQuantityText, parseQuantity, rangeSentence, unitOf, type UnitSystem } from '@/lib/units'
import { useSettledError } from './use-settled-error'

interface SheetFieldProps {
  field: FieldDef
  value: string
  system: UnitSystem
  onChange: (name: string, value: string) => void
  error?: string
  /** This input drives a finding that is outside. */
  flagged?: boolean
  source?: Provenance
  disabled?: boolean
  /** Where a figure comes from that nobody typed. */
  origin?: string
  /** Replaces the label of the table where the group's head says the rest. */
  label?: string
}

/** What a typed unit becomes in the field's own: "6.5 in is 165.1 mm." */
export function conversionNote(field: FieldDef, value: string, system: UnitSystem): string | undefined {
  if (field.kind !== 'number' || !field.quantity) return undefined
  const read = parseQuantity(value, field.quantity, system)
  return read.ok && read.converted ? `${value.trim()} is ${formatQuantityText(read.value, field.quantity, system, { decimals: unitOf(field.quantity, system).decimals + 1 })}.` : undefined
}

/** What the field is, and its range in the person’s units. */
export function fieldTitle({ help, quantity, min, max }: FieldDef, label: string, system: UnitSystem): string | undefined {
  const range = quantity && min !== undefined && max !== undefined ? rangeSentence(label, quantity, system, { min, max }) : undefined
  return help && range ? `${help} ${range}` : help ?? range
}

/** One input of the scenario, drawn from its line in the field table. */
export const SheetField = memo(function SheetField({ field, value, system, onChange, error, flagged, source, disabled, origin, label = field.label }: SheetFieldProps) {
  const [shownError, settle] = useSettledError(error, value)
  const shared = { label, name: field.name, error: shownError, flagged, disabled, onBlur: settle }
  const title = fieldTitle(field, label, system)
  if (field.kind === 'check')
    return <CheckField label={label} name={field.name} checked={value !== ''} disabled={disabled} error={shownError} note={origin} title={title} onChange={(event) => onChange(field.name, event.target.checked ? 'on' : '')} />
  if (field.kind === 'select')
    return <SelectField {...shared} source={source} title={title} note={origin} value={value} choices={field.options ?? []} onChange={(event) => onChange(field.name, event.target.value)} />
  if (field.kind === 'longText' || field.kind === 'table' || field.kind === 'matrix') {
    const lines = Math.min(14, Math.max(field.kind === 'longText' ? 3 : 5, value.split('\n').length + 1))
    return <TextareaField {...shared} note={field.help} rows={lines} value={value} maxLength={field.maxLength} wrap={field.kind === 'longText' ? undefined : 'off'} className={field.kind === 'longText' ? undefined : 'grid-text'} onChange={(event) => onChange(field.name, event.target.value)} />
  }
  const isNumber = field.kind === 'number'
  return (
    <InputField
      {...shared} source={source} title={title} value={value} maxLength={field.maxLength ?? 60} layout={isNumber ? 'row' : 'wide'}
      unit={isNumber && field.quantity ? unitOf(field.quantity, system).word : undefined}
      note={conversionNote(field, value, system) ?? origin}
      onChange={(event) => onChange(field.name, event.target.value)}
    />
  )
})
