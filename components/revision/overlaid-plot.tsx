'use client'

import { useMemo } from 'react'
import { degAt } from '@/components/plots/curve'
import { LinePlot } from '@/components/plots/line-plot'
import type { FigureData } from '@/components/ui/figure-data'
import type { OverlaidCurve } from '@/lib/compare/overlaid-curves'

interface OverlaidPlotProps {
  curves: readonly OverlaidCurve[]
  /** What the curves say, in a sentence over them. */
  finding: string | null
  toRpm: number
  csvName: string
}

const nameOf = ({ channel, digit }: OverlaidCurve) => (digit === null ? `${channel}, the same in both` : `${channel} ${digit}`)
/** Speeds of the table, rpm apart. */
const tableStepRpm = 100

/** Advance curves of two revisions over each other, told apart by the digit at the line's end. */
export function OverlaidPlot({ curves, finding, toRpm, csvName }: OverlaidPlotProps) {
  const series = useMemo(() => curves.map((curve) => ({ name: nameOf(curve), look: curve.channel, points: curve.points.map(({ rpm, deg }) => ({ x: rpm, y: deg })) })), [curves])
  const data = useMemo<FigureData>(() => ({
    caption: 'Advance against speed in both revisions, degrees before top dead centre',
    columns: [{ head: 'Speed', unit: 'rpm' }, ...curves.map((curve) => ({ head: nameOf(curve), unit: '°', decimals: 1 }))],
    rows: Array.from({ length: Math.floor(toRpm / tableStepRpm) }, (_, i) => (i + 1) * tableStepRpm)
      .map((rpm) => [rpm, ...curves.map(({ points }) => degAt(points, rpm))])
      .filter((row) => row.slice(1).some((cell) => cell !== null)),
  }), [curves, toRpm])
  return (
    <LinePlot
      finding={finding} sentence={`${data.caption}: ${curves.map(nameOf).join('; ')}`} series={series} x={{ from: 0, to: toRpm }} xUnit="rpm" yUnit="degrees before TDC"
      csvName={csvName} data={data} height={320}
    />
  )
}
