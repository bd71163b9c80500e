import type { MikroORM } from '@mikro-orm/postgresql'
import type { Actor } from '@/lib/auth/actor'
import type { Action } from '@/lib/auth/permissions'
import type { Cast } from '../support/actors'

export type World = Cast & { orm: MikroORM }

/** What a recipe knows of the call it prepares: who calls (null: signed out) and the row it is about. */
type Call<T> = { actor: Actor, target: T, world: World }
type Callable = (...args: never[]) => unknown

type Recipe<F extends Callable, T> = {
  /** The action a caller's role must permit; 'public' for what works before sign-in. */
  needs: Action | 'public'
  /** The action that is enough for rows the caller wrote. Others' rows are then not found. */
  own?: Action
  /** Makes a fresh row of `world.shop`, written by `author`, and returns what the call needs to name it. Without it the call names no row. */
  prepare?: (world: World, author: Actor) => Promise<T>
  /** The arguments of the call. `actor` is the caller; someone signed out gets the stranger here. */
  args: (call: Call<T>) => Parameters<F>
}

export type Declaration = {
  of: Callable
  needs: Action | 'public'
  own: Action | undefined
  namesRow: boolean
  /** Prepares one call on a row of `author`; the returned function makes it. */
  ready: (world: World, actor: Actor, author: Actor) => Promise<() => unknown>
}

/** One line of the table: a data function, a server action or a route handler, what it needs, and how to call it. */
export function declare<F extends Callable, T = undefined>(of: F, { needs, own, prepare, args }: Recipe<F, T>): Declaration {
  return {
    of,
    needs,
    own,
    namesRow: prepare !== undefined,
    ready: async (world, actor, author) => {
      const target = prepare ? await prepare(world, author) : undefined as T
      const list = args({ actor, target, world })
      return () => of(...list)
    },
  }
}
