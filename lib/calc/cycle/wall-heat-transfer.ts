import { takeNumber } from '../validate/number'
import { finiteResult } from '../validate/result'
import { membersOf } from '../validate/shape'

export interface WallHeatInput { readonly boreMm: number, readonly pressureKpa: number, readonly temperatureK: number, readonly gasMps: number }

/**
 * Heat transfer coefficient from the gas to the walls, W/(m² K).
 *
 * h = 3.26·B^−0.2·p^0.8·T^−0.55·w^0.8, B in m, p in kPa, T in K, w in m/s
 *
 * Validity: four-stroke engines with little swirl.
 * Source: woschni-1967 (read)
 *
 * @param input.boreMm bore, mm > 0
 * @param input.pressureKpa pressure, kPa > 0
 * @param input.temperatureK mean temperature of the gas, K > 0
 * @param input.gasMps speed of the gas, m/s ≥ 0
 * @throws CalcError on any of these by its name
 * @example
 * wallHeatTransfer({ boreMm: 100, pressureKpa: 5000, temperatureK: 2000, gasMps: 20 }) // → 790.04
 */
export const wallHeatTransfer = (input: WallHeatInput): number => {
  const { boreMm, pressureKpa, temperatureK, gasMps } = membersOf(input)
  const bore = takeNumber(boreMm, 'boreMm', { name: 'The bore', unit: 'mm', above: 0 }) / 1000
  const kpa = takeNumber(pressureKpa, 'pressureKpa', { name: 'The pressure', unit: 'kPa', above: 0 })
  const kelvin = takeNumber(temperatureK, 'temperatureK', { name: 'The temperature', unit: 'K', above: 0 })
  const speed = takeNumber(gasMps, 'gasMps', { name: 'The speed of the gas', unit: 'm/s', min: 0 })
  return finiteResult(3.26 * bore ** -0.2 * kpa ** 0.8 * kelvin ** -0.55 * speed ** 0.8, 'boreMm', boreMm, 'mm')
}
