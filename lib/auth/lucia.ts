import 'server-only'
import { createHash } from 'node:crypto'
import { NodePostgresAdapter } from '@lucia-auth/adapter-postgresql'
import { Lucia, generateIdFromEntropySize, type Cookie } from 'lucia'
import { authPool } from './pool'

/**
 * `expires: false`: the cookie outlives the session and the row alone decides. Pages cannot write cookies, so a session that a
 * page view has prolonged would otherwise lose its cookie on the old date.
 */
const lucia = new Lucia(new NodePostgresAdapter(authPool, { user: 'users', session: 'sessions' }), {
  sessionCookie: { name: 'halfspeed_session', expires: false, attributes: { secure: process.env.COOKIE_SECURE === '1', sameSite: 'lax' } },
  // The adapter reads whole user rows; nothing of them but the id is passed on.
  getUserAttributes: () => ({}),
  getSessionAttributes: ({ shop_id }) => ({ shopId: shop_id ?? null }),
})

declare module 'lucia' {
  interface Register {
    Lucia: typeof lucia
    DatabaseSessionAttributes: { shop_id: string | null }
  }
}

/** A session as the rest of the program knows it. `renewed`: its end was moved, so the cookie should be written again. */
export type OpenSession = { id: string, userId: string, shopId: string | null, renewed: boolean }

export const sessionCookieName = lucia.sessionCookieName

/** The row's key is a digest of the cookie's value: a copy of the table opens nothing. */
const idOf = (token: string) => createHash('sha256').update(token).digest('hex')

export async function readSession(token: string): Promise<OpenSession | null> {
  const { session } = await lucia.validateSession(idOf(token))
  return session && { id: session.id, userId: session.userId, shopId: session.shopId, renewed: session.fresh }
}

/** Opens a session and returns the cookie that holds it. */
export async function createSession(userId: string, shopId: string | null): Promise<Cookie> {
  const token = generateIdFromEntropySize(25)
  await lucia.createSession(userId, { shop_id: shopId }, { sessionId: idOf(token) })
  return lucia.createSessionCookie(token)
}

export const endSession = (token: string): Promise<void> => lucia.invalidateSession(idOf(token))
export const sessionCookie = (token: string): Cookie => lucia.createSessionCookie(token)
export const blankCookie = (): Cookie => lucia.createBlankSessionCookie()
