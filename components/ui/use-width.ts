'use client'

import { useEffect, useRef, useState, type RefObject } from 'react'

/** The width an element is given, px; null until it is on the screen. Drawings are made anew for it, not scaled. */
export function useWidth<T extends HTMLElement>(): [RefObject<T | null>, number | null] {
  const ref = useRef<T>(null)
  const [width, setWidth] = useState<number | null>(null)
  useEffect(() => {
    const element = ref.current
    if (!element) return
    const measure = (next: number) => {
      // A hidden part of the page has no width: it keeps the last one.
      if (next > 0) setWidth(Math.floor(next))
    }
    measure(element.clientWidth)
    const observer = new ResizeObserver((entries) => measure(entries[0]?.contentRect.width ?? 0))
    observer.observe(element)
    return () => observer.disconnect()
  }, [])
  return [ref, width]
}
