import { memo } from 'react'
import { CartesianGrid, Line, LineChart, ReferenceLine, XAxis, YAxis } from 'recharts'
import { formatNumber } from '@/lib/units'
import { axisLine, axisTick, channelLine, grid, still } from './axes'
import { decimalsOf, ticksIn, type Domain, type PlotArea } from './scale'

export interface PlotPoint { x: number, y: number | null }

export interface PlotSeries {
  /** At the end of its line. */
  name: string
  /** A solid teal, B dashed ochre, ink and pencil for what is no channel. */
  look: 'A' | 'B' | 'ink' | 'pencil'
  points: readonly PlotPoint[]
}

const looks = {
  ...channelLine,
  ink: { stroke: 'var(--ink)', strokeWidth: 2 },
  pencil: { stroke: 'var(--pencil)', strokeWidth: 1.2 },
} as const

interface LineCurvesProps {
  area: PlotArea
  series: readonly PlotSeries[]
  xDomain: Domain
  xStep: number
  yDomain: Domain & { step: number }
  levels: readonly number[]
}

export const LineCurves = memo(function LineCurves({ area, series, xDomain, xStep, yDomain, levels }: LineCurvesProps) {
  const yDecimals = decimalsOf(yDomain.step)
  const xDecimals = decimalsOf(xStep)
  return (
    <LineChart width={area.width} height={area.height} margin={{ top: area.top, right: area.right, bottom: 0, left: 0 }} accessibilityLayer={false}>
      <CartesianGrid {...grid} />
      <XAxis type="number" dataKey="x" domain={[xDomain.from, xDomain.to]} ticks={ticksIn(xDomain, xStep)} interval={0} height={area.bottom} tickLine={false} tickMargin={6} axisLine={axisLine} tick={axisTick} tickFormatter={(x: number) => formatNumber(x, xDecimals)} allowDataOverflow />
      <YAxis type="number" dataKey="y" domain={[yDomain.from, yDomain.to]} ticks={ticksIn(yDomain, yDomain.step)} interval={0} width={area.left} tickLine={false} tickMargin={6} axisLine={axisLine} tick={axisTick} tickFormatter={(y: number) => formatNumber(y, yDecimals)} allowDataOverflow />
      {levels.map((y) => <ReferenceLine key={y} y={y} stroke="var(--ink)" strokeWidth={1.2} />)}
      {series.map(({ name, look, points }) => <Line key={name} {...still} data={points as PlotPoint[]} dataKey="y" type="linear" {...looks[look]} />)}
    </LineChart>
  )
})
