'use client'

import { useState } from 'react'
import { LinkButton } from '@/components/ui/button'
import { SheetField } from './sheet-field'
import type { SheetForm } from './sheet-form'
import { maxPitches, scenarioFieldsBySection } from '@/lib/schemas/scenario-fields'

const fieldsOfPitch = (i: number) => scenarioFieldsBySection.propeller.filter((field) => field.name.startsWith(`pitch.${i}.`))
const isTyped = (form: SheetForm, i: number) => fieldsOfPitch(i).some((field) => (form.values[field.name] ?? '') !== '')

/** Named pitch settings: those that are typed, and one empty one to fill next. */
export function PitchInputs({ form }: { form: SheetForm }) {
  const typed = Array.from({ length: maxPitches }, (_, i) => i).filter((i) => isTyped(form, i))
  const last = typed.at(-1) ?? -1
  const [extra, setExtra] = useState(false)
  const shown = Math.min(maxPitches, last + 1 + (extra || last < 0 ? 1 : 0))
  return (
    <>
      {Array.from({ length: shown }, (_, i) => (
        <fieldset key={i} className="pitch">
          <legend>Pitch {i + 1}</legend>
          {fieldsOfPitch(i).map((field) => (
            <SheetField
              key={field.name} field={field} label={field.label.replace(/^Pitch \d+, /, '')} value={form.values[field.name] ?? ''} system={form.system}
              onChange={form.onChange} error={form.errors[field.name]} flagged={form.flagged.has(field.name)} source="typed"
            />
          ))}
        </fieldset>
      ))}
      {shown < maxPitches && !extra ? <p className="addline"><LinkButton onClick={() => setExtra(true)}>Add a pitch setting</LinkButton></p> : null}
      <noscript><p className="fnote">Another pitch setting can be added where a script runs.</p></noscript>
    </>
  )
}
