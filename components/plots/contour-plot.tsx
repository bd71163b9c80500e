'use client'

import { useId, useMemo, type ReactNode } from 'react'
import { Figure } from '@/components/ui/figure'
import type { FigureData } from '@/components/ui/figure-data'
import { useWidth } from '@/components/ui/use-width'
import { formatNumber } from '@/lib/units'
import { ContourCurves } from './contour-curves'
import { contourLines, regionOutlines, type PlotGrid, type PlotXY } from './contour-lines'
import { lengthOf, placeLabels, textBox, type Box } from './label-room'
import { placeNotes, pointBox, PlotPoints, type PlotPlace } from './plot-points'
import { decimalsOf, niceStep, ticksIn, xPixel, yPixel, type PlotArea } from './scale'

/** Places without a value, said in words where they are. */
export interface PlotRegion {
  words: string
  isIn: (i: number, j: number) => boolean
}

export interface ContourPlotProps {
  title: ReactNode
  level?: 2 | 3
  sentence: string
  finding: ReactNode
  grid: PlotGrid
  /** Unit of the values, joined to the labels. */
  labelUnit: string
  /** Drawn as a dotted line where it is zero. */
  border?: PlotGrid['values']
  regions: readonly PlotRegion[]
  places: readonly PlotPlace[]
  xUnit: string
  yTitle: string
  /** The same axis in other terms: so much more or less in proportion. */
  beside: { title: string, perY: number }
  data: FigureData
  csvName: string
}

const servedWidth = 620
const shortestLinePx = 30
const none: readonly [] = []

const finite = (values: PlotGrid['values']): number[] => values.flatMap((row) => row.filter((value) => value !== null))

/** Lines of equal value over two axes, each with its value on it. */
export function ContourPlot({ title, level, sentence, finding, grid, labelUnit, border, regions, places, xUnit, yTitle, beside, data, csvName }: ContourPlotProps) {
  const [ref, found] = useWidth<HTMLDivElement>()
  const width = found ?? servedWidth
  const isNarrow = width < 480
  const hatch = useId()
  const drawn = useMemo(() => {
    const area: PlotArea = { width, height: isNarrow ? 330 : 420, left: 44, right: 44, top: 10, bottom: 24 }
    const domain = (axis: readonly number[], most: number, room: number) => {
      const [from, to] = [axis[0] ?? 0, axis.at(-1) ?? 1]
      // A point at an end of the axis stands clear of its numbers.
      return { from: from - room * (to - from), to: to + room * (to - from), step: niceStep(to - from, most) }
    }
    const x = domain(grid.x, isNarrow ? 4 : 7, isNarrow ? 0.06 : 0.035)
    const y = domain(grid.y, 6, 0.015)
    const known = finite(grid.values)
    const [low, high] = [Math.min(...known), Math.max(...known)]
    const step = Math.max(0.5, niceStep(high - low, isNarrow ? 11 : 14))
    const levels = known.length > 0 ? ticksIn({ from: low, to: high }, step) : []
    const toPixel = (point: PlotXY): PlotXY => ({ x: xPixel(area, x, point.x), y: yPixel(area, y, point.y) })
    // Scraps between two places without a value say nothing and take no label.
    const lines = contourLines(grid, levels).filter(({ points }) => lengthOf(points.map(toPixel)) > shortestLinePx)
    const frame: Box = { x: area.left + 2, y: area.top + 2, width: area.width - area.left - area.right - 4, height: area.height - area.top - area.bottom - 4 }
    const hatched = regions.flatMap(({ words, isIn }) => {
      const outlines = regionOutlines(grid, isIn).map((ring) => ring.map(toPixel))
      const largest = outlines.flat()
      if (largest.length === 0) return []
      const middle = (values: readonly number[]) => (Math.min(...values) + Math.max(...values)) / 2
      const box = textBox(words, { x: middle(largest.map((point) => point.x)), y: middle(largest.map((point) => point.y)) }, 6.6)
      const shift = Math.max(frame.x, Math.min(box.x, frame.x + frame.width - box.width)) - box.x
      return [{ words, box: { ...box, x: box.x + shift }, path: outlines.map((ring) => `M${ring.map((point) => `${point.x.toFixed(1)} ${point.y.toFixed(1)}`).join('L')}Z`).join('') }]
    })
    return { area, x, y, step, lines, toPixel, frame, hatched, borders: border ? contourLines({ ...grid, values: border }, [0]) : none }
  }, [grid, border, regions, width, isNarrow])
  const { area, x, y, step, lines, frame, hatched, toPixel, borders } = drawn
  const notes = useMemo(() => placeNotes(places.filter((place) => place.x >= x.from && place.x <= x.to && place.y >= y.from && place.y <= y.to).map((place) => ({ ...place, ...toPixel(place) })), frame), [places, x, y, toPixel, frame])
  const labels = useMemo(() => {
    const taken = [...notes.flatMap((place) => [place.box, pointBox(place)]), ...hatched.map(({ box }) => box)]
    const decimals = decimalsOf(step)
    return placeLabels(lines.map(({ level: value, points }) => ({ text: formatNumber(value, decimals) + labelUnit, points: points.map(toPixel) })), taken, frame)
  }, [lines, notes, hatched, step, labelUnit, toPixel, frame])
  const besideStep = niceStep((y.to - y.from) * beside.perY, 6)
  return (
    <div className="drawn" ref={ref}>
      <Figure title={title} level={level} sentence={sentence} data={data} csvName={csvName}>
        <p className="mb-1">{finding}</p>
        <p className="fine contour-heads"><span>{yTitle}</span><span>{beside.title}</span></p>
        <div className="plot" style={{ height: area.height + 14 }}>
          <ContourCurves area={area} x={x} y={y} lines={lines} borders={borders} />
          <svg className="overlay" width={area.width} height={area.height + 14} aria-hidden="true">
            <defs>
              <pattern id={hatch} width="5" height="5" patternUnits="userSpaceOnUse" patternTransform="rotate(45)"><line className="hatch-p" x1="0" y1="0" x2="0" y2="5" /></pattern>
            </defs>
            {hatched.map(({ words: text, box, path }) => (
              <g key={text}>
                <path d={path} fill={`url(#${hatch})`} fillRule="evenodd" stroke="var(--line)" strokeWidth="1" />
                <text className="s halo" x={box.x + box.width / 2} y={box.y + 13} textAnchor="middle">{text}</text>
              </g>
            ))}
            <path className="g-axis" d={`M${area.width - area.right} ${area.top}V${area.height - area.bottom}`} />
            {ticksIn({ from: y.from * beside.perY, to: y.to * beside.perY }, besideStep).map((value) => (
              <text key={value} className="s" x={area.width - area.right + 6} y={yPixel(area, y, value / beside.perY) + 4.5}>{formatNumber(value, decimalsOf(besideStep))}</text>
            ))}
            {labels.map(({ text, x: at, y: down }) => <text key={`${text} ${at} ${down}`} className="k halo" x={at} y={down + 5} textAnchor="middle">{text}</text>)}
            <PlotPoints places={notes} />
            <text className="s" x={area.width - area.right} y={area.height + 12} textAnchor="end">{xUnit}</text>
          </svg>
        </div>
      </Figure>
    </div>
  )
}
