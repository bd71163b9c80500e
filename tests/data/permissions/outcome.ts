import { AppError } from '@/lib/errors'
import { digestOf, redirectPlace } from '../support/next-mocks'

/** How a call ended: 'done', or the code it was refused with. `value` is whatever reached the caller. */
export type Outcome = { code: string, value?: unknown }

/** One measure for data functions (that throw), actions (that return a state or redirect) and routes (that answer with a status). */
export async function outcomeOf(call: () => unknown): Promise<Outcome> {
  try {
    const value = await call()
    if (value instanceof Response) return await ofResponse(value)
    return isRefusal(value) ? { code: value.code ?? 'refused without a code', value } : { code: 'done', value }
  } catch (thrown) {
    if (thrown instanceof AppError) return { code: thrown.code }
    if (digestOf(thrown) === 'NEXT_HTTP_ERROR_FALLBACK;404') return { code: 'notFound' }
    const place = redirectPlace(thrown)
    if (place === null) throw thrown
    return { code: codeOfPlace(place), value: place }
  }
}

/** A single button's action tells what went wrong in the address it leads back to. */
const codeOfPlace = (place: string) =>
  (place.startsWith('/sign-in?') ? 'signedOut' : new URL(place, 'http://here.invalid').searchParams.get('problem') ?? 'done')

const isRefusal = (value: unknown): value is { ok: false, code?: string } =>
  typeof value === 'object' && value !== null && 'ok' in value && value.ok === false

async function ofResponse(response: Response): Promise<Outcome> {
  const text = await response.text()
  if (response.status < 400) return { code: 'done', value: text }
  const { error } = JSON.parse(text) as { error: { code: string } }
  return { code: error.code, value: text }
}
