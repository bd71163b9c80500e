import Link from 'next/link'
import type { ReactNode } from 'react'
import { BrandGlyph } from '@/components/ui/glyphs'

interface EntryPageProps {
  title: string
  /** The form and the lines under it. */
  children: ReactNode
  /** What stands at the right in a wide window. */
  picture: ReactNode
}

/** Sign-in and sign-up: form at the left, the wheel at the right. */
export function EntryPage({ title, children, picture }: EntryPageProps) {
  return (
    <main className="si" id="main" tabIndex={-1}>
      <div className="form">
        <Link prefetch={false} className="mark" href="/"><BrandGlyph />Halfspeed</Link>
        <h1>{title}</h1>
        {children}
      </div>
      <div className="pic">{picture}</div>
    </main>
  )
}
