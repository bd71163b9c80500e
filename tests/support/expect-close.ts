import { expect } from 'vitest'

export interface Tolerance { readonly rel?: number, readonly abs?: number }

/** Expects two finite numbers to agree within |expected|·rel, or within abs, whichever is wider. One of the two must be given. */
export const expectClose = (actual: unknown, expected: unknown, tolerance: Tolerance): void => {
  const { rel, abs } = tolerance
  if (rel === undefined && abs === undefined) throw new Error('expectClose needs a tolerance: rel, abs or both')
  for (const [name, part] of [['rel', rel], ['abs', abs]] as const) {
    if (part !== undefined && !(Number.isFinite(part) && part >= 0)) throw new Error(`expectClose: ${name} must be a finite number of at least 0`)
  }
  if (typeof expected !== 'number' || !Number.isFinite(expected)) throw new Error(`expectClose: expected must be a finite number, got ${String(expected)}`)
  if (typeof actual !== 'number' || !Number.isFinite(actual)) expect.fail(`expected a finite number close to ${expected}, got ${String(actual)}`)
  const allowed = Math.max(Math.abs(expected) * (rel ?? 0), abs ?? 0)
  const off = Math.abs(actual - expected)
  if (!(off <= allowed)) expect.fail(`expected ${actual} to be within ${allowed} of ${expected}; it is off by ${off}`)
}
