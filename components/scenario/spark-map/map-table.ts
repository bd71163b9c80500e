import { shownNumber } from '@/components/plots/shown-number'
import type { FigureData } from '@/components/ui/figure-data'
import { manifoldKpaFromCharge } from '@/lib/calc/live'
import { formatNumber, unitOf, type UnitSystem } from '@/lib/units'
import { placeLongWords, viewTitle } from '@/lib/words/spark-map-words'
import { placesOf, type MapView } from '@/lib/workbench/spark-map/views'
import type { DrawnMap } from './use-spark-map'

/** A map in numbers: speeds down, charge pressures across, the manifold pressures they stand for in the first line. */
export function mapTable({ map, pressures }: DrawnMap, view: MapView, system: UnitSystem): FigureData {
  const { symbol, decimals } = unitOf('pressure', system)
  const shown = (kpa: number) => formatNumber(shownNumber(kpa, 'pressure', system), Math.max(1, decimals))
  const words = (place: number | 'never' | 'always') => (typeof place === 'number' ? place : placeLongWords[place])
  return {
    caption: `${viewTitle[view]} in degrees before top dead centre: speed in rpm down, charge pressure at inlet closing across`,
    columns: [{ head: 'Speed', unit: 'rpm' }, ...map.pressureKpa.map((kpa) => ({ head: shown(kpa), unit: symbol, decimals: 1 }))],
    rows: [
      ['in the manifold', ...map.pressureKpa.map((chargeKpa) => shown(manifoldKpaFromCharge({ chargeKpa, ...pressures })))],
      ...placesOf(map, view).map((row, i) => [map.rpm[i] ?? 0, ...row.map(words)]),
    ],
  }
}
