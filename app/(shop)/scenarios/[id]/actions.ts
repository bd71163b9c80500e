'use server'

import { revalidatePath } from 'next/cache'
import { redirect } from 'next/navigation'
import { touchActor } from '@/lib/auth/session'
import { releaseRevision } from '@/lib/data/plans/release-revision'
import { evaluateForActor } from '@/lib/data/scenarios/evaluate-for-actor'
import { getRevision } from '@/lib/data/scenarios/get-revision'
import { getScenario } from '@/lib/data/scenarios/get-scenario'
import { saveScenario } from '@/lib/data/scenarios/save-scenario'
import { AppError, type ActionState } from '@/lib/errors'
import { formValues, runAction } from '@/lib/run-action'
import { unitSystem } from '@/lib/schemas/people'
import { fieldOfScenarioPath, formToScenario } from '@/lib/schemas/scenario-form'
import type { SheetAnswer, SheetState } from '@/lib/schemas/sheet-answer'

/** The library names inputs by their place in a scenario; the form marks them at their field. */
async function atFields<T>(values: Record<string, string>, work: () => Promise<T>): Promise<T> {
  try {
    return await work()
  } catch (error) {
    if (!(error instanceof AppError) || !error.fieldErrors) throw error
    const fieldErrors = Object.fromEntries(Object.entries(error.fieldErrors).map(([path, words]) => [fieldOfScenarioPath(path, values), words]))
    throw new AppError(error.code, { ...error.details, fieldErrors })
  }
}

/**
 * Saves the scenario's form as the next revision, or with `intent` evaluate computes it and stores nothing (the way without a
 * script). Only the typed texts count: figures that come with the form are never read.
 */
export async function saveSheet(id: string, _before: SheetState, form: FormData): Promise<SheetState> {
  return runAction(async (): Promise<SheetAnswer> => {
    const actor = await touchActor()
    const values = formValues(form)
    const filledFrom = await getRevision(actor, id, Number(values.filledFrom))
    const read = formToScenario(values, unitSystem.catch(actor.unitSystem).parse(values.unitSystem), filledFrom.sheet)
    if (!read.ok) throw new AppError('invalid', { fieldErrors: read.errors })
    const { title, sheet } = read.input
    if (values.intent === 'evaluate') {
      const { engine } = await getScenario(actor, id)
      const { result } = await atFields(values, () => evaluateForActor(actor, { engineId: engine.id, sheet }))
      return { kind: 'evaluated', values, sheet, result }
    }
    const revision = await atFields(values, () => saveScenario(actor, id, {
      baseRevision: Number(values.baseRevision), engineVersion: Number(values.engineVersion), title, sheet,
    }))
    revalidatePath('/scenarios', 'layout')
    return { kind: 'saved', revision }
  }, form)
}

/** Releases a revision as a plan; `reason.<finding>` holds why a finding outside its limit is released all the same. */
export async function releasePlan(id: string, number: number, _before: ActionState, form: FormData): Promise<ActionState> {
  return runAction(async () => {
    const actor = await touchActor()
    const reasons = Object.fromEntries(Object.entries(formValues(form)).filter(([name]) => name.startsWith('reason.')).map(([name, words]) => [name.slice('reason.'.length), words]))
    await releaseRevision(actor, id, number, { reasons })
    revalidatePath('/', 'layout')
    redirect(`/plans/${id}/${number}`)
  }, form)
}
