'use client'

import { useMemo, type ReactNode } from 'react'
import { Figure } from '@/components/ui/figure'
import { KeyCap } from '@/components/ui/key-cap'
import { useWidth } from '@/components/ui/use-width'
import { AdvanceCurves, type AdvanceChannel, type SpeedMark } from './advance-curves'
import { AdvanceOverlay, type PlotNote } from './advance-overlay'
import { advanceTable } from './advance-table'
import { domainAround, niceStep, type PlotArea } from './scale'
import { Scrubber } from './scrubber'

export interface AdvancePlotProps {
  /** Kept the same object while nothing in it changes: moving the handle then redraws no curve. */
  channels: readonly AdvanceChannel[]
  marks: readonly SpeedMark[]
  fromRpm: number
  toRpm: number
  rpm: number
  onRpm: (rpm: number) => void
  at?: { A: number | null, B: number | null }
  notes?: readonly PlotNote[]
  title?: ReactNode
  sentence?: string
  csvName?: string
  height?: number
}

const noNotes: readonly PlotNote[] = []
/** Width a server draws for, px. */
const servedWidth = 572

/** Both channels' advance against speed; the speed axis is the scrubber. */
export function AdvancePlot({ channels, marks, fromRpm, toRpm, rpm, onRpm, at, notes = noNotes, title, sentence = 'Advance of both channels against speed', csvName = 'advance', height = 300 }: AdvancePlotProps) {
  const [ref, found] = useWidth<HTMLDivElement>()
  const width = found ?? servedWidth
  const area = useMemo<PlotArea>(() => ({ width, height, left: 38, right: 20, top: 8, bottom: 24 }), [width, height])
  const speed = useMemo(() => ({ from: fromRpm, to: toRpm }), [fromRpm, toRpm])
  const advance = useMemo(() => domainAround(channels.flatMap(({ rising, falling = [] }) => [...rising, ...falling].map(({ deg }) => deg)), { withZero: true }), [channels])
  const data = useMemo(() => advanceTable(channels, marks, speed), [channels, marks, speed])
  const speedStep = niceStep(toRpm - fromRpm, width < 420 ? 4 : 7)
  return (
    <div className="drawn" ref={ref}>
      <Figure
        title={title} sentence={sentence} data={data} csvName={csvName}
        keys={<span className="only-w"><KeyCap>←</KeyCap> <KeyCap>→</KeyCap> 10 rpm &nbsp; <KeyCap>1</KeyCap>–<KeyCap>{String(Math.max(1, Math.min(9, marks.length)))}</KeyCap> marked speeds</span>}
        controls={<Scrubber area={area} speed={speed} marks={marks} rpm={rpm} onRpm={onRpm} />}
      >
        <p className="fine">degrees before TDC</p>
        <div className="plot" style={{ height }}>
          <AdvanceCurves area={area} channels={channels} marks={marks} speed={speed} advance={advance} speedStep={speedStep} />
          <AdvanceOverlay area={area} channels={channels} speed={speed} advance={advance} rpm={rpm} at={at} notes={notes} />
        </div>
      </Figure>
    </div>
  )
}
