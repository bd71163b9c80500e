'use client'

import { useEffect, useRef, useState } from 'react'
import type { FullThrottlePressures, PartError, Scenario, SparkMap } from '@/lib/calc/live'
import type { SparkMapProgress, SparkMapRequest } from '@/lib/workbench/spark-map/request'
import { runSparkMap } from '@/lib/workbench/spark-map/runner'

/** A run was stopped by the person, by an edit of what it stands on, or because nobody waits for it any more. */
type StopReason = 'person' | 'edit'

export type MapRun =
  | { kind: 'none' }
  | { kind: 'running', progress: SparkMapProgress }
  | { kind: 'done' }
  | { kind: 'stopped', by: StopReason }
  | { kind: 'failed', error: PartError }

/** A map with what it was computed of. */
export interface DrawnMap {
  map: SparkMap
  pressures: FullThrottlePressures
  scenario: Scenario
  day: SparkMapRequest['choice']['day']
  /** Of everything it stands on: the sheet, and the choices of its own. */
  sheetKey: string
  choiceKey: string
}

/** Runs one map at a time, and only for what stands on the page now: a change of either key stops the run. The last map stays. */
export function useSparkMap(sheetKey: string, choiceKey: string) {
  const [run, setRun] = useState<MapRun>({ kind: 'none' })
  const [drawn, setDrawn] = useState<DrawnMap | null>(null)
  const current = useRef<AbortController | null>(null)
  const stop = (reason: StopReason) => current.current?.abort(reason)
  useEffect(() => () => stop('edit'), [sheetKey, choiceKey])

  const start = (request: SparkMapRequest) => {
    stop('edit')
    const mine = new AbortController()
    current.current = mine
    const isMine = () => current.current === mine
    setRun({ kind: 'running', progress: { done: 0, total: request.choice.rpm.length } })
    runSparkMap(request, { signal: mine.signal, onProgress: (progress) => { if (isMine()) setRun({ kind: 'running', progress }) } }).then((answer) => {
      if (!isMine()) return
      if (!answer.ok) return setRun({ kind: 'failed', error: answer.error })
      setDrawn({ map: answer.map, pressures: answer.pressures, scenario: request.scenario, day: request.choice.day, sheetKey, choiceKey })
      setRun({ kind: 'done' })
    }, () => {
      if (isMine()) setRun({ kind: 'stopped', by: mine.signal.reason === 'person' ? 'person' : 'edit' })
    })
  }
  return { run, drawn, start, cancel: () => stop('person') }
}
