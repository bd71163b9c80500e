import type { MikroORM } from '@mikro-orm/postgresql'
import type { Actor } from '@/lib/auth/actor'
import type { Action } from '@/lib/auth/permissions'
import type { Cast } from '../support/actors'

export type World = Cast & { orm: MikroORM }

/** What a recipe knows of the call it prepares: who calls (null: signed out) and the row it is about. */
type Call<T> = { actor: Actor, target: T, world: World }

type Recipe<A extends unknown[], T> = {
  /** The action a caller's role must permit; 'public' for what works before sign-in. */
  needs: Action | 'public'
  /** The action that is enough for rows the caller wrote. Others' rows are then not found. */
  own?: Action
  /** Makes a fresh row of `world.shop`, written by `author`, and returns what the call needs to name it. Without it the call names no row. */
  prepare?: (world: World, author: Actor) => Promise<T>
  /** Makes the call: `fn` is the declared function, `actor` the caller; someone signed out gets the stranger here. */
  call: (fn: (...args: A) => unknown, call: Call<T>) => unknown
}

export type Declaration = {
  of: (...args: never[]) => unknown
  needs: Action | 'public'
  own: Action | undefined
  namesRow: boolean
  /** Prepares one call on a row of `author`; the returned function makes it. */
  ready: (world: World, actor: Actor, author: Actor) => Promise<() => unknown>
}

/** One line of the table: a data function, a server action or a route handler, what it needs, and how to call it. */
export function declare<A extends unknown[], T = undefined>(of: (...args: A) => unknown, { needs, own, prepare, call }: Recipe<A, T>): Declaration {
  return {
    of,
    needs,
    own,
    namesRow: prepare !== undefined,
    ready: async (world, actor, author) => {
      const target = prepare ? await prepare(world, author) : undefined as T
      return () => {
        let calls = 0
        const counted = (...args: A) => {
          calls++
          return of(...args)
        }
        const end = call(counted, { actor, target, world })
        if (calls !== 1) throw new Error(`The recipe of ${of.name} calls it ${calls} times; it has to, once.`)
        return end
      }
    },
  }
}
