'use client'

import { useRouter } from 'next/navigation'
import { startTransition, useActionState, useDeferredValue, useMemo, useState, type FormEvent, type ReactNode } from 'react'
import { PhoneRibbon } from '@/components/shell/phone-ribbon'
import { useAskBeforeLeaving } from '@/components/ui/use-ask-before-leaving'
import type { Engine, Limits, ScenarioResult, ScenarioSheet } from '@/lib/calc/live'
import type { FormValues } from '@/lib/schemas/field'
import type { RevisionDto } from '@/lib/schemas/revision-dto'
import { scenarioToForm } from '@/lib/schemas/scenario-form'
import type { SheetState } from '@/lib/schemas/sheet-answer'
import type { UnitSystem } from '@/lib/units'
import { editLive, startLive } from '@/lib/workbench/live-evaluation'
import { flaggedFields } from '@/lib/workbench/flagged-fields'
import { FindingsList } from './findings-list'
import { InputBook } from './input-book'
import { ResultLedgers } from './result-ledgers'
import { SaveAnswer } from './save-answer'
import { SheetNotices } from './sheet-notices'
import type { SheetForm } from './sheet-form'
import { SparkMapSection } from './spark-map/spark-map-section'
import { SpeedPlots } from './speed-plots'
import { TimingDrawings } from './timing-drawings'
import { useLiveEvaluation } from './use-live-evaluation'
import { useSave, type SavedAs } from './use-save'
import { WorkbenchHead } from './workbench-head'

export interface WorkbenchProps {
  scenario: { id: string, code: string, archived: boolean, canWrite: boolean, canRelease: boolean, releasedRevision: number | null }
  engine: { id: string, name: string, spec: Engine, version: number }
  engineChanged: boolean
  canOpenEngine: boolean
  saved: SavedAs
  values: FormValues
  sheet: ScenarioSheet
  /** Computed on the server from the same inputs. */
  result: ScenarioResult
  limits: Limits
  system: UnitSystem
  save: (before: SheetState, form: FormData) => Promise<SheetState>
  /** Duplicate, archive, restore: forms of their own. */
  more: ReactNode
}

const formId = 'scenario-form'
const views = [{ value: 'result', label: 'Result' }, { value: 'inputs', label: 'Inputs' }] as const

/** The working sheet: inputs at the left, every result at the right, computed as one types. */
export function Workbench(props: WorkbenchProps) {
  const { scenario, limits, system } = props
  const router = useRouter()
  const [formAnswer, formAction] = useActionState(props.save, { ok: false })
  const [view, setView] = useState<'result' | 'inputs'>('result')
  const context = { engine: props.engine.spec, limits, system, base: props.sheet }
  const { live, context: now, edit, fillFrom, setContext, turnTo, warm } = useLiveEvaluation(() => {
    const opened = startLive(props.values, props.sheet, props.result, context)
    if (formAnswer.ok && formAnswer.data.kind === 'evaluated') return startLive(formAnswer.data.values, formAnswer.data.sheet, formAnswer.data.result, context)
    return !formAnswer.ok && formAnswer.values ? editLive(opened, formAnswer.values, context) : opened
  }, context)
  // The person changed their units while this page was open: what was typed turns with them.
  if (now.system !== system) turnTo(system)
  const { answer, saved, saving, engineVersion, submit, setSaved } = useSave({
    save: props.save, first: formAnswer, saved: props.saved, engineVersion: props.engine.version,
    onSaved: (revision) => {
      setContext({ ...now, base: revision.sheet })
      router.refresh()
    },
    onEngineChanged: (engine) => setContext({ ...now, engine: engine.spec }),
  })
  // Ledgers and curves follow when finding and wheel are painted.
  const later = useDeferredValue(live)
  const shown = later.result
  const scenarioNow = useMemo(() => ({ engine: now.engine, sheet: live.sheet }), [now.engine, live.sheet])
  const shownScenario = useDeferredValue(scenarioNow)
  const flagged = useMemo(() => flaggedFields(live.result.findings, live.values), [live.result.findings, live.values])
  const form: SheetForm = { values: live.values, errors: live.errors, faultAt: live.faultAt, flagged, system, onChange: edit }
  // What was typed for a saved value, or how it reads when the page is opened again: both are saved.
  const reopened = props.saved.number === saved.number ? props.saved.values : saved.values
  const dirty = Object.entries(live.values).some(([name, value]) => (saved.values[name] ?? '') !== value && (reopened[name] ?? '') !== value)

  useAskBeforeLeaving(dirty)

  const fill = (revision: RevisionDto) => {
    const values = scenarioToForm(revision.title, revision.sheet, system)
    setSaved({ number: revision.number, at: revision.createdAt, by: revision.author.name, values })
    fillFrom(values, { ...now, base: revision.sheet })
  }
  const onSubmit = (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault()
    const data = new FormData(event.currentTarget)
    startTransition(() => void submit(data, live.values))
  }

  return (
    <div className="p-wb" data-view={view}>
      <WorkbenchHead
        scenario={scenario} title={live.values.title ?? ''} saved={saved} dirty={dirty} saving={saving} formId={formId} result={live.result} system={system}
        stale={live.stale.size > 0} pendingFindings={live.pendingFindings} more={props.more}
      />
      <SaveAnswer answer={answer} values={live.values} errors={live.errors} system={system} onKeepMine={(theirs) => void submit(null, live.values, theirs.number)} onTakeTheirs={fill} />
      <div className="wb">
        <form id={formId} className="book" aria-label="Inputs" action={formAction} onSubmit={onSubmit} onFocus={warm} noValidate>
          <input type="hidden" name="baseRevision" value={saved.number} />
          <input type="hidden" name="filledFrom" value={saved.filledFrom ?? saved.number} />
          <input type="hidden" name="engineVersion" value={engineVersion} />
          <input type="hidden" name="unitSystem" value={system} />
          <InputBook form={form} engine={{ ...props.engine, spec: now.engine }} canOpenEngine={props.canOpenEngine} />
          <noscript><button className="btn" name="intent" value="evaluate">Compute without saving</button></noscript>
        </form>
        <div className="res">
          <SheetNotices notices={shown.notices} engineChanged={props.engineChanged} archived={scenario.archived} canWrite={scenario.canWrite} />
          <TimingDrawings scenario={scenarioNow} result={live.result} deferred={shown} stale={live.stale} system={system} name={scenario.code} />
          <FindingsList findings={live.result.findings} staleFindings={live.staleFindings} pendingFindings={live.pendingFindings} system={system} />
          <ResultLedgers parts={shown.parts} stale={later.stale} pending={later.pending} scenario={shownScenario} system={system} />
          <SpeedPlots parts={shown.parts} stale={later.stale} scenario={shownScenario} system={system} name={scenario.code} />
          <SparkMapSection scenario={shownScenario} parts={shown.parts} pending={later.pending} limits={limits} system={system} name={scenario.code} values={later.values} onChange={edit} />
          <p className="fine">Judged by the program’s default limits, each named beside its finding; they are this shop’s to choose, no authority’s. These figures compare settings of one engine; they clear none for flight: ground-run, then flight-test as your rules and licensed practice say.</p>
        </div>
      </div>
      <PhoneRibbon label="Parts of the sheet" tabs={views} value={view} onChoose={setView} />
    </div>
  )
}
