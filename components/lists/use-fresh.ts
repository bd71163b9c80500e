'use client'

import { useEffect, useState } from 'react'
import useSWR from 'swr'
import { fetchJson, FetchProblem } from './fetch-json'

export interface Fresh<T> {
  data: T
  /** The last refresh failed: what is shown is older than it could be. */
  problem: FetchProblem | null
  /** When what is shown was read, as this browser's clock has it; null before the first refresh. */
  readAt: Date | null
  retry: () => void
}

/**
 * A list as the server drew it, kept fresh from its GET route: once after the page has come (a page the browser kept may be old),
 * when the window gets the focus, and when the connection returns. Another page from the server, after a save, wins at once.
 */
export function useFresh<T>(url: string, initial: T): Fresh<T> {
  const [readAt, setReadAt] = useState<Date | null>(null)
  const { data, error, mutate } = useSWR<T, unknown>(url, fetchJson<T>, {
    fallbackData: initial, revalidateOnMount: false, onSuccess: () => setReadAt(new Date()),
  })
  useEffect(() => {
    void mutate(initial, { revalidate: true })
  }, [initial, mutate])
  const problem = error === undefined || error === null ? null : error instanceof FetchProblem ? error : new FetchProblem('The list could not be read.')
  return { data: data ?? initial, problem, readAt, retry: () => void mutate() }
}
