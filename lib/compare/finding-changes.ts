import type { Finding, ScenarioResult, Verdict } from '../calc/live'

/** A finding whose verdict is another than before; `now` null: it is judged no longer, `was` null: it was not judged before. */
export interface FindingChange {
  id: string
  was: Finding | null
  now: Finding | null
}

export interface FindingChanges {
  /** Outside or close now, and better or not judged before. */
  gained: FindingChange[]
  /** Outside or close before, and better or not judged now. */
  lost: FindingChange[]
}

const rank: Record<Verdict, number> = { outside: 0, close: 1, within: 2 }
/** What is not judged cannot be outside: it ranks with what lies within. */
const rankOf = (finding: Finding | undefined) => (finding ? rank[finding.verdict] : rank.within)

/** Which findings came and which went from one evaluation to another. */
export function findingChanges(left: Pick<ScenarioResult, 'findings'>, right: Pick<ScenarioResult, 'findings'>): FindingChanges {
  const [lefts, rights] = [left, right].map((result) => new Map(result.findings.map((finding) => [finding.id, finding])))
  const changes = [...new Set([...(rights?.keys() ?? []), ...(lefts?.keys() ?? [])])].map((id) => {
    const [was, now] = [lefts?.get(id), rights?.get(id)]
    return { id, was: was ?? null, now: now ?? null, step: rankOf(now) - rankOf(was), worst: Math.min(rankOf(was), rankOf(now)) }
  })
  const pick = (chosen: typeof changes) => chosen.sort((one, other) => one.worst - other.worst).map(({ id, was, now }) => ({ id, was, now }))
  return { gained: pick(changes.filter(({ step }) => step < 0)), lost: pick(changes.filter(({ step }) => step > 0)) }
}
