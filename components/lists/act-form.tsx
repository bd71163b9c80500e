'use client'

import { useFormStatus } from 'react-dom'
import { Button } from '@/components/ui/button'

export type FormAction = (form: FormData) => Promise<void>

function SubmitButton({ children, size, kind }: { children: string, size?: 'small', kind?: 'do' | 'plain' }) {
  const { pending } = useFormStatus()
  return <Button type="submit" size={size} kind={kind} pending={pending}>{children}</Button>
}

interface ActFormProps {
  action: FormAction
  /** Hidden fields: the id of what it is about, the page to come back to as `next`. */
  fields: Readonly<Record<string, string>>
  children: string
  size?: 'small'
  kind?: 'do' | 'plain'
}

/** One button that changes a record; works without a script. */
export function ActForm({ action, fields, children, size, kind }: ActFormProps) {
  return (
    <form action={action} className="contents">
      {Object.entries(fields).map(([name, value]) => <input key={name} type="hidden" name={name} value={value} />)}
      <SubmitButton size={size} kind={kind}>{children}</SubmitButton>
    </form>
  )
}
