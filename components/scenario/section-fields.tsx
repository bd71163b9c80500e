'use client'

import { defaultNote } from '@/lib/schemas/default-texts'
import type { FieldDef } from '@/lib/schemas/field'
import { SheetField } from './sheet-field'
import type { SheetForm } from './sheet-form'

/** Fields that only matter with another choice: kept, but not in the way. */
function isAsked(name: string, { values }: SheetForm): boolean {
  if (name === 'governedRpm') return values.propellerKind === 'constantSpeed'
  if (name === 'rotor.backupPhasedAtDeg') return values.distribution === 'capEach'
  if (name === 'redundancy.ratesPerH.cap') return values.distribution !== 'directCoils'
  return true
}

/** Lines of a field table, each with where its figure comes from. */
export function SectionFields({ fields, form }: { fields: readonly FieldDef[], form: SheetForm }) {
  return fields.map((field) => {
    const value = form.values[field.name] ?? ''
    const origin = defaultNote(field.name, value, form.system)
    return isAsked(field.name, form)
      ? (
        <SheetField
          key={field.name} field={field} value={value} system={form.system} onChange={form.onChange} origin={origin}
          error={form.errors[field.name]} flagged={form.flagged.has(field.name)} source={field.kind !== 'number' ? undefined : origin ? 'default' : 'typed'}
        />
      )
      : <input key={field.name} type="hidden" name={field.name} value={value} />
  })
}
