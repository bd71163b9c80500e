import 'server-only'
import { cookies, headers } from 'next/headers'
import { redirect } from 'next/navigation'
import { cache } from 'react'
import { findActor } from '@/lib/data/people/find-actor'
import { AppError } from '@/lib/errors'
import type { Actor } from './actor'
import { blankCookie, createSession, endSession, readSession, sessionCookie, sessionCookieName, type OpenSession } from './lucia'
import { safeNext } from './safe-next'

const readToken = async () => (await cookies()).get(sessionCookieName)?.value ?? null

async function writeCookie({ name, value, attributes }: ReturnType<typeof blankCookie>) {
  (await cookies()).set(name, value, attributes)
}

/** Who is signed in, for server components: read only, once per request. */
export const getActor = cache(async (): Promise<Actor | null> => {
  const token = await readToken()
  const session = token ? await readSession(token) : null
  return session && findActor(session.userId, session.shopId)
})

/** The same for pages that need someone: sends everyone else to sign in and back to where they were. */
export async function requireActor(): Promise<Actor> {
  const actor = await getActor()
  if (actor) return actor
  // A layout cannot see its own address; proxy.ts writes it into this header of every request.
  const here = safeNext((await headers()).get('x-halfspeed-path'))
  redirect(here ? `/sign-in?next=${encodeURIComponent(here)}` : '/sign-in')
}

/** For actions and route handlers: who is signed in and with which session; renews the cookie when it is due. */
export async function touchSession(): Promise<{ actor: Actor, session: OpenSession }> {
  const token = await readToken()
  const session = token ? await readSession(token) : null
  const actor = session && await findActor(session.userId, session.shopId)
  // A dead cookie is left alone: writing cookies makes the framework draw the page again, which would lose what was typed.
  if (!token || !actor) throw new AppError('signedOut')
  if (session.renewed) await writeCookie(sessionCookie(token))
  return { actor, session }
}

export const touchActor = async (): Promise<Actor> => (await touchSession()).actor

/** After a right password: a new session, the old one of this browser ended. */
export async function openSession(userId: string, shopId: string | null): Promise<void> {
  const old = await readToken()
  if (old) await endSession(old)
  await writeCookie(await createSession(userId, shopId))
}

export async function closeSession(): Promise<void> {
  const token = await readToken()
  if (token) await endSession(token)
  await writeCookie(blankCookie())
}
