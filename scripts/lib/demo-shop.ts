import { Membership, User } from '@/entities/index'
import type { Actor } from '@/lib/auth/actor'
import { hashPassword } from '@/lib/auth/passwords'
import { createEngine } from '@/lib/data/engines/create-engine'
import { listEngines } from '@/lib/data/engines/list-engines'
import { createPersonWithShop } from '@/lib/data/people/create-person-with-shop'
import { findActor } from '@/lib/data/people/find-actor'
import { createScenario } from '@/lib/data/scenarios/create-scenario'
import { listScenarios } from '@/lib/data/scenarios/list-scenarios'
import { saveScenario } from '@/lib/data/scenarios/save-scenario'
import { newEm } from '@/lib/data/support/orm'
import type { ScenarioSheet } from '@/lib/calc/scenario/scenario-types'
import type { EngineInput } from '@/lib/schemas/engine'
import type { EngineDto } from '@/lib/schemas/engine-dto'
import type { DemoSignIn } from './demo-sign-ins.mjs'

/**
 * The pieces the demo is laid out with. Each looks for what it would make and leaves it alone where it is there, so that a run
 * that was cut short is finished by the next.
 */

const findDemoActor = async (email: string): Promise<Actor | null> => {
  const user = await (await newEm()).findOne(User, { email }, { fields: ['id'] })
  return user ? findActor(user.id, null) : null
}

async function requireDemoActor(email: string): Promise<Actor> {
  const actor = await findDemoActor(email)
  if (!actor) throw new Error(`${email} belongs to no shop.`)
  return actor
}

/** An owner signs up as anybody does, which makes the shop; the owner is returned as an actor. */
export async function demoOwner({ name, email, password, shop: shopName }: DemoSignIn): Promise<Actor> {
  const found = await findDemoActor(email)
  if (found) return found
  await createPersonWithShop({ name, email, password, shopName }, 'demo')
  return requireDemoActor(email)
}

export async function demoMember({ name, email, password, role }: DemoSignIn, { shop }: Actor): Promise<Actor> {
  const found = await findDemoActor(email)
  if (found) return found
  const em = await newEm()
  const user = em.create(User, { email, name, passwordHash: await hashPassword(password) })
  em.create(Membership, { user, shop: shop.id, role })
  await em.flush()
  return requireDemoActor(email)
}

export async function demoEngine(designer: Actor, input: EngineInput): Promise<EngineDto> {
  const { rows } = await listEngines(designer, { search: input.code })
  return rows.find((row) => row.code === input.code) ?? createEngine(designer, input)
}

/** A scenario with its revisions in order; the id. A title that occurs once in the demo tells whether it is there. */
export async function demoScenario(author: Actor, engine: EngineDto, title: string, ...[first, ...later]: [ScenarioSheet, ...ScenarioSheet[]]): Promise<string> {
  const found = (await listScenarios(author, { engineId: engine.id, search: title })).rows.find((row) => row.title === title)
  const id = found?.id ?? (await createScenario(author, { engineId: engine.id, engineVersion: engine.version, title, sheet: first })).id
  for (const [i, sheet] of later.entries()) {
    if ((found?.currentRevision ?? 1) > i + 1) continue
    await saveScenario(author, id, { baseRevision: i + 1, engineVersion: engine.version, title, sheet })
  }
  return id
}
