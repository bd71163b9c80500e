import { defineEntity, p, type InferEntity } from '@mikro-orm/core'
import { roles, type Role } from '../lib/auth/roles'
import { Shop } from './shop.entity'
import { User } from './user.entity'

/** A person's place in a shop, with one role. */
export const Membership = defineEntity({
  name: 'Membership',
  tableName: 'memberships',
  properties: {
    id: p.uuid().primary().defaultRaw('gen_random_uuid()'),
    user: () => p.manyToOne(User).deleteRule('cascade'),
    shop: () => p.manyToOne(Shop).deleteRule('cascade'),
    role: p.enum([...roles]).$type<Role>(),
    createdAt: p.datetime().onCreate(() => new Date()).defaultRaw('now()'),
  },
  uniques: [{ name: 'memberships_user_shop_unique', properties: ['user', 'shop'] }],
  indexes: [{ name: 'memberships_shop_index', properties: ['shop'] }],
})
export type Membership = InferEntity<typeof Membership>
