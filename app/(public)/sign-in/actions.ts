'use server'

import { redirect } from 'next/navigation'
import { callerAddress } from '@/lib/auth/address'
import { homeOf } from '@/lib/auth/home'
import { safeNext } from '@/lib/auth/safe-next'
import { openSession } from '@/lib/auth/session'
import { checkSignIn } from '@/lib/data/people/check-sign-in'
import type { ActionState } from '@/lib/errors'
import { formValues, runAction } from '@/lib/run-action'
import { signInInput } from '@/lib/schemas/people'

export async function signIn(_before: ActionState, form: FormData): Promise<ActionState> {
  return runAction(async () => {
    const input = signInInput.parse(formValues(form))
    const person = await checkSignIn(input, await callerAddress())
    await openSession(person.userId, person.shopId)
    redirect(safeNext(input.next) ?? homeOf(person))
  }, form)
}
