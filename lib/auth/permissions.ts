import type { Actor } from './actor'
import type { Role } from './roles'

/**
 * Everything that can be permitted. `…Own` is enough for rows the person created; the plain action reaches every row
 * of the shop. A released plan is read by every role; drafts only by those who work on them.
 */
export const actions = [
  'engine.read', 'engine.write', 'engine.archive',
  'scenario.read', 'scenario.readOwn', 'scenario.create', 'scenario.write', 'scenario.writeOwn',
  'scenario.archive', 'scenario.archiveOwn',
  'plan.read', 'plan.release',
  'person.readSelf', 'person.writeSelf', 'shop.switch',
] as const
export type Action = (typeof actions)[number]

const self = ['person.readSelf', 'person.writeSelf', 'shop.switch'] as const
const reader = ['plan.read', ...self] as const
const ownSheets = ['scenario.readOwn', 'scenario.create', 'scenario.writeOwn', 'scenario.archiveOwn'] as const

/** The one table role × action. A role may do what its line lists and nothing else. */
export const permissions = {
  builder: [...reader, 'engine.read', ...ownSheets],
  designer: [
    ...reader, 'engine.read', 'engine.write', 'engine.archive',
    ...ownSheets, 'scenario.read', 'scenario.write', 'scenario.archive', 'plan.release',
  ],
  technician: [...reader],
  inspector: [...reader],
  instructor: [...reader],
  owner: [...actions],
} as const satisfies Record<Role, readonly Action[]>

/** True when the actor's role may do this. Which rows it reaches is the query's business. */
export const can = (actor: Pick<Actor, 'role'>, action: Action): boolean =>
  (permissions[actor.role] as readonly Action[]).includes(action)
