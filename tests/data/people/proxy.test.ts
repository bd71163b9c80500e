import { unstable_doesMiddlewareMatch } from 'next/experimental/testing/server'
import { NextRequest } from 'next/server'
import { afterEach, expect, test, vi } from 'vitest'
import { sessionCookieName } from '@/lib/auth/lucia'
import { config, proxy } from '@/proxy'

afterEach(() => vi.unstubAllEnvs())
const origin = 'http://127.0.0.1:3000'
const request = (path: string, init: { method?: string, headers?: Record<string, string> } = {}) => new NextRequest(origin + path, init)

test('every answer has a policy with a nonce of its own, and the page gets the same nonce', () => {
  const nonces = [1, 2].map(() => {
    const answer = proxy(request('/'))
    const policy = answer.headers.get('content-security-policy') ?? ''
    const nonce = /'nonce-([A-Za-z0-9+/=]{40,})'/.exec(policy)?.[1]
    expect(answer.headers.get('x-middleware-request-x-nonce')).toBe(nonce)
    expect(policy).toContain(`script-src 'self' 'nonce-${nonce}' 'strict-dynamic';`)
    expect(policy).toContain(`frame-ancestors 'none'`)
    expect(policy).not.toMatch(/unsafe-eval|script-src[^;]*unsafe-inline|style-src [^;]*unsafe-inline/)
    return nonce
  })
  expect(nonces[0]).not.toBe(nonces[1])
})

test('development may reload, production over TLS insists on it', () => {
  vi.stubEnv('NODE_ENV', 'development')
  expect(proxy(request('/')).headers.get('content-security-policy')).toMatch(/'unsafe-eval'.*style-src 'self' 'unsafe-inline';.*ws:/)
  vi.stubEnv('NODE_ENV', 'production')
  expect(proxy(request('/')).headers.get('strict-transport-security')).toBeNull()
  vi.stubEnv('COOKIE_SECURE', '1')
  expect(proxy(request('/')).headers.get('strict-transport-security')).toContain('max-age')
})

test.each(['/', '/sign-in', '/api/me'])('%s cannot be framed or guessed at', (path) => {
  const { headers } = proxy(request(path))
  expect(headers.get('x-content-type-options')).toBe('nosniff')
  expect(headers.get('x-frame-options')).toBe('DENY')
  expect(headers.get('referrer-policy')).toBe('same-origin')
})

test('a page view without a session goes to sign in and back; the header of a visitor is not believed', () => {
  const answer = proxy(request('/scenarios/7?at=2400'))
  expect(answer.status).toBe(303)
  // The framework makes it relative when the host is the request's own, under whichever of its names loopback goes.
  const place = new URL(answer.headers.get('location') ?? '')
  expect(place.host).toBe(request('/').nextUrl.host)
  expect(place.pathname + place.search).toBe('/sign-in?next=%2Fscenarios%2F7%3Fat%3D2400')
  expect(answer.headers.get('content-security-policy')).toContain('nonce')

  const signedIn = proxy(request('/scenarios/7?at=2400', { headers: { 'cookie': `${sessionCookieName}=x`, 'x-halfspeed-path': '/elsewhere', 'x-nonce': 'mine' } }))
  expect(signedIn.status).toBe(200)
  expect(signedIn.headers.get('x-middleware-request-x-halfspeed-path')).toBe('/scenarios/7?at=2400')
  expect(signedIn.headers.get('x-middleware-request-x-nonce')).not.toBe('mine')
})

test.each([['/'], ['/sign-in'], ['/sign-up'], ['/scenariosx'], ['/api/me']])('%s is open', (path) => {
  expect(proxy(request(path)).status).toBe(200)
})

test('an action without a session is let through: its form says what happened', () => {
  expect(proxy(request('/scenarios/7', { method: 'POST', headers: { 'content-length': '10', 'next-action': 'x' } })).status).toBe(200)
})

test.each([
  ['/api/scenarios', {}, 'application/json', /"code":"tooLarge".*1 MB/],
  ['/scenarios/7', { 'next-action': 'x' }, 'text/plain', /^What was sent is larger than 1 MB/],
  ['/sign-in', {}, 'text/html; charset=utf-8', /<h1>Not taken in<\/h1><p>What was sent is larger than 1 MB/],
])('a body above 1 MB to %s %o is refused in words', async (path, headers, type, words) => {
  const send = (bytes: number) => proxy(request(path, { method: 'POST', headers: { ...headers, 'content-length': String(bytes) } }))
  const answer = send(1_000_001)
  expect(answer.status).toBe(413)
  expect(answer.headers.get('content-type')).toBe(type)
  expect(await answer.text()).toMatch(words)
  expect(send(1_000_000).status).toBe(200)
})

test('a body that hides its size is refused', () => {
  expect(proxy(request('/sign-in', { method: 'POST', headers: { 'transfer-encoding': 'chunked' } })).status).toBe(411)
  expect(proxy(request('/sign-in', { method: 'POST', headers: { 'content-length': 'lots' } })).status).toBe(413)
})

test.each([
  ['/', true], ['/sign-in', true], ['/api/me', true], ['/scenarios/7', true], ['/_next/static/chunks/a.js', false], ['/fonts/a.woff2', false],
])('runs for %s: %s', (url, matches) => {
  expect(unstable_doesMiddlewareMatch({ config, nextConfig: {}, url })).toBe(matches)
})
