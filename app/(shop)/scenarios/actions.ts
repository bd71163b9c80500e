'use server'

import { revalidatePath } from 'next/cache'
import { redirect } from 'next/navigation'
import { touchActor } from '@/lib/auth/session'
import { getEngine } from '@/lib/data/engines/get-engine'
import { archiveScenario as archive, restoreScenario as restore } from '@/lib/data/scenarios/archive-scenario'
import { createScenario } from '@/lib/data/scenarios/create-scenario'
import { duplicateScenario as duplicate } from '@/lib/data/scenarios/duplicate-scenario'
import { AppError, type ActionState } from '@/lib/errors'
import { formValues, runAction } from '@/lib/run-action'
import { runFormAction } from '@/lib/run-form-action'
import { startingSheet } from '@/lib/schemas/scenario-defaults'

const listPath = '/scenarios'
const pageOf = (id: string) => `${listPath}/${encodeURIComponent(id)}`

function refresh(id: string) {
  revalidatePath(listPath)
  revalidatePath(pageOf(id))
}

/** Fields `engineId` and `title`. Starts with what the engine itself gives, and opens it. */
export async function newScenario(_before: ActionState, form: FormData): Promise<ActionState> {
  return runAction(async () => {
    const { engineId = '', title = '' } = formValues(form)
    const actor = await touchActor()
    if (!engineId) throw new AppError('invalid', { fieldErrors: { engineId: 'Choose the engine it is laid out on.' } })
    const engine = await getEngine(actor, engineId)
    const made = await createScenario(actor, { engineId, engineVersion: engine.version, title, sheet: startingSheet(engine.spec) })
    revalidatePath(listPath)
    redirect(pageOf(made.id))
  }, form)
}

/** Field `id`, and `revision` for another than the current one. Opens the copy. */
export async function duplicateScenario(form: FormData): Promise<void> {
  const { id = '', revision } = formValues(form)
  await runFormAction(async () => {
    const copy = await duplicate(await touchActor(), id, revision ? { revision: Number(revision) } : {})
    revalidatePath(listPath)
    redirect(pageOf(copy.id))
  }, form, pageOf(id))
}

/** Field `id`. */
export async function archiveScenario(form: FormData): Promise<void> {
  const { id = '' } = formValues(form)
  await runFormAction(async () => {
    await archive(await touchActor(), id)
    refresh(id)
  }, form, pageOf(id))
}

/** Field `id`. */
export async function restoreScenario(form: FormData): Promise<void> {
  const { id = '' } = formValues(form)
  await runFormAction(async () => {
    await restore(await touchActor(), id)
    refresh(id)
  }, form, pageOf(id))
}
