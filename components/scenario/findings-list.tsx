'use client'

import { memo, useState } from 'react'
import { EquationLink } from '@/components/method/equation-link'
import { LinkButton } from '@/components/ui/button'
import { ChannelChip } from '@/components/ui/channel-chip'
import { LimitStrip } from '@/components/ui/limit-strip'
import { Num } from '@/components/ui/num'
import { VerdictMark } from '@/components/ui/verdict-mark'
import { defaultLimits, type Finding, sources } from '@/lib/calc/live'
import { findingEquation } from '@/lib/method/anchors'
import { findingSentence } from '@/lib/words/finding-sentences'
import { findingSpread, findingTitle, findingValue, limitOrigin, limitWords, letterOf, namedInOrigin, noValueWord } from '@/lib/words/findings'
import { sourceWords } from '@/lib/words/sources'
import type { UnitSystem } from '@/lib/units'

const verdictClass = { outside: 'outside', close: 'close', within: '' } as const

interface FindingRowProps {
  finding: Finding
  system: UnitSystem
  /** Its inputs cannot be read: as it was before. */
  stale: boolean
  /** Its figures are being computed again. */
  again?: boolean
  reason?: string
}

/** One finding: mark, name, value, limit, strip, why and from where. */
export const FindingRow = memo(function FindingRow({ finding, system, stale, again = false, reason }: FindingRowProps) {
  const title = findingTitle(finding, system)
  const value = findingValue(finding, system)
  const spread = findingSpread(finding, system)
  const { from } = defaultLimits[finding.limitId]
  const origin = limitOrigin[from]
  const cited = finding.sourceIds.filter((id) => id !== namedInOrigin[from]).map((id) => sources[id]).filter((source) => source !== undefined).map(sourceWords).filter((words) => words !== origin)
  return (
    <li className={`find ${verdictClass[finding.verdict]}${stale ? ' stale' : ''}${again ? ' again' : ''}`} data-finding={finding.id} aria-busy={again || undefined}>
      <VerdictMark verdict={finding.verdict} wordless />
      <b className="what">{title}{finding.channel ? <> <ChannelChip channel={letterOf(finding.channel)} /></> : null}{again ? <small className="again-word">being computed again</small> : null}</b>
      <span className="val">{value ? <Num value={value.text} unit={value.unit} bad={finding.verdict === 'outside'} /> : <span className="bad">{noValueWord(finding)}</span>}{spread ? <small>{spread}</small> : null}</span>
      <span className="lim">{limitWords(finding, system)}</span>
      <LimitStrip value={finding.value} verdict={finding.verdict} {...(finding.sense === 'atLeast' ? { atLeast: finding.limit } : { atMost: finding.limit })} />
      <span className="why">
        {stale ? <em>As it was before the field that cannot be read. </em> : null}
        {findingSentence(finding, system)} <span className="srcs">Limit: {[origin, ...cited].join('; ')} <EquationLink id={findingEquation[finding.limitId]} of={title} /></span>
        {reason ? <span className="reason">Released with this reason: {reason}</span> : null}
      </span>
    </li>
  )
})

interface FindingsListProps {
  findings: readonly Finding[]
  staleFindings: ReadonlySet<string>
  /** Those whose figures are being computed again. */
  pendingFindings?: ReadonlySet<string>
  system: UnitSystem
  /** Id → why it was released all the same. */
  reasons?: Record<string, string>
}

/** Findings, worst first; those within fold behind their count. */
export function FindingsList({ findings, staleFindings, pendingFindings, system, reasons = {} }: FindingsListProps) {
  const hit = findings.filter((finding) => finding.verdict !== 'within')
  const within = findings.filter((finding) => finding.verdict === 'within')
  const [chosen, setChosen] = useState<boolean | null>(null)
  const showsAll = chosen ?? hit.length === 0
  const rows = showsAll ? [...hit, ...within] : hit
  return (
    <section className="sec" aria-labelledby="findings-head">
      <header className="secline">
        <h2 id="findings-head">Findings</h2>
        <span className="right fine">
          {within.length > 0 && hit.length > 0 ? <>{within.length} more within the limits set, <LinkButton aria-expanded={showsAll} onClick={() => setChosen(!showsAll)}>{showsAll ? 'fold' : 'show'}</LinkButton></> : null}
        </span>
      </header>
      <div className="find hd" aria-hidden="true"><span /><span>Finding</span><span className="r">Value</span><span>Limit</span><span /><span>Why it matters, and where it comes from</span></div>
      <ul className="rows" aria-label="Findings, worst first">
        {rows.map((finding) => <FindingRow key={finding.id} finding={finding} system={system} stale={staleFindings.has(finding.id)} again={pendingFindings?.has(finding.id)} reason={reasons[finding.id]} />)}
      </ul>
      {findings.length === 0 ? <p className="fine">Nothing can be judged yet.</p> : null}
      {!showsAll ? <noscript><ul className="rows">{within.map((finding) => <FindingRow key={finding.id} finding={finding} system={system} stale={false} />)}</ul></noscript> : null}
    </section>
  )
}
