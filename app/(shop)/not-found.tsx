import type { Metadata } from 'next'
import { PageHead } from '@/components/shell/page-head'
import { ButtonLink } from '@/components/ui/button'
import { EmptyNote } from '@/components/ui/note'

export const metadata: Metadata = { title: 'Not in this shop' }

export default function NotFound() {
  return (
    <>
      <PageHead over="Not found" title="There is no such page in this shop" />
      <div className="body">
        <EmptyNote level={2} title="Nothing stands at this address">
          <p>The address may be mistyped, what stood here may have been removed, or it belongs to another shop than the one you are in.</p>
          <p className="mt-3 acts"><ButtonLink href="/plans">To the released plans</ButtonLink><ButtonLink href="/scenarios">To the scenarios</ButtonLink></p>
        </EmptyNote>
      </div>
    </>
  )
}
