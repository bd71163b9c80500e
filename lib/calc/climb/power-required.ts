import { finiteResult } from '../validate/result'
import { membersOf } from '../validate/shape'
import { levelPowerW, takeDensity, takePolar, takeSpeed } from './aeroplane'

export interface PowerRequiredInput {
  readonly massKg: number
  readonly wingAreaM2: number
  readonly cd0: number
  readonly inducedK: number
  readonly densityKgM3: number
  readonly speedMps: number
}

/**
 * Thrust power that level flight takes, kW: drag times speed.
 *
 * P = ½·ρ·V³·S·cd0 + 2·K·W²/(ρ·V·S), W = m·9.80665 m/s²
 *
 * Validity: a parabolic drag polar, level flight, speeds of light aeroplanes (no compressibility), above the stall.
 * Source: lowry, drag of the example aeroplane (read).
 *
 * @param input.massKg mass m, kg, > 0
 * @param input.wingAreaM2 wing area S, m², > 0
 * @param input.cd0 drag coefficient without lift, ≥ 0
 * @param input.inducedK induced drag factor K = 1/(π·e·aspect ratio), ≥ 0
 * @param input.densityKgM3 density of the air ρ, kg/m³, > 0
 * @param input.speedMps true airspeed V, m/s, > 0
 * @throws CalcError on any of these by its name
 * @example
 * powerRequiredKw({ massKg: 1000, wingAreaM2: 16, cd0: 0.03, inducedK: 0.06, densityKgM3: 1.225, speedMps: 40 }) // → 33.5360
 */
export const powerRequiredKw = (input: PowerRequiredInput): number => {
  const members = membersOf(input)
  const polarAt = takePolar(members, { min: 0 })
  const densityKgM3 = takeDensity(members.densityKgM3)
  const speedMps = takeSpeed(members.speedMps)
  return finiteResult(levelPowerW(polarAt(densityKgM3), speedMps) / 1000, 'speedMps', speedMps, 'm/s')
}
