import { z } from 'zod'
import { AppError } from './errors'
import { logUnexpected } from './log-unexpected'

// What the driver says when the database is stopped, restarting or out of connections (PostgreSQL classes 08, 53 and 57P).
const isDown = (code: unknown) =>
  typeof code === 'string' && (/^(08|53)...$|^57P0[1-5]$/.test(code) || ['ECONNREFUSED', 'ECONNRESET', 'EPIPE', 'ETIMEDOUT'].includes(code))

function isUnavailable(error: Error): boolean {
  if ('code' in error && isDown(error.code)) return true
  if (/Connection terminated|timeout exceeded when trying to connect|Timeout acquiring a connection/.test(error.message)) return true
  return error instanceof AggregateError && error.errors.some((one) => one instanceof Error && isUnavailable(one))
}

/** `rows.3.advance` for a path of keys and indices: the name the field has in its form; `form` when the whole is meant. */
const fieldName = (path: readonly PropertyKey[]) => path.map(String).join('.') || 'form'

function fromZod(error: z.ZodError): AppError {
  const fieldErrors: Record<string, string> = {}
  for (const { path, message } of error.issues) fieldErrors[fieldName(path)] ??= message
  return new AppError('invalid', { fieldErrors })
}

// Known by shape: the calculation library stands below this file's layer and its errors may come from a worker.
const isCalcError = (error: unknown): error is RangeError & { field: string } =>
  error instanceof RangeError && 'field' in error && typeof error.field === 'string'

/** Any thrown thing as an AppError. What was not expected is logged here, once. */
export function knownError(error: unknown, where: string): AppError {
  if (error instanceof AppError) return error
  if (error instanceof z.ZodError) return fromZod(error)
  if (isCalcError(error)) return new AppError('invalid', { fieldErrors: { [error.field]: error.message } })
  const id = logUnexpected(error, where)
  return error instanceof Error && isUnavailable(error) ? new AppError('unavailable') : new AppError('unexpected', { id })
}
