import { calcVersion } from '@/lib/calc/live'
import type { RevisionDto } from '@/lib/schemas/revision-dto'
import { noticeWords } from '@/lib/words/parts'

/** What to know beside the figures of a saved revision. */
export function RevisionNotices({ revision }: { revision: Pick<RevisionDto, 'results' | 'calcVersion'> }) {
  const lines = [
    ...(revision.calcVersion === calcVersion ? [] : [`The figures are those stored when this was saved, computed by version ${revision.calcVersion} of the library; the curves are drawn by version ${calcVersion}.`]),
    ...revision.results.notices.map(noticeWords),
  ]
  return lines.length > 0 ? <ul className="notices" aria-label="To know beside the figures">{lines.map((line) => <li key={line}>{line}</li>)}</ul> : null
}
