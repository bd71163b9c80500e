import { defineEntity, p, type InferEntity } from '@mikro-orm/core'

/**
 * Counted attempts. Read and written by the rate limiter of lib/auth, whose INSERT names no columns: key, points,
 * expire must stay in this order, and no column may be added.
 */
export const SignInLimit = defineEntity({
  name: 'SignInLimit',
  tableName: 'sign_in_limits',
  properties: {
    key: p.string().length(255).primary(),
    points: p.integer().default(0),
    /** End of the window, ms since 1970. */
    expire: p.bigint().$type<string>().nullable(),
  },
})
export type SignInLimit = InferEntity<typeof SignInLimit>
