import { unstable_rethrow } from 'next/navigation'
import type { ActionState } from './errors'
import { knownError } from './known-error'

const isSecret = (name: string) => /password|token|secret/i.test(name)

/** A form's text fields by name, the framework's own left out. Of a name that occurs twice the last one counts. */
export function formValues(form: FormData): Record<string, string> {
  const values: Record<string, string> = {}
  for (const [name, value] of form) if (typeof value === 'string' && !name.startsWith('$ACTION_')) values[name] = value
  return values
}

/** What may be shown again. */
const echo = (form: FormData) => Object.fromEntries(Object.entries(formValues(form)).filter(([name]) => !isSecret(name)))

/**
 * The body of every server action that a form waits for. Whatever `fn` returns is the data; what it throws becomes the state
 * the form shows, with everything typed still in it. A redirect passes through.
 */
export async function runAction<T>(fn: () => Promise<T>, form?: FormData): Promise<ActionState<T>> {
  try {
    return { ok: true, data: await fn() }
  } catch (thrown) {
    unstable_rethrow(thrown)
    const error = knownError(thrown, 'action')
    return {
      ok: false,
      code: error.code,
      formError: error.message,
      ...(error.fieldErrors ? { fieldErrors: error.fieldErrors } : {}),
      ...(form ? { values: echo(form) } : {}),
      ...(error.conflict === undefined ? {} : { conflict: error.conflict }),
    }
  }
}
