'use client'

import { memo, useMemo } from 'react'
import { EquationLink } from '@/components/method/equation-link'
import { LinePlot } from '@/components/plots/line-plot'
import { shownNumber } from '@/components/plots/shown-number'
import type { FigureData } from '@/components/ui/figure-data'
import type { PartName, Scenario, ScenarioParts } from '@/lib/calc/live'
import { partEquation } from '@/lib/method/anchors'
import { formatQuantity, unitOf, type UnitSystem } from '@/lib/units'
import { PartView } from './stale-part'

interface SpeedPlotsProps {
  parts: ScenarioParts
  stale: ReadonlySet<PartName>
  scenario: Scenario
  system: UnitSystem
  name: string
}

/** Every few samples make a table that can be read; the curve keeps them all. */
const tableEvery = 5

function StaggerPlot({ parts, stale, scenario, system, name }: SpeedPlotsProps) {
  const { stagger } = parts
  const curve = stagger.ok ? stagger.curve : null
  const series = useMemo(() => [{ name: 'B later', look: 'ink' as const, points: (curve ?? []).map(({ rpm, staggerDeg }) => ({ x: rpm, y: staggerDeg })) }], [curve])
  const data = useMemo<FigureData>(() => ({
    caption: 'Stagger against speed: primary less backup, plus when the backup fires later',
    columns: [
      { head: 'Speed', unit: 'rpm' }, { head: 'Crank', unit: '°', decimals: 1, signed: true }, { head: 'Distributor', unit: '°', decimals: 2, signed: true },
      { head: 'Time', unit: 'ms', decimals: 3, signed: true }, { head: 'On the plate', unit: unitOf('arc', system).symbol, decimals: 2, signed: true },
    ],
    rows: (curve ?? []).filter((point, i, all) => i % tableEvery === 0 || i === all.length - 1 || point.rpm === all[i + 1]?.rpm || point.rpm === all[i - 1]?.rpm)
      .map((point) => [Math.round(point.rpm), point.staggerDeg, point.staggerDistributorDeg, point.staggerMs, point.plateArcMm === null ? 'no radius' : shownNumber(point.plateArcMm, 'arc', system)]),
  }), [curve, system])
  const { crankingSlowestRpm, maxRpm } = scenario.engine
  return (
    <PartView name="stagger" part={stagger} stale={stale.has('stagger')}>
      {({ smallest, largest }) => (
        <LinePlot
          title="Stagger against speed" series={series} x={{ from: crankingSlowestRpm, to: maxRpm }} xUnit="rpm" yUnit="crank degrees, plus: backup later" signed csvName={`${name}-stagger`} data={data}
          sentence={`Stagger of the channels against speed, from ${formatQuantity(smallest.staggerDeg, 'angle', system, { sign: true }).text}° at ${Math.round(smallest.rpm)} rpm to ${formatQuantity(largest.staggerDeg, 'angle', system, { sign: true }).text}° at ${Math.round(largest.rpm)} rpm`}
        />
      )}
    </PartView>
  )
}

function PowerPlot({ parts, stale, system, name, kind }: SpeedPlotsProps & { kind: 'power' | 'torque' }) {
  const { power } = parts
  const curve = power.ok ? power.curve : null
  const series = useMemo(() => (['primary', 'backup'] as const).map((channel) => ({
    name: channel === 'primary' ? 'A' : 'B', look: channel === 'primary' ? 'A' as const : 'B' as const,
    points: (curve ?? []).map((point) => ({ x: point.rpm, y: shownNumber(kind === 'power' ? point[`${channel}Kw`] : point[`${channel}Nm`], kind, system) })),
  })), [curve, kind, system])
  const unit = unitOf(kind, system).symbol
  const data = useMemo<FigureData>(() => ({
    caption: `${kind === 'power' ? 'Power' : 'Torque'} against speed at each channel’s timing, full throttle`,
    columns: [{ head: 'Speed', unit: 'rpm' }, { head: 'A primary', channel: 'A', unit, decimals: 1 }, { head: 'B backup', channel: 'B', unit, decimals: 1 }],
    rows: (series[0]?.points ?? []).flatMap((point, i, all) => (i % tableEvery === 0 || i === all.length - 1 ? [[Math.round(point.x), point.y, series[1]?.points[i]?.y ?? null]] : [])),
  }), [series, kind, unit])
  const from = curve?.[0]?.rpm ?? 0
  const to = curve?.at(-1)?.rpm ?? 1
  return (
    <PartView name="power" part={power} stale={stale.has('power')}>
      {() => (
        <LinePlot title={kind === 'power' ? 'Power at full throttle' : 'Torque at full throttle'} series={series} x={{ from, to }} xUnit="rpm" yUnit={unit} csvName={`${name}-${kind}`} data={data} sentence={data.caption} withZero={kind === 'power'} />
      )}
    </PartView>
  )
}

/** Curves against speed, each with its numbers as a table and a file. */
export const SpeedPlots = memo(function SpeedPlots(props: SpeedPlotsProps) {
  return (
    <section aria-labelledby="curves-head">
      <header className="secline"><h2 id="curves-head">Curves against speed</h2><span className="right fine"><EquationLink id={partEquation.stagger} of="stagger against speed" /></span></header>
      <div className="curves">
        <StaggerPlot {...props} />
        <PowerPlot {...props} kind="power" />
        <PowerPlot {...props} kind="torque" />
      </div>
    </section>
  )
})
