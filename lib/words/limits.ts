import type { Limit } from '../calc/live'
import type { UnitSystem } from '../units'
import { findingTitle, limitOrigin, limitWords } from './findings'

export interface LimitLine {
  id: string
  /** What it limits. */
  title: string
  /** "at least 3.0°" */
  limit: string
  /** Whose it is. */
  origin: string
}

/** A limit in words; that of the proof speed counts from the engine's idle. */
export function limitLine({ id, sense, value, unit, from }: Limit, system: UnitSystem): LimitLine {
  const words = limitWords({ sense, unit, limit: value }, system)
  return {
    id, title: findingTitle({ limitId: id, verdict: 'within', value: 0 }, system),
    limit: id === 'proofAboveIdleRpm' ? `${words} above idle` : words,
    origin: limitOrigin[from],
  }
}
