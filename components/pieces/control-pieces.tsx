import { Button, LinkButton, TextLink } from '@/components/ui/button'
import { Caution } from '@/components/ui/caution'
import { KeyCap } from '@/components/ui/key-cap'
import { LoadingLines } from '@/components/ui/loading-lines'
import { EmptyNote, FailedNote, WithheldNote } from '@/components/ui/note'
import { Pager } from '@/components/ui/pager'
import { SearchBox } from '@/components/ui/search-box'
import { Section } from '@/components/ui/section'
import { WorkingRuler } from '@/components/ui/working-ruler'

export function ControlPieces() {
  return (
    <>
      <Section title="Buttons and links">
        <p className="acts py-3"><Button kind="do">Release a plan</Button><Button>Compare</Button><Button pending>Saving</Button><Button className="is-focus">Focused</Button></p>
        <p className="acts pb-3"><Button off="1 outside">Release a plan</Button><Button size="small">Small</Button></p>
        <p><LinkButton>Take 2.0° off full advance</LinkButton> <TextLink href="/pieces">A link</TextLink> <KeyCap>T</KeyCap></p>
      </Section>
      <Section title="List: find and page">
        <div className="pt-3"><SearchBox action="/pieces" label="Find a scenario" /></div>
        <Pager at="51 to 100 of 312 scenarios" of="scenarios" earlierHref="/pieces" laterHref="/pieces" />
        <LoadingLines label="Loading scenarios" lines={3} />
      </Section>
      <Section title="Withheld, with the reason">
        <WithheldNote title="No power at the backup’s timing"><p>The power curve ends at 2600 rpm; the climb is at 2780. <LinkButton>Go to the power curve</LinkButton></p></WithheldNote>
      </Section>
      <Section title="Nothing here yet">
        <EmptyNote title="No scenario yet"><p>A scenario is the working sheet of one engine’s timing. <TextLink href="/pieces">Start one</TextLink></p></EmptyNote>
      </Section>
      <Section title="Something failed">
        <FailedNote title="The revision was not kept"><p>The connection broke. Everything you typed is still here. Quote <b>e-7f3a-19</b> if it happens again. <LinkButton>Send again</LinkButton></p></FailedNote>
      </Section>
      <Section title="Caution">
        <Caution lead="Before hands go in:">ignition off, supply disconnected. Secondary voltage can kill.</Caution>
      </Section>
      <Section title="Working"><WorkingRuler label="Map of 18 × 12 points" share={0.61} /></Section>
    </>
  )
}
