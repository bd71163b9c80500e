import type { Verdict } from '../calc/live'

type Counted = { counts: Record<Verdict, number> }

interface ScenarioHead {
  state: string
  /** Something narrows the list: a search, an engine. */
  isFiltered: boolean
  /** The rows are one page of more. */
  isPart: boolean
  /** The person's own only. */
  isOwn: boolean
}

const plural = (count: number, one: string, many = `${one}s`) => (count === 1 ? one : many)

/** Head of the list of scenarios: says the state where it can. Counts, never an approval. */
export function scenarioHead(rows: readonly Counted[], { state, isFiltered, isPart, isOwn }: ScenarioHead): string {
  const count = rows.length
  if (count === 0) {
    if (isFiltered) return 'No scenario fits'
    return { archived: 'No archived scenario', released: 'No scenario with a released plan', outside: 'No scenario outside a limit' }[state] ?? 'No scenario yet'
  }
  const some = isPart ? `The first ${count}` : String(count)
  if (state === 'archived') return `${some} archived ${plural(count, 'scenario')}`
  if (state === 'released') return `${some} ${plural(count, 'scenario')} with a released plan`
  if (state === 'outside') return `${some} ${plural(count, 'scenario')} outside a limit`
  const outside = rows.filter((row) => row.counts.outside > 0).length
  const of = `${isPart ? 'these ' : ''}${isOwn ? 'your ' : ''}${count} ${plural(count, 'scenario')}`
  if (outside === 0) return isOwn && !isPart ? `Your ${plural(count, 'scenario', `${count} scenarios`)}, none outside a limit` : `${isPart ? 'These ' : ''}${count} ${plural(count, 'scenario')}, none outside a limit`
  return `${outside} of ${of} outside a limit`
}

/** "3 engines", "No archived engine". */
export function countHead(count: number, what: string, { isFiltered, isPart, kind = '' }: { isFiltered: boolean; isPart: boolean; kind?: string }): string {
  const noun = kind ? `${kind} ${what}` : what
  if (count === 0) return isFiltered ? `No ${what} fits` : `No ${noun}${kind ? '' : ' yet'}`
  return `${isPart ? 'The first ' : ''}${count} ${plural(count, noun)}`
}
