'use client'

import { memo } from 'react'
import { ChannelChip } from '@/components/ui/channel-chip'
import { Stamp } from '@/components/ui/stamp'
import type { ScenarioResult } from '@/lib/calc/live'
import type { UnitSystem } from '@/lib/units'
import { findingLead, findingSpread, findingValue, headLine, letterOf, limitWords, noValueWord } from '@/lib/words/findings'

interface SheetStampProps {
  result: Pick<ScenarioResult, 'counts' | 'findings'>
  system: UnitSystem
  stale: boolean
  /** Findings whose figures are being computed again. */
  pendingFindings?: ReadonlySet<string>
}

/** The count of findings, with the worst one named. Never an approval. */
export const SheetStamp = memo(function SheetStamp({ result: { counts, findings }, system, stale, pendingFindings }: SheetStampProps) {
  const worst = findings[0]
  const verdict = counts.outside > 0 ? 'outside' : counts.close > 0 ? 'close' : counts.within > 0 ? 'within' : 'notJudged'
  const value = worst ? findingValue(worst, system) : null
  const spread = worst ? findingSpread(worst, system) : null
  return (
    <Stamp verdict={verdict} head={headLine(counts)} live>
      {worst && worst.verdict !== 'within' ? (
        <>
          {worst.channel ? <><ChannelChip channel={letterOf(worst.channel)} /> </> : null}
          {findingLead(worst, system)}{value ? <> <b className={worst.verdict === 'outside' ? 'one bad' : 'one'}>{value.text}{value.unit === '°' ? '°' : value.unit ? ` ${value.unit}` : ''}</b></> : worst.limitId === 'proofAboveIdleRpm' ? null : <> <b className="one bad">{noValueWord(worst)}</b></>}{spread ? ` (${spread})` : null}; {limitWords(worst, system)}.{pendingFindings?.has(worst.id) ? ' Being computed again.' : null}
        </>
      ) : stale ? null : 'By the limits named beside each finding.'}
      {stale ? ' An input cannot be read: some figures are the last valid ones.' : null}
    </Stamp>
  )
})
