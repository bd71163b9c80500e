'use client'

import { useRouter } from 'next/navigation'
import { startTransition } from 'react'
import { PageHead } from '@/components/shell/page-head'
import { Button } from '@/components/ui/button'
import { FailedNote } from '@/components/ui/note'

interface ErrorPageProps {
  error: Error & { digest?: string }
  reset: () => void
}

/** A page that could not be read: the frame stays, and it can be tried again in place. */
export default function ShopError({ error, reset }: ErrorPageProps) {
  const router = useRouter()
  // What failed was read on the server: it must be asked again, not only drawn again.
  const again = () => startTransition(() => {
    router.refresh()
    reset()
  })
  return (
    <>
      <PageHead title="This page could not be made" />
      <div className="body">
        <FailedNote level={2} title="Something failed on our side">
          <p>What was saved before is kept. The records may be out of reach for a moment, or the connection may be gone.{error.digest ? <> If it happens again, quote <b>{error.digest}</b>.</> : null}</p>
          <p className="mt-3"><Button kind="do" onClick={again}>Try again</Button></p>
        </FailedNote>
      </div>
    </>
  )
}
