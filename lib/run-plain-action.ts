import { notFound, redirect } from 'next/navigation'
import { safeNext } from './auth/safe-next'
import { AppError } from './errors'

/**
 * For forms that show no answer of their own (a menu's button). They may name the page they stand on in a field `next`: a person
 * who is signed out meanwhile is sent to sign in and back to it; an id that is not theirs ends on the not-found page.
 */
export async function runPlainAction(fn: () => Promise<void>, form?: FormData): Promise<void> {
  try {
    await fn()
  } catch (thrown) {
    // Anything else goes on to the framework, which logs it and shows the error page with the id of that entry.
    if (!(thrown instanceof AppError)) throw thrown
    if (thrown.code === 'signedOut') redirect(`/sign-in?next=${encodeURIComponent(safeNext(form?.get('next')) ?? '')}`)
    if (thrown.code === 'notFound') notFound()
    throw thrown
  }
}
