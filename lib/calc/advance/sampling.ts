import { CalcError } from '../calc-error'

/** A formula is sampled each 1 rpm: beyond this range the samples would take seconds. No engine comes near it. */
export const widestSampledRpm = 100_000

export const checkSampleCount = (fromRpm: number, toRpm: number, field: string): void => {
  if (toRpm - fromRpm <= widestSampledRpm) return
  throw new CalcError({
    field, value: toRpm, limit: `≤ ${fromRpm + widestSampledRpm} for a formula`, unit: 'rpm',
    message: `A formula is computed at each 1 rpm, over at most ${widestSampledRpm} rpm: the highest speed must be at most ${fromRpm + widestSampledRpm} rpm; ${toRpm} rpm was given.`,
  })
}
