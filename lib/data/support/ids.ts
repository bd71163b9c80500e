import { AppError } from '@/lib/errors'

const uuid = /^[0-9a-f]{8}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{12}$/i

/** The id when it has the form of one, else not-found: PostgreSQL would answer anything else with an error of its own. */
export function requireId(id: string, what?: string): string {
  if (!uuid.test(id)) throw new AppError('notFound', what ? { what } : {})
  return id
}
