import { takeRecord } from '../validate/shape'
import { loadOf, meanProbability } from './exposure-probability'
import type { FaultEvent } from './fault-tree-types'
import { takeEvent } from './take-event'
import { takeId } from './take-id'

/**
 * Probability that a part has failed, a number 0 … 1: in flight, on average between two checks, or as given.
 *
 * rate at temperature λ = ratePerH · exp(−(activationEv/k)·(1/temperatureK − 1/referenceK)), k = 8.617e-5 eV/K, or ratePerH without heat;
 * flight: 1 − e^(−λ·hours); latent: the mean over the interval, 1 − (1 − e^(−λT))/(λT), T = checkIntervalHours, by its series up to λT = 1; probability: p
 *
 * Validity: a constant rate: neither early failures nor wear. A rate is mostly a guess within a factor of ten.
 * Source: mil-hdbk-217f, form of the temperature factor (memory).
 *
 * @param event `{ id, ratePerH, temperatureK?, referenceK?, activationEv?, exposure }`: ratePerH in failures an hour, ≥ 0, may be left out with a probability; temperatureK and referenceK in kelvin, > 0, activationEv in eV, ≥ 0: all three or none;
 * exposure one of `{ kind: 'flight', hours }`, hours ≥ 0, `{ kind: 'latent', checkIntervalHours }`, hours > 0, `{ kind: 'probability', p }`, p 0 … 1; heat does not change a p. id is not used here and may be left out
 * @throws CalcError on `event` or on any of these below it, `event.exposure.hours`
 * @example
 * eventProbability({ id: 'coil', ratePerH: 0.001, exposure: { kind: 'flight', hours: 2 } }) // → 0.0019980013
 * eventProbability({ id: 'coil', ratePerH: 0.001, exposure: { kind: 'latent', checkIntervalHours: 100 } }) // → 0.0483741804
 * eventProbability({ id: 'coil', exposure: { kind: 'probability', p: 0.2 } }) // → 0.2
 */
export const eventProbability = (event: Omit<FaultEvent, 'id'> & { readonly id?: string }): number => {
  const members = takeRecord(event, 'event', 'The event')
  if (members.id !== undefined) takeId(members.id, 'event.id', 'The id of the event')
  return meanProbability(loadOf(takeEvent(members, 'event').exposure))
}
