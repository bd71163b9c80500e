import { staggerReport } from '../advance/stagger-report'
import type { Limits } from '../limits'
import { rankFindings, toFindings, type Draft } from './draft'
import type { ChannelName, CurvePoint, Finding, PerChannel, ScenarioParts } from './result-types'
import type { ReadyScenario } from './ready-scenario'
import type { Scenario } from './scenario-types'
import { closedDrafts } from './closed-findings'
import { channelNames, dependsOnPressure } from './speed-points'

/** Speeds looked at between slowest and fastest cranking, rpm apart. */
const crankingStepRpm = 5

const scheduleInputs = (channel: ChannelName) => [`sheet.${channel}.schedule`, `sheet.${channel}.latencyUs`]

/** Pressures (kPa) a pressure-following channel is judged at; the others need one only. */
function pressuresOf({ sheet }: Scenario): number[] {
  const { idleKpa, runUpKpa, fullKpa } = sheet.manifold
  return channelNames.some((channel) => dependsOnPressure(sheet[channel])) ? [fullKpa, runUpKpa, idleKpa] : [fullKpa]
}

/** Greatest advance while the starter turns: slow cranking of a weak battery to the fastest, before and after a first fire. */
function crankingDraft(scenario: ReadyScenario, channel: ChannelName, stackDeg: number | null): Draft {
  const { crankingSlowestRpm, crankingFastestRpm } = scenario.engine
  const steps = Math.ceil((crankingFastestRpm - crankingSlowestRpm) / crankingStepRpm)
  let worst = { rpm: crankingSlowestRpm, deg: -Infinity, released: false }
  for (const kpa of pressuresOf(scenario)) for (const trend of ['rising', 'falling'] as const) for (let i = 0; i <= steps; i += 1) {
    const rpm = i === steps ? crankingFastestRpm : crankingSlowestRpm + i * crankingStepRpm
    const deg = scenario.advance(channel, rpm, kpa, trend)
    if (deg > worst.deg + 1e-12) worst = { rpm, deg, released: trend === 'falling' }
  }
  return {
    limitId: 'crankingAdvanceDeg', channel, value: worst.deg,
    data: { stackDeg, rpm: worst.rpm, released: worst.released, slowestRpm: crankingSlowestRpm, fastestRpm: crankingFastestRpm },
    inputs: [...scheduleInputs(channel), `sheet.${channel}.crankRetard.byDeg`, 'engine.crankingSlowestRpm', 'engine.crankingFastestRpm'],
    sourceIds: ['trade'],
  }
}

/** The retard's band between cranking and idle: its lower edge above the fastest cranking, its upper edge below the slowest idle. */
function retardDrafts({ engine, sheet }: Scenario, channel: ChannelName): Draft[] {
  const retard = sheet[channel].crankRetard
  if (!retard || retard.byDeg === 0) return []
  const hysteresisRpm = retard.hysteresisRpm ?? 0
  const shared = { channel, inputs: [`sheet.${channel}.crankRetard.belowRpm`], sourceIds: ['trade'] }
  return [
    {
      ...shared, limitId: 'retardAboveCrankingRpm', value: retard.belowRpm - hysteresisRpm - engine.crankingFastestRpm,
      data: { belowRpm: retard.belowRpm, hysteresisRpm, fastestRpm: engine.crankingFastestRpm, byDeg: retard.byDeg },
    },
    {
      ...shared, limitId: 'retardBelowIdleRpm', value: engine.idleSlowestRpm - retard.belowRpm,
      data: { belowRpm: retard.belowRpm, slowestRpm: engine.idleSlowestRpm, byDeg: retard.byDeg },
    },
  ]
}

/** Most advance beyond best torque from idle up, at full throttle and without retard. */
function beyondMbtDraft({ sheet }: Scenario, channel: ChannelName, curve: CurvePoint[], idleRpm: number, stackDeg: number | null): Draft {
  let worst = curve.at(-1) ?? { rpm: idleRpm, deg: -Infinity }
  for (const point of curve) if (point.rpm >= idleRpm && point.deg > worst.deg + 1e-12) worst = point
  return {
    limitId: 'beyondMbtDeg', channel, value: worst.deg - sheet.mbt.deg,
    data: { stackDeg, rpm: worst.rpm, deg: worst.deg, mbtDeg: sheet.mbt.deg, provenance: sheet.mbt.provenance },
    inputs: [...scheduleInputs(channel), 'sheet.mbt.deg'], sourceIds: ['heywood-1988', 'crossley-cook-1991'],
  }
}

