import 'server-only'
import type { Part, PartName } from '@/lib/calc/live'
import type { StoredResult } from '@/lib/schemas/revision-dto'

/** Parts that results of the first sheet version were stored without. */
const laterParts = ['coils', 'climb', 'redundancy', 'stack', 'charge', 'detonation', 'pressure', 'spark'] as const satisfies readonly PartName[]

const notComputed: Part<never> = {
  ok: false,
  error: {
    code: 'notComputed', field: 'sheet', value: null, limit: null, unit: null,
    message: 'Not worked out when this was saved. Saving it again works it out.',
  },
}

/** A stored result with every part of today: those it was stored without stand as not computed; nothing is worked out anew. */
export function readResult(stored: StoredResult): StoredResult {
  const missing = Object.fromEntries(laterParts.filter((name) => !Object.hasOwn(stored.parts, name)).map((name) => [name, notComputed]))
  return Object.keys(missing).length === 0 ? stored : { ...stored, parts: { ...stored.parts, ...missing } }
}
