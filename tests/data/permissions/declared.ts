/**
 * The one table of what each door of the server needs. Every function exported from `lib/data` (but `support`), every handler in
 * a `route.ts` and every export of an `actions.ts` has a line in one of the lists below; the walk fails for one without.
 *
 * To add one: `declare(fn, { needs, own?, prepare?, call })` in the list of its noun (a new noun: a new file in `declared/`).
 *   needs    the action of lib/auth/permissions.ts its caller must have, or 'public'
 *   own      the action that is enough for rows the caller wrote, where there is such a difference
 *   prepare  makes a fresh row in `world.shop` written by `author` and returns its id(s); leave out for lists and creations
 *   call     (fn, { actor, target, world }) => fn(…): data functions get the actor first, actions (state, formOf({ … })),
 *            routes (request, { params }); `target` is what `prepare` returned
 * The walk then calls it signed out, as a stranger, as each role, and as the owner of another shop, and expects
 *   permitted → it works · own rows only → not found on others' rows, works on own · else forbidden ·
 *   stranger and other shop → not found (or a result without anything of this shop) · signed out → signed out,
 * and that no refused call changed a row.
 */
import type { Declaration } from './declare'
import { engines } from './declared/engines'
import { people } from './declared/people'
import { plans } from './declared/plans'
import { scenarios } from './declared/scenarios'
import { shell } from './declared/shell'

export const declared: readonly Declaration[] = [
  ...engines,
  ...scenarios,
  ...plans,
  ...people,
  ...shell,
]
