'use client'

import { useActionState } from 'react'
import { Button } from '@/components/ui/button'
import { ErrorSummary } from '@/components/ui/error-summary'
import { InputField } from '@/components/ui/field'
import type { ActionState } from '@/lib/errors'

interface SignInFormProps {
  action: (before: ActionState, formData: FormData) => Promise<ActionState>
  /** Where to go afterwards. */
  next?: string
}

export function SignInForm({ action, next }: SignInFormProps) {
  const [state, submit, pending] = useActionState(action, { ok: false })
  const failed = state.ok ? undefined : state
  return (
    <form action={submit} noValidate>
      <ErrorSummary title="Not signed in" formError={failed?.formError} fieldErrors={failed?.fieldErrors} />
      {next ? <input type="hidden" name="next" value={next} /> : null}
      <InputField layout="stack" label="E-mail address" name="email" type="email" inputMode="email" autoComplete="username" required defaultValue={failed?.values?.email} error={failed?.fieldErrors?.email} />
      <InputField layout="stack" label="Password" name="password" type="password" autoComplete="current-password" required error={failed?.fieldErrors?.password} />
      <div className="send"><Button type="submit" kind="do" size="big" pending={pending}>Sign in</Button></div>
    </form>
  )
}
