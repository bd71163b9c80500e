import type { ReactNode } from 'react'
import { EquationLink } from '@/components/method/equation-link'
import { ChannelChip } from '@/components/ui/channel-chip'
import { Num } from '@/components/ui/num'
import { Section } from '@/components/ui/section'
import type { Part, PartName, Scenario, ScenarioParts } from '@/lib/calc/live'
import { partEquation } from '@/lib/method/anchors'
import { formatQuantity, type FormatOptions, type QuantityKind, type UnitSystem } from '@/lib/units'
import { partTitle } from '@/lib/words/parts'
import { PartView } from '../stale-part'

export interface LedgersProps {
  parts: ScenarioParts
  stale: ReadonlySet<PartName>
  /** Parts whose figures are being computed again. */
  pending?: ReadonlySet<PartName>
  /** A saved revision: nothing in it is computed again. */
  isSaved?: boolean
  scenario: Scenario
  system: UnitSystem
}

export const channelHeads = [{ head: '' }, { head: <ChannelChip channel="A" />, right: true }, { head: <ChannelChip channel="B" />, right: true }]

export const equationOf = (name: PartName) => <EquationLink id={partEquation[name]} of={partTitle[name]} />

/** A quantity of the library as the person reads it. */
export function Quantity({ value, kind, system, ...options }: { value: number, kind: QuantityKind, system: UnitSystem } & FormatOptions) {
  const { text, unit } = formatQuantity(value, kind, system, options)
  return <Num value={text} unit={unit} />
}

/** The same, bound to one unit system. */
export const quantityIn = (system: UnitSystem) => function inSystem(value: number, kind: QuantityKind, options: FormatOptions = {}): ReactNode {
  return <Quantity value={value} kind={kind} system={system} {...options} />
}

interface PartSectionProps<T> {
  name: PartName
  part: Part<T>
  title: ReactNode
  ledgers: LedgersProps
  children: (figures: T) => ReactNode
}

/** A part under its head: equation, whether it is being computed again, figures or the reason why there are none. */
export function PartSection<T>({ name, part, title, ledgers: { stale, pending, isSaved }, children }: PartSectionProps<T>) {
  const isPending = pending?.has(name) ?? false
  return (
    <Section title={title} level={3} right={<>{isPending && (part.ok || part.error.code !== 'notComputed') ? <span className="again-word">computing<span className="sr"> again, these are the last figures</span></span> : null} {equationOf(name)}</>}>
      <PartView name={name} part={part} stale={stale.has(name)} pending={isPending} isSaved={isSaved}>{children}</PartView>
    </Section>
  )
}
