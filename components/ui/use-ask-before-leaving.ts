'use client'

import { useEffect } from 'react'

/** While something typed is not saved, the browser asks before it leaves the page. */
export function useAskBeforeLeaving(dirty: boolean): void {
  useEffect(() => {
    if (!dirty) return
    const ask = (event: BeforeUnloadEvent) => event.preventDefault()
    window.addEventListener('beforeunload', ask)
    return () => window.removeEventListener('beforeunload', ask)
  }, [dirty])
}
