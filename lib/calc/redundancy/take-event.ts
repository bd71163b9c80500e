import { takeNumber, takeOptionalNumber } from '../validate/number'
import { finiteResult } from '../validate/result'
import { takeChoice, takeRecord } from '../validate/shape'
import { idTwice, takeId } from './take-id'

/** Boltzmann's constant, eV/K, as the specification rounds it. */
const boltzmannEvPerK = 8.617e-5

export type ReadyExposure = { readonly kind: 'probability', readonly p: number } | { readonly kind: 'flight' | 'latent', readonly hours: number, readonly ratePerH: number }

/** An event that was checked, its rate at its own temperature. */
export interface ReadyEvent {
  readonly exposure: ReadyExposure
  readonly heatSensitive: boolean
}

const heatNames = ['temperatureK', 'referenceK', 'activationEv'] as const

/** By how much heat multiplies the rate. One of the three members asks for the other two. */
const heatFactor = (members: Record<string, unknown>, field: string): { readonly factor: number, readonly sensitive: boolean } => {
  if (heatNames.every((name) => members[name] === undefined)) return { factor: 1, sensitive: false }
  const temperatureK = takeNumber(members.temperatureK, `${field}.temperatureK`, { name: 'The temperature of the part', unit: 'K', above: 0 })
  const referenceK = takeNumber(members.referenceK, `${field}.referenceK`, { name: 'The temperature that the rate is given for', unit: 'K', above: 0 })
  const activationEv = takeNumber(members.activationEv, `${field}.activationEv`, { name: 'The activation energy', unit: 'eV', min: 0 })
  if (activationEv === 0) return { factor: 1, sensitive: false }
  const factor = Math.exp(-(activationEv / boltzmannEvPerK) * (1 / temperatureK - 1 / referenceK))
  return { factor: finiteResult(factor, `${field}.activationEv`, members.activationEv, 'eV'), sensitive: true }
}

const takeExposure = (value: unknown, field: string, ratePerH: number | null): ReadyExposure => {
  const members = takeRecord(value, field, 'The exposure')
  const kind = takeChoice(members.kind, `${field}.kind`, 'The kind of exposure', ['flight', 'latent', 'probability'])
  if (kind === 'probability') return { kind, p: takeNumber(members.p, `${field}.p`, { name: 'The probability', unit: '', min: 0, max: 1 }) }
  const hours = kind === 'flight'
    ? takeNumber(members.hours, `${field}.hours`, { name: 'The exposure in flight', unit: 'h', min: 0 })
    : takeNumber(members.checkIntervalHours, `${field}.checkIntervalHours`, { name: 'The interval between checks', unit: 'h', above: 0 })
  return { kind, hours, ratePerH: ratePerH ?? 0 }
}

/** Checks all of an event but its id, which the caller needs unique or not at all. */
export const takeEvent = (members: Record<string, unknown>, field: string): ReadyEvent => {
  const rule = { name: 'The failure rate', unit: '/h', min: 0 }
  const rateField = `${field}.ratePerH`
  const given = takeOptionalNumber(members.ratePerH, rateField, rule, null)
  const { factor, sensitive } = heatFactor(members, field)
  const heated = given === null ? null : finiteResult(given * factor, rateField, members.ratePerH, '/h')
  const exposure = takeExposure(members.exposure, `${field}.exposure`, heated)
  if (exposure.kind !== 'probability' && given === null) takeNumber(members.ratePerH, rateField, rule)
  return { exposure, heatSensitive: sensitive }
}

/** Adds the events of a list to those known, by id in the order given. `refused` says which ids others have; `hint` tells what to do about one given twice. */
export const takeEvents = (list: readonly unknown[], field: string, events: Map<string, ReadyEvent>, refused: (id: string) => boolean, hint = ''): void => {
  for (let i = 0; i < list.length; i += 1) {
    const members = takeRecord(list[i], `${field}.${i}`, `Event ${i + 1}`)
    const id = takeId(members.id, `${field}.${i}.id`, `The id of event ${i + 1}`)
    if (events.has(id) || refused(id)) throw idTwice(`${field}.${i}.id`, id, hint)
    events.set(id, takeEvent(members, `${field}.${i}`))
  }
}
