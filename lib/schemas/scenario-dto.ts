import { z } from 'zod'
import type { ScenarioResult } from '../calc/live'
import { engineDto, isoTime, storedSpec } from './engine-dto'
import { personDto, revisionDto, verdictCounts } from './revision-dto'
import { scenarioSheet } from './scenario'

/** A line in the list of scenarios. */
export const scenarioRowDto = z.object({
  id: z.uuid(),
  code: z.string(),
  title: z.string(),
  owner: personDto,
  engine: z.object({ id: z.uuid(), name: z.string(), code: z.string() }),
  /** Of the current revision. */
  counts: verdictCounts,
  currentRevision: z.int(),
  releasedRevision: z.int().nullable(),
  archivedAt: isoTime.nullable(),
  updatedAt: isoTime,
})
export type ScenarioRowDto = z.infer<typeof scenarioRowDto>

export const scenarioList = z.object({ rows: z.array(scenarioRowDto), nextCursor: z.string().nullable() })
export type ScenarioList = z.infer<typeof scenarioList>

export const scenarioDto = z.object({
  id: z.uuid(),
  code: z.string(),
  title: z.string(),
  owner: personDto,
  /** As it is now; the revision holds it as it was. */
  engine: engineDto,
  archivedAt: isoTime.nullable(),
  updatedAt: isoTime,
  /** Number of the revision released last. */
  releasedRevision: z.int().nullable(),
  /** The current one. */
  revision: revisionDto,
  /** The engine was changed since the current revision was saved. */
  engineChanged: z.boolean(),
  canWrite: z.boolean(),
  canRelease: z.boolean(),
})
export type ScenarioDto = z.infer<typeof scenarioDto>

/** An evaluation that nothing was stored of. */
export const evaluationDto = z.object({
  engine: z.object({ id: z.uuid(), name: z.string(), code: z.string(), spec: storedSpec, version: z.int() }),
  sheet: scenarioSheet,
  result: z.custom<ScenarioResult>((value) => typeof value === 'object' && value !== null),
})
export type EvaluationDto = z.infer<typeof evaluationDto>
