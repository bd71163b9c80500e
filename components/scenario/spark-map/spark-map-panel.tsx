'use client'

import { useMemo, useState } from 'react'
import { Caution } from '@/components/ui/caution'
import { WithheldNote } from '@/components/ui/note'
import type { Limits, PartName, Scenario, ScenarioParts } from '@/lib/calc/live'
import type { ChannelPrefix } from '@/lib/schemas/scenario-fields'
import { formatQuantityText, type UnitSystem } from '@/lib/units'
import { detonationCaution } from '@/lib/words/detonation-words'
import { withheldWords } from '@/lib/words/parts'
import { dayWords } from '@/lib/words/spark-map-words'
import { sparkMapAxes } from '@/lib/workbench/spark-map/axes'
import { sparkMapPoints } from '@/lib/workbench/spark-map/points'
import { sparkMapKeyOf } from '@/lib/workbench/spark-map/request'
import { MapPointsLedger } from './map-points-ledger'
import { SparkMapCopy } from './spark-map-copy'
import { SparkMapFigure } from './spark-map-figure'
import { SparkMapRun } from './spark-map-run'
import { countsOf, firstSettings, SparkMapSettings } from './spark-map-settings'
import { useSparkMap, type DrawnMap } from './use-spark-map'

export interface SparkMapPanelProps {
  scenario: Scenario
  parts: ScenarioParts
  pending: ReadonlySet<PartName>
  limits: Limits
  system: UnitSystem
  /** For file names. */
  name: string
  /** What stands in each channel's map field. */
  typed: Record<ChannelPrefix, string>
  onUse: (channel: ChannelPrefix, text: string) => void
}

/** Spark over speed and charge, computed when asked, beside the page. */
export function SparkMapPanel({ scenario, parts, pending, limits, system, name, typed, onUse }: SparkMapPanelProps) {
  const [settings, setSettings] = useState(firstSettings)
  const counts = countsOf(settings, system)
  const sheetKey = useMemo(() => sparkMapKeyOf(scenario), [scenario])
  const choiceKey = JSON.stringify([settings.day, counts])
  const { run, drawn, start, cancel } = useSparkMap(sheetKey, choiceKey)
  const { detonation } = parts
  const isWithheld = !detonation.ok && detonation.error.code !== 'notComputed' && !pending.has('detonation')
  const onStart = () => {
    if (counts) start({ scenario, choice: { day: settings.day, ...sparkMapAxes(scenario.engine, scenario.sheet.manifold.fullKpa, counts) } })
  }
  const old = drawn === null ? null : drawn.sheetKey !== sheetKey ? 'the sheet has changed since' : drawn.choiceKey !== choiceKey ? 'other choices stand above' : null
  return (
    <div className="map-panel">
      <p className="fine">Best torque and the limit of detonation at every speed and charge, from the cycle calibrated above; the later of the two sets the spark. Computed in this browser when asked, and not stored.</p>
      <Caution>{detonationCaution}</Caution>
      <SparkMapSettings settings={settings} system={system} onChange={setSettings} />
      {isWithheld && !detonation.ok ? <WithheldNote title="No map"><p>{withheldWords('detonation', detonation.error).reason}</p></WithheldNote> : (
        <SparkMapRun run={run} off={counts ? null : 'a number of lines cannot be read'} onStart={onStart} onCancel={cancel} />
      )}
      {drawn ? <MapOnPage {...{ drawn, old, scenario, parts, system, name }} /> : null}
      {drawn ? <SparkMapCopy drawn={drawn} off={old} system={system} marginDeg={limits.detonationDeg.value} typed={typed} onUse={onUse} /> : null}
    </div>
  )
}

type MapOnPageProps = Pick<SparkMapPanelProps, 'scenario' | 'parts' | 'system' | 'name'> & { drawn: DrawnMap, old: string | null }

function MapOnPage({ drawn, old, scenario, parts, system, name }: MapOnPageProps) {
  const { speeds, detonation } = parts
  const points = useMemo(() => sparkMapPoints(scenario, { speeds, detonation }, drawn.pressures, drawn.day), [scenario, speeds, detonation, drawn])
  const { fullChargeKpa, fullManifoldKpa } = drawn.pressures
  const pressure = (kpa: number) => formatQuantityText(kpa, 'pressure', system)
  return (
    <div className={old ? 'stale' : undefined}>
      {old ? <p className="stale-word" role="status">This map is an older one: {old}. Compute it again.</p> : null}
      <SparkMapFigure drawn={drawn} points={points} system={system} name={name} />
      <MapPointsLedger drawn={drawn} points={points} system={system} />
      <p className="fine">
        With {dayWords(drawn.scenario.sheet, drawn.day, system)}. The points stand where the sheet’s manifold pressures put them{drawn.day === 'worse' && scenario.sheet.worse.denserKpa > 0 ? `, ${pressure(scenario.sheet.worse.denserKpa)} denser` : ''}. Above the dotted line detonation sets the spark, below it best torque.
        {' '}Burn angles follow speed to the power ⅓ and charge to the power −¼ from full power: from memory, not read. Charge at inlet closing is not manifold pressure: {pressure(fullManifoldKpa)} in the manifold is {pressure(fullChargeKpa)} of charge at full throttle, and the rest is taken in proportion.
      </p>
    </div>
  )
}
