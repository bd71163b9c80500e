'use client'

import Link from 'next/link'
import { ChannelChip } from '@/components/ui/channel-chip'
import { Fold } from '@/components/ui/fold'
import { ProvenanceKey } from '@/components/ui/provenance'
import type { Engine } from '@/lib/calc/live'
import { scenarioFieldsBySection } from '@/lib/schemas/scenario-fields'
import { unitOf } from '@/lib/units'
import { ChannelInputs } from './channel-inputs'
import { CoilInputs, coilSectionFields } from './coil-inputs'
import { engineSummary } from './engine-summary'
import { foldSummaries } from './fold-summaries'
import { PitchInputs } from './pitch-inputs'
import { SectionFields } from './section-fields'
import { SectionFold } from './section-fold'
import type { SheetForm } from './sheet-form'

const sections = scenarioFieldsBySection
/** The pitches have rows of their own. */
const propellerFields = sections.propeller.filter((field) => !field.name.startsWith('pitch.'))
const drawCoils = (form: SheetForm) => <CoilInputs form={form} />

interface InputBookProps {
  form: SheetForm
  engine: { id: string, name: string, spec: Engine }
  canOpenEngine: boolean
}

/** The left page of the notebook: everything that can be typed. */
export function InputBook({ form, engine, canOpenEngine }: InputBookProps) {
  const { values, system } = form
  const text = (name: string) => values[name] ?? ''
  const pressureMatters = ['primary', 'backup'].some((channel) => values[`${channel}.kind`] === 'map' || (values[`${channel}.kind`] === 'formula' && /\bmap\b/.test(text(`${channel}.formula`))))
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
        <SectionFields fields={sections.torque} form={form} />
      </Fold>
      <Fold title="Propeller and run-up" level={2} open>
        <SectionFields fields={propellerFields} form={form} />
        <PitchInputs form={form} />
      </Fold>
      <Fold title="How the sparks are shared out" level={2} open>
        <SectionFields fields={sections.distribution} form={form} />
      </Fold>
      <SectionFold
        title="Fuel and detonation" fields={sections.fuel} form={form} summary={foldSummaries.fuel(values, system)}
        lead="Detonation is judged with the worse fuel, the hotter and the denser charge. A setting known to run clean anchors the model to this engine."
      />
      <SectionFold
        title="Aeroplane and place" fields={sections.place} form={form} summary={foldSummaries.place(values, system)}
        lead="What it has to lift, and where: the climb on either channel and with a cold cylinder follows from these."
      />
      <SectionFold title="Rotor and plate" fields={sections.rotor} form={form} follows={['distribution']} summary={foldSummaries.rotor(values, system)} />
      <SectionFold
        title="Coils and plug" fields={coilSectionFields} form={form} draw={drawCoils} summary={foldSummaries.coils(values, system)}
        lead="Charge, heat and voltage of each channel’s coil, running and while the starter turns."
      />
      <SectionFold
        title="Charge and burn" fields={sections.charge} form={form} summary={foldSummaries.charge(values, system)}
        lead="The cycle that detonation is worked out in. The burn follows best-torque timing; the charge follows the power, unless its filling is typed."
      />
      <SectionFold
        title="Chances of failure" fields={sections.failures} form={form} follows={['distribution']} summary={foldSummaries.failures(values, system)}
        lead="Rates are guesses unless you know their source: the results say how much rests on them."
      />
      <SectionFold
        title="Manifold pressure" fields={sections.manifold} form={form} open={pressureMatters}
        summary={pressureMatters ? `idle ${text('manifold.idleKpa')}, full ${text('manifold.fullKpa')} ${pressure}` : 'no schedule follows it'}
      />
      <SectionFold title="Tolerances" fields={sections.tolerances} form={form} summary={foldSummaries.tolerances(values, system)} />
      <SectionFold title="Name and notes" fields={sections.general} form={form} summary={text('title')} />
      <ProvenanceKey sources={['typed', 'default']} />
    </>
  )
}
