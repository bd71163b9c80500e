'use client'

import { useEffect, useState, type ReactNode } from 'react'
import { Button, ButtonLink } from '@/components/ui/button'
import { TimeAt } from '@/components/lists/time-at'
import { PageHead } from '@/components/shell/page-head'
import type { ScenarioResult } from '@/lib/calc/live'
import type { UnitSystem } from '@/lib/units'
import { SheetStamp } from './sheet-stamp'
import type { SavedAs } from './use-save'

interface WorkbenchHeadProps {
  scenario: { id: string, code: string, archived: boolean, canWrite: boolean, canRelease: boolean, releasedRevision: number | null }
  title: string
  saved: SavedAs
  dirty: boolean
  saving: boolean
  formId: string
  result: ScenarioResult
  system: UnitSystem
  stale: boolean
  pendingFindings: ReadonlySet<string>
  more: ReactNode
}

/** True while the browser has no connection. */
function useOffline(): boolean {
  const [offline, setOffline] = useState(false)
  useEffect(() => {
    const look = () => setOffline(!navigator.onLine)
    look()
    window.addEventListener('online', look)
    window.addEventListener('offline', look)
    return () => {
      window.removeEventListener('online', look)
      window.removeEventListener('offline', look)
    }
  }, [])
  return offline
}

/** Head of the working sheet: which revision, what it comes to, what can be done with it. */
export function WorkbenchHead({ scenario, title, saved, dirty, saving, formId, result, system, stale, pendingFindings, more }: WorkbenchHeadProps) {
  const offline = useOffline()
  const outside = result.counts.outside
  const cannotSave = scenario.archived ? 'it is archived' : !scenario.canWrite ? 'your role reads it' : undefined
  return (
    <>
      <PageHead
        over={(
          <>
            Scenario {scenario.code} · <span title={`saved by ${saved.by}`}>revision {saved.number}</span> · <TimeAt iso={saved.at} />
            <span className="sheet-state" role="status">{offline ? ' · no connection: saving waits for it' : saving ? ' · saving' : dirty ? ' · changes not saved' : ''}</span>
          </>
        )}
        title={title || 'Scenario without a name'}
        stamp={<SheetStamp result={result} system={system} stale={stale} pendingFindings={pendingFindings} />}
        actions={(
          <>
            <Button kind="do" type="submit" form={formId} name="intent" value="save" pending={saving} off={cannotSave}>Save</Button>
            {scenario.canRelease ? (
              dirty
                ? <Button off="save first">Release a plan</Button>
                : <ButtonLink href={`/scenarios/${scenario.id}/release`}>Release a plan{outside > 0 ? `: ${outside} outside` : ''}</ButtonLink>
            ) : null}
          </>
        )}
      />
      <nav className="sub" aria-label="Pages of this scenario">
        <a href={`/scenarios/${scenario.id}`} aria-current="page">Sheet</a>
        <a href={`/scenarios/${scenario.id}/revisions`}>Revisions</a>
        {scenario.releasedRevision === null ? null : <a href={`/plans/${scenario.id}/${scenario.releasedRevision}`}>Plan {scenario.code}.{scenario.releasedRevision}</a>}
        {more}
      </nav>
    </>
  )
}
