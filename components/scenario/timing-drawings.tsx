'use client'

import { useMemo, useState } from 'react'
import { EquationLink } from '@/components/method/equation-link'
import { AdvancePlot } from '@/components/plots/advance-plot'
import type { AdvanceChannel, SpeedMark } from '@/components/plots/advance-curves'
import { WheelFigure } from '@/components/wheel/wheel-figure'
import { dependsOnPressure, findSpeedPoint, firingSchedule, type Engine, type PartName, type Scenario, type ScenarioResult, type SpeedPoint } from '@/lib/calc/live'
import { partEquation } from '@/lib/method/anchors'
import { formatQuantityText, type UnitSystem } from '@/lib/units'
import { scheduleKinds } from '@/lib/schemas/scenario-fields'
import { PartView } from './stale-part'

interface TimingDrawingsProps {
  scenario: Scenario
  /** Of the newest edit: the wheel follows it in the same frame. */
  result: ScenarioResult
  /** A frame later: the curves. */
  deferred: ScenarioResult
  stale: ReadonlySet<PartName>
  system: UnitSystem
  /** For file names. */
  name: string
}

const kindName = (kind: string) => scheduleKinds.find(({ value }) => value === kind)?.label ?? kind
const roundUp = (rpm: number) => Math.ceil(rpm / 100) * 100

function speedMarks(engine: Engine, runUpRpm: number): SpeedMark[] {
  return [{ label: 'crank', rpm: engine.crankingRpm }, { label: 'idle', rpm: engine.idleRpm }, { label: 'run-up', rpm: runUpRpm }, { label: 'full power', rpm: engine.maxRpm }]
}

function drawnChannels(curves: ScenarioResult['parts']['curves'], primaryKind: string, backupKind: string): AdvanceChannel[] {
  if (!curves.ok) return []
  const { rising, falling } = curves
  return [
    { channel: 'A', name: `A primary, ${kindName(primaryKind)}`, rising: rising.primary, ...(falling.primary ? { falling: falling.primary } : {}) },
    { channel: 'B', name: `B backup, ${kindName(backupKind)}`, rising: rising.backup, ...(falling.backup ? { falling: falling.backup } : {}) },
  ]
}

const cylindersOf = (engine: Engine) => firingSchedule({ firingOrder: engine.firingOrder, ...(engine.intervalsDeg ? { intervalsDeg: engine.intervalsDeg } : {}) })
  .map(({ cylinder, atDeg }) => ({ label: String(cylinder), atDeg }))

/** The degree wheel at the chosen speed and the advance curves; the speed axis of the plot chooses. */
export function TimingDrawings({ scenario, result, deferred, stale, system, name }: TimingDrawingsProps) {
  const { engine, sheet } = scenario
  const [chosen, setChosen] = useState<number | null>(null)
  const rpm = chosen ?? engine.maxRpm
  const point = useMemo(() => findSpeedPoint(scenario, rpm), [scenario, rpm])
  const cylinders = useMemo(() => cylindersOf(engine), [engine])
  // The curves are redrawn when they change, a frame after the wheel, and not for another reason.
  const { curves } = deferred.parts
  const primaryKind = sheet.primary.schedule.kind
  const backupKind = sheet.backup.schedule.kind
  const channels = useMemo(() => drawnChannels(curves, primaryKind, backupKind), [curves, primaryKind, backupKind])
  const marks = useMemo(() => speedMarks(engine, sheet.runUpRpm), [engine, sheet.runUpRpm])
  const followsPressure = dependsOnPressure(sheet.primary) || dependsOnPressure(sheet.backup)
  const fullPressure = formatQuantityText(sheet.manifold.fullKpa, 'pressure', system)
  const unreadable = stale.has('curves')
  return (
    <div className="two">
      <div className={unreadable ? 'stale' : undefined}>
        <WheelFigure
          csvName={`${name}-wheel`} rpm={rpm} rotation={engine.crankRotation} cylindersAt={cylinders}
          primaryDeg={point?.primaryDeg ?? null} backupDeg={point?.backupDeg ?? null} staggerDeg={point?.staggerDeg ?? null} staggerMs={point?.staggerMs ?? null}
        />
        <SpeedLine point={point} system={system} />
      </div>
      <PartView name="curves" part={result.parts.curves} stale={unreadable}>
        {() => (
          <>
            <AdvancePlot
              title="Advance against speed" channels={channels} marks={marks} fromRpm={0} toRpm={roundUp(engine.maxRpm * 1.08)} rpm={rpm} onRpm={setChosen}
              at={{ A: point?.primaryDeg ?? null, B: point?.backupDeg ?? null }} csvName={`${name}-advance`}
            />
            {followsPressure ? <p className="fine">Drawn at full-throttle manifold pressure, {fullPressure}; idle and run-up figures use their own.</p> : null}
          </>
        )}
      </PartView>
    </div>
  )
}

/** The chosen speed's stagger in all its units. */
function SpeedLine({ point, system }: { point: SpeedPoint | null, system: UnitSystem }) {
  if (!point) return <p className="fine" role="status">No figures at this speed: a channel cannot be computed here.</p>
  const parts = [
    `${formatQuantityText(point.staggerDeg, 'angle', system, { sign: true })} crank`,
    `${formatQuantityText(point.staggerDistributorDeg, 'distributorAngle', system, { sign: true, decimals: 2 })} distributor`,
    formatQuantityText(point.staggerMs, 'timeMs', system, { sign: true }),
    ...(point.plateArcMm === null ? [] : [`${formatQuantityText(point.plateArcMm, 'arc', system, { sign: true })} on the plate`]),
  ]
  return <p className="fine speedline">Stagger, plus: the backup later. {parts.join(' · ')} <EquationLink id={partEquation.curves} of="the advance of a channel" /></p>
}
