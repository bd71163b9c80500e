import 'server-only'
import { Membership, Session } from '@/entities/index'
import type { Actor } from '@/lib/auth/actor'
import type { Role } from '@/lib/auth/roles'
import { AppError } from '@/lib/errors'
import { authorise } from '../support/authorise'
import { requireId } from '../support/ids'
import { newEm } from '../support/orm'

/** Moves this sign-in, and no other of the person's, to another of the person's shops; returns the role there. */
export async function updateSessionShop(actor: Actor, sessionId: string, shopId: string): Promise<{ role: Role }> {
  const em = await newEm()
  await authorise(em, actor, 'shop.switch')
  const membership = await em.findOne(Membership, { user: actor.userId, shop: requireId(shopId, 'shop') })
  if (!membership) throw new AppError('notFound', { what: 'shop' })
  await em.nativeUpdate(Session, { id: sessionId, user: actor.userId }, { shop: shopId })
  return { role: membership.role }
}
