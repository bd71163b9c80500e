'use server'

import { redirect } from 'next/navigation'
import { callerAddress } from '@/lib/auth/address'
import { homeOf } from '@/lib/auth/home'
import { safeNext } from '@/lib/auth/safe-next'
import { openSession } from '@/lib/auth/session'
import { createPersonWithShop } from '@/lib/data/people/create-person-with-shop'
import type { ActionState } from '@/lib/errors'
import { formValues, runAction } from '@/lib/run-action'
import { signUpInput } from '@/lib/schemas/people'

export async function signUp(_before: ActionState, form: FormData): Promise<ActionState> {
  return runAction(async () => {
    const input = signUpInput.parse(formValues(form))
    const { userId, shopId } = await createPersonWithShop(input, await callerAddress())
    await openSession(userId, shopId)
    redirect(safeNext(input.next) ?? homeOf({ role: 'owner' }))
  }, form)
}
