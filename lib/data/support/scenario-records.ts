import 'server-only'
import { LockMode } from '@mikro-orm/core'
import type { EntityManager } from '@mikro-orm/postgresql'
import { Engine, Revision, Scenario, User } from '@/entities/index'
import type { Actor } from '@/lib/auth/actor'
import { can, type Action } from '@/lib/auth/permissions'
import type { Role } from '@/lib/auth/roles'
import type { ScenarioSheet } from '@/lib/calc/live'
import { AppError } from '@/lib/errors'
import { scenarioDto, type ScenarioDto } from '@/lib/schemas/scenario-dto'
import { sheetVersion } from '@/lib/schemas/scenario'
import { toDto } from './dto'
import { toEngineDto } from './engine-records'
import { evaluatedColumns } from './evaluation'
import { requireId } from './ids'
import { isoOf, isoOrNull } from './list-page'
import { findRevision, toRevisionDto } from './revision-records'
import { searchText } from './search-text'

/** Rows a role reaches with this action: all of the shop, or only those the person owns. */
export function scenarioScope(actor: Actor, role: Role, wholeShop: Action): { shop: string, owner?: string } {
  return can({ role }, wholeShop) ? { shop: actor.shop.id } : { shop: actor.shop.id, owner: actor.userId }
}

/** A scenario in that scope, or not-found; with `lock` held until the transaction ends. */
export async function findScenario(em: EntityManager, scope: ReturnType<typeof scenarioScope>, id: string, lock = false): Promise<Scenario> {
  const lockMode = lock ? LockMode.PESSIMISTIC_WRITE : undefined
  const scenario = await em.findOne(Scenario, { id: requireId(id, 'scenario'), ...scope }, { lockMode })
  if (!scenario) throw new AppError('notFound', { what: 'scenario' })
  return scenario
}

/**
 * A revision with everything the library makes of its inputs, not yet flushed; the scenario's row follows it. Throws for
 * inputs that cannot be computed with, before anything is written.
 */
export function addRevision(em: EntityManager, actor: Actor, scenario: Scenario, engine: Engine, number: number, title: string, sheet: ScenarioSheet): Revision {
  const evaluated = evaluatedColumns({ engine: engine.spec, sheet })
  const { outsideCount, closeCount, withinCount } = evaluated
  const search = scenarioSearch(scenario.code, title, engine.name)
  const now = new Date()
  em.assign(scenario, { title, currentRevision: number, outsideCount, closeCount, withinCount, search, updatedAt: now })
  return em.create(Revision, {
    ...evaluated, scenario, shop: actor.shop.id, number, title, sheet, sheetVersion, search, createdAt: now,
    engineVersion: engine.version, engine: { name: engine.name, code: engine.code, spec: engine.spec }, author: actor.userId,
  })
}

/** The engine's name is the last line: a new name replaces it alone. */
const scenarioSearch = (code: string, title: string, engineName: string) => searchText(code, title, engineName)

/** A new scenario of the actor on a locked engine, numbered after it, with its first revision. */
export function addScenario(em: EntityManager, actor: Actor, engine: Engine, title: string, sheet: ScenarioSheet): Scenario {
  const number = engine.lastScenarioNumber + 1
  engine.lastScenarioNumber = number
  const scenario = em.create(Scenario, {
    shop: actor.shop.id, engine, owner: actor.userId, code: `${engine.code}-${String(number).padStart(2, '0')}`,
    title, currentRevision: 1, outsideCount: 0, closeCount: 0, withinCount: 0, search: '',
  })
  addRevision(em, actor, scenario, engine, 1, title, sheet)
  return scenario
}

/** Everything a page shows of a scenario, with its current revision. */
export async function toScenarioDto(em: EntityManager, actor: Actor, role: Role, scenario: Scenario): Promise<ScenarioDto> {
  const engine = await em.findOneOrFail(Engine, { id: scenario.engine.id, shop: actor.shop.id })
  const revision = await findRevision(em, scenario, scenario.currentRevision)
  const owner = await em.findOneOrFail(User, scenario.owner.id, { fields: ['name'] })
  const archived = Boolean(scenario.archivedAt)
  const writes = can({ role }, 'scenario.write') || (can({ role }, 'scenario.writeOwn') && scenario.owner.id === actor.userId)
  return toDto(scenarioDto, {
    id: scenario.id, code: scenario.code, title: scenario.title,
    owner: { id: owner.id, name: owner.name },
    engine: await toEngineDto(em, engine),
    archivedAt: isoOrNull(scenario.archivedAt ?? null),
    updatedAt: isoOf(scenario.updatedAt),
    releasedRevision: scenario.releasedRevision ?? null,
    revision: toRevisionDto(revision),
    engineChanged: engine.version !== revision.engineVersion,
    canWrite: writes && !archived,
    canRelease: can({ role }, 'plan.release') && !archived,
  })
}
