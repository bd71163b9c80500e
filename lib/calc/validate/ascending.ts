import { CalcError } from '../calc-error'

/** Throws on the first entry that is not above the one before it. */
export const mustAscend = (values: readonly number[], unit: string, fieldOf: (i: number) => string, nameOf: (i: number) => string): void => {
  for (let i = 1; i < values.length; i += 1) {
    const before = values[i - 1] ?? 0
    const value = values[i] ?? 0
    if (value > before) continue
    throw new CalcError({
      field: fieldOf(i), value, limit: `> ${before}`, unit,
      message: `${nameOf(i)} must be above the one before it, ${before} ${unit}; ${value} ${unit} was given.`,
    })
  }
}
