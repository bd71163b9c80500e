import { CalcError } from '../calc-error'
import { takeNumber } from '../validate/number'
import { takeChoice, takeList, takeRecord } from '../validate/shape'
import { loadOf } from './exposure-probability'
import { gateOrder } from './gate-order'
import { takeCommonCauses, type ReadyCause } from './take-common-causes'
import type { Leaf, ReadyGate, ReadyTree } from './ready-tree'
import { takeEvents, type ReadyEvent } from './take-event'
import { idTwice, takeId } from './take-id'

const idsOfGates = (list: readonly unknown[]): string[] => {
  const ids = new Set<string>()
  for (let i = 0; i < list.length; i += 1) {
    const id = takeId(takeRecord(list[i], `tree.gates.${i}`, `Gate ${i + 1}`).id, `tree.gates.${i}.id`, `The id of gate ${i + 1}`)
    if (ids.has(id)) throw idTwice(`tree.gates.${i}.id`, id)
    ids.add(id)
  }
  return [...ids]
}

const takeGate = (value: unknown, i: number, places: ReadonlyMap<string, number>): ReadyGate => {
  const field = `tree.gates.${i}`
  const members = takeRecord(value, field, `Gate ${i + 1}`)
  const kind = takeChoice(members.kind, `${field}.kind`, `The kind of gate ${i + 1}`, ['and', 'or', 'atLeast'])
  const list = takeList(members.inputs, `${field}.inputs`, `The list of inputs of gate ${i + 1}`, 1)
  const inputs: number[] = []
  for (let j = 0; j < list.length; j += 1) {
    const id = takeId(list[j], `${field}.inputs.${j}`, `Input ${j + 1} of gate ${i + 1}`)
    inputs.push(placeOf(id, `${field}.inputs.${j}`, `Input ${j + 1} of gate ${i + 1}`, places))
  }
  if (kind !== 'atLeast') return { kind, k: kind === 'or' ? 1 : inputs.length, inputs }
  const k = takeNumber(members.k, `${field}.k`, { name: `The number of inputs of gate ${i + 1} that must fail`, unit: '', min: 1, max: inputs.length, integer: true })
  return { kind, k, inputs }
}

const placeOf = (id: string, field: string, name: string, places: ReadonlyMap<string, number>): number => {
  const place = places.get(id)
  if (place !== undefined) return place
  throw new CalcError({ field, value: id, limit: 'the id of an event or a gate', unit: '', message: `${name} is “${id.slice(0, 60)}”, which is neither an event nor a gate of the tree.` })
}

const leavesOf = (events: ReadonlyMap<string, ReadyEvent>, causes: readonly ReadyCause[], causeOf: number[]): Leaf[] => {
  const shares = new Array<number>(events.size).fill(1)
  const leafOf = (id: string, { exposure, heatSensitive }: ReadyEvent, share: number): Leaf => ({
    id, heatSensitive, load: loadOf(exposure, share), intervalHours: exposure.kind === 'latent' ? exposure.hours : null,
  })
  causes.forEach(({ beta, events: places }, i) => {
    for (const place of places) {
      causeOf[place] = events.size + i
      shares[place] = 1 - beta
    }
  })
  const ready = [...events.values()]
  return [
    ...[...events].map(([id, event], place) => leafOf(id, event, shares[place] ?? 1)),
    ...causes.flatMap(({ id, beta, events: places }) => {
      const members = places.flatMap((place) => ready[place] ?? [])
      const [first] = members
      return first ? [leafOf(id, { exposure: first.exposure, heatSensitive: members.some(({ heatSensitive }) => heatSensitive) }, beta)] : []
    }),
  ]
}

/** Checks a whole tree and puts places for ids. */
export const takeTree = (tree: unknown): ReadyTree => {
  const members = takeRecord(tree, 'tree', 'The fault tree')
  const eventList = takeList(members.events, 'tree.events', 'The list of events', 1)
  const gateList = takeList(members.gates, 'tree.gates', 'The list of gates', 0)
  const gateIds = idsOfGates(gateList)
  const namesOfGates = new Set(gateIds)
  const events = new Map<string, ReadyEvent>()
  takeEvents(eventList, 'tree.events', events, (id) => namesOfGates.has(id))
  const places = new Map([...events.keys(), ...gateIds].map((id, place) => [id, place]))
  const gates: ReadyGate[] = []
  for (let i = 0; i < gateList.length; i += 1) gates.push(takeGate(gateList[i], i, places))
  const causes = takeCommonCauses(members.commonCause, 'tree.commonCause', events, (id) => places.has(id))
  const top = placeOf(takeId(members.top, 'tree.top', 'The id of the top'), 'tree.top', 'The top', places)
  const causeOf = new Array<number>(events.size).fill(-1)
  return { given: tree, top, eventCount: events.size, gates, order: gateOrder(gates, events.size, gateIds, gateList), leaves: leavesOf(events, causes, causeOf), causeOf }
}
