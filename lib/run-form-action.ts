import { notFound, redirect, unstable_rethrow } from 'next/navigation'
import { safeNext } from './auth/safe-next'
import { AppError } from './errors'

/**
 * The body of an action behind a single button. The form may name the page it stands on in a field `next`; `home` is where it leads
 * otherwise. An expected failure comes back to that page with its code in the address, where `problemWords` gives the sentence: so it
 * is told without a script too. `fn` redirects where success leads.
 */
export async function runFormAction(fn: () => Promise<void>, form: FormData, home: string): Promise<void> {
  const page = safeNext(form.get('next')) ?? home
  try {
    await fn()
  } catch (thrown) {
    unstable_rethrow(thrown)
    if (!(thrown instanceof AppError)) throw thrown
    if (thrown.code === 'signedOut') redirect(`/sign-in?next=${encodeURIComponent(page)}`)
    if (thrown.code === 'notFound') notFound()
    redirect(withProblem(page, thrown.code))
  }
  redirect(withProblem(page, null))
}

/** The page's own address with the code in it, or without the one of an earlier try. */
function withProblem(page: string, code: string | null): string {
  const url = new URL(page, 'http://here.invalid')
  if (code) url.searchParams.set('problem', code)
  else url.searchParams.delete('problem')
  return url.pathname + url.search + url.hash
}
