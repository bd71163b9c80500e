import { takeNumber } from '../validate/number'

/** Air to fuel by mass at which petrol burns completely. */
const stoichiometricRatio = 14.6

/**
 * Share of the fuel's heat that a mixture can release, 0 … 0.97.
 *
 * 0.97·min(1, AFR/14.6): what a rich mixture lacks in air stays unburned.
 *
 * Validity: petrol; lean mixtures up to the limit at which they still burn.
 * Source: common practice, no published source (air balance).
 *
 * @param airFuelRatio mass of air to mass of fuel, > 0
 * @throws CalcError on `airFuelRatio`
 * @example
 * combustionEfficiency(14.6) // → 0.97
 * combustionEfficiency(12.8) // → 0.850411
 */
export const combustionEfficiency = (airFuelRatio: number): number =>
  0.97 * Math.min(1, takeNumber(airFuelRatio, 'airFuelRatio', { name: 'The air-fuel ratio', unit: '', above: 0 }) / stoichiometricRatio)
