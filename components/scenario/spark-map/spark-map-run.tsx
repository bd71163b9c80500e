import { Button } from '@/components/ui/button'
import { WithheldNote } from '@/components/ui/note'
import { WorkingRuler } from '@/components/ui/working-ruler'
import { withheldWords } from '@/lib/words/parts'
import type { MapRun } from './use-spark-map'

interface SparkMapRunProps {
  run: MapRun
  /** Why none can be started. */
  off: string | null
  onStart: () => void
  onCancel: () => void
}

/** Said once a change, not at every row. */
function runWords(run: MapRun): string {
  if (run.kind === 'running') return 'The map is being computed.'
  if (run.kind === 'done') return 'The map is drawn.'
  if (run.kind === 'stopped') return run.by === 'person' ? 'Cancelled.' : 'Stopped: something the map stands on was changed.'
  return ''
}

/** Starts and ends a run, and says how far it is. */
export function SparkMapRun({ run, off, onStart, onCancel }: SparkMapRunProps) {
  const isRunning = run.kind === 'running'
  const { done, total } = isRunning ? run.progress : { done: 0, total: 1 }
  return (
    <>
      <div className="acts">
        {isRunning ? <Button key="act" onClick={onCancel}>Cancel</Button> : <Button key="act" off={off ?? undefined} onClick={onStart}>Compute the map</Button>}
        <p role="status" className="fine">{runWords(run)}</p>
      </div>
      {isRunning ? <WorkingRuler label={`Row ${Math.min(done + 1, total)} of ${total}`} share={done / total} /> : null}
      {run.kind === 'failed' ? <FailedRun run={run} /> : null}
    </>
  )
}

function FailedRun({ run: { error } }: { run: Extract<MapRun, { kind: 'failed' }> }) {
  const { reason } = withheldWords('detonation', error)
  return <WithheldNote title="No map"><p>{reason}</p></WithheldNote>
}
