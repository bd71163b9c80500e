import '@/lib/calc/index'
import { defaultLimits } from '@/lib/calc/limits'
import { evaluateScenario } from '@/lib/calc/scenario/evaluate-scenario'
import type { ScenarioSheet } from '@/lib/calc/scenario/scenario-types'
import { storedResult } from '@/lib/calc/scenario/stored-result'
import { scenarioSheet } from '@/lib/schemas/scenario'
import { startingSheet } from '@/lib/schemas/scenario-defaults'
import type { RevisionDto } from '@/lib/schemas/revision-dto'
import { sampleEngine } from './sample-engine'

const person = { id: '6b0a1d90-6f0a-4a53-8a2c-0a5d1f0f4a11', name: 'Noor Adeyemi' }

/** A saved revision of an invented scenario, evaluated as a save does. */
export function sampleRevision(number: number, change: Partial<ScenarioSheet> = {}): RevisionDto {
  const sheet: ScenarioSheet = { ...startingSheet(sampleEngine), backup: { schedule: { kind: 'fixed', deg: 17 }, latencyUs: 0 }, ...change }
  return {
    scenarioId: '0f6b9c8e-3f5c-4d35-9a58-7f2f3f9f7c01', number, title: 'Climb timing', sheet: scenarioSheet.parse(sheet), sheetVersion: 2, engineVersion: 1,
    engine: { name: 'Flat six 2.6 litres', code: 'J260', spec: sampleEngine },
    results: storedResult(evaluateScenario({ engine: sampleEngine, sheet })), limits: defaultLimits, calcVersion: '1.0.0',
    author: person, createdAt: '2026-12-03T10:42:00.000Z', releasedAt: null, releasedBy: null, releaseReasons: null,
  }
}
