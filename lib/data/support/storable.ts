import { AppError } from '@/lib/errors'

/**
 * PostgreSQL keeps no zero character and no half of a surrogate pair. Either comes from a broken paste or from a program, and
 * is told at its place instead of failing in the database.
 */
export function requireStorable(value: unknown, path: string[] = []): void {
  if (typeof value === 'string') {
    if (value.includes('\0') || !value.isWellFormed()) {
      throw new AppError('invalid', { fieldErrors: { [path.join('.')]: 'This text holds a character that cannot be stored. Type it again instead of pasting it.' } })
    }
  } else if (typeof value === 'object' && value !== null) {
    for (const [key, member] of Object.entries(value)) {
      requireStorable(key, path)
      requireStorable(member, [...path, key])
    }
  }
}

/** The value as jsonb will give it back (no undefined, no −0), for comparing with what is stored. */
export const asStored = <T>(value: T): T => JSON.parse(JSON.stringify(value)) as T
