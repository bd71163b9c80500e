import { computedValue, type PublishedCheck } from '@/tests/published/published-case'

export type CheckOutcome =
  | { ok: true, computed: number, difference: number, isWithin: boolean }
  /** The library threw, or gave no number. */
  | { ok: false, message: string }

/** Most that computed and expected may differ by. */
export const allowedDifference = ({ expected, tolerance }: Pick<PublishedCheck, 'expected' | 'tolerance'>): number =>
  'abs' in tolerance ? tolerance.abs : Math.abs(expected) * tolerance.rel

/** Computes a check with the library and judges it as the tests do. */
export function judgeCheck(library: Readonly<Record<string, unknown>>, check: PublishedCheck): CheckOutcome {
  try {
    const computed = computedValue(library, check)
    const difference = computed - check.expected
    return { ok: true, computed, difference, isWithin: Math.abs(difference) <= allowedDifference(check) }
  } catch (error) {
    return { ok: false, message: error instanceof Error ? error.message : String(error) }
  }
}

export const isOutside = (outcome: CheckOutcome): boolean => !outcome.ok || !outcome.isWithin

/** True where computing needs the formula parser, which is fetched apart. */
export const usesFormula = ({ args, over }: Pick<PublishedCheck, 'args' | 'over'>): boolean =>
  JSON.stringify([args, over?.args ?? []]).includes('"kind":"formula"')
