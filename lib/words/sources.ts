import type { Source } from '../calc/live'

/** A publication in a line, with how far it was traced. */
export function sourceWords({ id, author, year, provenance }: Source): string {
  if (id === 'trade') return 'common practice, no published source'
  const named = year === null ? author : `${author} ${year}`
  return provenance === 'memory' ? `${named} (from memory)` : named
}
