'use client'

import { useState } from 'react'
import { AdvancePlot } from '@/components/plots/advance-plot'
import type { AdvanceChannel } from '@/components/plots/advance-curves'
import { LinePlot } from '@/components/plots/line-plot'
import type { PlotSeries } from '@/components/plots/line-curves'
import { Section } from '@/components/ui/section'

const advanceA = (rpm: number, below: number) => 27.2 + Math.min(1.4, Math.max(0, (rpm - 1000) / 900)) - (rpm < below ? 8 : 0)
const speeds = Array.from({ length: 31 }, (_, index) => 100 + index * 100)
const curve = (below: number) => [...speeds.filter((rpm) => rpm < below).map((rpm) => ({ rpm, deg: advanceA(rpm, below) })), { rpm: below, deg: advanceA(below - 1, below) }, ...[below, ...speeds.filter((rpm) => rpm > below)].map((rpm) => ({ rpm, deg: advanceA(rpm, below) }))]

const channels: AdvanceChannel[] = [
  { channel: 'A', name: 'A primary', rising: curve(450), falling: curve(380) },
  { channel: 'B', name: 'B backup, fixed', rising: [{ rpm: 100, deg: 17 }, { rpm: 3100, deg: 17 }] },
]
const marks = [{ label: 'cranking', rpm: 190 }, { label: 'idle', rpm: 820 }, { label: 'run-up', rpm: 1700 }, { label: 'climb', rpm: 2780 }]
const notes = [{ rpm: 450, deg: 23, text: '−8° below 450' }]
const speed = { from: 0, to: 3200 }
const stagger: PlotSeries[] = [{ name: 'stagger', look: 'ink', points: speeds.map((x) => ({ x, y: advanceA(x, 450) - 17 })) }]
const power: PlotSeries[] = [
  { name: 'A', look: 'A', points: speeds.map((x) => ({ x, y: x < 1000 ? null : 52 * Math.sin((x / 3300) * 1.5) })) },
  { name: 'B', look: 'B', points: speeds.map((x) => ({ x, y: x < 1000 ? null : 48 * Math.sin((x / 3300) * 1.5) })) },
]

/** A stagger at a limit of 9°. */
const levels = [{ y: 9, label: 'at most 9.0°' }]

export function PlotPieces() {
  const [rpm, setRpm] = useState(2780)
  return (
    <Section title="Plots">
      <div className="cols desk:grid-cols-2 pt-3">
        <AdvancePlot title="Advance against speed" channels={channels} marks={marks} notes={notes} fromRpm={0} toRpm={3200} rpm={rpm} onRpm={setRpm} />
        <div className="grid gap-4">
          <LinePlot title="Stagger against speed" sentence="Stagger against speed" series={stagger} x={speed} xUnit="rpm" yUnit="crank degrees" withZero={false} levels={levels} cursor={rpm} csvName="stagger" />
          <LinePlot title="Power" finding="On the backup alone the engine makes 4 kW less." sentence="Power on each channel against speed" series={power} x={speed} xUnit="rpm" yUnit="kW" cursor={rpm} csvName="power" />
        </div>
      </div>
    </Section>
  )
}
