// The driver puts the statement, with every value in it, before its own words. The words are enough; people's data stays out of logs.
const withoutStatement = (message: string) => message.replace(/^\s*(select|insert|update|delete|with)\b.* - /is, '')

/** Where it was thrown: the lines of the stack after the message, which it repeats. */
const framesOf = (stack = '') => stack.split('\n').filter((line) => /^\s+at /.test(line)).map((line) => line.trim())

/**
 * Writes an unexpected error to the log, once, and returns the id it stands under there: the only thing of it that people see.
 * One line of JSON, so that a search for the id finds all of it.
 */
export function logUnexpected(error: unknown, where: string): string {
  const id = crypto.randomUUID().slice(0, 8)
  const { name, message, stack } = error instanceof Error ? error : { name: typeof error, message: String(error), stack: undefined }
  const cause = error instanceof Error && error.cause instanceof Error ? withoutStatement(error.cause.message) : undefined
  console.error(JSON.stringify({ level: 'error', id, where, name, message: withoutStatement(message), cause, stack: framesOf(stack) }))
  return id
}
