'use client'

import { useActionState } from 'react'
import { Button } from '@/components/ui/button'
import { ErrorSummary } from '@/components/ui/error-summary'
import { InputField } from '@/components/ui/field'
import type { ActionState } from '@/lib/errors'

interface SignUpFormProps {
  action: (before: ActionState, formData: FormData) => Promise<ActionState>
  next?: string
}

export function SignUpForm({ action, next }: SignUpFormProps) {
  const [state, submit, pending] = useActionState(action, { ok: false })
  const failed = state.ok ? undefined : state
  const typed = failed?.values
  const wrong = failed?.fieldErrors
  return (
    <form action={submit} noValidate>
      <ErrorSummary title="No account was made" formError={failed?.formError} fieldErrors={wrong} />
      {next ? <input type="hidden" name="next" value={next} /> : null}
      <InputField layout="stack" label="Your name" name="name" autoComplete="name" required maxLength={80} defaultValue={typed?.name} error={wrong?.name} />
      <InputField layout="stack" label="E-mail address" name="email" type="email" inputMode="email" autoComplete="username" required defaultValue={typed?.email} error={wrong?.email} />
      <InputField layout="stack" label="Password" name="password" type="password" autoComplete="new-password" required maxLength={200} note="10 characters at least; a few words that nobody would guess are best." error={wrong?.password} />
      <InputField layout="stack" label="Name of your shop" name="shopName" autoComplete="organization" required maxLength={80} note="Everything you keep belongs to it, and no other shop sees it. You become its owner." defaultValue={typed?.shopName} error={wrong?.shopName} />
      <div className="send"><Button type="submit" kind="do" size="big" pending={pending}>Make the account</Button></div>
    </form>
  )
}
