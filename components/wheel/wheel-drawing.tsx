import { memo, useId, useMemo } from 'react'
import { formatNumber } from '@/lib/units'
import { foldCylinders, type CylinderAt } from './cylinders'
import { wheelAngle } from './geometry'
import { placeLabels } from './labels'
import { wheelView, type WheelSize } from './sizes'
import { WheelBurns, type WheelBurn } from './wheel-burns'
import { WheelLimitMark, WheelRing, WheelTurn, type WheelLimit } from './wheel-face'
import { FirstCylinder, OtherCylinders, RayA, RayB, StaggerArc } from './wheel-sparks'
import { degText, staggerWord, wheelSentence, type WheelFigures } from './words'

export interface WheelDrawingProps extends WheelFigures {
  size: WheelSize
  /** px; the type keeps its size on the screen whatever the width. */
  width: number
  cylindersAt: readonly CylinderAt[]
  limit?: WheelLimit
  burns?: readonly WheelBurn[]
  /** Greatest pressure, degrees after top dead centre. */
  peakDeg?: number
}

/** One speed, all sparks: a fixed ring with the crank turning inside it, as the person with the timing light sees it. */
export const WheelDrawing = memo(function WheelDrawing({ size, width, cylindersAt, limit, burns, peakDeg, ...figures }: WheelDrawingProps) {
  const { rpm, primaryDeg, backupDeg, staggerDeg, staggerMs, rotation } = figures
  const hatchId = useId()
  const view = useMemo(() => wheelView(size, width), [size, width])
  const groups = useMemo(() => foldCylinders(cylindersAt), [cylindersAt])
  // Cylinders that fire while the crank points down need the room of the arrow.
  const low = groups.some(({ atDeg }) => atDeg > 150 && atDeg < 235)
  const primary = primaryDeg === null ? null : { deg: primaryDeg, text: degText(primaryDeg) }
  const backup = backupDeg === null ? null : { deg: backupDeg, text: degText(backupDeg) }
  const labels = placeLabels({ rotation, primary, backup, view })
  const { font } = view
  const mini = size === 'mini'
  const known = [primaryDeg, backupDeg].filter((deg): deg is number => deg !== null)
  return (
    <svg viewBox={`${view.left} ${view.top} ${view.width} ${view.height}`} width={width} height={Math.round(width * view.height / view.width)} role="img" aria-label={wheelSentence(figures)}>
      {limit ? <defs><pattern id={hatchId} width="5" height="5" patternUnits="userSpaceOnUse" patternTransform="rotate(20)"><line className="hatch" x1="0" y1="0" x2="0" y2="5" /></pattern></defs> : null}
      <WheelRing />
      {labels.numbers.map(({ text, at }) => <text key={`${text} ${at.x}`} className="s" style={{ fontSize: font.small }} x={at.x} y={at.y} textAnchor="middle">{text}</text>)}
      <text className="k" style={{ fontSize: mini ? font.small : font.medium }} x={labels.tdc.x} y={labels.tdc.y} textAnchor="middle">TDC</text>
      {limit ? <WheelLimitMark limit={limit} rotation={rotation} hatchId={hatchId} view={view} /> : null}
      {burns || peakDeg !== undefined ? <WheelBurns burns={burns ?? []} peakDeg={peakDeg} rotation={rotation} /> : null}
      <WheelTurn rotation={rotation} view={view} low={low} />
      <OtherCylinders groups={groups} primaryDeg={primaryDeg} backupDeg={backupDeg} rotation={rotation} view={view} low={low} />
      {known.length > 0 ? <FirstCylinder group={groups.find(({ atDeg }) => atDeg === 0)} earliestDeg={Math.max(...known)} rotation={rotation} view={view} /> : null}
      {staggerDeg !== null && primaryDeg !== null && backupDeg !== null ? <StaggerArc fromDeg={wheelAngle(rotation, primaryDeg)} toDeg={wheelAngle(rotation, backupDeg)} leaderTo={-font.small * 0.8 - 24} /> : null}
      {labels.b && backup ? <RayB label={labels.b} text={backup.text} view={view} /> : null}
      {labels.a && primary ? <RayA label={labels.a} text={primary.text} view={view} /> : null}
      {staggerDeg === null ? null : (
        <>
          <text className="s" style={{ fontSize: font.small }} x="0" y="-18" textAnchor="middle">{staggerWord(staggerDeg)}</text>
          <text x="0" y={mini ? 28 : 18} textAnchor="middle" style={{ fontSize: font.centre, fontWeight: 600, letterSpacing: '-.02em' }}>{degText(Math.abs(staggerDeg))}</text>
        </>
      )}
      <text className="m" style={{ fontSize: font.medium }} x="0" y={mini ? 55 : 40} textAnchor="middle">
        {staggerMs === null ? `at ${formatNumber(rpm, 0)} rpm` : mini ? `${formatNumber(Math.abs(staggerMs), 2)} ms` : `${formatNumber(Math.abs(staggerMs), 2)} ms at ${formatNumber(rpm, 0)} rpm`}
      </text>
    </svg>
  )
})
