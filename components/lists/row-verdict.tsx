import { VerdictMark } from '@/components/ui/verdict-mark'
import type { VerdictName } from '@/components/ui/verdict'
import type { Verdict } from '@/lib/calc/live'

/** What the counts of an evaluation come to: its worst finding. */
export const verdictOf = ({ outside, close, within }: Record<Verdict, number>): VerdictName =>
  (outside > 0 ? 'outside' : close > 0 ? 'close' : within > 0 ? 'within' : 'notJudged')

/** In the margin of a list; its word is for readers, the row says it in sight. */
export function RowVerdict({ counts }: { counts: Record<Verdict, number> }) {
  return <VerdictMark verdict={verdictOf(counts)} wordless />
}
