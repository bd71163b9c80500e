import 'server-only'
import { Membership } from '@/entities/index'
import type { Actor } from '@/lib/auth/actor'
import { meDto, type MeDto } from '@/lib/schemas/people'
import { authorise } from '../support/authorise'
import { toDto } from '../support/dto'
import { requestEm } from '../support/orm'

/** The actor's own data, with every shop the person belongs to, by name. */
export async function getMe(actor: Actor): Promise<MeDto> {
  const em = await requestEm()
  const { role } = await authorise(em, actor, 'person.readSelf')
  const memberships = await em.find(Membership, { user: actor.userId }, {
    populate: ['shop'], fields: ['role', 'shop.name'], orderBy: { shop: { name: 'asc', id: 'asc' } },
  })
  return toDto(meDto, {
    ...actor,
    role,
    shops: memberships.map(({ shop, role: roleThere }) => ({ id: shop.id, name: shop.name, role: roleThere })),
  })
}
