'use client'

import { useCallback, useEffect, useReducer } from 'react'
import { loadFormulaParser } from '@/lib/calc/live'
import type { FormValues } from '@/lib/schemas/field'
import type { UnitSystem } from '@/lib/units'
import { editLive, turnUnits, type LiveContext, type LiveState } from '@/lib/workbench/live-evaluation'

type LiveAction =
  | { kind: 'edit', changes: FormValues }
  | { kind: 'again' }
  | { kind: 'replace', state: LiveState }
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
    case 'replace': return { live: action.state, context }
    case 'system': {
      const turned = turnUnits(live, context, action.system)
      return { live: turned.state, context: turned.context }
    }
    case 'context': return { live: editLive(live, {}, action.context), context: action.context }
  }
}

/** The sheet as it is typed, with its figures computed at each edit; the formula parser is fetched when a formula asks for it. */
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
  const edit = useCallback((name: string, value: string) => dispatch({ kind: 'edit', changes: { [name]: value } }), [])
  const replace = useCallback((state: LiveState) => dispatch({ kind: 'replace', state }), [])
  const setContext = useCallback((next: LiveContext) => dispatch({ kind: 'context', context: next }), [])
  const turnTo = (system: UnitSystem) => dispatch({ kind: 'system', system })
  return { live, context: held.context, edit, replace, setContext, turnTo }
}
