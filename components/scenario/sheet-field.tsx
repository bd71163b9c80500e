'use client'

import { memo, useEffect, useState } from 'react'
import { CheckField, InputField, SelectField, TextareaField } from '@/components/ui/field'
import type { Provenance } from '@/components/ui/provenance'
import type { FieldDef } from '@/lib/schemas/field'
import { formatQuantityText, parseQuantity, unitOf, type UnitSystem } from '@/lib/units'

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
  /** Replaces the label of the table where the group's head says the rest. */
  label?: string
}

/** A hand still typing is not corrected: a fault is said after this pause, or when the field is left. */
const pauseMs = 700

/** The fault to show now: none while it is being typed, the newest after a pause. */
function useSettledError(error: string | undefined, value: string): [string | undefined, () => void] {
  const [settledValue, setSettledValue] = useState<string | null>(value)
  useEffect(() => {
    const timer = setTimeout(() => setSettledValue(value), pauseMs)
    return () => clearTimeout(timer)
  }, [value])
  return [settledValue === value ? error : undefined, () => setSettledValue(value)]
}

/** What a typed unit becomes in the field's own: "6.5 in is 165.1 mm." */
function conversionNote(field: FieldDef, value: string, system: UnitSystem): string | undefined {
  if (field.kind !== 'number' || !field.quantity) return undefined
  const read = parseQuantity(value, field.quantity, system)
  return read.ok && read.converted ? `${value.trim()} is ${formatQuantityText(read.value, field.quantity, system, { decimals: unitOf(field.quantity, system).decimals + 1 })}.` : undefined
}

/** One input of the scenario, drawn from its line in the field table. */
export const SheetField = memo(function SheetField({ field, value, system, onChange, error, flagged, source, disabled, label = field.label }: SheetFieldProps) {
  const [shownError, settle] = useSettledError(error, value)
  const shared = { label, name: field.name, error: shownError, flagged, disabled, onBlur: settle }
  const title = field.help
  if (field.kind === 'check')
    return <CheckField label={label} name={field.name} checked={value !== ''} disabled={disabled} error={shownError} onChange={(event) => onChange(field.name, event.target.checked ? 'on' : '')} />
  if (field.kind === 'select')
    return <SelectField {...shared} source={source} title={title} value={value} choices={field.options ?? []} onChange={(event) => onChange(field.name, event.target.value)} />
  if (field.kind === 'longText' || field.kind === 'table' || field.kind === 'matrix') {
    const lines = Math.min(14, Math.max(field.kind === 'longText' ? 3 : 5, value.split('\n').length + 1))
    return <TextareaField {...shared} note={field.help} rows={lines} value={value} maxLength={field.maxLength} wrap={field.kind === 'longText' ? undefined : 'off'} className={field.kind === 'longText' ? undefined : 'grid-text'} onChange={(event) => onChange(field.name, event.target.value)} />
  }
  const isNumber = field.kind === 'number'
  return (
    <InputField
      {...shared} source={source} title={title} value={value} maxLength={field.maxLength ?? 60} layout={isNumber ? 'row' : 'wide'}
      unit={isNumber && field.quantity ? unitOf(field.quantity, system).word : undefined}
      note={conversionNote(field, value, system)}
      onChange={(event) => onChange(field.name, event.target.value)}
    />
  )
})
