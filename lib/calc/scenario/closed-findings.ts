import type { Draft } from './draft'
import type { ChannelName, ScenarioParts } from './result-types'
import type { ReadyScenario } from './ready-scenario'
import { channelNames } from './speed-points'

/** Findings on coils, climb and redundancy. */
export function closedDrafts(scenario: ReadyScenario, parts: ScenarioParts): Draft[] {
  return [...channelNames.flatMap((channel) => coilDrafts(scenario, parts, channel)), ...climbDrafts(scenario, parts), ...redundancyDrafts(scenario, parts)]
}

function coilDrafts({ engine, sheet }: ReadyScenario, { coils }: ScenarioParts, channel: ChannelName): Draft[] {
  if (!coils.ok) return []
  const { windingK, powerW, currentA, periodShare } = coils[channel]
  const { dwellMs, ambientK } = sheet.coils[channel]
  const inputs = [`sheet.coils.${channel}.dwellMs`]
  return [
    { limitId: 'windingK', channel, value: windingK, data: { currentA, powerW, dwellMs, ambientK, rpm: engine.maxRpm }, inputs: [...inputs, `sheet.coils.${channel}.ambientK`], sourceIds: ['iec-60085'] },
    { limitId: 'periodShare', channel, value: periodShare, data: { dwellMs, sparkDurationMs: sheet.rotor.sparkDurationMs, rpm: engine.maxRpm }, inputs, sourceIds: ['trade'] },
  ]
}

function climbDrafts({ sheet }: ReadyScenario, { climb }: ScenarioParts): Draft[] {
  const row = climb.ok ? climb.rows.find(({ state }) => state === 'oneCold') : undefined
  if (!climb.ok || !row) return []
  return [{
    limitId: 'climbMps', channel: null, value: row.climbMps,
    data: { densityAltitudeM: climb.densityAltitudeM, massKg: sheet.airframe.massKg, powerKw: row.powerKw, rpm: row.rpm, ceilingM: row.ceilingM, verdict: row.verdict },
    inputs: ['sheet.airframe.massKg', 'sheet.conditions.pressureAltitudeM'], sourceIds: ['gagg-ferrar-1934', 'trade'],
  }]
}

function redundancyDrafts(_scenario: ReadyScenario, { redundancy }: ScenarioParts): Draft[] {
  const row = redundancy.ok ? redundancy.losses.find(({ loss }) => loss === 'noSpark') : undefined
  if (!redundancy.ok || !row) return []
  return [{
    limitId: 'noSparkPerH', channel: null, value: row.perHour,
    data: {
      lowPerHour: row.lowPerHour, highPerHour: row.highPerHour, checkIntervalHours: redundancy.checkIntervalHours,
      singlePoints: redundancy.singlePoints.map(({ id }) => id).join(', '), heatSensitive: redundancy.singlePoints.some(({ heatSensitive }) => heatSensitive),
    },
    inputs: ['sheet.redundancy.checkIntervalHours'], sourceIds: ['ac-23-1309-1e'],
  }]
}
