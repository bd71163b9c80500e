'use server'

import { revalidatePath } from 'next/cache'
import { redirect } from 'next/navigation'
import type { Actor } from '@/lib/auth/actor'
import { touchActor } from '@/lib/auth/session'
import { archiveEngine as archive, restoreEngine as restore } from '@/lib/data/engines/archive-engine'
import { createEngine as create } from '@/lib/data/engines/create-engine'
import { duplicateEngine as duplicate } from '@/lib/data/engines/duplicate-engine'
import { getEngine } from '@/lib/data/engines/get-engine'
import { removeEngine as remove } from '@/lib/data/engines/remove-engine'
import { updateEngine as update } from '@/lib/data/engines/update-engine'
import { AppError, type ActionState } from '@/lib/errors'
import { formValues, runAction } from '@/lib/run-action'
import { runFormAction } from '@/lib/run-form-action'
import type { EngineInput } from '@/lib/schemas/engine'
import type { EngineDto } from '@/lib/schemas/engine-dto'
import { formToEngine } from '@/lib/schemas/engine-form'
import { unitSystem } from '@/lib/schemas/people'

const listPath = '/engines'
const pageOf = (id: string) => `${listPath}/${encodeURIComponent(id)}`

/** The typed texts in the units the form was drawn in, which its field `unitSystem` names: the person may have changed them since. */
function readForm(values: Record<string, string>, actor: Actor, base?: EngineDto): EngineInput {
  const read = formToEngine(values, unitSystem.catch(actor.unitSystem).parse(values.unitSystem), base?.spec)
  if (read.ok) return read.input
  throw new AppError('invalid', { fieldErrors: read.errors })
}

/** Scenarios say that their engine has changed, so their pages are old too. */
function refresh() {
  revalidatePath(listPath, 'layout')
  revalidatePath('/scenarios', 'layout')
}

/** The engine form, empty at first. Opens the new engine. */
export async function createEngine(_before: ActionState<EngineDto>, form: FormData): Promise<ActionState<EngineDto>> {
  return runAction(async () => {
    const actor = await touchActor()
    const made = await create(actor, readForm(formValues(form), actor))
    refresh()
    redirect(pageOf(made.id))
  }, form)
}

/** The engine form; `version` is the one it was filled from. A newer one comes back as the conflict, and `over` names the one to save over. */
export async function updateEngine(id: string, _before: ActionState<EngineDto>, form: FormData): Promise<ActionState<EngineDto>> {
  return runAction(async () => {
    const actor = await touchActor()
    const values = formValues(form)
    const base = await getEngine(actor, id)
    const saved = await update(actor, id, { version: Number(values.over ?? values.version) || 1, ...readForm(values, actor, base) })
    refresh()
    return saved
  }, form)
}

/** Field `id`. */
export async function archiveEngine(form: FormData): Promise<void> {
  const { id = '' } = formValues(form)
  await runFormAction(async () => {
    await archive(await touchActor(), id)
    refresh()
  }, form, pageOf(id))
}

/** Field `id`. */
export async function restoreEngine(form: FormData): Promise<void> {
  const { id = '' } = formValues(form)
  await runFormAction(async () => {
    await restore(await touchActor(), id)
    refresh()
  }, form, pageOf(id))
}

/** Field `id`. Opens the copy. */
export async function duplicateEngine(form: FormData): Promise<void> {
  const { id = '' } = formValues(form)
  await runFormAction(async () => {
    const copy = await duplicate(await touchActor(), id)
    refresh()
    redirect(pageOf(copy.id))
  }, form, pageOf(id))
}

/** Field `id`. Ends on the list. */
export async function removeEngine(form: FormData): Promise<void> {
  const { id = '' } = formValues(form)
  await runFormAction(async () => {
    await remove(await touchActor(), id)
    refresh()
    redirect(listPath)
  }, form, pageOf(id))
}
