'use client'

import clsx from 'clsx'
import { memo } from 'react'
import { InputField, SelectField, TextareaField } from '@/components/ui/field'
import type { FieldDef } from '@/lib/schemas/field'
import { formatQuantityText, parseQuantity, unitOf, type QuantityKind, type UnitSystem } from '@/lib/units'

interface EngineFieldProps {
  field: FieldDef
  value: string
  system: UnitSystem
  error?: string
  onChange: (name: string, value: string) => void
  onLeave: (name: string) => void
  /** Another choice made it idle: kept, shown only where no script could show it again. */
  idle?: boolean
}

/** These are always typed as plain numbers; the others may carry a unit, which a phone's number pad cannot write. */
const plainKinds: readonly QuantityKind[] = ['angle', 'engineSpeed', 'ratio', 'count']

/** What a typed unit becomes in the field's own: "3.4 in is 86.36 mm." */
function conversion({ kind, quantity }: FieldDef, value: string, system: UnitSystem): string | null {
  if (kind !== 'number' || !quantity) return null
  const read = parseQuantity(value, quantity, system)
  if (!read.ok || !read.converted) return null
  return `${value.trim()} is ${formatQuantityText(read.value, quantity, system, { decimals: unitOf(quantity, system).decimals + 1 })}.`
}

/** One input of the engine's sheet, drawn from its line in the field table. */
export const EngineField = memo(function EngineField({ field, value, system, error, onChange, onLeave, idle = false }: EngineFieldProps) {
  const { name, label, kind, quantity, help, maxLength } = field
  const shared = {
    name, label, value, error, note: conversion(field, value, system) ?? help,
    onBlur: () => onLeave(name),
    onChange: (event: { target: { value: string } }) => onChange(name, event.target.value),
  }
  const input = kind === 'select'
    ? <SelectField {...shared} layout="broad" choices={field.options ?? []} />
    : kind === 'table'
      ? <TextareaField {...shared} rows={Math.min(14, Math.max(4, value.split('\n').length + 1))} wrap="off" className="grid-text" />
      : (
        <InputField
          {...shared} maxLength={maxLength ?? 120} layout={kind === 'number' ? 'row' : 'broad'}
          unit={kind === 'number' && quantity ? unitOf(quantity, system).word : undefined}
          inputMode={quantity && plainKinds.includes(quantity) ? 'decimal' : undefined}
        />
      )
  return <div className={clsx('efield', idle && 'idle')}>{input}</div>
})
