import type { Draft } from './draft'
import type { ChannelName, ScenarioParts } from './result-types'
import type { ReadyScenario } from './ready-scenario'
import { channelNames } from './speed-points'

/** Findings of the cycle layer; a part that failed gives none. */
export function cycleDrafts(scenario: ReadyScenario, parts: ScenarioParts): Draft[] {
  return channelNames.flatMap((channel) => [...detonationDrafts(scenario, parts, channel), ...sparkDrafts(scenario, parts, channel)])
}

function detonationDrafts({ sheet }: ReadyScenario, { detonation, stack }: ScenarioParts, channel: ChannelName): Draft[] {
  if (!detonation.ok) return []
  const { planned, worse, perOctaneDeg, per10KDeg, per10KpaDeg } = detonation[channel]
  const { octaneUncertainty, anchored, gainDeg, gainOctane } = detonation
  return [{
    limitId: 'detonationDeg', channel, value: worse.marginDeg, low: worse.lowDeg,
    data: {
      rpm: worse.rpm, sparkDeg: worse.sparkDeg, limitDeg: worse.limitDeg, state: worse.state, plannedDeg: planned.marginDeg,
      lowDeg: worse.lowDeg, uncertaintyOctane: octaneUncertainty, octaneRequired: worse.octaneRequired, octane: sheet.fuel.worseOctane, scale: sheet.fuel.scale,
      perOctaneDeg, per10KDeg, per10KpaDeg, anchored, hotterK: sheet.worse.hotterK, denserKpa: sheet.worse.denserKpa,
      stackDeg: stack.ok ? stack.expandedDeg : null,
      ...(channel === 'backup' ? { gainDeg, gainOctane } : {}),
    },
    inputs: [`sheet.${channel}.schedule`, `sheet.${channel}.latencyUs`, 'sheet.fuel.worseOctane', 'sheet.worse.hotterK'],
    sourceIds: ['douaud-eyzat-1978', 'livengood-wu-1955'],
  }]
}

function sparkDrafts({ engine, sheet }: ReadyScenario, { spark }: ScenarioParts, channel: ChannelName): Draft[] {
  if (!spark.ok) return []
  const { ratio, crankingRatio, demandKv, offeredKv, crankingDemandKv, crankingOfferedKv } = spark[channel]
  const atCranking = crankingRatio < ratio
  return [{
    limitId: 'sparkVoltageRatio', channel, value: Math.min(ratio, crankingRatio),
    data: {
      atCranking, rpm: atCranking ? engine.crankingRpm : engine.maxRpm, gapMm: sheet.plugGapMm,
      demandKv: atCranking ? crankingDemandKv : demandKv, offeredKv: atCranking ? crankingOfferedKv : offeredKv,
    },
    inputs: [`sheet.coils.${channel}.dwellMs`, 'sheet.plugGapMm'], sourceIds: ['wadhwa'],
  }]
}