/** Smallest stagger over cranking to full power, both ways of the hysteresis, at every pressure that matters. */
function backupFirstDraft(scenario: ReadyScenario, stackDeg: number | null): Draft {
  const { engine, sheet } = scenario
  const reports = pressuresOf(scenario).flatMap((mapKpa) => (['rising', 'falling'] as const).map((trend) => staggerReport(sheet.primary, sheet.backup, {
    crankingRpm: engine.crankingSlowestRpm, idleRpm: engine.idleRpm, maxRpm: engine.maxRpm, mapKpa, trend,
  }).smallest))
  const smallest = reports.reduce((least, point) => (point.staggerDeg < least.staggerDeg - 1e-12 ? point : least))
  return {
    limitId: 'backupFirstDeg', channel: null, value: smallest.staggerDeg, data: { stackDeg, rpm: smallest.rpm, staggerMs: smallest.staggerMs },
    inputs: ['sheet.primary.schedule', 'sheet.backup.schedule'], sourceIds: ['trade'],
  }
}

function proofDraft(scenario: Scenario, channel: ChannelName, proof: { rpm: PerChannel<number | null>; toleranceDeg: number }, limits: Limits): Draft {
  const { engine, sheet } = scenario
  return {
    limitId: 'proofAboveIdleRpm', channel, value: proof.rpm[channel], limit: engine.idleRpm + limits.proofAboveIdleRpm.value,
    data: { idleRpm: engine.idleRpm, maxRpm: engine.maxRpm, toleranceDeg: proof.toleranceDeg, followsPressure: dependsOnPressure(sheet[channel]) },
    // The retard stands in the way only where it acts above idle.
    inputs: [...scheduleInputs(channel), ...((sheet[channel].crankRetard?.belowRpm ?? 0) > engine.idleRpm ? [`sheet.${channel}.crankRetard.belowRpm`] : []), 'sheet.tolerances.timingCheckDeg', 'engine.idleRpm'], sourceIds: ['trade'],
  }
}

/** Every finding the computed parts allow; a part that failed gives none. */
function drafts(scenario: ReadyScenario, parts: ScenarioParts, limits: Limits): Draft[] {
  const { engine, sheet } = scenario
  const { curves, power, register, leads, proof, marks } = parts
  const list: Draft[] = []
  const stackDeg = parts.stack.ok ? parts.stack.expandedDeg : null
  const add = (compute: () => Draft | Draft[]) => list.push(...[compute()].flat())
  for (const channel of channelNames) {
    if (!curves.ok) continue
    add(() => beyondMbtDraft(scenario, channel, curves.falling[channel] ?? curves.rising[channel], engine.idleSlowestRpm, stackDeg))
    add(() => crankingDraft(scenario, channel, stackDeg))
    add(() => retardDrafts(scenario, channel))
  }
  if (curves.ok && parts.stagger.ok) add(() => backupFirstDraft(scenario, parts.stack.ok ? parts.stack.staggerExpandedDeg : null))
  if (power.ok) add(() => ({
    limitId: 'backupPowerRatio', channel: 'backup', value: power.backupToPrimary,
    data: { rpm: engine.maxRpm, primaryKw: power.atMax.primaryKw, backupKw: power.atMax.backupKw, shortOfMbtDeg: power.shortOfMbtDeg.backup },
    inputs: ['sheet.backup.schedule', 'sheet.mbt.deg'], sourceIds: ['heywood-1988', 'crossley-cook-1991', 'trade'],
  }))
  if (proof.ok) for (const channel of channelNames) add(() => proofDraft(scenario, channel, proof, limits))
  if (register.ok) for (const channel of channelNames) {
    const { rpm, registerDeg, freeDeg, endOffsetDeg } = register.worst[channel]
    const phasedAtDeg = channel === 'backup' && sheet.distribution === 'capEach' ? sheet.rotor.backupPhasedAtDeg : sheet.rotor.phasedAtDeg
    const shared = { channel, data: { rpm, endOffsetDeg, phasedAtDeg, bestPhasingDeg: register.bestPhasingDeg[channel], sparkDurationMs: sheet.rotor.sparkDurationMs }, inputs: [channel === 'backup' && sheet.distribution === 'capEach' ? 'sheet.rotor.backupPhasedAtDeg' : 'sheet.rotor.phasedAtDeg'], sourceIds: ['trade'] }
    add(() => [{ ...shared, limitId: 'registerDeg', value: registerDeg }, { ...shared, limitId: 'freeDeg', value: freeDeg }])
  }
  if (leads.ok) add(() => ({
    limitId: 'leadsOutOfPlace', channel: null, value: leads.outOfPlace,
    data: { expected: leads.expected.join(' '), actual: leads.actual.join(' '), rotation: engine.distributorRotation },
    inputs: ['engine.capTerminals', 'engine.firingOrder', 'engine.distributorRotation'], sourceIds: ['trade'],
  }))
  list.push(...closedDrafts(scenario, parts))
  if (marks.ok) add(() => ({
    limitId: 'markSpacingMm', channel: null, value: marks.mmPerDeg, data: { diameterMm: engine.damperDiameterMm },
    inputs: ['engine.damperDiameterMm'], sourceIds: ['timing-arithmetic'],
  }))
  return list
}

/** Findings that the closed forms give, ranked. */
export const findingsOf = (scenario: ReadyScenario, parts: ScenarioParts, limits: Limits): Finding[] =>
  rankFindings(toFindings(drafts(scenario, parts, limits), limits))
