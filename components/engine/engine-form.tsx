'use client'

import { useActionState, useCallback, useMemo, useState, type ReactNode } from 'react'
import { EngineConflict, isEngineDto } from './engine-conflict'
import { EngineFactsPanel } from './engine-facts-panel'
import { EngineField } from './engine-field'
import { PageHead } from '@/components/shell/page-head'
import { Button } from '@/components/ui/button'
import { ErrorSummary } from '@/components/ui/error-summary'
import { SectionHead } from '@/components/ui/section'
import { useAskBeforeLeaving } from '@/components/ui/use-ask-before-leaving'
import type { Engine } from '@/lib/calc/live'
import { longLabel } from '@/lib/compare/long-label'
import { capFromOrder } from '@/lib/engine/cap-leads'
import type { ActionState } from '@/lib/errors'
import type { EngineDto } from '@/lib/schemas/engine-dto'
import { engineFields, engineFieldsBySection, engineSections } from '@/lib/schemas/engine-fields'
import { engineToForm, formToEngine } from '@/lib/schemas/engine-form'
import type { FormValues } from '@/lib/schemas/field'
import { formatNumberList, parseNumberList } from '@/lib/schemas/read-fields'
import type { UnitSystem } from '@/lib/units'

const formId = 'engine-form'
const labels = Object.fromEntries(engineFields.map((field) => [field.name, longLabel(field)]))

export interface EngineFormProps {
  /** Over the name: code, version, when it was changed. */
  over: ReactNode
  title: string
  saveLabel: string
  initial: FormValues
  /** What the form was filled from: untouched fields keep its exact figures. */
  base?: Engine
  version?: number
  system: UnitSystem
  save: (before: ActionState<EngineDto>, form: FormData) => Promise<ActionState<EngineDto>>
  /** What stands under the form: scenarios of the engine, what else can be done. */
  children?: ReactNode
}

/** The engine's sheet as a form, with what it comes to beside it. */
export function EngineForm({ over, title, saveLabel, initial, base, version, system, save, children }: EngineFormProps) {
  const [answer, submit, pending] = useActionState(save, { ok: false })
  const [values, setValues] = useState<FormValues>(() => (!answer.ok && answer.values ? { ...initial, ...answer.values } : initial))
  const [from, setFrom] = useState({ base, version, values: initial })
  const [left, setLeft] = useState<ReadonlySet<string>>(new Set())
  const [seen, setSeen] = useState(answer)
  const fill = (engine: EngineDto) => {
    const filled = engineToForm(engine.name, engine.code, engine.spec, system)
    setValues(filled)
    setFrom({ base: engine.spec, version: engine.version, values: filled })
    setLeft(new Set())
  }
  if (answer !== seen) {
    setSeen(answer)
    if (answer.ok) fill(answer.data)
  }
  const failed = answer.ok ? null : answer
  const conflict = failed?.code === 'conflict' && isEngineDto(failed.conflict) ? failed.conflict : null
  const live = useMemo(() => formToEngine(values, system, from.base), [values, system, from.base])
  const change = useCallback((name: string, value: string) => setValues((now) => ({ ...now, [name]: value })), [])
  const leave = useCallback((name: string) => setLeft((now) => (now.has(name) ? now : new Set(now).add(name))), [])
  const dirty = Object.entries(values).some(([name, value]) => name in from.values && (from.values[name] ?? '') !== value)

  useAskBeforeLeaving(dirty)

  const errorOf = (name: string): string | undefined => {
    const sent = failed?.fieldErrors?.[name]
    // What only the server knows (a code that is taken) stands until the field is changed.
    if (sent && values[name] === failed?.values?.[name]) return sent
    const now = live.ok ? undefined : live.errors[name]
    return now && (failed?.fieldErrors || (left.has(name) && values[name]?.trim())) ? now : undefined
  }
  const idleName = values.frictionKind === 'power' ? 'mechanicalEfficiency' : 'frictionPowerKw'
  const fillCap = (rotation: 'clockwise' | 'anticlockwise') => {
    const order = parseNumberList(values.firingOrder ?? '')
    if (order) change('capTerminals', formatNumberList(capFromOrder(order, rotation)))
  }
  const saved = answer.ok && !dirty
  return (
    <>
      <PageHead
        over={<>{over}{dirty ? <> · changed, not saved</> : saved ? <> · saved</> : null}</>} title={title}
        actions={<Button type="submit" form={formId} kind="do" pending={pending}>{saveLabel}</Button>}
      />
      <div className="body eform">
        <div>
          <p className="sr" role="status">{saved ? `Saved, version ${from.version}.` : ''}</p>
          {conflict
            ? <EngineConflict theirs={conflict} values={values} system={system} formId={formId} onTakeTheirs={() => fill(conflict)} />
            : <ErrorSummary title="The engine was not saved" formError={failed?.formError} fieldErrors={failed?.fieldErrors} labels={labels} />}
          <form id={formId} action={submit} noValidate className="esecs">
            <input type="hidden" name="unitSystem" value={system} />
            {from.version === undefined ? null : <input type="hidden" name="version" value={from.version} />}
            {engineSections.map((section) => (
              <section key={section.id} className="esec" aria-labelledby={`sec-${section.id}`}>
                <SectionHead title={section.title} id={`sec-${section.id}`} />
                {engineFieldsBySection[section.id].map((field) => (
                  <EngineField
                    key={field.name} field={field} value={values[field.name] ?? ''} system={system} error={errorOf(field.name)}
                    onChange={change} onLeave={leave} idle={field.name === idleName}
                  />
                ))}
              </section>
            ))}
          </form>
          <p className="acts mb-6"><Button type="submit" form={formId} pending={pending}>{saveLabel}</Button></p>
          {children}
        </div>
        <aside aria-label="What the sheet comes to" className="eside"><EngineFactsPanel values={values} system={system} onFillCap={fillCap} /></aside>
      </div>
    </>
  )
}
