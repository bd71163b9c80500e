import 'server-only'
import type { Actor } from '@/lib/auth/actor'
import { AppError } from '@/lib/errors'
import type { PlanDto } from '@/lib/schemas/plan-dto'
import { authorise } from '../support/authorise'
import { newEm } from '../support/orm'
import { toPlanDto } from '../support/plan-records'
import { findRevision } from '../support/revision-records'
import { findScenario } from '../support/scenario-records'

/** A released revision of the shop, whoever owns its scenario and whether that is archived or not. Drafts read as not there. */
export async function getPlan(actor: Actor, scenarioId: string, number: number): Promise<PlanDto> {
  const em = await newEm()
  await authorise(em, actor, 'plan.read')
  const notThere = new AppError('notFound', { what: 'plan' })
  const scenario = await findScenario(em, { shop: actor.shop.id }, scenarioId).catch((error: unknown) => {
    throw error instanceof AppError ? notThere : error
  })
  const revision = await findRevision(em, scenario, number).catch((error: unknown) => {
    throw error instanceof AppError ? notThere : error
  })
  if (!revision.releasedAt) throw notThere
  return toPlanDto(revision, scenario.code)
}
