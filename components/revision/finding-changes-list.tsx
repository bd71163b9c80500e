import { EquationLink } from '@/components/method/equation-link'
import { ChannelChip } from '@/components/ui/channel-chip'
import { EmptyNote } from '@/components/ui/note'
import { RuledList, RuledRow } from '@/components/ui/ruled-list'
import { Section } from '@/components/ui/section'
import { VerdictMark } from '@/components/ui/verdict-mark'
import type { Finding } from '@/lib/calc/live'
import type { FindingChange, FindingChanges } from '@/lib/compare/finding-changes'
import { findingEquation } from '@/lib/method/anchors'
import type { UnitSystem } from '@/lib/units'
import { findingAmount, findingTitle, letterOf, limitWords, verdictWord } from '@/lib/words/findings'

const wordOf = (finding: Finding | null) => (finding ? verdictWord[finding.verdict].toLowerCase() : 'not judged')

const valueWords = (finding: Finding, system: UnitSystem) =>
  `${finding.value === null ? 'no such value' : findingAmount(finding, system)}, ${limitWords(finding, system)}`

function ChangeRow({ change: { was, now }, system }: { change: FindingChange, system: UnitSystem }) {
  const shown = now ?? was
  if (!shown) return null
  return (
    <RuledRow mark={<VerdictMark verdict={now?.verdict ?? 'notJudged'} wordless />} hit={now?.verdict === 'outside'}>
      <b>{findingTitle(shown, system)}</b>{shown.channel ? <> <ChannelChip channel={letterOf(shown.channel)} spoken /></> : null}
      <small>{wordOf(was)} before{was ? ` (${valueWords(was, system)})` : ''}, {wordOf(now)} now{now ? ` (${valueWords(now, system)})` : ''} <EquationLink id={findingEquation[shown.limitId]} of={findingTitle(shown, system)} /></small>
    </RuledRow>
  )
}

/** Findings whose verdict is another in the second than in the first. */
export function FindingChangesList({ changes: { gained, lost }, system }: { changes: FindingChanges, system: UnitSystem }) {
  if (gained.length + lost.length === 0) return <EmptyNote title="No finding has another verdict"><p>The figures may still differ: see the results.</p></EmptyNote>
  const list = (title: string, changes: readonly FindingChange[]) => (changes.length > 0 ? (
    <Section title={title} level={3}>
      <RuledList label={title}>{changes.map((change) => <ChangeRow key={change.id} change={change} system={system} />)}</RuledList>
    </Section>
  ) : null)
  return <>{list('New or worse', gained)}{list('Gone or better', lost)}</>
}
