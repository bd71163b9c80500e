import type { Metadata } from 'next'
import { ButtonLink } from '@/components/ui/button'

export const metadata: Metadata = { title: 'No such page' }

export default function NotFound() {
  return (
    <main id="main" className="alone" tabIndex={-1}>
      <h1>There is no such page</h1>
      <p>The address may be mistyped, the page may have been removed, or it belongs to another shop than the one you are in.</p>
      <p className="acts"><ButtonLink href="/scenarios" kind="do">To the scenarios</ButtonLink><ButtonLink href="/">To the front page</ButtonLink></p>
    </main>
  )
}
