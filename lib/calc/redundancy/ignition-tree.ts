import { CalcError } from '../calc-error'
import { takeNumber } from '../validate/number'
import { membersOf, takeList, takeRecord } from '../validate/shape'
import type { CommonCause, Exposure, FaultEvent, FaultGate, FaultTree } from './fault-tree-types'
import { takeCommonCauses } from './take-common-causes'
import { takeEvents, type ReadyEvent } from './take-event'
import { takeId } from './take-id'

export interface ChannelParts { readonly id: string, readonly parts: readonly FaultEvent[] }
export interface CylinderParts { readonly cylinder: number, readonly parts: readonly FaultEvent[] }

export interface IgnitionTreeInput {
  readonly channels: readonly [ChannelParts, ChannelParts]
  readonly common: readonly FaultEvent[]
  readonly cylinders: readonly CylinderParts[]
  readonly commonCause?: readonly CommonCause[]
}

export interface IgnitionTrees {
  readonly noSpark: FaultTree
  readonly channelLost: FaultTree
  /** `null` where no part belongs to a single cylinder. */
  readonly cylinderLost: FaultTree | null
}

const hint = ' A part that both channels share belongs to the common parts.'
const repeated = (field: string, value: unknown, message: string): CalcError => new CalcError({ field, value, limit: 'each once', unit: '', message })

const exposureOf = (exposure: Exposure): Exposure => {
  if (exposure.kind === 'flight') return { kind: exposure.kind, hours: exposure.hours }
  return exposure.kind === 'latent' ? { kind: exposure.kind, checkIntervalHours: exposure.checkIntervalHours } : { kind: exposure.kind, p: exposure.p }
}

/** A copy of what was checked, with nothing in it that an event does not have. */
const copyOf = ({ id, ratePerH, temperatureK, referenceK, activationEv, exposure }: FaultEvent): FaultEvent => ({
  id,
  ...(ratePerH === undefined ? {} : { ratePerH }),
  ...(temperatureK === undefined ? {} : { temperatureK, referenceK, activationEv }),
  exposure: exposureOf(exposure),
})

/** Parts of the whole ignition, each list checked, ids unique over all of them. */
const takeParts = (input: unknown): { events: Map<string, ReadyEvent>, channelIds: string[] } => {
  const { channels, common, cylinders } = membersOf(input)
  const events = new Map<string, ReadyEvent>()
  const take = (list: unknown, field: string, name: string, least: number): void =>
    takeEvents(takeList(list, field, name, least), field, events, () => false, hint)
  const channelList = takeList(channels, 'channels', 'The list of channels', 2)
  if (channelList.length !== 2) throw new CalcError({ field: 'channels', value: channels, limit: 'two channels', unit: '', message: `There must be two channels; ${channelList.length} were given.` })
  const channelIds = [0, 1].map((i) => {
    const members = takeRecord(channelList[i], `channels.${i}`, `Channel ${i + 1}`)
    const id = takeId(members.id, `channels.${i}.id`, `The id of channel ${i + 1}`)
    take(members.parts, `channels.${i}.parts`, `The list of parts of channel ${i + 1}`, 1)
    return id
  })
  if (channelIds[0] === channelIds[1]) throw repeated('channels.1.id', channelIds[1], 'The two channels need different ids.')
  take(common, 'common', 'The list of common parts', 0)
  const cylinderList = takeList(cylinders, 'cylinders', 'The list of cylinders', 0)
  const numbers = new Set<number>()
  for (let i = 0; i < cylinderList.length; i += 1) {
    const members = takeRecord(cylinderList[i], `cylinders.${i}`, `Entry ${i + 1} of the cylinders`)
    const cylinder = takeNumber(members.cylinder, `cylinders.${i}.cylinder`, { name: `The number of cylinder entry ${i + 1}`, unit: '', min: 1, integer: true })
    if (numbers.has(cylinder)) throw repeated(`cylinders.${i}.cylinder`, cylinder, `Cylinder ${cylinder} is listed twice.`)
    numbers.add(cylinder)
    take(members.parts, `cylinders.${i}.parts`, `The list of parts of cylinder ${cylinder}`, 0)
  }
  return { events, channelIds }
}

