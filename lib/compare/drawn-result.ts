// With the formula parser: a schedule may be a formula.
import '../calc/index'
import { defaultLimits, evaluateClosedForms, type ScenarioResult } from '../calc/live'
import type { RevisionDto } from '../schemas/revision-dto'

/**
 * A revision's result with its curves again. Every figure and finding stays as it was stored; only the curves, which a revision
 * does not keep, are drawn anew from its own inputs.
 */
export function drawnResult({ engine, sheet, limits, results }: Pick<RevisionDto, 'engine' | 'sheet' | 'limits' | 'results'>): ScenarioResult {
  // Curves are judged by nothing; a limit that came later has to be there all the same.
  const { curves, stagger, power } = evaluateClosedForms({ engine: engine.spec, sheet }, { ...defaultLimits, ...limits }).parts
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
