import { memo } from 'react'
import { arrow, inkTickPath, polar, radius, tickPath, type Rotation } from './geometry'
import type { WheelView } from './sizes'

/** The fixed ring: nothing in it moves with the speed, so it is drawn once. */
export const WheelRing = memo(function WheelRing() {
  return (
    <>
      <circle r={radius.face} fill="var(--sheet)" stroke="var(--line)" strokeWidth="1" />
      <circle r={radius.rim} fill="none" stroke="var(--line)" strokeWidth="1" />
      <path className="g-tick" d={tickPath} />
      <path className="g-tick" d={inkTickPath} style={{ stroke: 'var(--ink)' }} />
    </>
  )
})

interface TurnProps {
  rotation: Rotation
  view: WheelView
  /** Words and arrow nearer to the middle, where cylinders fire at the bottom of the ring. */
  low: boolean
}

/** Which way the crank turns inside the ring, and from where one looks. */
export const WheelTurn = memo(function WheelTurn({ rotation, view, low }: TurnProps) {
  if (view.size === 'mini') return null
  const side = rotation === 'clockwise' ? 1 : -1
  const crop = view.size === 'crop'
  const { arc, head } = crop ? arrow(112, side * 242, side * 288) : low ? arrow(86, side * 158, side * 206) : arrow(104, side * 160, side * 203)
  return (
    <>
      <path className="g-ink" d={arc} />
      <path d={head} fill="var(--ink)" />
      <text className="s" style={{ fontSize: view.font.small }} x="0" y={crop || low ? 65 : 122} textAnchor="middle">seen from the damper end</text>
    </>
  )
})

/** Marks and labels of the limit, where it is given: the ring hatched from its low end on the early side. */
export interface WheelLimit {
  /** Low end, degrees before top dead centre. */
  lowDeg: number
  midDeg?: number
  text: string
}

export function WheelLimitMark({ limit, rotation, hatchId, view }: { limit: WheelLimit, rotation: Rotation, hatchId: string, view: WheelView }) {
  const side = rotation === 'clockwise' ? -1 : 1
  const at = (deg: number, r: number) => polar(side * deg, r)
  const far = Math.min(limit.lowDeg + 28, 180)
  const [outerFrom, outerTo, innerTo, innerFrom] = [at(limit.lowDeg, radius.rim), at(far, radius.rim), at(far, radius.face), at(limit.lowDeg, radius.face)]
  const sweep = side > 0 ? 1 : 0
  const line = (deg: number, inner: number, outer: number) => ({ x1: at(deg, inner).x, y1: at(deg, inner).y, x2: at(deg, outer).x, y2: at(deg, outer).y })
  const label = at(limit.lowDeg + 18, 170)
  return (
    <>
      <path d={`M${outerFrom.x} ${outerFrom.y}A${radius.rim} ${radius.rim} 0 0 ${sweep} ${outerTo.x} ${outerTo.y}L${innerTo.x} ${innerTo.y}A${radius.face} ${radius.face} 0 0 ${1 - sweep} ${innerFrom.x} ${innerFrom.y}Z`} fill={`url(#${hatchId})`} />
      <line className="g-red" {...line(limit.lowDeg, 142, 166)} />
      {limit.midDeg === undefined ? null : <line className="g-red" {...line(limit.midDeg, radius.face, radius.rim)} style={{ strokeWidth: 1.4, strokeDasharray: '2 2' }} />}
      {view.size === 'mini' ? null : <text className="bad" style={{ fontSize: view.font.small, fontWeight: 600 }} x={label.x} y={label.y} textAnchor={side < 0 ? 'end' : 'start'}>{limit.text}</text>}
    </>
  )
}
