import { defineEntity, p, type InferEntity } from '@mikro-orm/core'
import type { Engine as EngineSpec } from '../lib/calc/scenario/scenario-types'
import { Shop } from './shop.entity'
import { User } from './user.entity'

/** An engine of a shop. Scenarios are laid out on it and numbered after its code. */
export const Engine = defineEntity({
  name: 'Engine',
  tableName: 'engines',
  properties: {
    id: p.uuid().primary().defaultRaw('gen_random_uuid()'),
    shop: () => p.manyToOne(Shop),
    name: p.string().length(80),
    code: p.string().length(12),
    spec: p.json<EngineSpec>(),
    /** Counts the changes of name, code and spec: what a scenario was evaluated with, and what a form was opened on. */
    version: p.integer().default(1),
    /** Number given last to one of its scenarios; raised under a row lock, so that numbers neither repeat nor skip. */
    lastScenarioNumber: p.integer().default(0),
    archivedAt: p.datetime(3).nullable(),
    createdBy: () => p.manyToOne(User),
    createdAt: p.datetime(3).onCreate(() => new Date()).defaultRaw('now()'),
    updatedAt: p.datetime(3).onCreate(() => new Date()).defaultRaw('now()'),
    /** Lower-case code and name. */
    search: p.text(),
  },
  indexes: [
    // J260 and j260 would number their scenarios alike.
    { name: 'engines_shop_code_unique', expression: 'create unique index "engines_shop_code_unique" on "engines" ("shop_id", lower("code"))' },
    { name: 'engines_shop_updated_index', expression: 'create index "engines_shop_updated_index" on "engines" ("shop_id", "updated_at" desc, "id" desc)' },
    { name: 'engines_search_index', expression: 'create index "engines_search_index" on "engines" using gin ("search" gin_trgm_ops) with (fastupdate = off)' },
    { name: 'engines_created_by_index', properties: ['createdBy'] },
  ],
})
export type Engine = InferEntity<typeof Engine>
