import { z } from 'zod'

const search = z.string().max(200, 'Search for 200 characters at most.').default('')
const cursor = z.string().max(600, 'This address does not lead to a page of the list.').optional()

export const scenarioStates = ['active', 'archived', 'released', 'outside'] as const
export const scenarioSorts = ['updated', 'title', 'code', 'outside'] as const
export const scenarioListQuery = z.object({
  search,
  engineId: z.uuid('There is no such engine in this shop.').optional(),
  state: z.enum(scenarioStates, 'Show active, archived, released or outside.').default('active'),
  sort: z.enum(scenarioSorts, 'Sort by updated, title, code or outside.').default('updated'),
  cursor,
})
export type ScenarioListQuery = z.input<typeof scenarioListQuery>

export const engineStates = ['active', 'archived'] as const
export const engineSorts = ['updated', 'name', 'code'] as const
export const engineListQuery = z.object({
  search,
  state: z.enum(engineStates, 'Show active or archived.').default('active'),
  sort: z.enum(engineSorts, 'Sort by updated, name or code.').default('updated'),
  cursor,
})
export type EngineListQuery = z.input<typeof engineListQuery>

export const planListQuery = z.object({ search, cursor })
export type PlanListQuery = z.input<typeof planListQuery>

export const revisionListQuery = z.object({ cursor })
export type RevisionListQuery = z.input<typeof revisionListQuery>

/** What a list function takes: a query of ours, or whatever an address held. */
export type Asked<Q> = Q | Record<string, string>

type PageParams = Record<string, string | string[] | undefined>

/**
 * The query of an address, from a route's URLSearchParams or a page's searchParams: the first of each name, and no
 * empty ones: an empty choice of a form is no choice. What is wrong in it is told by the list function, as a sentence.
 */
export function queryOf(params: URLSearchParams | PageParams): Record<string, string> {
  const entries = params instanceof URLSearchParams ? [...params].reverse() : Object.entries(params)
  return Object.fromEntries(entries.flatMap(([name, value]) => {
    const first = Array.isArray(value) ? value[0] : value
    return !first ? [] : [[name, first]]
  }))
}
