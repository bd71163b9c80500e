import type { ScenarioResult, ScenarioSheet } from '../calc/live'
import type { ActionState } from '../errors'
import type { FormValues } from './field'
import type { RevisionDto } from './revision-dto'

/** What the scenario's form gets back: the stored revision, or, without a script, an evaluation that nothing was stored of. */
export type SheetAnswer =
  | { kind: 'saved', revision: RevisionDto }
  | { kind: 'evaluated', values: FormValues, sheet: ScenarioSheet, result: ScenarioResult }

export type SheetState = ActionState<SheetAnswer>
