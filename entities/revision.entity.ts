import { defineEntity, p, type InferEntity } from '@mikro-orm/core'
import type { Limits } from '../lib/calc/limits'
import type { storedResult } from '../lib/calc/scenario/stored-result'
import type { Engine as EngineSpec } from '../lib/calc/scenario/scenario-types'
import { Scenario } from './scenario.entity'
import { Shop } from './shop.entity'
import { User } from './user.entity'

/**
 * What was saved once: the sheet, the engine as it was, what the library made of them, and the limits they were judged by.
 * Its release is the one change it ever sees; triggers in the database refuse any other, and its removal.
 */
export const Revision = defineEntity({
  name: 'Revision',
  tableName: 'revisions',
  properties: {
    id: p.uuid().primary().defaultRaw('gen_random_uuid()'),
    scenario: () => p.manyToOne(Scenario).deleteRule('cascade'),
    /** The scenario's shop once more, for the membership condition. */
    shop: () => p.manyToOne(Shop),
    number: p.integer(),
    title: p.string().length(120),
    /** In the form of `sheetVersion`: read it through lib/data/scenarios/read-sheet. */
    sheet: p.json<unknown>(),
    sheetVersion: p.integer(),
    engineVersion: p.integer(),
    engine: p.json<{ name: string, code: string, spec: EngineSpec }>(),
    results: p.json<ReturnType<typeof storedResult>>(),
    outsideCount: p.integer(),
    closeCount: p.integer(),
    withinCount: p.integer(),
    limits: p.json<Limits>(),
    calcVersion: p.string().length(32),
    author: () => p.manyToOne(User),
    createdAt: p.datetime(3).onCreate(() => new Date()).defaultRaw('now()'),
    releasedAt: p.datetime(3).nullable(),
    releasedBy: () => p.manyToOne(User).nullable().deleteRule('no action'),
    /** Id of each finding outside its limit → why it is released all the same. */
    releaseReasons: p.json<Record<string, string>>().nullable(),
    /** Lower-case code, title and engine's name, for the list of plans. */
    search: p.text(),
  },
  uniques: [{ name: 'revisions_scenario_number_unique', properties: ['scenario', 'number'] }],
  indexes: [
    { name: 'revisions_released_index', expression: 'create index "revisions_released_index" on "revisions" ("shop_id", "released_at" desc, "id" desc) where "released_at" is not null' },
    { name: 'revisions_search_index', expression: 'create index "revisions_search_index" on "revisions" using gin ("search" gin_trgm_ops) with (fastupdate = off) where "released_at" is not null' },
    { name: 'revisions_author_index', properties: ['author'] },
  ],
})
export type Revision = InferEntity<typeof Revision>
