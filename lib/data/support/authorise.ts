import 'server-only'
import type { EntityManager } from '@mikro-orm/postgresql'
import { Membership } from '@/entities/index'
import type { Actor } from '@/lib/auth/actor'
import { can, type Action } from '@/lib/auth/permissions'
import type { Role } from '@/lib/auth/roles'
import { AppError } from '@/lib/errors'

/**
 * First line of every data function: the actor is a member of the shop now, and the role held now permits the action.
 * Both are read from the membership's row, so a role taken away a moment ago no longer counts. Who is no member gets
 * not-found. Afterwards every query still carries `shop: actor.shop.id`. `anyOf`: one of several actions is enough.
 * Returns the role, for the difference between own rows and all rows.
 */
export async function authorise(em: EntityManager, actor: Actor, ...anyOf: [Action, ...Action[]]): Promise<{ role: Role }> {
  const membership = await em.findOne(Membership, { user: actor.userId, shop: actor.shop.id }, { fields: ['role'] })
  if (!membership) throw new AppError('notFound')
  const { role } = membership
  if (!anyOf.some((action) => can({ role }, action))) throw new AppError('forbidden')
  return { role }
}
