import { defineEntity, p, type InferEntity } from '@mikro-orm/core'
import { Shop } from './shop.entity'
import { User } from './user.entity'

/**
 * An open sign-in. Rows are read and written by lib/auth (raw SQL: id, user_id, expires_at, shop_id). `id` is the
 * SHA-256 of the cookie's value, so that a copy of the table opens nothing.
 */
export const Session = defineEntity({
  name: 'Session',
  tableName: 'sessions',
  properties: {
    id: p.text().primary(),
    user: () => p.manyToOne(User).deleteRule('cascade'),
    expiresAt: p.datetime(),
    /** The shop this sign-in works in; empty: the person's first membership. */
    shop: () => p.manyToOne(Shop).nullable().deleteRule('set null'),
  },
  indexes: [
    { name: 'sessions_user_index', properties: ['user'] },
    { name: 'sessions_shop_index', properties: ['shop'] },
  ],
})
export type Session = InferEntity<typeof Session>
