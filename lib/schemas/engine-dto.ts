import { z } from 'zod'
import type { Engine } from '../calc/live'

/** A time as ISO 8601 in UTC: the same text from a page and from a route. */
export const isoTime = z.iso.datetime()

/** Stored by us after `engineSpec` had passed it; not judged again on its way out. */
export const storedSpec = z.custom<Engine>((value) => typeof value === 'object' && value !== null)

export const engineDto = z.object({
  id: z.uuid(),
  name: z.string(),
  code: z.string(),
  spec: storedSpec,
  /** To be sent back with a change: a stale one is a conflict. */
  version: z.int(),
  archivedAt: isoTime.nullable(),
  updatedAt: isoTime,
  /** Scenarios on this engine, archived ones included. */
  scenarioCount: z.int(),
})
export type EngineDto = z.infer<typeof engineDto>

export const engineList = z.object({ rows: z.array(engineDto), nextCursor: z.string().nullable() })
export type EngineList = z.infer<typeof engineList>
