import type { Metadata } from 'next'
import { forbidden } from 'next/navigation'
import { createEngine } from '../actions'
import { EngineForm } from '@/components/engine/engine-form'
import { can } from '@/lib/auth/permissions'
import { requireActor } from '@/lib/auth/session'
import { engineFields } from '@/lib/schemas/engine-fields'
import type { FormValues } from '@/lib/schemas/field'

export const metadata: Metadata = { title: 'New engine' }

/** Nothing is claimed of an engine nobody has typed: only choices start with one. */
const empty: FormValues = Object.fromEntries(engineFields.map(({ name, options }) => [name, options?.[0]?.value ?? '']))

export default async function NewEnginePage() {
  const actor = await requireActor()
  if (!can(actor, 'engine.write')) forbidden()
  return <EngineForm key={actor.unitSystem} over="New engine" title="Lay out an engine" saveLabel="Save the engine" initial={empty} system={actor.unitSystem} save={createEngine} />
}
