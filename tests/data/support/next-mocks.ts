/**
 * What the framework gives an action or a route during a request. A test file puts them in place with
 *   vi.mock('next/headers', async () => (await import('@/tests/data/support/next-mocks')).nextHeaders())
 *   vi.mock('next/cache', async () => (await import('@/tests/data/support/next-mocks')).nextCache())
 * and then reads and writes `cookieJar`, `requestHeaders` and `revalidatedPaths` here.
 */
export const cookieJar = new Map<string, string>()
export const requestHeaders = new Headers()
export const revalidatedPaths: string[] = []

const jar = {
  get: (name: string) => (cookieJar.has(name) ? { name, value: cookieJar.get(name) } : undefined),
  has: (name: string) => cookieJar.has(name),
  set: (name: string, value: string) => void (value ? cookieJar.set(name, value) : cookieJar.delete(name)),
  delete: (name: string) => void cookieJar.delete(name),
}

export const nextHeaders = () => ({ cookies: async () => jar, headers: async () => requestHeaders })

export const nextCache = () => ({
  revalidatePath: (path: string) => void revalidatedPaths.push(path),
  revalidateTag: () => {},
  refresh: () => {},
})

/** A form as a browser sends it. */
export function formOf(fields: Record<string, string>): FormData {
  const form = new FormData()
  for (const [name, value] of Object.entries(fields)) form.set(name, value)
  return form
}

/** Where a call that must end in a redirect goes. */
export async function redirectOf(call: Promise<unknown>): Promise<string> {
  const thrown: unknown = await call.then((value) => { throw new Error(`no redirect, but ${JSON.stringify(value)}`) }, (error: unknown) => error)
  const place = redirectPlace(thrown)
  if (place === null) throw thrown
  return place
}

/** The place a thrown redirect leads to, null when it is none. Its digest reads `NEXT_REDIRECT;push;/path;307;`. */
export function redirectPlace(thrown: unknown): string | null {
  const digest = digestOf(thrown)
  return digest.startsWith('NEXT_REDIRECT;') ? digest.split(';').slice(2, -2).join(';') : null
}

export const digestOf = (thrown: unknown): string =>
  (thrown instanceof Error && 'digest' in thrown && typeof thrown.digest === 'string' ? thrown.digest : '')
