import { NextResponse, type NextRequest } from 'next/server'
import { refuseBody } from './lib/proxy/refuse-body'
import { contentPolicy, securityHeaders } from './lib/proxy/security-headers'

// Pages behind the sign-in, by first part of the path. A list for convenience: lib/data decides what anyone may read.
const shopPaths = ['/engines', '/scenarios', '/plans', '/compare']
const sessionCookie = 'halfspeed_session'

const isShopPath = (path: string) => shopPaths.some((shop) => path === shop || path.startsWith(`${shop}/`))

/** Headers on every answer, large bodies refused before they are read, strangers shown to the sign-in page. Never the guard. */
export function proxy(request: NextRequest): NextResponse {
  const { pathname, search } = request.nextUrl
  const nonce = btoa(crypto.randomUUID())
  const policy = contentPolicy(nonce, process.env.NODE_ENV === 'development')

  const answer = refuseBody(request) ?? toSignIn(request) ?? NextResponse.next({ request: { headers: forwarded() } })
  for (const [name, value] of Object.entries(securityHeaders(policy))) answer.headers.set(name, value)
  return answer

  // What the pages read: the nonce for their scripts, and their own address, which a layout cannot see otherwise.
  function forwarded() {
    const headers = new Headers(request.headers)
    headers.set('x-nonce', nonce)
    headers.set('content-security-policy', policy)
    headers.set('x-halfspeed-path', pathname + search)
    return headers
  }
}

// Only page views: an action of someone signed out answers in its form, where what was typed stays.
function toSignIn({ method, nextUrl, cookies, url }: NextRequest): NextResponse | null {
  if (method !== 'GET' || cookies.has(sessionCookie) || !isShopPath(nextUrl.pathname)) return null
  return NextResponse.redirect(new URL(`/sign-in?next=${encodeURIComponent(nextUrl.pathname + nextUrl.search)}`, url), 303)
}

export const config = { matcher: '/((?!_next/static|_next/image|fonts/|favicon.ico).*)' }
