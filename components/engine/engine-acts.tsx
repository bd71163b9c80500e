import { ActForm, type FormAction } from '@/components/lists/act-form'
import { Section } from '@/components/ui/section'

interface EngineActsProps {
  id: string
  archived: boolean
  scenarioCount: number
  /** Absent where the role may not. */
  duplicate?: FormAction
  archive?: FormAction
  restore?: FormAction
  remove?: FormAction
}

/** What else is done with an engine. */
export function EngineActs({ id, archived, scenarioCount, duplicate, archive, restore, remove }: EngineActsProps) {
  const fields = { id, next: `/engines/${id}` }
  if (!duplicate && !archive && !restore && !remove) return null
  return (
    <Section title="This engine">
      <div className="acts mt-3">
        {duplicate ? <ActForm action={duplicate} fields={fields}>Duplicate</ActForm> : null}
        {archived ? restore && <ActForm action={restore} fields={fields}>Restore</ActForm> : archive && <ActForm action={archive} fields={fields}>Archive</ActForm>}
        {scenarioCount === 0 && remove ? <ActForm action={remove} fields={fields}>Remove for good</ActForm> : null}
      </div>
      <p className="fine mt-2">
        {scenarioCount > 0
          ? 'Archiving takes it out of the lists; its scenarios stay readable and are saved again once it is restored. It can be removed only while no scenario stands on it.'
          : 'No scenario stands on it yet, so it can be removed.'}
      </p>
    </Section>
  )
}
