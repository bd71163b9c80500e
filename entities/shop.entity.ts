import { defineEntity, p, type InferEntity } from '@mikro-orm/core'

/** A shop. Everything else belongs to exactly one, and nothing of one is visible to another. */
export const Shop = defineEntity({
  name: 'Shop',
  tableName: 'shops',
  properties: {
    id: p.uuid().primary().defaultRaw('gen_random_uuid()'),
    name: p.string().length(80),
    /** May a revision with a finding outside its limit be released, with a written reason for each? */
    releasesOutsideAllowed: p.boolean().default(true),
    createdAt: p.datetime().onCreate(() => new Date()).defaultRaw('now()'),
  },
})
export type Shop = InferEntity<typeof Shop>
