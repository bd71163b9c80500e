import 'server-only'
// The index, not ./live: it brings the formula parser.
import '@/lib/calc/index'
import { defaultLimits, evaluateScenario, inputErrors, type Scenario, storedResult } from '@/lib/calc/live'
import { AppError } from '@/lib/errors'

/** The columns of a revision that the library fills. Inputs it cannot compute with are told at their fields. */
export function evaluatedColumns(scenario: Scenario) {
  const limits = defaultLimits
  const result = evaluateScenario(scenario, limits)
  const faults = inputErrors(result)
  if (faults.length > 0) {
    // The first of several parts that fail for one field says it.
    const fieldErrors = Object.fromEntries([...faults].reverse().map(({ field, message }) => [field, message]))
    throw new AppError('invalid', { fieldErrors })
  }
  const { outside, close, within } = result.counts
  return {
    results: storedResult(result), limits, calcVersion: result.calcVersion,
    outsideCount: outside, closeCount: close, withinCount: within,
  }
}
