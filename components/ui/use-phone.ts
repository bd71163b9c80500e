'use client'

import { useSyncExternalStore } from 'react'

/** The width at which the style turns to one column: keep with the media queries of app/styles. */
const query = '(max-width: 760px)'
const media = () => (typeof window.matchMedia === 'function' ? window.matchMedia(query) : null)

function subscribe(changed: () => void) {
  const list = media()
  list?.addEventListener('change', changed)
  return () => list?.removeEventListener('change', changed)
}

/** Whether the page stands in one column; false where it is made on a server. */
export const usePhone = (): boolean => useSyncExternalStore(subscribe, () => media()?.matches ?? false, () => false)
