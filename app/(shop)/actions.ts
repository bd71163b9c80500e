'use server'

import { revalidatePath } from 'next/cache'
import { redirect } from 'next/navigation'
import { homeOf } from '@/lib/auth/home'
import { closeSession, touchActor, touchSession } from '@/lib/auth/session'
import { updateMyUnits } from '@/lib/data/people/update-my-units'
import { updateSessionShop } from '@/lib/data/people/update-session-shop'
import { formValues } from '@/lib/run-action'
import { runPlainAction } from '@/lib/run-plain-action'
import { unitSystem } from '@/lib/schemas/people'

export async function signOut(): Promise<void> {
  await closeSession()
  redirect('/sign-in')
}

/** Field `unitSystem`: metric or us. */
export async function setUnitSystem(form: FormData): Promise<void> {
  await runPlainAction(async () => {
    await updateMyUnits(await touchActor(), unitSystem.parse(formValues(form).unitSystem))
    revalidatePath('/', 'layout')
  }, form)
}

/** Field `shopId`. Ends on the home page of that shop: the page one stood on belongs to the other. */
export async function switchShop(form: FormData): Promise<void> {
  await runPlainAction(async () => {
    const { actor, session } = await touchSession()
    const there = await updateSessionShop(actor, session.id, formValues(form).shopId ?? '')
    revalidatePath('/', 'layout')
    redirect(homeOf(there))
  }, form)
}
