import type { Actor } from './actor'
import { can } from './permissions'

/** The first page after signing in: the working sheets for who has some, the released plans for everyone else. */
export const homeOf = (actor: Pick<Actor, 'role'>): '/scenarios' | '/plans' =>
  can(actor, 'scenario.read') || can(actor, 'scenario.readOwn') ? '/scenarios' : '/plans'