/**
 * The fault trees of a two-channel ignition: `{ noSpark, channelLost, cylinderLost }`, each a tree for the other functions; cylinderLost is `null` when no cylinder has parts of its own.
 *
 * noSpark = or(common parts, and(or(parts of channel 1), or(parts of channel 2))); channelLost = or(parts of both channels); cylinderLost = or(parts of all cylinders).
 * A common cause stands in each tree with those of its events that the tree has.
 *
 * Validity: either channel alone keeps every cylinder firing; a common part stops both. A part that several places share is a common part.
 * Source: common practice, no published source.
 *
 * @param input.channels two of `{ id, parts }`: ids that differ, parts events as in `eventProbability`, one at least, every id once over all lists
 * @param input.common events that stop both channels; the list may be empty
 * @param input.cylinders `{ cylinder, parts }[]`: a whole number ≥ 1, each once, and the events that silence that cylinder alone; lists may be empty
 * @param input.commonCause as in `faultTreeProbability`; none when left out
 * @throws CalcError on the place that cannot be used: `channels`, `channels.i.parts.j.id`, `common.i.ratePerH`, `cylinders.i.cylinder`, `commonCause.i.events.j`
 * @example
 * ignitionTree({ channels: [{ id: 'A', parts: [{ id: 'coil A', exposure: { kind: 'probability', p: 0.1 } }] }, { id: 'B', parts: [{ id: 'coil B', exposure: { kind: 'probability', p: 0.1 } }] }], common: [], cylinders: [] }).noSpark.gates[0] // → { id: 'no spark', kind: 'or', inputs: ['both channels'] }
 */
export const ignitionTree = (input: IgnitionTreeInput): IgnitionTrees => {
  const { events, channelIds } = takeParts(input)
  const { channels: [one, two], common, cylinders, commonCause = [] } = input
  const causes = takeCommonCauses(input.commonCause, 'commonCause', events, (id) => events.has(id))
  const causeIds = new Set(causes.map(({ id }) => id))
  const taken = new Set([...events.keys(), ...causeIds])
  const freeId = (wanted: string): string => {
    let id = wanted
    for (let n = 2; taken.has(id); n += 1) id = `${wanted} (${n})`
    taken.add(id)
    return id
  }
  const treeOf = (parts: readonly FaultEvent[], gates: readonly FaultGate[]): FaultTree => {
    const own = new Set(parts.map(({ id }) => id))
    const shared = commonCause.map((cause) => ({ id: cause.id, events: cause.events.filter((id) => own.has(id)), beta: cause.beta })).filter((cause) => cause.events.length > 0)
    return { top: gates[0]?.id ?? '', events: parts.map(copyOf), gates, ...(shared.length > 0 ? { commonCause: shared } : {}) }
  }
  const idsOf = (parts: readonly FaultEvent[]): string[] => parts.map(({ id }) => id)
  const or = (id: string, inputs: readonly string[]): FaultGate => ({ id, kind: 'or', inputs })

  const both = freeId('both channels')
  const [first, second] = [freeId(channelIds[0] ?? ''), freeId(channelIds[1] ?? '')]
  const channelParts = [...one.parts, ...two.parts]
  const cylinderParts = cylinders.flatMap(({ parts }) => parts)
  return {
    noSpark: treeOf([...common, ...channelParts], [
      or(freeId('no spark'), [...idsOf(common), both]),
      { id: both, kind: 'and', inputs: [first, second] },
      or(first, idsOf(one.parts)),
      or(second, idsOf(two.parts)),
    ]),
    channelLost: treeOf(channelParts, [or(freeId('channel lost'), idsOf(channelParts))]),
    cylinderLost: cylinderParts.length === 0 ? null : treeOf(cylinderParts, [or(freeId('cylinder lost'), idsOf(cylinderParts))]),
  }
}
