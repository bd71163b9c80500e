import { unstable_rethrow } from 'next/navigation'
import { NextResponse } from 'next/server'
import { knownError } from './known-error'

// What a person may see depends on who asks: no cache between may keep it.
const privately = { 'cache-control': 'private, no-store' }

/** The body of every route handler: a DTO becomes JSON, a thrown error its status and `{ error: { code, message, fieldErrors? } }`. */
export async function runRoute(fn: () => Promise<unknown>): Promise<Response> {
  try {
    const result = await fn()
    return result instanceof Response ? result : NextResponse.json(result, { headers: privately })
  } catch (thrown) {
    unstable_rethrow(thrown)
    const { code, message, fieldErrors, conflict, details, status } = knownError(thrown, 'route')
    const response = NextResponse.json({ error: { code, message, fieldErrors, conflict } }, { status, headers: privately })
    if (details.waitSeconds !== undefined) response.headers.set('retry-after', String(details.waitSeconds))
    return response
  }
}
