'use client'

import type { ReactNode } from 'react'
import { FindingsList } from '@/components/scenario/findings-list'
import { ResultLedgers } from '@/components/scenario/result-ledgers'
import { TimingDrawings } from '@/components/scenario/timing-drawings'
import { Section } from '@/components/ui/section'
import type { PartName, Scenario, ScenarioResult } from '@/lib/calc/live'
import type { UnitSystem } from '@/lib/units'

const noParts: ReadonlySet<PartName> = new Set()
const noFindings: ReadonlySet<string> = new Set()

interface RevisionBodyProps {
  scenario: Scenario
  result: ScenarioResult
  system: UnitSystem
  /** For file names: J260-05.2. */
  name: string
  /** Why a finding outside its limit was released. */
  reasons?: Record<string, string>
  /** Stands where somebody will read on to act on the engine: before the figures that are proved and run. */
  beforeFigures?: ReactNode
}

/** Drawings, findings and figures of a saved revision: nothing in it can be changed. */
export function RevisionBody({ scenario, result, system, name, reasons, beforeFigures }: RevisionBodyProps) {
  return (
    <>
      <Section title="When each channel fires">
        <TimingDrawings scenario={scenario} result={result} deferred={result} stale={noParts} system={system} name={name} />
      </Section>
      <FindingsList findings={result.findings} staleFindings={noFindings} system={system} reasons={reasons} />
      {beforeFigures}
      <ResultLedgers parts={result.parts} stale={noParts} isSaved scenario={scenario} system={system} />
    </>
  )
}
