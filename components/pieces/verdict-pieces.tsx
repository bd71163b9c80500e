import { ChannelChip } from '@/components/ui/channel-chip'
import { Ledger } from '@/components/ui/ledger'
import { LimitStrip } from '@/components/ui/limit-strip'
import { Num } from '@/components/ui/num'
import { RuledList, RuledRow } from '@/components/ui/ruled-list'
import { Section } from '@/components/ui/section'
import { Stamp } from '@/components/ui/stamp'
import type { VerdictName } from '@/components/ui/verdict'
import { VerdictMark } from '@/components/ui/verdict-mark'

const meanings: [VerdictName, string][] = [
  ['within', 'inside the limit'],
  ['close', 'inside, but in the band this finding defines'],
  ['outside', 'outside, no direction'],
  ['early', 'fires before plan; lozenge left of the plan line'],
  ['late', 'fires after plan; lozenge right of it'],
  ['due', 'asked for, not yet read'],
  ['notJudged', 'cannot be judged, or waits for signal'],
  ['single', 'one part carries both channels'],
  ['singleHeat', 'the same, and heat shortens it'],
]

export function VerdictPieces() {
  return (
    <>
      <Section title="Verdicts">
        <Ledger caption="Verdicts" rowHeads={false} columns={[{ head: 'Mark', width: '180px' }, { head: 'Meaning' }]} rows={meanings.map(([verdict, meaning]) => ({ key: verdict, cells: [<VerdictMark key="mark" verdict={verdict} />, meaning] }))} />
      </Section>
      <Section title="Value against limit">
        <Ledger caption="Values against limits" rowHeads={false} columns={[{ head: 'Value', right: true, width: '80px' }, { head: 'Limit' }, { head: 'Strip' }]} rows={[
          { key: 'within', cells: [<Num key="n" value="13.2" unit="°" />, 'at least 3.0°', <LimitStrip key="s" value={13.2} atLeast={3} verdict="within" width={180} />] },
          { key: 'close', cells: [<Num key="n" value="1.7" unit="°" />, 'at least 1.0°', <LimitStrip key="s" value={1.7} atLeast={1} verdict="close" width={180} />] },
          { key: 'outside', cells: [<Num key="n" value="−1.8" unit="°" bad />, '±1.0°, late', <LimitStrip key="s" value={-1.8} atLeast={-1} atMost={1} verdict="late" deviation width={180} />] },
          { key: 'band', cells: [<Num key="n" value="64" unit="rpm" />, '42 to 92 rpm', <LimitStrip key="s" value={64} atLeast={42} atMost={92} verdict="within" width={180} />] },
          { key: 'none', cells: [<span key="n" className="n bad">none</span>, 'at most 920 rpm', <LimitStrip key="s" value={null} atMost={920} verdict="outside" width={180} />] },
        ]} />
        <p className="fine mt-2">Hatching is the forbidden side. Time runs to the right: early left, late right; plus is early, minus is late.</p>
      </Section>
      <Section title="Stamps: counts, never an approval">
        <div className="grid gap-3 pt-3">
          <Stamp verdict="outside" head="1 outside its limit, 3 close"><ChannelChip channel="A" /> shows full timing only from <b className="one">1710 rpm</b>; at most 920.</Stamp>
          <Stamp verdict="close" head="All 18 within the limits set, 3 close">no red word</Stamp>
          <Stamp verdict="within" head="All 18 within the limits set">whose limits: the shop’s</Stamp>
        </div>
      </Section>
      <Section title="One finding, two wordings">
        <RuledList>
          <RuledRow mark={<VerdictMark verdict="within" wordless />} right={<Num value="820" unit="rpm" />}>Full timing shows at idle</RuledRow>
          <RuledRow hit mark={<VerdictMark verdict="outside" wordless />} right={<Num value="1710" unit="rpm" bad />}>Full timing shows only from 1710 rpm, beside a turning propeller</RuledRow>
        </RuledList>
      </Section>
    </>
  )
}
