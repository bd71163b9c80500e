/** What an address asks of a list, as its schema reads it. */
export type ListParams = Readonly<Record<string, string>>

/** The list's address with some of it changed: an empty value takes a name out, and any change but of the place starts from the first page. */
export function listAddress(path: string, params: ListParams, changes: Record<string, string | null> = {}): string {
  const merged: Record<string, string | null> = { ...params, ...('cursor' in changes ? {} : { cursor: null }), ...changes }
  const search = new URLSearchParams(Object.entries(merged).flatMap(([name, value]) => (value ? [[name, value]] : [])))
  const text = search.toString()
  return text ? `${path}?${text}` : path
}

/** Names in an address that narrow a list; state, sort and place do not. */
export const isNarrowed = (params: ListParams): boolean => Boolean(params.search || params.engineId)
