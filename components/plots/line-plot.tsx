'use client'

import { useMemo, type ReactNode } from 'react'
import { Figure } from '@/components/ui/figure'
import type { FigureData } from '@/components/ui/figure-data'
import { useWidth } from '@/components/ui/use-width'
import { LineCurves, type PlotSeries } from './line-curves'
import { PlotNames, type PlotLevel } from './plot-names'
import { domainAround, niceStep, xPixel, type Domain, type PlotArea } from './scale'

export interface LinePlotProps {
  title?: ReactNode
  /** One sentence that the curve says, over it. */
  finding?: ReactNode
  sentence: string
  series: readonly PlotSeries[]
  x: Domain
  xUnit: string
  yUnit: string
  /** Starts at zero unless false: a share of a whole does, a stagger need not. */
  withZero?: boolean
  decimals?: number
  signed?: boolean
  /** Lines across: a limit, a plan. */
  levels?: readonly PlotLevel[]
  /** The speed chosen elsewhere on the page. */
  cursor?: number
  csvName: string
  /** The numbers; made from the points when left out. */
  data?: FigureData
  height?: number
}

const noLevels: readonly PlotLevel[] = []
const servedWidth = 420

/** The values of all series on the first one's x: they are computed at the same speeds. */
function tableOf({ sentence, series, xUnit, yUnit, decimals = 1, signed }: LinePlotProps): FigureData {
  const xs = [...new Set(series.flatMap(({ points }) => points.map(({ x }) => x)))].sort((one, other) => one - other)
  const maps = series.map(({ points }) => new Map(points.map(({ x, y }) => [x, y])))
  return {
    caption: sentence,
    columns: [{ head: 'Speed', unit: xUnit }, ...series.map(({ name, look }) => ({ head: name, unit: yUnit, decimals, signed, ...(look === 'A' || look === 'B' ? { channel: look } : {}) }))],
    rows: xs.map((x) => [x, ...maps.map((map) => map.get(x) ?? null)]),
  }
}

/** One to three curves against speed, in a frame of two lines. */
export function LinePlot(props: LinePlotProps) {
  const { title, finding, sentence, series, x, xUnit, yUnit, withZero = true, levels = noLevels, cursor, csvName, data: given, height = 200 } = props
  const [ref, found] = useWidth<HTMLDivElement>()
  const width = found ?? servedWidth
  const area = useMemo<PlotArea>(() => ({ width, height, left: 44, right: 16, top: 10, bottom: 24 }), [width, height])
  const { from, to } = x
  const xDomain = useMemo(() => ({ from, to }), [from, to])
  const yDomain = useMemo(() => domainAround([...series.flatMap(({ points }) => points.flatMap(({ y }) => (y === null ? [] : [y]))), ...levels.map(({ y }) => y)], { withZero, most: height < 180 ? 4 : 5 }), [series, levels, withZero, height])
  const levelValues = useMemo(() => levels.map(({ y }) => y), [levels])
  // The table is made from what shows in it; the other props only name it.
  const made = useMemo(() => given ?? tableOf({ sentence, series, xUnit, yUnit, decimals: props.decimals, signed: props.signed, x: { from, to }, csvName }), [given, sentence, series, xUnit, yUnit, props.decimals, props.signed, from, to, csvName])
  return (
    <div className="drawn" ref={ref}>
      <Figure title={title} sentence={sentence} data={made} csvName={csvName}>
        {finding ? <p className="mb-1">{finding}</p> : null}
        <p className="fine">{yUnit}</p>
        <div className="plot" style={{ height: height + 14 }}>
          <LineCurves area={area} series={series} xDomain={xDomain} xStep={niceStep(to - from, width < 420 ? 4 : 6)} yDomain={yDomain} levels={levelValues} />
          <svg className="overlay" width={area.width} height={area.height + 14} aria-hidden="true">
            <PlotNames area={area} series={series} xDomain={xDomain} yDomain={yDomain} levels={levels} />
            {cursor === undefined || cursor < from || cursor > to ? null : <path d={`M${xPixel(area, xDomain, cursor)} ${area.top}V${area.height - area.bottom}`} stroke="var(--ink)" strokeWidth="1.5" />}
            <text className="s" x={area.width - area.right} y={area.height + 12} textAnchor="end">{xUnit}</text>
          </svg>
        </div>
      </Figure>
    </div>
  )
}
