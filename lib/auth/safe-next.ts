/** Where to go after signing in, when the wish is a path of this site; anything else, from another host to a script, is null. */
export function safeNext(wish: unknown): string | null {
  if (typeof wish !== 'string' || wish.length > 2000 || !wish.startsWith('/')) return null
  // `//host` and `/\host` are other hosts to a browser, which also drops tabs and line ends before it reads an address.
  if (/^\/[/\\]/.test(wish) || /[\u0000-\u001f\\]/.test(wish)) return null
  const here = 'http://here.invalid'
  if (!URL.canParse(wish, here)) return null
  const url = new URL(wish, here)
  if (url.origin !== here || url.pathname.startsWith('//') || url.pathname.startsWith('/sign-')) return null
  return url.pathname + url.search + url.hash
}
