'use client'

import Link from 'next/link'
import { ChannelChip } from '@/components/ui/channel-chip'
import { Fold } from '@/components/ui/fold'
import { ProvenanceKey } from '@/components/ui/provenance'
import type { Engine } from '@/lib/calc/live'
import { scenarioFieldsBySection, type ScenarioSection } from '@/lib/schemas/scenario-fields'
import { unitOf } from '@/lib/units'
import { ChannelInputs } from './channel-inputs'
import { engineSummary } from './engine-summary'
import { PitchInputs } from './pitch-inputs'
import { SheetField } from './sheet-field'
import type { SheetForm } from './sheet-form'

/** Fields that only matter with another choice: kept, but not in the way. */
function isAsked(name: string, { values }: SheetForm): boolean {
  if (name === 'governedRpm') return values.propellerKind === 'constantSpeed'
  if (name === 'rotor.backupPhasedAtDeg') return values.distribution === 'capEach'
  return true
}

function Fields({ section, form, except }: { section: ScenarioSection, form: SheetForm, except?: (name: string) => boolean }) {
  return scenarioFieldsBySection[section].filter((field) => !except?.(field.name)).map((field) => (
    isAsked(field.name, form)
      ? (
        <SheetField
          key={field.name} field={field} value={form.values[field.name] ?? ''} system={form.system} onChange={form.onChange}
          error={form.errors[field.name]} flagged={form.flagged.has(field.name)} source={field.kind === 'number' ? 'typed' : undefined}
        />
      )
      : <input key={field.name} type="hidden" name={field.name} value={form.values[field.name] ?? ''} />
  ))
}

interface InputBookProps {
  form: SheetForm
  engine: { id: string, name: string, spec: Engine }
  canOpenEngine: boolean
}

/** The left page of the notebook: everything that can be typed. */
export function InputBook({ form, engine, canOpenEngine }: InputBookProps) {
  const { values, system, errors } = form
  const text = (name: string) => values[name] ?? ''
  const pressureMatters = ['primary', 'backup'].some((channel) => values[`${channel}.kind`] === 'map' || (values[`${channel}.kind`] === 'formula' && /\bmap\b/.test(text(`${channel}.formula`))))
  const hasError = (section: ScenarioSection) => scenarioFieldsBySection[section].some((field) => errors[field.name])
  const pressure = unitOf('pressure', system).symbol
  return (
    <>
      <Fold title="Engine" level={2} summary={engineSummary(engine.spec, system)}>
        <p className="fnote">
          {engine.name}. {canOpenEngine ? <Link prefetch={false} className="link" href={`/engines/${engine.id}`}>Open the engine’s sheet</Link> : null}
        </p>
      </Fold>
      <Fold title={<><ChannelChip channel="A" /> Primary channel</>} level={2} open>
        <ChannelInputs channel="primary" form={form} />
      </Fold>
      <Fold title={<><ChannelChip channel="B" /> Backup channel</>} level={2} open>
        <ChannelInputs channel="backup" form={form} />
      </Fold>
      <Fold title="Best torque" level={2} open>
        <Fields section="torque" form={form} />
      </Fold>
      <Fold title="Propeller and run-up" level={2} open>
        <Fields section="propeller" form={form} except={(name) => name.startsWith('pitch.')} />
        <PitchInputs form={form} />
      </Fold>
      <Fold title="How the sparks are shared out" level={2} open>
        <Fields section="distribution" form={form} />
      </Fold>
      <Fold title="Rotor and plate" level={2} open={hasError('rotor') || undefined} summary={values.distribution === 'directCoils' ? 'direct coils, no rotor' : `tip ${text('rotor.rotorWidthDeg')}°, centred at ${text('rotor.phasedAtDeg')}°`}>
        <Fields section="rotor" form={form} />
      </Fold>
      <Fold title="Manifold pressure" level={2} open={pressureMatters || hasError('manifold') || undefined} summary={pressureMatters ? `idle ${text('manifold.idleKpa')}, full ${text('manifold.fullKpa')} ${pressure}` : 'no schedule follows it'}>
        <Fields section="manifold" form={form} />
      </Fold>
      <Fold title="Tolerances" level={2} open={hasError('tolerances') || undefined} summary={`check ±${text('tolerances.timingCheckDeg')}°, bench ±${text('tolerances.benchDeg')}°`}>
        <Fields section="tolerances" form={form} />
      </Fold>
      <Fold title="Name and notes" level={2} open={hasError('general') || undefined} summary={text('title')}>
        <Fields section="general" form={form} />
      </Fold>
      <ProvenanceKey sources={['typed', 'default']} />
    </>
  )
}
