'use client'

import { memo, type KeyboardEvent } from 'react'
import { formatNumber } from '@/lib/units'
import type { SpeedMark } from './advance-curves'
import { xPixel, type Domain, type PlotArea } from './scale'

interface RulerProps {
  area: PlotArea
  speed: Domain
  marks: readonly SpeedMark[]
  chosen: number | null
}

const line = 12
/** Half a character of 13 px text. */
const halfSign = 3.4

/** Names under the notches; one that would meet its left neighbour goes one row down. */
function rowsOf(marks: readonly SpeedMark[], at: (rpm: number) => number): number[] {
  const ends = [-Infinity, -Infinity]
  return marks.map(({ label, rpm }) => {
    const half = label.length * halfSign + 4
    const row = (ends[0] ?? 0) <= at(rpm) - half ? 0 : 1
    ends[row] = at(rpm) + half
    return row
  })
}

const Ruler = memo(function Ruler({ area, speed, marks, chosen }: RulerProps) {
  const at = (rpm: number) => xPixel(area, speed, rpm)
  const ticks = Array.from({ length: Math.floor((speed.to - speed.from) / 100) + 1 }, (_, index) => speed.from + index * 100)
  const rows = rowsOf(marks, at)
  return (
    <svg width={area.width} height={rows.includes(1) ? 58 : 43} aria-hidden="true">
      <text className="s" x="2" y={line + 4.5}>rpm</text>
      <path className="g-axis" d={`M${at(speed.from)} ${line}H${at(speed.to)}`} />
      <path className="g-tick" d={ticks.map((rpm) => `M${at(rpm)} ${line}V${line + (rpm % 500 === 0 ? 8 : 4)}`).join('')} />
      {marks.map(({ label, rpm }, index) => {
        const x = Math.min(area.width - label.length * halfSign, Math.max(label.length * halfSign, at(rpm)))
        return (
          <g key={label}>
            <path d={`M${at(rpm)} ${line + 1}l4 7h-8z`} fill={rpm === chosen ? 'var(--ink)' : 'var(--pencil)'} />
            <text className="s" x={x} y={line + 24 + (rows[index] ?? 0) * 15} textAnchor="middle" style={rpm === chosen ? { fill: 'var(--ink)', fontWeight: 600 } : undefined}>{label}</text>
          </g>
        )
      })}
    </svg>
  )
})

interface ScrubberProps {
  area: PlotArea
  speed: Domain
  marks: readonly SpeedMark[]
  rpm: number
  onRpm: (rpm: number) => void
}

/** Pixels the thumb of the range input takes; half of it hangs over each end, so that value and pixel agree. */
const thumb = 52
const arrowStep = 10

/** The speed axis as an input: drag, arrows by 10 rpm, 1 to 4 for the marked speeds. */
export function Scrubber({ area, speed, marks, rpm, onRpm }: ScrubberProps) {
  const keep = (value: number) => Math.min(speed.to, Math.max(speed.from, Math.round(value)))
  const mark = marks.find((candidate) => Math.round(candidate.rpm) === Math.round(rpm))
  const onKeyDown = (event: KeyboardEvent) => {
    if (event.ctrlKey || event.metaKey || event.altKey) return
    const step = event.key === 'ArrowRight' || event.key === 'ArrowUp' ? arrowStep : event.key === 'ArrowLeft' || event.key === 'ArrowDown' ? -arrowStep : 0
    const chosen = /^[1-9]$/.test(event.key) ? marks[Number(event.key) - 1]?.rpm : undefined
    const next = step !== 0 ? keep(rpm + step) : chosen
    if (next === undefined) return
    event.preventDefault()
    onRpm(next)
  }
  return (
    <div className="scrub">
      <Ruler area={area} speed={speed} marks={marks} chosen={mark?.rpm ?? null} />
      <input
        type="range" aria-label="Speed" min={speed.from} max={speed.to} step={1} value={Math.round(rpm)}
        aria-valuetext={`${formatNumber(rpm, 0)} rpm${mark ? `, ${mark.label}` : ''}`}
        style={{ left: area.left - thumb / 2, width: area.width - area.left - area.right + thumb }}
        onChange={(event) => onRpm(keep(event.target.valueAsNumber))} onKeyDown={onKeyDown}
      />
      <span className="handle" aria-hidden="true" style={{ transform: `translateX(${xPixel(area, speed, Math.min(speed.to, Math.max(speed.from, rpm)))}px)` }}>{formatNumber(rpm, 0)}</span>
    </div>
  )
}
