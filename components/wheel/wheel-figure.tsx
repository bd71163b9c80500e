'use client'

import { Figure } from '@/components/ui/figure'
import type { FigureData } from '@/components/ui/figure-data'
import { formatNumber } from '@/lib/units'
import { DegreeWheel, type DegreeWheelProps } from './degree-wheel'
import { wheelSentence } from './words'

/** Where both channels fire each cylinder, crank degrees of the cycle; the first one's sparks stand before 0. */
export function wheelTable({ rpm, primaryDeg, backupDeg, cylindersAt }: Pick<DegreeWheelProps, 'rpm' | 'primaryDeg' | 'backupDeg' | 'cylindersAt'>): FigureData {
  const fires = (atDeg: number, advance: number | null) => (advance === null ? null : atDeg - advance)
  return {
    caption: `Where each cylinder fires at ${formatNumber(rpm, 0)} rpm, crank degrees of the cycle`,
    columns: [{ head: 'Cylinder' }, { head: 'Top dead centre', unit: '°', decimals: 1 }, { head: 'A fires', channel: 'A', unit: '°', decimals: 1 }, { head: 'B fires', channel: 'B', unit: '°', decimals: 1 }],
    rows: cylindersAt.map(({ label, atDeg }) => [label, atDeg, fires(atDeg, primaryDeg), fires(atDeg, backupDeg)]),
  }
}

/** The wheel with its numbers one key away. */
export function WheelFigure({ csvName, title, ...wheel }: DegreeWheelProps & { csvName: string, title?: string }) {
  return <Figure title={title} sentence={wheelSentence(wheel)} data={wheelTable(wheel)} csvName={csvName}><DegreeWheel {...wheel} /></Figure>
}
