import { expect } from 'vitest'
import { CalcError } from '@/lib/calc/calc-error'

/** Runs the function, expects a CalcError on this very field with everything a person needs, and returns it. */
export const expectCalcError = (run: () => unknown, field: string): CalcError => {
  let result: unknown
  try {
    result = run()
  } catch (error) {
    if (!(error instanceof CalcError)) throw error
    expect(error).toBeInstanceOf(RangeError)
    expect(error.field, error.message).toBe(field)
    expect(error.limit).not.toBe('')
    expect(error.message).toMatch(/^[A-Z].{10,}[.]$/s)
    expect(typeof error.unit).toBe('string')
    return error
  }
  return expect.fail(`expected a CalcError on ${field}, got ${JSON.stringify(result)}`)
}
