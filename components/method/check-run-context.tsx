'use client'

import { createContext, useContext, useState, useSyncExternalStore, type ReactNode } from 'react'
import { CheckRun, type CheckCounts } from './check-run'

const RunContext = createContext<CheckRun | null>(null)

/** One run for the whole page: its checks, its contents and its head look at the same outcomes. */
export function CheckRunProvider({ children }: { children: ReactNode }) {
  const [run] = useState(() => new CheckRun())
  return <RunContext value={run}>{children}</RunContext>
}

export function useCheckRun(): CheckRun {
  const run = useContext(RunContext)
  if (!run) throw new Error('useCheckRun stands outside its provider')
  return run
}

/** Counts of a group, or of all; undefined before its first outcome. */
export function useCheckCounts(group?: string): CheckCounts | undefined {
  const run = useCheckRun()
  return useSyncExternalStore(run.subscribe, () => run.countsOf(group), () => undefined)
}

export function useRunFailed(): boolean {
  const run = useCheckRun()
  return useSyncExternalStore(run.subscribe, run.hasFailed, () => false)
}
