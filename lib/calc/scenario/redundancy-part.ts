import { eventProbability } from '../redundancy/event-probability'
import type { Exposure, FaultEvent, FaultTree } from '../redundancy/fault-tree-types'
import { ignitionTree, type IgnitionTrees } from '../redundancy/ignition-tree'
import { minimalCutSets } from '../redundancy/minimal-cut-sets'
import { singlePoints } from '../redundancy/single-points'
import { timeAveragedProbability } from '../redundancy/time-averaged-probability'
import type { LossRow, PartFigures } from './result-types'
import type { RedundancyPart, Scenario } from './scenario-types'

/** Parts that heat shortens; the others leave it alone. */
const heated: ReadonlySet<RedundancyPart> = new Set(['trigger', 'module', 'coil'])

/** Each guessed rate at a tenth and ten times: what the answer rests on. */
const spread = [1, 0.1, 10] as const

/** The newest answer with what it stands on: most edits of a sheet leave the chain as it is, and its diagrams are the dearest of the closed forms. */
let newest: { readonly key: string, readonly figures: PartFigures<'redundancy'> } | null = null

/** Chances of losing all spark, a channel, a cylinder, an hour of flight; from the chain of parts as the sheet describes it. */
export function redundancyPart(scenario: Scenario): PartFigures<'redundancy'> {
  const { distribution, selection, redundancy } = scenario.sheet
  const key = JSON.stringify([scenario.engine.cylinders, distribution, selection, redundancy])
  if (newest?.key !== key) newest = { key, figures: computeRedundancy(scenario) }
  return structuredClone(newest.figures)
}

function computeRedundancy(scenario: Scenario): PartFigures<'redundancy'> {
  const { redundancy } = scenario.sheet
  const trees = spread.map((factor) => treesOf(scenario, factor))
  const rows = trees.map((tree) => chances(tree, redundancy.flightHours))
  const noSpark = trees[0]?.noSpark ?? treesOf(scenario, 1).noSpark
  const row = (loss: LossRow['loss']): LossRow => ({ loss, perHour: rows[0]?.[loss] ?? 0, lowPerHour: rows[1]?.[loss] ?? 0, highPerHour: rows[2]?.[loss] ?? 0 })
  return {
    losses: [row('noSpark'), row('channelLost'), row('cylinderLost')],
    cutSets: minimalCutSets(noSpark).length, singlePoints: singlePoints(noSpark),
    checkIntervalHours: redundancy.checkIntervalHours,
  }
}

/**
 * Losing all spark takes a channel that failed unseen since its last check. Losing one channel or one cylinder counts in the flight it happens in:
 * there the same parts stand in one series, each at its chance in that flight.
 */
function chances({ noSpark, channelLost, cylinderLost }: IgnitionTrees, hours: number): Record<LossRow['loss'], number> {
  const series = (tree: FaultTree | null) => -Math.expm1((tree?.events ?? []).reduce(
    (sum, event) => sum + Math.log1p(-eventProbability({ ...event, exposure: { kind: 'flight', hours } })), 0,
  ))
  return { noSpark: timeAveragedProbability(noSpark) / hours, channelLost: series(channelLost) / hours, cylinderLost: series(cylinderLost) / hours }
}

/** The two chains from supply to plug. With one channel in use the other fails unseen; with both in use either does, the other hides it. */
function treesOf({ engine, sheet }: Scenario, factor: number): IgnitionTrees {
  const { ratesPerH, hotK, referenceK, activationEv, sharedSupply, sharedCoil, flightHours, checkIntervalHours } = sheet.redundancy
  const flight: Exposure = { kind: 'flight', hours: flightHours }
  const latent: Exposure = { kind: 'latent', checkIntervalHours: Math.max(checkIntervalHours, flightHours) }
  const event = (id: string, part: RedundancyPart, exposure: Exposure): FaultEvent => ({
    id, ratePerH: ratesPerH[part] * factor, exposure,
    ...(heated.has(part) ? { temperatureK: hotK, referenceK, activationEv } : {}),
  })
  const shared = (part: RedundancyPart): boolean =>
    ((part === 'supply' || part === 'switch') && sharedSupply) || (part === 'coil' && sharedCoil) || (part === 'cap' && sheet.distribution === 'sharedCap')
  const chain = (['supply', 'switch', 'trigger', 'module', 'coil', ...(sheet.distribution === 'directCoils' ? [] : ['cap' as const])] as const)
  const channel = (letter: 'A' | 'B') => ({
    id: `channel ${letter}`,
    parts: chain.filter((part) => !shared(part)).map((part) => event(`${part} ${letter}`, part, letter === 'B' || sheet.selection === 'both' ? latent : flight)),
  })
  return ignitionTree({
    channels: [channel('A'), channel('B')],
    common: chain.filter(shared).map((part) => event(part, part, flight)),
    cylinders: Array.from({ length: engine.cylinders }, (_, i) => ({ cylinder: i + 1, parts: [event(`lead and plug ${i + 1}`, 'plug', flight)] })),
  })
}
