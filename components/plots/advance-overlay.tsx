import { formatNumber } from '@/lib/units'
import type { AdvanceChannel } from './advance-curves'
import { degAt } from './curve'
import { Marker } from './marker'
import { xPixel, yPixel, type Domain, type PlotArea } from './scale'

export interface PlotNote { rpm: number, deg: number, text: string }

interface AdvanceOverlayProps {
  area: PlotArea
  channels: readonly AdvanceChannel[]
  speed: Domain
  advance: Domain
  rpm: number
  /** Values at the chosen speed, computed exactly; the curve is only as fine as its points. */
  at?: { A: number | null, B: number | null }
  notes: readonly PlotNote[]
}

const nameSpots = [0.4, 0.66, 0.2]
/** With this much between the curves both values fit between them, px. */
const gapForValues = 46

/** What moves with the handle, laid over the curves: the line of the chosen speed, full points, their values; and the names, which step aside for them. */
export function AdvanceOverlay({ area, channels, speed, advance, rpm, at, notes }: AdvanceOverlayProps) {
  const x = xPixel(area, speed, rpm)
  const y = (deg: number) => yPixel(area, advance, deg)
  const keep = (value: number) => Math.min(area.height - area.bottom - 6, Math.max(area.top + 12, value))
  const points = channels.flatMap(({ channel, rising }) => {
    const deg = at ? at[channel] : degAt(rising, rpm)
    return deg === null ? [] : [{ channel, deg, y: y(deg) }]
  }).sort((one, other) => one.y - other.y)
  const [upper, lower] = points
  const between = Boolean(upper && lower && lower.y - upper.y > gapForValues)
  const atLeft = x - area.left > 64
  const nameX = xPixel(area, speed, speed.from + (nameSpots.find((spot) => Math.abs(area.left + spot * (area.width - area.left - area.right) - x) > 90) ?? 0.4) * (speed.to - speed.from))
  const nameRpm = speed.from + ((nameX - area.left) / (area.width - area.left - area.right)) * (speed.to - speed.from)
  const names = channels.flatMap(({ channel, name, rising }) => {
    const deg = degAt(rising, nameRpm)
    return deg === null ? [] : [{ channel, name, y: y(deg) }]
  }).sort((one, other) => one.y - other.y)
  return (
    <svg className="overlay" width={area.width} height={area.height} aria-hidden="true">
      {notes.map((note) => <text key={note.text} className="s halo" x={xPixel(area, speed, note.rpm) + 6} y={keep(y(note.deg))}>{note.text}</text>)}
      {names.map(({ channel, name, y: lineY }, index) => <text key={channel} className={`k halo ch-${channel.toLowerCase()}`} x={nameX} y={keep(index === 0 ? lineY - 11 : lineY + 21)} textAnchor="middle">{name}</text>)}
      <path d={`M${x} ${area.top}V${area.height - area.bottom}`} stroke="var(--ink)" strokeWidth="1.5" />
      {points.map((point, index) => {
        const above = (index === 0) !== between
        return (
          <g key={point.channel}>
            <Marker channel={point.channel} cx={x} cy={point.y} full />
            <text className={`k halo ch-${point.channel.toLowerCase()}`} x={atLeft ? x - 11 : x + 11} y={keep(above ? point.y - 10 : point.y + 21)} textAnchor={atLeft ? 'end' : 'start'}>{formatNumber(point.deg, 1)}°</text>
          </g>
        )
      })}
    </svg>
  )
}
