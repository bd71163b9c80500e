import { ScenarioRow } from '@/components/lists/scenario-row'
import { TextLink } from '@/components/ui/button'
import { RuledList } from '@/components/ui/ruled-list'
import { Section } from '@/components/ui/section'
import type { ScenarioList } from '@/lib/schemas/scenario-dto'

interface EngineScenariosProps {
  engineId: string
  list: ScenarioList
  isOwn: boolean
  /** A new one can be laid out: the engine is not archived, the role may. */
  canStart: boolean
}

/** Active scenarios of an engine, those changed last first. */
export function EngineScenarios({ engineId, list, isOwn, canStart }: EngineScenariosProps) {
  const { rows, nextCursor } = list
  return (
    <Section title={isOwn ? 'Your scenarios on it' : 'Scenarios on it'} right={<>{nextCursor ? <TextLink href={`/scenarios?engineId=${engineId}`}>all of them</TextLink> : null} {canStart ? <TextLink href={`/scenarios/new?engine=${engineId}`}>start one</TextLink> : null}</>}>
      {rows.length > 0
        ? <RuledList label="Scenarios on this engine">{rows.slice(0, 12).map((row) => <ScenarioRow key={row.id} row={row} withOwner={!isOwn} withEngine={false} />)}</RuledList>
        : <p className="fine mt-2">None is active.</p>}
      {rows.length > 12 && !nextCursor ? <p className="mt-2"><TextLink href={`/scenarios?engineId=${engineId}`}>All {rows.length}</TextLink></p> : null}
    </Section>
  )
}
