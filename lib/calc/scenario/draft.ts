import { judge, type LimitId, type Limits, type Verdict } from '../limits'
import type { ChannelName, Finding } from './result-types'

/** A finding before it is judged. */
export interface Draft {
  limitId: LimitId
  channel: ChannelName | null
  value: number | null
  /** Replaces the limit's own value where it is relative (idle speed + the allowed excess). */
  limit?: number
  /** Low end of an uncertain value: where only this lies outside, the value is close, whatever the band. */
  low?: number | null
  data: Finding['data']
  inputs: string[]
  sourceIds: string[]
}

const rank: Record<Verdict, number> = { outside: 0, close: 1, within: 2 }

/** How far inside its limit, in close bands (or in units where there is no band): the less, the worse. */
const roomOf = ({ value, limit, sense, closeBand }: Finding) =>
  value === null ? -Infinity : (sense === 'atMost' ? limit - value : value - limit) / (closeBand || 1)

/** Outside, close, within; the least room first in each. */
export const rankFindings = (findings: readonly Finding[]): Finding[] =>
  [...findings].sort((left, right) => rank[left.verdict] - rank[right.verdict] || roomOf(left) - roomOf(right) || left.id.localeCompare(right.id))

/** Drafts judged by the limits. */
export const toFindings = (list: readonly Draft[], limits: Limits): Finding[] => list.map(({ limit: relative, low, ...draft }): Finding => {
  const { sense, value, closeBand: ownBand, unit } = limits[draft.limitId]
  const limit = relative ?? value
  const closeBand = low === undefined ? ownBand : Math.max(0, (draft.value ?? 0) - (low ?? -Infinity))
  return {
    ...draft, limit, sense, unit, closeBand: Number.isFinite(closeBand) ? closeBand : Number.MAX_VALUE,
    id: draft.channel ? `${draft.limitId}.${draft.channel}` : draft.limitId,
    verdict: judge(draft.value, { sense, value: limit, closeBand }),
  }
})
