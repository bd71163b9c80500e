import { statedDefaults } from './stated-defaults'

const isRecord = (value: unknown): value is Record<string, unknown> => typeof value === 'object' && value !== null && !Array.isArray(value)

/** Version 1 knew nothing of detonation, coils, climb and failures: what it lacks is taken from the stated defaults. */
function fromFirst(stored: unknown): unknown {
  if (!isRecord(stored)) return stored
  const { tolerances, ...others } = statedDefaults()
  return { ...others, ...stored, tolerances: { ...tolerances, ...(isRecord(stored.tolerances) ? stored.tolerances : {}) } }
}

/** The step from each version to the one after it. */
const steps: Record<number, (stored: unknown) => unknown> = { 1: fromFirst }

/** A stored sheet of an earlier version in the shape of `to`, unchecked; the stored one is not written to. */
export function liftSheet(stored: unknown, from: number, to: number): unknown {
  let lifted = stored
  for (let version = from; version < to; version += 1) lifted = steps[version]?.(lifted) ?? lifted
  return lifted
}
