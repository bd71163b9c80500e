import { Ledger } from '@/components/ui/ledger'
import { ScrollBox } from '@/components/ui/scroll-box'
import { ChannelChip } from '@/components/ui/channel-chip'
import { manifoldKpaFromCharge } from '@/lib/calc/live'
import { formatQuantityText, type UnitSystem } from '@/lib/units'
import type { MapPoint } from '@/lib/workbench/spark-map/points'
import { valueAt } from '@/lib/workbench/spark-map/views'
import type { DrawnMap } from './use-spark-map'

interface MapPointsLedgerProps {
  drawn: DrawnMap
  points: readonly MapPoint[]
  system: UnitSystem
}

/** The plan's points in numbers, beside what the map has there. */
export function MapPointsLedger({ drawn: { map, pressures }, points, system }: MapPointsLedgerProps) {
  const angle = (deg: number | null | undefined, missing: string) => (deg === null || deg === undefined ? missing : formatQuantityText(deg, 'angle', system))
  return (
    <ScrollBox label="The plan on the map">
      <Ledger
        className="wide" caption="Points of the plan: speed, charge and manifold pressure, the map’s spark and each channel’s"
        columns={[
          { head: 'point' }, { head: 'speed', right: true }, { head: 'charge', right: true }, { head: 'manifold', right: true }, { head: 'map', right: true },
          { head: <ChannelChip key="a" channel="A" spoken />, right: true }, { head: <ChannelChip key="b" channel="B" spoken />, right: true },
        ]}
        rows={points.map((point) => {
          const { name, rpm, pressureKpa, sparks } = point
          const own = (channel: 'A' | 'B') => angle(sparks.find((spark) => spark.channel === channel)?.deg, '')
          return {
            key: `${name} ${rpm} ${pressureKpa}`,
            cells: [
              name, formatQuantityText(rpm, 'engineSpeed', system), formatQuantityText(pressureKpa, 'pressure', system),
              formatQuantityText(manifoldKpaFromCharge({ chargeKpa: pressureKpa, ...pressures }), 'pressure', system),
              angle(valueAt(map, 'spark', rpm, pressureKpa), 'not on it'), own('A'), own('B'),
            ],
          }
        })}
      />
    </ScrollBox>
  )
}
