import { combineUncertainty, type UncertaintyContribution } from '../statistics/combine-uncertainty'
import type { StackRow } from './result-types'
import type { Scenario } from './scenario-types'

/**
 * What the timing of one channel may be off by, crank degrees: setting by light, bench, reading the mark, scatter. Between the channels
 * of one unit the setting and the mark are the same for both, so only bench and scatter count, once for each.
 */
export function stackPart({ sheet }: Scenario): { rows: StackRow[]; standardDeg: number; expandedDeg: number; worstCaseDeg: number; staggerExpandedDeg: number } {
  const { timingCheckDeg, benchDeg, markDeg, scatterDeg } = sheet.tolerances
  const evenly = (value: number): UncertaintyContribution => ({ value, distribution: 'rectangular' })
  const scatter: UncertaintyContribution = { value: scatterDeg, distribution: 'normal' }
  const one = combineUncertainty([evenly(timingCheckDeg), evenly(benchDeg), evenly(markDeg), scatter])
  const between = combineUncertainty([evenly(benchDeg), evenly(benchDeg), scatter, scatter])
  return {
    rows: [
      { what: 'setting', halfWidthDeg: timingCheckDeg }, { what: 'bench', halfWidthDeg: benchDeg },
      { what: 'mark', halfWidthDeg: markDeg }, { what: 'scatter', halfWidthDeg: scatterDeg },
    ],
    standardDeg: one.standard, expandedDeg: one.expanded, worstCaseDeg: one.worstCase, staggerExpandedDeg: between.expanded,
  }
}
