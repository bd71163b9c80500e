import { z } from 'zod'
import type { ScenarioSheet } from '../calc/live'
import { scenarioSheet, scenarioTitle } from './scenario'

/** Callers hold the library's own read-only type; the schema checks it all the same. */
type WithSheet<T> = Omit<T, 'sheet'> & { sheet: ScenarioSheet }

const version = z.int().min(1)

/** A new scenario. `engineVersion`: the engine as the form showed it. */
export const scenarioCreateInput = z.object({ engineId: z.string(), engineVersion: version, title: scenarioTitle, sheet: scenarioSheet })
export type ScenarioCreateInput = WithSheet<z.input<typeof scenarioCreateInput>>

/** A save. `baseRevision`: the revision the form was opened on. Results are never part of it. */
export const scenarioSaveInput = z.object({ baseRevision: version, engineVersion: version, title: scenarioTitle, sheet: scenarioSheet })
export type ScenarioSaveInput = WithSheet<z.input<typeof scenarioSaveInput>>

/** An evaluation that stores nothing. */
export const scenarioEvaluateInput = z.object({ engineId: z.string(), sheet: scenarioSheet })
export type ScenarioEvaluateInput = WithSheet<z.input<typeof scenarioEvaluateInput>>

/** Least length of the reason for a release with a finding outside, characters. */
export const leastReason = 10

/** Reasons by the id of the finding. */
export const releaseInput = z.object({ reasons: z.record(z.string().max(100), z.string().trim().max(1000, 'The reason is longer than 1000 characters.')).default({}) })
export type ReleaseInput = z.input<typeof releaseInput>
