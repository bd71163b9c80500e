'use client'

import { InputDifferences } from '@/components/revision/input-differences'
import { Button } from '@/components/ui/button'
import { FailedNote } from '@/components/ui/note'
import type { EngineDto } from '@/lib/schemas/engine-dto'
import { engineFields } from '@/lib/schemas/engine-fields'
import { engineToForm } from '@/lib/schemas/engine-form'
import type { FormValues } from '@/lib/schemas/field'
import type { UnitSystem } from '@/lib/units'
import { timeWords } from '@/lib/words/times'

interface EngineConflictProps {
  theirs: EngineDto
  values: FormValues
  system: UnitSystem
  formId: string
  onTakeTheirs: () => void
}

export const isEngineDto = (conflict: unknown): conflict is EngineDto =>
  typeof conflict === 'object' && conflict !== null && 'spec' in conflict && 'version' in conflict && 'code' in conflict

/** Someone else saved first: both versions side by side, and the choice. Works without a script, where taking theirs is opening the page anew. */
export function EngineConflict({ theirs, values, system, formId, onTakeTheirs }: EngineConflictProps) {
  return (
    <section className="conflict" role="alert">
      <FailedNote level={2} title="Someone else saved this engine meanwhile">
        <p>Nothing is lost: theirs, of {timeWords(theirs.updatedAt)}, is stored, and yours is still in the form. These differ:</p>
      </FailedNote>
      <InputDifferences
        fields={engineFields} system={system}
        left={{ label: 'Theirs, stored', values: engineToForm(theirs.name, theirs.code, theirs.spec, system) }}
        right={{ label: 'Yours, not saved', values }}
      />
      <div className="acts mt-3">
        <Button type="submit" form={formId} name="over" value={String(theirs.version)}>Keep mine, over theirs</Button>
        <a className="btn" href={`/engines/${theirs.id}`} onClick={(event) => {
          event.preventDefault()
          onTakeTheirs()
        }}>Take theirs into the form</a>
      </div>
    </section>
  )
}
