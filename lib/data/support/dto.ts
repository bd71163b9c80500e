import { z } from 'zod'

/**
 * What leaves the server passes through here: keys the schema does not name are dropped. A value that does not fit is our own
 * mistake, never the typing person's, so it is not a zod error on its way out.
 */
export function toDto<S extends z.ZodType>(schema: S, value: unknown): z.output<S> {
  const parsed = schema.safeParse(value)
  if (!parsed.success) throw new Error(`A result does not fit its schema: ${z.prettifyError(parsed.error)}`)
  return parsed.data
}
