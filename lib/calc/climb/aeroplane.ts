import { gravity } from '../air/troposphere'
import { takeNumber, type NumberRule } from '../validate/number'
import { finiteResult } from '../validate/result'

/** An aeroplane by its parabolic drag polar: drag coefficient = cd0 + inducedK·(lift coefficient)². */
export interface Aeroplane {
  readonly massKg: number
  readonly wingAreaM2: number
  readonly cd0: number
  readonly inducedK: number
}

/** Power that level flight takes at speed V: parasite·V³ + induced/V, in W with V in m/s. */
export interface Polar {
  readonly weightN: number
  readonly parasite: number
  readonly induced: number
}

/** Mass, wing and drag of an aeroplane, checked; the polar at one density is made of them. */
export type PolarAt = (densityKgM3: number) => Polar

const areaName = 'The wing area'

/** `coefficient` is what both drag coefficients must be: ≥ 0 where one may be left out, > 0 where a best speed is sought. */
export const takePolar = (members: Record<string, unknown>, coefficient: Pick<NumberRule, 'min' | 'above'>): PolarAt => {
  const massKg = takeNumber(members.massKg, 'massKg', { name: 'The mass of the aeroplane', unit: 'kg', above: 0 })
  const wingAreaM2 = takeNumber(members.wingAreaM2, 'wingAreaM2', { name: areaName, unit: 'm²', above: 0 })
  const cd0 = takeNumber(members.cd0, 'cd0', { name: 'The drag coefficient without lift', unit: '', ...coefficient })
  const inducedK = takeNumber(members.inducedK, 'inducedK', { name: 'The induced drag factor', unit: '', ...coefficient })
  const weightN = finiteResult(massKg * gravity, 'massKg', massKg, 'kg')
  return (densityKgM3) => ({
    weightN,
    parasite: finiteResult(0.5 * densityKgM3 * wingAreaM2 * cd0, 'wingAreaM2', wingAreaM2, 'm²'),
    induced: finiteResult(2 * inducedK * weightN * (weightN / densityKgM3 / wingAreaM2), 'massKg', massKg, 'kg'),
  })
}

export const takeDensity = (value: unknown): number => takeNumber(value, 'densityKgM3', { name: 'The density of the air', unit: 'kg/m³', above: 0 })
export const takeSpeed = (value: unknown): number => takeNumber(value, 'speedMps', { name: 'The airspeed', unit: 'm/s', above: 0 })

/** Power to fly level at a speed, W. */
export const levelPowerW = ({ parasite, induced }: Polar, speedMps: number): number => parasite * speedMps ** 3 + induced / speedMps
