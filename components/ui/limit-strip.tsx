import { useId } from 'react'
import { stripGeometry } from './strip-geometry'
import type { VerdictName } from './verdict'

interface LimitStripProps {
  /** null: there is no value to mark, which counts as outside; the mark stands at the forbidden end. */
  value: number | null
  atLeast?: number
  atMost?: number
  verdict: VerdictName
  width?: number
  /** A signed timing deviation: plus is early and stands left, because time runs to the right. */
  deviation?: boolean
  /** Left out where the number and its limit stand beside the strip, as they must: then readers skip it. */
  label?: string
  className?: string
}

const mid = 9

function Marker({ x, verdict }: { x: number, verdict: VerdictName }) {
  if (verdict === 'outside' || verdict === 'early' || verdict === 'late') return <path d={`M${x} 2.5 ${x + 6.5} 9 ${x} 15.5 ${x - 6.5} 9Z`} fill="var(--red)" />
  if (verdict === 'close') return <><path d={`M${x} 3 ${x + 6} 9 ${x} 15 ${x - 6} 9Z`} fill="var(--paper)" stroke="var(--red)" strokeWidth="1.6" /><path d={`M${x} 3V15L${x - 6} 9Z`} fill="var(--red)" /></>
  return <circle cx={x} cy={mid} r="4.5" fill="var(--ink)" />
}

/** Where a value lies from its limit: limit as a tick, forbidden side hatched. Never without the number beside it. */
export function LimitStrip({ value, atLeast, atMost, verdict, width = 116, deviation = false, label, className }: LimitStripProps) {
  const hatchId = useId()
  const { ticks, forbidden, marker, from, to } = stripGeometry({ value, atLeast, atMost, width, deviation })
  return (
    <svg className={className ?? 'strip'} width={width} height="18" viewBox={`0 0 ${width} 18`} role={label ? 'img' : undefined} aria-label={label} aria-hidden={label ? undefined : true}>
      <defs><pattern id={hatchId} width="5" height="5" patternUnits="userSpaceOnUse" patternTransform="rotate(45)"><line className="hatch" x1="0" y1="0" x2="0" y2="5" /></pattern></defs>
      {forbidden.map((band) => <rect key={band.from} x={band.from} y="4" width={band.to - band.from} height="10" fill={`url(#${hatchId})`} />)}
      <line className="g-axis" x1={from} x2={to} y1={mid} y2={mid} />
      {ticks.map((x) => <line key={x} x1={x} x2={x} y1="1" y2="17" stroke="var(--ink)" strokeWidth="1.5" />)}
      <Marker x={marker} verdict={verdict} />
    </svg>
  )
}
