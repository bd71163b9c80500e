import { memo } from 'react'
import { CartesianGrid, Scatter, ScatterChart, XAxis, YAxis } from 'recharts'
import { formatNumber } from '@/lib/units'
import { axisLine, axisTick, grid } from './axes'
import type { ContourLine } from './contour-lines'
import { decimalsOf, ticksIn, type Domain, type PlotArea } from './scale'

export const contourLook = { stroke: 'var(--ink)', strokeWidth: 1.4 } as const
/** The line between two ways of setting the same thing: dots. */
export const borderLook = { stroke: 'var(--ink)', strokeWidth: 2.6, strokeDasharray: '1 5', strokeLinecap: 'round' } as const

interface ContourCurvesProps {
  area: PlotArea
  x: Domain & { step: number }
  y: Domain & { step: number }
  lines: readonly ContourLine[]
  borders: readonly ContourLine[]
}

const noShape = () => <g />

/** The lines in their frame. */
export const ContourCurves = memo(function ContourCurves({ area, x, y, lines, borders }: ContourCurvesProps) {
  const yDecimals = decimalsOf(y.step)
  return (
    <ScatterChart width={area.width} height={area.height} margin={{ top: area.top, right: area.right, bottom: 0, left: 0 }} accessibilityLayer={false}>
      <CartesianGrid {...grid} />
      <XAxis type="number" dataKey="x" domain={[x.from, x.to]} ticks={ticksIn(x, x.step)} interval={0} height={area.bottom} tickLine={false} tickMargin={6} axisLine={axisLine} tick={axisTick} tickFormatter={(value: number) => formatNumber(value, 0)} allowDataOverflow />
      <YAxis type="number" dataKey="y" domain={[y.from, y.to]} ticks={ticksIn(y, y.step)} interval={0} width={area.left} tickLine={false} tickMargin={6} axisLine={axisLine} tick={axisTick} tickFormatter={(value: number) => formatNumber(value, yDecimals)} allowDataOverflow />
      {[...lines.map((line) => ({ ...line, look: contourLook })), ...borders.map((line) => ({ ...line, look: borderLook }))].map(({ points, look }, index) => (
        <Scatter key={index} data={points} line={look} lineType="joint" shape={noShape} isAnimationActive={false} />
      ))}
    </ScatterChart>
  )
})
