'use client'

import { useEffect, useState, useSyncExternalStore } from 'react'
import useSWR from 'swr'
import { fetchJson, FetchProblem, noConnection } from './fetch-json'

export interface Fresh<T> {
  data: T
  /** The last refresh failed: what is shown is older than it could be. */
  problem: FetchProblem | null
  /** When what is shown was read, as this browser's clock has it; null before the first refresh. */
  readAt: Date | null
  retry: () => void
}

const watchConnection = (changed: () => void) => {
  window.addEventListener('online', changed)
  window.addEventListener('offline', changed)
  return () => {
    window.removeEventListener('online', changed)
    window.removeEventListener('offline', changed)
  }
}

const offline = new FetchProblem(noConnection)

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
  // Without a connection nothing is even tried, so no error would come of it.
  const isOnline = useSyncExternalStore(watchConnection, () => navigator.onLine, () => true)
  const failed = error === undefined || error === null ? null : error instanceof FetchProblem ? error : new FetchProblem('The list could not be read.')
  return { data: data ?? initial, problem: isOnline ? failed : offline, readAt, retry: () => void mutate() }
}
