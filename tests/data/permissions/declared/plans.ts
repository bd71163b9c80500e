import { GET as listPlansRoute } from '@/app/api/plans/route'
import { releasePlan } from '@/app/(shop)/scenarios/[id]/actions'
import type { Actor } from '@/lib/auth/actor'
import { getPlan } from '@/lib/data/plans/get-plan'
import { listPlans } from '@/lib/data/plans/list-plans'
import { releaseRevision } from '@/lib/data/plans/release-revision'
import { formOf } from '../../support/next-mocks'
import { aScenario } from '../../support/records'
import { declare, type World } from '../declare'

const draft = async (world: World, author: Actor) => (await aScenario(author, world.author)).id
const released = async (world: World, author: Actor) => {
  const id = await draft(world, author)
  await releaseRevision(world.author, id, 1, {})
  return id
}

export const plans = [
  declare(releaseRevision, { needs: 'plan.release', prepare: draft, call: (fn, { actor, target }) => fn(actor, target, 1, {}) }),
  declare(getPlan, { needs: 'plan.read', prepare: released, call: (fn, { actor, target }) => fn(actor, target, 1) }),
  declare(listPlans, { needs: 'plan.read', call: (fn, { actor }) => fn(actor, {}) }),

  declare(releasePlan, { needs: 'plan.release', prepare: draft, call: (fn, { target: id }) => fn(id, 1, { ok: false }, formOf({})) }),

  declare(listPlansRoute, { needs: 'plan.read', call: (fn) => fn(new Request('http://127.0.0.1/api/plans')) }),
]
