'use client'

import { memo, useMemo, useState } from 'react'
import { ContourPlot, type PlotRegion } from '@/components/plots/contour-plot'
import type { PlotPlace } from '@/components/plots/plot-points'
import { shownNumber } from '@/components/plots/shown-number'
import { ChoiceStrip } from '@/components/ui/choice-strip'
import { formatQuantityText, unitOf, type UnitSystem } from '@/lib/units'
import { placeShortWords, viewFinding, viewTitle } from '@/lib/words/spark-map-words'
import type { MapPoint } from '@/lib/workbench/spark-map/points'
import { limitLessBest, placesOf, type MapView } from '@/lib/workbench/spark-map/views'
import { mapTable } from './map-table'
import type { DrawnMap } from './use-spark-map'

interface SparkMapFigureProps {
  drawn: DrawnMap
  points: readonly MapPoint[]
  system: UnitSystem
  name: string
}

const views = (['spark', 'mbt', 'limit'] as const).map((value) => ({ value, label: viewTitle[value] }))

/** The map as lines of equal spark over speed and charge, the plan's own points on it. */
export const SparkMapFigure = memo(function SparkMapFigure({ drawn, points, system, name }: SparkMapFigureProps) {
  const [view, setView] = useState<MapView>('spark')
  const { map, pressures } = drawn
  const { symbol } = unitOf('pressure', system)
  const drawing = useMemo(() => {
    const places = placesOf(map, view)
    const region = (what: 'never' | 'always'): PlotRegion => ({ words: placeShortWords[what], isIn: (i, j) => places[i]?.[j] === what })
    return {
      grid: { x: map.rpm, y: map.pressureKpa.map((kpa) => shownNumber(kpa, 'pressure', system)), values: places.map((row) => row.map((place) => (typeof place === 'number' ? place : null))) },
      regions: [region('always'), region('never')],
    }
  }, [map, view, system])
  const border = useMemo(() => (view === 'spark' ? limitLessBest(map) : undefined), [map, view])
  const data = useMemo(() => mapTable(drawn, view, system), [drawn, view, system])
  const places = useMemo(() => points.map(({ name: word, rpm, pressureKpa, sparks }): PlotPlace => ({
    name: word, x: rpm, y: shownNumber(pressureKpa, 'pressure', system), marks: sparks.map(({ channel, deg }) => ({ channel, text: formatQuantityText(deg, 'angle', system) })),
  })), [points, system])
  return (
    <div className="map-drawing">
      <ChoiceStrip label="What is drawn" choices={views} value={view} onChoose={setView} />
      <ContourPlot
        title={`${viewTitle[view]}, degrees before TDC`} level={3} csvName={`${name}-map-${view}`}
        sentence={`${viewTitle[view]} over speed and charge pressure as contour lines`} finding={viewFinding(map, view, points, system)}
        {...drawing} border={border} places={places} labelUnit="°" xUnit="rpm" data={data}
        yTitle={`charge at inlet closing, ${symbol}`} beside={{ title: `in the manifold, ${symbol}`, perY: pressures.fullManifoldKpa / pressures.fullChargeKpa }}
      />
    </div>
  )
})
