import { CalcError } from '../calc-error'
import type { CheckedCycle } from './check-cycle'

/** What an engine has: only to name the value that lies furthest from it. */
const usual: Readonly<Record<string, number>> = {
  'engine.boreMm': 90, 'engine.strokeMm': 80, 'engine.rodMm': 140, 'engine.compressionRatio': 8, rpm: 2500,
  'charge.pressureKpa': 100, 'charge.temperatureK': 370, 'charge.residualFraction': 0.06, 'charge.airFuelRatio': 13,
  'burn.durationDeg': 70, 'burn.a': 5, 'burn.m': 2, 'burn.efficiency': 0.9, 'burn.heatingValueKjPerKg': 44_000,
  'heatLoss.wallK': 470, 'heatLoss.headAreaFactor': 1, octane: 95, stepDeg: 0.5,
}

/** The error of a cycle whose pressure leaves the range of numbers: on the value furthest from an engine's, counted in powers of ten. */
export const refuseRunaway = (checked: CheckedCycle): CalcError => {
  const valueAt = (path: string): unknown =>
    path.split('.').reduce<unknown>((value, key) => (typeof value === 'object' && value !== null ? Object.entries(value).find(([name]) => name === key)?.[1] : undefined), checked)
  let field = 'charge.pressureKpa'
  let furthest = -1
  for (const [path, normal] of Object.entries(usual)) {
    const value = valueAt(path)
    if (typeof value !== 'number' || value === 0) continue
    const distance = Math.abs(Math.log10(Math.abs(value)) - Math.log10(normal))
    if (distance > furthest) {
      furthest = distance
      field = path
    }
  }
  return new CalcError({
    field, value: valueAt(field), limit: 'a value whose cycle stays within numbers', unit: '',
    message: 'The cycle runs beyond what the model can follow: this value lies too far from what an engine has.',
  })
}
