import { z } from 'zod'
import type { Limits, storedResult } from '../calc/live'
import { isoTime, storedSpec } from './engine-dto'
import { scenarioSheet } from './scenario'

/** What a revision keeps of its evaluation: everything but the sampled curves, which the page computes. */
export type StoredResult = ReturnType<typeof storedResult>

const isObject = (value: unknown) => typeof value === 'object' && value !== null

export const personDto = z.object({ id: z.uuid(), name: z.string() })
export type PersonDto = z.infer<typeof personDto>

export const verdictCounts = z.object({ outside: z.int(), close: z.int(), within: z.int() })

export const revisionDto = z.object({
  scenarioId: z.uuid(),
  number: z.int(),
  title: z.string(),
  sheet: scenarioSheet,
  sheetVersion: z.int(),
  engineVersion: z.int(),
  /** The engine as it was when this was saved. */
  engine: z.object({ name: z.string(), code: z.string(), spec: storedSpec }),
  results: z.custom<StoredResult>(isObject),
  /** What it was judged by. */
  limits: z.custom<Limits>(isObject),
  calcVersion: z.string(),
  author: personDto,
  createdAt: isoTime,
  releasedAt: isoTime.nullable(),
  releasedBy: personDto.nullable(),
  /** Id of each finding outside its limit → why it is released all the same. */
  releaseReasons: z.record(z.string(), z.string()).nullable(),
})
export type RevisionDto = z.infer<typeof revisionDto>

/** A line in the list of revisions. */
export const revisionRowDto = z.object({
  number: z.int(),
  title: z.string(),
  author: personDto,
  counts: verdictCounts,
  createdAt: isoTime,
  releasedAt: isoTime.nullable(),
  releasedBy: personDto.nullable(),
})
export type RevisionRowDto = z.infer<typeof revisionRowDto>

export const revisionList = z.object({ rows: z.array(revisionRowDto), nextCursor: z.string().nullable() })
export type RevisionList = z.infer<typeof revisionList>
