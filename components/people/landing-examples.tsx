import { proofSpeedRpm, timingTorqueRatio } from '@/lib/calc/live'
import { formatNumber } from '@/lib/units'
import { LimitStrip } from '@/components/ui/limit-strip'
import { Num } from '@/components/ui/num'

/** Figures of an invented engine, computed where they are shown. */
const timing = { mbtDeg: 33, curvaturePerDeg2: 3.2e-4 }
const atLeastRatio = 0.85
const idleRpm = 820
const proofAtMostRpm = idleRpm + 100
const mechanical = { schedule: { kind: 'mechanical' as const, initialDeg: 10, startRpm: 900, fullRpm: 1900, fullDeg: 26.5 } }

/** Power on the backup alone, as a share of the power on the primary. */
export function BackupPowerExample() {
  const ratio = timingTorqueRatio(timing, 17) / timingTorqueRatio(timing, 26.5)
  return (
    <>
      <LimitStrip value={ratio} atLeast={atLeastRatio} verdict={ratio < atLeastRatio ? 'outside' : 'within'} width={340} />
      <p className="cap"><Num value={formatNumber(ratio, 2)} /> of the power on B alone, at least {formatNumber(atLeastRatio, 2)}</p>
    </>
  )
}

/** Where a timing light proves full timing of a mechanical advance. */
export function ProofSpeedExample() {
  const proof = proofSpeedRpm(mechanical, { idleRpm, maxRpm: 2780, toleranceDeg: 1 })
  const outside = proof === null || proof > proofAtMostRpm
  return (
    <>
      <LimitStrip value={proof} atMost={proofAtMostRpm} verdict={outside ? 'outside' : 'within'} width={340} />
      <p className="cap">full timing shows from {proof === null ? 'no speed' : <Num value={formatNumber(proof, 0)} unit="rpm" bad={outside} />}, at most {formatNumber(proofAtMostRpm, 0)}</p>
    </>
  )
}
