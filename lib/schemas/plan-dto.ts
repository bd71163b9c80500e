import { z } from 'zod'
import { isoTime } from './engine-dto'
import { personDto, revisionDto, verdictCounts } from './revision-dto'

/** A line in the list of plans. */
export const planRowDto = z.object({
  scenarioId: z.uuid(),
  number: z.int(),
  /** Scenario's code, a point, the revision: J260-05.2. */
  code: z.string(),
  title: z.string(),
  engine: z.object({ name: z.string(), code: z.string() }),
  counts: verdictCounts,
  author: personDto,
  releasedAt: isoTime,
  releasedBy: personDto,
})
export type PlanRowDto = z.infer<typeof planRowDto>

export const planList = z.object({ rows: z.array(planRowDto), nextCursor: z.string().nullable() })
export type PlanList = z.infer<typeof planList>

/** A released revision, never changed. */
export const planDto = revisionDto.extend({
  code: z.string(),
  releasedAt: isoTime,
  releasedBy: personDto,
  releaseReasons: z.record(z.string(), z.string()),
})
export type PlanDto = z.infer<typeof planDto>
