'use client'

import { startTransition, useCallback, useEffect, useReducer, useRef } from 'react'
import { loadFormulaParser } from '@/lib/calc/live'
import type { FormValues } from '@/lib/schemas/field'
import type { UnitSystem } from '@/lib/units'
import type { CycleAnswer } from '@/lib/workbench/cycle-answer'
import { createCycleRunner, type CycleRunner } from '@/lib/workbench/cycle-runner'
import { editLive, takeCycle, takeOver, turnUnits, type LiveContext, type LiveState } from '@/lib/workbench/live-evaluation'

type LiveAction =
  | { kind: 'edit', changes: FormValues }
  | { kind: 'again' }
  | { kind: 'takeOver', values: FormValues, context: LiveContext }
  | { kind: 'cycle', key: string, answer: CycleAnswer }
  | { kind: 'context', context: LiveContext }
  | { kind: 'system', system: UnitSystem }

interface Held {
  live: LiveState
  context: LiveContext
}

function reduce({ live, context }: Held, action: LiveAction): Held {
  switch (action.kind) {
    case 'edit': return { live: editLive(live, action.changes, context), context }
    case 'again': return { live: editLive(live, {}, context), context }
    case 'takeOver': return { live: takeOver(live, action.values, action.context), context: action.context }
    case 'cycle': return { live: takeCycle(live, action.key, action.answer, context), context }
    case 'system': {
      const turned = turnUnits(live, context, action.system)
      return { live: turned.state, context: turned.context }
    }
    case 'context': return { live: editLive(live, {}, action.context), context: action.context }
  }
}

/**
 * The sheet as it is typed. The closed forms are computed at each edit; the simulated cycle follows from a worker, and the next edit ends its
 * run. The formula parser is fetched when a formula asks for it.
 */
export function useLiveEvaluation(start: () => LiveState, context: LiveContext) {
  const [held, dispatch] = useReducer(reduce, null, () => ({ live: start(), context }))
  const { live } = held
  const usesFormula = live.values['primary.kind'] === 'formula' || live.values['backup.kind'] === 'formula'
  useEffect(() => {
    if (!usesFormula) return
    let isCurrent = true
    void loadFormulaParser().then(() => {
      if (isCurrent) dispatch({ kind: 'again' })
    })
    return () => { isCurrent = false }
  }, [usesFormula])
  const runner = useRef<CycleRunner | null>(null)
  useEffect(() => {
    const made = createCycleRunner()
    runner.current = made
    return () => made.close()
  }, [])
  const { due } = live
  useEffect(() => {
    if (!due) return
    runner.current?.ask(due, (answer) => startTransition(() => dispatch({ kind: 'cycle', key: due.key, answer })))
    return () => runner.current?.cancel()
  }, [due])
  const warm = useCallback(() => runner.current?.warm(), [])
  const edit = useCallback((name: string, value: string) => dispatch({ kind: 'edit', changes: { [name]: value } }), [])
  const fillFrom = useCallback((values: FormValues, next: LiveContext) => dispatch({ kind: 'takeOver', values, context: next }), [])
  const setContext = useCallback((next: LiveContext) => dispatch({ kind: 'context', context: next }), [])
  const turnTo = (system: UnitSystem) => dispatch({ kind: 'system', system })
  return { live, context: held.context, edit, fillFrom, setContext, turnTo, warm }
}
