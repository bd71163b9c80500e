'use client'

import clsx from 'clsx'
import { useEffect, useRef, useState, type ReactNode } from 'react'

/** Something too wide for a phone scrolls by itself, and then the Tab key reaches it; while it fits it is no stop. */
export function ScrollBox({ label, className, children }: { label: string, className?: string, children: ReactNode }) {
  const box = useRef<HTMLDivElement>(null)
  const [overflows, setOverflows] = useState(false)
  useEffect(() => {
    const element = box.current
    if (!element) return
    const observer = new ResizeObserver(() => setOverflows(element.scrollWidth > element.clientWidth + 1))
    observer.observe(element)
    for (const child of element.children) observer.observe(child)
    return () => observer.disconnect()
  }, [])
  return <div ref={box} className={clsx('scroll', className)} {...(overflows ? { tabIndex: 0, role: 'group', 'aria-label': label } : {})}>{children}</div>
}
