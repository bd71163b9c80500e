import 'server-only'
import { Shop, User } from '@/entities/index'
import type { Actor } from '@/lib/auth/actor'
import { AppError } from '@/lib/errors'
import type { PlanDto } from '@/lib/schemas/plan-dto'
import type { StoredResult } from '@/lib/schemas/revision-dto'
import { leastReason, releaseInput, type ReleaseInput } from '@/lib/schemas/scenario-input'
import { authorise } from '../support/authorise'
import { newEm } from '../support/orm'
import { toPlanDto } from '../support/plan-records'
import { findRevision } from '../support/revision-records'
import { findScenario, scenarioScope } from '../support/scenario-records'
import { requireStorable } from '../support/storable'

/** The reason of each finding outside its limit; a missing or short one is told at `reason.<finding>`. Others are not kept. */
function reasonsFor({ findings }: StoredResult, given: Record<string, string>): Record<string, string> {
  const outside = findings.filter((finding) => finding.verdict === 'outside')
  const short = outside.filter(({ id }) => (given[id] ?? '').length < leastReason)
  if (short.length > 0) {
    const sentence = `Write why this is released outside its limit, in ${leastReason} characters at least.`
    throw new AppError('invalid', { fieldErrors: Object.fromEntries(short.map(({ id }) => [`reason.${id}`, sentence])) })
  }
  return Object.fromEntries(outside.map(({ id }) => [id, given[id] ?? '']))
}

/**
 * Makes a revision a plan: read by every role of the shop, never changed. It is judged by the limits it was saved with. With
 * a finding outside, each needs a written reason, and a shop may forbid it altogether.
 */
export async function releaseRevision(actor: Actor, scenarioId: string, number: number, input: ReleaseInput): Promise<PlanDto> {
  const forked = await newEm()
  const { role } = await authorise(forked, actor, 'plan.release')
  const given = releaseInput.parse(input).reasons
  requireStorable({ reason: given })
  return forked.transactional(async (em) => {
    const scenario = await findScenario(em, scenarioScope(actor, role, 'scenario.read'), scenarioId, true)
    if (scenario.archivedAt) throw new AppError('archived', { what: 'scenario' })
    const revision = await findRevision(em, scenario, number)
    if (revision.releasedAt) throw new AppError('alreadyReleased')
    const { releasesOutsideAllowed } = await em.findOneOrFail(Shop, actor.shop.id)
    if (revision.outsideCount > 0 && !releasesOutsideAllowed) throw new AppError('releaseRefused')
    const releasedBy = await em.findOneOrFail(User, actor.userId, { fields: ['name'] })
    em.assign(revision, { releasedAt: new Date(), releasedBy, releaseReasons: reasonsFor(revision.results, given) })
    scenario.releasedRevision = revision.number
    await em.flush()
    return toPlanDto(revision, scenario.code)
  })
}
