import 'server-only'
import { Membership } from '@/entities/index'
import type { Actor } from '@/lib/auth/actor'
import { requestEm } from '../support/orm'

/**
 * The actor of a session: the person in the session's shop or, when the session names none or the person left it, in the shop
 * joined first. Null for a person without a shop. Trusts its caller to have checked the session: only lib/auth calls it.
 */
export async function findActor(userId: string, shopId: string | null): Promise<Actor | null> {
  const em = await requestEm()
  const memberships = await em.find(Membership, { user: userId }, {
    populate: ['user', 'shop'],
    fields: ['role', 'user.name', 'user.email', 'user.unitSystem', 'shop.name'],
    orderBy: { createdAt: 'asc', id: 'asc' },
  })
  const membership = memberships.find((one) => one.shop.id === shopId) ?? memberships[0]
  if (!membership) return null
  const { user, shop, role } = membership
  return { userId: user.id, name: user.name, email: user.email, unitSystem: user.unitSystem, shop: { id: shop.id, name: shop.name }, role }
}
