import { CalcError } from '../calc-error'
import { takeNumber } from '../validate/number'
import { takeList, takeRecord } from '../validate/shape'
import type { ReadyEvent } from './take-event'
import { idTwice, takeId } from './take-id'

export interface ReadyCause {
  readonly id: string
  readonly beta: number
  /** Places of its events. */
  readonly events: readonly number[]
}

/** Rates after heat may differ in their last digits where the same temperature was reached by two ways of writing it. */
const rateTolerance = 1e-12

const isAlike = (one: ReadyEvent, other: ReadyEvent): boolean => {
  const { exposure: a } = one
  const { exposure: b } = other
  if (a.kind === 'probability' || b.kind === 'probability') return false
  return a.kind === b.kind && a.hours === b.hours && Math.abs(a.ratePerH - b.ratePerH) <= rateTolerance * Math.max(a.ratePerH, b.ratePerH)
}

const takeMembers = (list: readonly unknown[], field: string, name: string, events: ReadonlyMap<string, ReadyEvent>, places: ReadonlyMap<string, number>, used: Set<string>): number[] => {
  let first: ReadyEvent | undefined
  const members: number[] = []
  for (let j = 0; j < list.length; j += 1) {
    const at = `${field}.${j}`
    const id = takeId(list[j], at, `Event ${j + 1} of ${name}`)
    const refuse = (limit: string, message: string) => new CalcError({ field: at, value: id, limit, unit: '', message })
    const event = events.get(id)
    const place = places.get(id)
    if (event === undefined || place === undefined) throw refuse('the id of an event', `Event ${j + 1} of ${name} is “${id.slice(0, 60)}”, which is no event of the tree.`)
    if (used.has(id)) throw refuse('an event named once', `The event “${id.slice(0, 60)}” is named twice: an event can share one common cause, once.`)
    if (event.exposure.kind === 'probability') throw refuse('an event with a rate', `The event “${id.slice(0, 60)}” has a probability and no rate: a common cause takes a share of a rate.`)
    first ??= event
    if (!isAlike(first, event)) throw refuse('equal rates and exposures', `The events of ${name} must have equal rates, heat included, and equal exposures; “${id.slice(0, 60)}” differs from the first.`)
    used.add(id)
    members.push(place)
  }
  return members
}

/** Common causes of a tree, none where nothing was given. `isTaken` knows the ids of events and gates. */
export const takeCommonCauses = (value: unknown, field: string, events: ReadonlyMap<string, ReadyEvent>, isTaken: (id: string) => boolean): ReadyCause[] => {
  if (value === undefined) return []
  const list = takeList(value, field, 'The list of common causes', 0)
  const places = new Map([...events.keys()].map((id, place) => [id, place]))
  const ids = new Set<string>()
  const used = new Set<string>()
  const causes: ReadyCause[] = []
  for (let i = 0; i < list.length; i += 1) {
    const name = `common cause ${i + 1}`
    const members = takeRecord(list[i], `${field}.${i}`, `Common cause ${i + 1}`)
    const id = takeId(members.id, `${field}.${i}.id`, `The id of ${name}`)
    if (ids.has(id) || isTaken(id)) throw idTwice(`${field}.${i}.id`, id)
    ids.add(id)
    const beta = takeNumber(members.beta, `${field}.${i}.beta`, { name: `The share beta of ${name}`, unit: '', min: 0, max: 1 })
    const eventList = takeList(members.events, `${field}.${i}.events`, `The list of events of ${name}`, 1)
    causes.push({ id, beta, events: takeMembers(eventList, `${field}.${i}.events`, name, events, places, used) })
  }
  return causes
}
