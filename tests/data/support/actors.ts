import type { MikroORM } from '@mikro-orm/postgresql'
import { randomUUID } from 'node:crypto'
import { Membership, Shop, User } from '@/entities/index'
import type { Actor } from '@/lib/auth/actor'
import { createSession } from '@/lib/auth/lucia'
import { nobodysHash } from '@/lib/auth/passwords'
import { roles, type Role } from '@/lib/auth/roles'
import { cookieJar } from './next-mocks'

/** A shop of its own for a test. */
export async function createShop(orm: MikroORM, name = `Shop ${randomUUID()}`): Promise<Actor['shop']> {
  const em = orm.em.fork()
  const shop = em.create(Shop, { name })
  await em.flush()
  return { id: shop.id, name }
}

/** A person nobody can sign in as (the password is unknown), belonging to no shop. */
export async function createPerson(orm: MikroORM, name = 'Someone'): Promise<Pick<Actor, 'userId' | 'name' | 'email' | 'unitSystem'>> {
  const em = orm.em.fork()
  const email = `${randomUUID()}@people.example`
  const user = em.create(User, { email, name, passwordHash: nobodysHash })
  await em.flush()
  return { userId: user.id, name, email, unitSystem: 'metric' }
}

export async function join(orm: MikroORM, userId: string, shopId: string, role: Role): Promise<void> {
  const em = orm.em.fork()
  em.create(Membership, { user: userId, shop: shopId, role })
  await em.flush()
}

/** A new person with a role in the shop. */
export async function createActor(orm: MikroORM, shop: Actor['shop'], role: Role): Promise<Actor> {
  const person = await createPerson(orm, `A ${role}`)
  await join(orm, person.userId, shop.id, role)
  return { ...person, shop, role }
}

export type Cast = {
  shop: Actor['shop']
  /** One person of each role in `shop`. */
  actors: Record<Role, Actor>
  /** A second designer of `shop`, who wrote the rows others come across. */
  author: Actor
  /** A person without any shop, who claims to be the owner of `shop`. */
  stranger: Actor
  /** The owner of another shop. */
  neighbour: Actor
}

export async function createCast(orm: MikroORM): Promise<Cast> {
  const shop = await createShop(orm)
  const entries: [Role, Actor][] = []
  for (const role of roles) entries.push([role, await createActor(orm, shop, role)])
  return {
    shop,
    actors: Object.fromEntries(entries) as Record<Role, Actor>,
    author: await createActor(orm, shop, 'designer'),
    stranger: { ...(await createPerson(orm, 'A stranger')), shop, role: 'owner' },
    neighbour: await createActor(orm, await createShop(orm), 'owner'),
  }
}

/** The browser of the mocked request is signed in as this person, or as nobody. */
export async function signInAs(actor: Pick<Actor, 'userId' | 'shop'> | null): Promise<void> {
  cookieJar.clear()
  if (!actor) return
  const { name, value } = await createSession(actor.userId, actor.shop.id)
  cookieJar.set(name, value)
}
