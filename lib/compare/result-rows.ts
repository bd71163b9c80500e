import type { ChannelName, Finding, ScenarioResult, Verdict } from '../calc/live'
import { formatQuantity, unitOf, type QuantityKind, type UnitSystem } from '../units'
import { findingEquation, partEquation } from '../method/anchors'
import type { EquationId } from '../method/topics'
import { findingSpread, findingTitle, findingValue, kindOfLimitUnit, limitWords, noValueWord } from '../words/findings'
import { keyResults, type KeyResult } from './key-results'

type Result = Pick<ScenarioResult, 'parts' | 'findings'>

/** A figure on one side: its text in the person's units, and what the limits make of it. */
export interface ResultSide {
  text: string
  verdict: Verdict | null
  /** How far an uncertain figure reaches: it never stands without. */
  spread?: string | null
}

export interface ResultRow {
  id: string
  label: string
  channel: ChannelName | null
  /** "at least 3.0°"; both where the two sides were judged by different limits. */
  limit: string | null
  unit: { symbol: string; joined: boolean }
  /** A row's own equation, where its group has none. */
  equation: EquationId | null
  left: ResultSide | null
  right: ResultSide | null
  /** Right less left, signed; 'same' when it rounds to nothing; null where a side has no number. */
  difference: string | null
}

export interface ResultGroup {
  id: string
  title: string
  equation: EquationId
  rows: ResultRow[]
}

const sameWord = 'same'

function step(left: number | null | undefined, right: number | null | undefined, kind: QuantityKind, system: UnitSystem, decimals?: number): string | null {
  if (left === null || left === undefined || right === null || right === undefined) return null
  // 20 K more is 36 °F more, not −424 °F.
  const { text } = formatQuantity(right - left, kind === 'temperature' ? 'temperatureDifference' : kind, system, { sign: true, decimals })
  return /[1-9]/.test(text) ? text : sameWord
}

const unitFor = (kind: QuantityKind, system: UnitSystem) => {
  const { symbol, joined } = unitOf(kind, system)
  return { symbol, joined }
}

const sideOf = (finding: Finding | undefined, system: UnitSystem): ResultSide | null =>
  finding ? { text: findingValue(finding, system)?.text ?? noValueWord(finding), verdict: finding.verdict, spread: findingSpread(finding, system) } : null

const rank: Record<Verdict, number> = { outside: 0, close: 1, within: 2 }
const worst = (...findings: (Finding | undefined)[]) => Math.min(...findings.map((finding) => (finding ? rank[finding.verdict] : 3)))

/** What the limits judge, on both sides: those outside on either side first. */
export function findingRows(left: Result, right: Result, system: UnitSystem): ResultRow[] {
  const byId = (result: Result) => new Map(result.findings.map((finding) => [finding.id, finding]))
  const [lefts, rights] = [byId(left), byId(right)]
  const ids = [...new Set([...lefts.keys(), ...rights.keys()])].sort((one, other) => worst(lefts.get(one), rights.get(one)) - worst(lefts.get(other), rights.get(other)))
  return ids.flatMap((id): ResultRow[] => {
    const [was, is] = [lefts.get(id), rights.get(id)]
    const any = is ?? was
    if (!any) return []
    const kind = kindOfLimitUnit[any.unit]
    const limits = [...new Set([was, is].flatMap((finding) => (finding ? [limitWords(finding, system)] : [])))]
    return [{
      id, channel: any.channel,
      // The wording of a finding inside its limit names the figure itself.
      label: findingTitle({ ...any, verdict: 'within' }, system),
      limit: limits.join(', then '), unit: unitFor(kind, system), equation: findingEquation[any.limitId],
      left: sideOf(was, system), right: sideOf(is, system),
      difference: step(was?.value, is?.value, kind, system),
    }]
  })
}

/** Key figures of both sides, group by group; a part withheld on both has no group. */
export function keyRows(left: Result, right: Result, system: UnitSystem): ResultGroup[] {
  const lefts = keyResults(left, system)
  const rights = keyResults(right, system)
  const side = (row: KeyResult | undefined): ResultSide | null =>
    (row ? { text: row.value === null ? row.none ?? 'none' : formatQuantity(row.value, row.kind, system, { sign: row.signed, decimals: row.decimals }).text, verdict: null, spread: row.spread ?? null } : null)
  return lefts.flatMap((group, i): ResultGroup[] => {
    const others = rights[i]?.rows ?? []
    const ids = [...new Set([...group.rows, ...others].map((row) => row.id))]
    const rows = ids.flatMap((id): ResultRow[] => {
      const [was, is] = [group.rows, others].map((list) => list.find((row) => row.id === id))
      const any = is ?? was
      return any
        ? [{ id, label: any.label, channel: any.channel, limit: null, unit: unitFor(any.kind, system), equation: null, left: side(was), right: side(is), difference: step(was?.value, is?.value, any.kind, system, any.decimals) }]
        : []
    })
    return rows.length > 0 ? [{ id: group.id, title: group.title, equation: partEquation[group.id], rows }] : []
  })
}
