import Link from 'next/link'
import type { ReactNode } from 'react'
import { BrandGlyph } from '@/components/ui/glyphs'
import { MainNav, type NavItem } from './main-nav'

interface TopStripProps {
  /** Where the brand mark leads. */
  homeHref: string
  shopName?: string
  items?: readonly NavItem[]
  /** The right end: the person's menu, or "Sign in". */
  children?: ReactNode
}

export function TopStrip({ homeHref, shopName, items = [], children }: TopStripProps) {
  return (
    <header className="top">
      <Link prefetch={false} className="mark" href={homeHref}><BrandGlyph />Halfspeed</Link>
      {shopName ? <span className="shop"><span>{shopName}</span></span> : null}
      {items.length > 0 ? <MainNav items={items} /> : null}
      <div className="who">{children}</div>
    </header>
  )
}
