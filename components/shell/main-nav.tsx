'use client'

import Link from 'next/link'
import { usePathname } from 'next/navigation'

export interface NavItem {
  href: string
  label: string
}

/** The page one is on, and every page below it. */
const isHere = (path: string, href: string) => path === href || path.startsWith(`${href}/`)

export function MainNav({ items }: { items: readonly NavItem[] }) {
  const path = usePathname()
  return (
    <nav className="main" aria-label="Main">
      {items.map((item) => <Link prefetch={false} key={item.href} href={item.href} aria-current={isHere(path, item.href) ? 'page' : undefined}>{item.label}</Link>)}
    </nav>
  )
}
