'use client'

import { InputDifferences } from '@/components/revision/input-differences'
import { Button, TextLink } from '@/components/ui/button'
import { ErrorSummary } from '@/components/ui/error-summary'
import { FailedNote } from '@/components/ui/note'
import type { FieldErrors, FormValues } from '@/lib/schemas/field'
import type { RevisionDto } from '@/lib/schemas/revision-dto'
import { scenarioFields } from '@/lib/schemas/scenario-fields'
import { scenarioToForm } from '@/lib/schemas/scenario-form'
import type { SheetState } from '@/lib/schemas/sheet-answer'
import type { UnitSystem } from '@/lib/units'

const labels = Object.fromEntries(scenarioFields.map((field) => [field.name, field.label]))

interface SaveAnswerProps {
  answer: SheetState
  values: FormValues
  /** Faults of the fields as they are now: those mended since are not named again. */
  errors: FieldErrors
  system: UnitSystem
  onKeepMine: (theirs: RevisionDto) => void
  onTakeTheirs: (theirs: RevisionDto) => void
}

const isRevision = (conflict: unknown): conflict is RevisionDto => typeof conflict === 'object' && conflict !== null && 'number' in conflict && 'sheet' in conflict

/** What came of the last save: nothing said where it went well, else what did not go in and what to do. */
export function SaveAnswer({ answer, values, errors, system, onKeepMine, onTakeTheirs }: SaveAnswerProps) {
  if (answer.ok || (!answer.formError && !answer.fieldErrors)) return null
  if (answer.code === 'conflict' && isRevision(answer.conflict)) {
    const theirs = answer.conflict
    return (
      <section className="conflict" aria-labelledby="conflict-head">
        <FailedNote level={2} title={<span id="conflict-head">Revision {theirs.number} was saved by {theirs.author.name} meanwhile</span>}>
          <p>Nothing is lost: theirs is stored, yours is still here in the form. These inputs differ:</p>
        </FailedNote>
        <InputDifferences
          fields={scenarioFields} system={system}
          left={{ label: `Theirs, revision ${theirs.number}`, values: scenarioToForm(theirs.title, theirs.sheet, system) }}
          right={{ label: 'Yours, not saved', values }}
        />
        <div className="acts">
          <Button onClick={() => onKeepMine(theirs)}>Save mine on top, as revision {theirs.number + 1}</Button>
          <Button onClick={() => onTakeTheirs(theirs)}>Take theirs into the form</Button>
        </div>
      </section>
    )
  }
  if (answer.code === 'signedOut') {
    return <FailedNote level={2} title="Not saved: the session ended"><p>{answer.formError} <TextLink href="/sign-in" target="_blank">Sign in in another tab</TextLink></p></FailedNote>
  }
  const still = Object.fromEntries(Object.entries(answer.fieldErrors ?? {}).filter(([name]) => errors[name]))
  if (answer.code === 'invalid' && Object.keys(still).length === 0) return null
  return <ErrorSummary title="Not saved" formError={answer.formError} fieldErrors={still} labels={labels} />
}
