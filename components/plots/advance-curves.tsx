import { memo } from 'react'
import { CartesianGrid, ComposedChart, Line, Scatter, XAxis, YAxis } from 'recharts'
import type { ChannelLetter } from '@/components/ui/channel-chip'
import { formatNumber } from '@/lib/units'
import { axisLine, axisTick, channelLine, grid, still } from './axes'
import { degAt, fallingRuns, type CurvePoint } from './curve'
import { Marker } from './marker'
import { ticksIn, type Domain, type PlotArea } from './scale'

export interface AdvanceChannel {
  channel: ChannelLetter
  /** Beside its line: "A primary", "B backup, fixed". */
  name: string
  /** A crank-retard jump stands as two points of one speed. */
  rising: readonly CurvePoint[]
  /** With the speed falling, where hysteresis makes it another curve. */
  falling?: readonly CurvePoint[]
}

export interface SpeedMark { label: string, rpm: number }

interface AdvanceCurvesProps {
  area: PlotArea
  channels: readonly AdvanceChannel[]
  marks: readonly SpeedMark[]
  speed: Domain
  advance: Domain & { step: number }
  speedStep: number
}

const circle = (props: { cx?: number, cy?: number }) => <Marker channel="A" cx={props.cx} cy={props.cy} />
const square = (props: { cx?: number, cy?: number }) => <Marker channel="B" cx={props.cx} cy={props.cy} />

/** The curves and their hollow points. Nothing here knows the chosen speed, so moving the handle redraws none of it. */
export const AdvanceCurves = memo(function AdvanceCurves({ area, channels, marks, speed, advance, speedStep }: AdvanceCurvesProps) {
  return (
    <ComposedChart width={area.width} height={area.height} margin={{ top: area.top, right: area.right, bottom: 0, left: 0 }} accessibilityLayer={false}>
      <CartesianGrid {...grid} />
      <XAxis type="number" dataKey="rpm" domain={[speed.from, speed.to]} ticks={ticksIn(speed, speedStep)} interval={0} height={area.bottom} tickLine={false} tickMargin={6} axisLine={axisLine} tick={axisTick} tickFormatter={(rpm: number) => formatNumber(rpm, 0)} allowDataOverflow />
      <YAxis type="number" dataKey="deg" domain={[advance.from, advance.to]} ticks={ticksIn(advance, advance.step)} interval={0} width={area.left} tickLine={false} tickMargin={6} axisLine={axisLine} tick={axisTick} tickFormatter={(deg: number) => formatNumber(deg, 0)} allowDataOverflow />
      {channels.flatMap(({ channel, rising, falling }) => (falling ? fallingRuns(rising, falling) : []).map((run, index) => (
        <Line key={`${channel} falling ${index}`} {...still} data={run} dataKey="deg" type="linear" {...channelLine[channel]} strokeWidth={1.2} />
      )))}
      {channels.map(({ channel, rising }) => <Line key={channel} {...still} data={rising as CurvePoint[]} dataKey="deg" type="linear" {...channelLine[channel]} />)}
      {channels.map(({ channel, rising }) => (
        <Scatter key={channel} isAnimationActive={false} shape={channel === 'A' ? circle : square} data={marks.flatMap(({ rpm }) => {
          const deg = degAt(rising, rpm)
          return deg === null ? [] : [{ rpm, deg }]
        })} />
      ))}
    </ComposedChart>
  )
})
