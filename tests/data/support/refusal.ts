import { AppError } from '@/lib/errors'
import { knownError } from '@/lib/known-error'

/** The refusal a call must end in, as an action or a route would tell it. What was not expected fails the test as it is. */
export async function refusalOf(call: Promise<unknown>): Promise<AppError> {
  const thrown: unknown = await call.then(
    (value) => { throw new Error(`not refused, but ${JSON.stringify(value)?.slice(0, 300)}`) },
    (error: unknown) => error,
  )
  const isExpected = thrown instanceof AppError || (thrown instanceof Error && (thrown.name === 'ZodError' || thrown.name === '$ZodError'))
  if (!isExpected) throw thrown
  return knownError(thrown, 'test')
}
