/**
 * Writes an unexpected error to the log, once, and returns the id it stands under there: the only thing of it that people see.
 * One line of JSON, so that a search for the id finds all of it.
 */
export function logUnexpected(error: unknown, where: string): string {
  const id = crypto.randomUUID().slice(0, 8)
  const { name, message, stack } = error instanceof Error ? error : { name: typeof error, message: String(error), stack: undefined }
  const cause = error instanceof Error && error.cause ? String(error.cause) : undefined
  console.error(JSON.stringify({ level: 'error', id, where, name, message, cause, stack }))
  return id
}
