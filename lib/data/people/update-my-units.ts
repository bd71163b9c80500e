import 'server-only'
import { User } from '@/entities/index'
import type { Actor } from '@/lib/auth/actor'
import { authorise } from '../support/authorise'
import { newEm } from '../support/orm'

/** The unit system this person reads and types in, in every shop. */
export async function updateMyUnits(actor: Actor, unitSystem: Actor['unitSystem']): Promise<void> {
  const em = await newEm()
  await authorise(em, actor, 'person.writeSelf')
  await em.nativeUpdate(User, { id: actor.userId }, { unitSystem })
}
