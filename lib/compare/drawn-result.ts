// With the formula parser: a schedule may be a formula.
import '../calc/index'
import { evaluateScenario, type ScenarioResult } from '../calc/live'
import type { RevisionDto } from '../schemas/revision-dto'

/**
 * A revision's result with its curves again. Every figure and finding stays as it was stored; only the curves, which a revision
 * does not keep, are drawn anew from its own inputs.
 */
export function drawnResult({ engine, sheet, limits, results }: Pick<RevisionDto, 'engine' | 'sheet' | 'limits' | 'results'>): ScenarioResult {
  const { curves, stagger, power } = evaluateScenario({ engine: engine.spec, sheet }, limits).parts
  const stored = results.parts
  return {
    ...results,
    parts: {
      ...stored,
      curves,
      stagger: stored.stagger.ok && stagger.ok ? { ...stored.stagger, curve: stagger.curve } : stored.stagger,
      power: stored.power.ok && power.ok ? { ...stored.power, curve: power.curve } : stored.power,
    },
  }
}
