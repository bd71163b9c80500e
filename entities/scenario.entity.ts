import { defineEntity, p, type InferEntity } from '@mikro-orm/core'
import { Engine } from './engine.entity'
import { Shop } from './shop.entity'
import { User } from './user.entity'

// One index for each order of the list. Each ends in the id, so that a page can begin after any row, equal values included.
const ordered = (name: string, columns: string, where = '"archived_at" is null') =>
  ({ name: `scenarios_${name}_index`, expression: `create index "scenarios_${name}_index" on "scenarios" (${columns}) where ${where}` })

/**
 * The working sheet: a row to find and lock; what was typed and computed stands in its revisions. The counts are those of
 * the current revision. Never deleted, only archived.
 */
export const Scenario = defineEntity({
  name: 'Scenario',
  tableName: 'scenarios',
  properties: {
    id: p.uuid().primary().defaultRaw('gen_random_uuid()'),
    shop: () => p.manyToOne(Shop),
    engine: () => p.manyToOne(Engine),
    /** Engine's code and a number of two digits or more: J260-04. */
    code: p.string().length(24),
    title: p.string().length(120),
    owner: () => p.manyToOne(User),
    currentRevision: p.integer(),
    outsideCount: p.integer(),
    closeCount: p.integer(),
    withinCount: p.integer(),
    /** Number of the revision released last. */
    releasedRevision: p.integer().nullable(),
    archivedAt: p.datetime(3).nullable(),
    createdAt: p.datetime(3).onCreate(() => new Date()).defaultRaw('now()'),
    /** Time of the current revision. */
    updatedAt: p.datetime(3).onCreate(() => new Date()).defaultRaw('now()'),
    /** Counts every change of this row; a flush with an older one fails. */
    version: p.integer().version(),
    /** Lower-case code, title and engine's name. */
    search: p.text(),
  },
  uniques: [{ name: 'scenarios_shop_code_unique', properties: ['shop', 'code'] }],
  indexes: [
    ordered('updated', '"shop_id", "updated_at" desc, "id" desc'),
    ordered('title', '"shop_id", "title" collate "natural_order", "id"'),
    ordered('code', '"shop_id", "code" collate "natural_order", "id"'),
    ordered('outside', '"shop_id", "outside_count" desc, "updated_at" desc, "id" desc'),
    ordered('owner', '"owner_id", "shop_id", "updated_at" desc, "id" desc'),
    ordered('engine', '"engine_id", "shop_id", "updated_at" desc, "id" desc'),
    ordered('archived', '"shop_id", "updated_at" desc, "id" desc', '"archived_at" is not null'),
    ordered('released', '"shop_id", "updated_at" desc, "id" desc', '"archived_at" is null and "released_revision" is not null'),
    { name: 'scenarios_engine_id_index', properties: ['engine'] },
    // No pending list: many new rows in it would make the planner read the table instead.
    { name: 'scenarios_search_index', expression: 'create index "scenarios_search_index" on "scenarios" using gin ("search" gin_trgm_ops) with (fastupdate = off)' },
  ],
})
export type Scenario = InferEntity<typeof Scenario>
