import type { Metadata } from 'next'
import { forbidden } from 'next/navigation'
import { newScenario } from '../actions'
import { engineChoices } from '../engine-choices'
import { NewScenarioForm } from '@/components/lists/new-scenario-form'
import { PageHead } from '@/components/shell/page-head'
import { TextLink } from '@/components/ui/button'
import { EmptyNote } from '@/components/ui/note'
import { can } from '@/lib/auth/permissions'
import { requireActor } from '@/lib/auth/session'
import { pageData } from '@/lib/page-data'

export const metadata: Metadata = { title: 'New scenario' }

export default async function NewScenarioPage({ searchParams }: { searchParams: Promise<{ engine?: string | string[] }> }) {
  const [actor, { engine }] = await Promise.all([requireActor(), searchParams])
  if (!can(actor, 'scenario.create')) forbidden()
  const chosen = typeof engine === 'string' ? engine : undefined
  const engines = await pageData(() => engineChoices(actor))
  return (
    <>
      <PageHead over="New scenario" title="Lay out a scenario" />
      <div className="body max-w-[680px]">
        {engines.length > 0
          ? <NewScenarioForm action={newScenario} engines={engines} chosen={chosen} />
          : (
            <EmptyNote level={2} title="A scenario is laid out on an engine">
              <p>{can(actor, 'engine.write') ? <>There is none yet. <TextLink href="/engines/new">Lay out the first engine</TextLink></> : 'There is none in this shop yet. A designer or the owner lays out the first.'}</p>
            </EmptyNote>
          )}
      </div>
    </>
  )
}
