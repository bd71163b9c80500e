import type { ScenarioResult } from './result-types'

/** The result as a revision keeps it: figures and findings, without the sampled curves, which the inputs give again at any time. */
export function storedResult(result: ScenarioResult): ScenarioResult {
  const { curves, stagger, power } = result.parts
  return {
    ...result,
    parts: {
      ...result.parts,
      curves: curves.ok ? { ok: true, rising: { primary: [], backup: [] }, falling: { primary: null, backup: null } } : curves,
      stagger: stagger.ok ? { ...stagger, curve: [] } : stagger,
      power: power.ok ? { ...power, curve: [] } : power,
    },
  }
}
