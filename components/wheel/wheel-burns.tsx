import type { ChannelLetter } from '@/components/ui/channel-chip'
import { arcPath, polar, wheelAngle, type Rotation } from './geometry'

/** How a charge burns after its spark, degrees of the crank; negative before top dead centre. */
export interface WheelBurn {
  channel: ChannelLetter
  /** Degrees before top dead centre. */
  sparkDeg: number
  /** 10 and 90 % burned, degrees after top dead centre. */
  tenDeg: number
  ninetyDeg: number
}

/** Delay dotted, 10 to 90 % as a band; a wedge where the pressure peaks. */
export function WheelBurns({ burns, peakDeg, rotation }: { burns: readonly WheelBurn[], peakDeg?: number, rotation: Rotation }) {
  return (
    <>
      {burns.map(({ channel, sparkDeg, tenDeg, ninetyDeg }) => {
        const r = channel === 'A' ? 133 : 122
        const colour = channel === 'A' ? 'var(--a)' : 'var(--b)'
        const ten = wheelAngle(rotation, -tenDeg)
        return (
          <g key={channel} fill="none" stroke={colour}>
            <path d={arcPath(r, wheelAngle(rotation, sparkDeg), ten)} strokeWidth="1.2" strokeDasharray="2 3" />
            <path d={arcPath(r, ten, wheelAngle(rotation, -ninetyDeg))} strokeWidth="7" opacity=".38" />
          </g>
        )
      })}
      {peakDeg === undefined ? null : <PeakWedge angleDeg={wheelAngle(rotation, -peakDeg)} />}
    </>
  )
}

function PeakWedge({ angleDeg }: { angleDeg: number }) {
  const { x, y } = polar(angleDeg, 146)
  return <g transform={`translate(${x} ${y}) rotate(${angleDeg})`}><path d="M0 1 5 -9H-5Z" fill="var(--ink)" /></g>
}
