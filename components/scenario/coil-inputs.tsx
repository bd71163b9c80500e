'use client'

import { ChannelChip } from '@/components/ui/channel-chip'
import { defaultNote } from '@/lib/schemas/default-texts'
import { type FieldDef } from '@/lib/schemas/field'
import { scenarioFieldsBySection } from '@/lib/schemas/scenario-fields'
import { PairField } from './pair-field'
import { SectionFields } from './section-fields'
import { SheetField } from './sheet-field'
import type { SheetForm } from './sheet-form'

const { primaryCoil, backupCoil, plugs } = scenarioFieldsBySection
const pairs = primaryCoil.flatMap((primary, i) => {
  const backup = backupCoil[i]
  return backup ? [{ primary, backup }] : []
})

/** Everything the fold of the coils holds. */
export const coilSectionFields: readonly FieldDef[] = [...primaryCoil, ...backupCoil, ...plugs]

/** Coils of both channels side by side, and the gap they have to jump. */
export function CoilInputs({ form }: { form: SheetForm }) {
  const half = (field: FieldDef) => {
    const value = form.values[field.name] ?? ''
    return { field, value, error: form.errors[field.name], flagged: form.flagged.has(field.name), origin: defaultNote(field.name, value, form.system) }
  }
  return (
    <>
      <div className="f pair head" aria-hidden="true"><span /><span /><ChannelChip channel="A" /><ChannelChip channel="B" /><span /></div>
      {pairs.filter(({ primary }) => primary.kind === 'number').map(({ primary, backup }) => (
        <PairField key={primary.name} primary={half(primary)} backup={half(backup)} system={form.system} onChange={form.onChange} />
      ))}
      {pairs.filter(({ primary }) => primary.kind === 'check').flatMap(({ primary, backup }) => [{ letter: 'A', field: primary }, { letter: 'B', field: backup }]).map(({ letter, field }) => (
        <SheetField
          key={field.name} field={field} label={`${letter}: ${field.label}`} value={form.values[field.name] ?? ''} system={form.system} onChange={form.onChange}
          error={form.errors[field.name]} flagged={form.flagged.has(field.name)}
        />
      ))}
      <SectionFields fields={plugs} form={form} />
    </>
  )
}
