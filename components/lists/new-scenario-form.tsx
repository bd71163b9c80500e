'use client'

import { useActionState, useState } from 'react'
import { Button } from '@/components/ui/button'
import { ErrorSummary } from '@/components/ui/error-summary'
import { InputField, SelectField } from '@/components/ui/field'
import type { ActionState } from '@/lib/errors'

interface NewScenarioFormProps {
  action: (before: ActionState, form: FormData) => Promise<ActionState>
  engines: readonly { id: string, name: string, code: string }[]
  /** The engine one comes from. */
  chosen?: string
}

/** Name and engine; everything else starts with what the engine gives and is typed on the sheet. */
export function NewScenarioForm({ action, engines, chosen }: NewScenarioFormProps) {
  const [state, submit, pending] = useActionState(action, { ok: false })
  const failed = state.ok ? undefined : state
  const [title, setTitle] = useState(failed?.values?.title ?? '')
  const [engineId, setEngineId] = useState(failed?.values?.engineId ?? chosen ?? '')
  return (
    <form action={submit} noValidate className="mt-4">
      <ErrorSummary title="No scenario was started" formError={failed?.formError} fieldErrors={failed?.fieldErrors} labels={{ title: 'Name', engineId: 'Engine' }} />
      <SelectField
        layout="stack" label="Engine" name="engineId" required value={engineId} onChange={(event) => setEngineId(event.target.value)} error={failed?.fieldErrors?.engineId}
        choices={[{ value: '', label: 'Choose an engine' }, ...engines.map(({ id, name, code }) => ({ value: id, label: `${name}, ${code}` }))]}
        note="The sheet starts with both channels fixed: the primary at the timing the engine’s power was measured with, the backup 8° later. Best torque stands there as a guess until it is typed."
      />
      <InputField layout="stack" label="Name" name="title" maxLength={120} required value={title} onChange={(event) => setTitle(event.target.value)} note="What is tried out, for example “Climb timing for 97 RON”." error={failed?.fieldErrors?.title} />
      <p className="acts"><Button type="submit" kind="do" pending={pending}>Open the sheet</Button></p>
    </form>
  )
}
