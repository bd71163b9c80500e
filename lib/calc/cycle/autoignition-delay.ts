import { takeNumber } from '../validate/number'
import { finiteResult } from '../validate/result'
import { membersOf } from '../validate/shape'

export interface AutoignitionInput { readonly octane: number, readonly pressureKpa: number, readonly temperatureK: number }

/**
 * Delay to autoignition of petrol at constant pressure and temperature, ms.
 *
 * τ = 17.68·(ON/100)^3.402·p^−1.7·exp(3800/T), p in atm
 *
 * Validity: fitted to primary reference fuels of 80 to 100 octane; good to ±5 octane at best on others.
 * Source: douaud-eyzat-1978 (memory)
 *
 * @param input.octane octane number, > 0
 * @param input.pressureKpa pressure of the unburned gas, kPa > 0
 * @param input.temperatureK its temperature, K > 0
 * @throws CalcError on any of these by its name
 * @example
 * autoignitionDelayMs({ octane: 100, pressureKpa: 3039.75, temperatureK: 800 }) // → 6.2990
 */
export const autoignitionDelayMs = (input: AutoignitionInput): number => {
  const { octane, pressureKpa, temperatureK } = membersOf(input)
  const on = takeNumber(octane, 'octane', { name: 'The octane number', unit: '', above: 0 })
  const kpa = takeNumber(pressureKpa, 'pressureKpa', { name: 'The pressure', unit: 'kPa', above: 0 })
  const kelvin = takeNumber(temperatureK, 'temperatureK', { name: 'The temperature', unit: 'K', above: 0 })
  return finiteResult(17.68 * (on / 100) ** 3.402 * (kpa / 101.325) ** -1.7 * Math.exp(3800 / kelvin), 'temperatureK', temperatureK, 'K')
}
