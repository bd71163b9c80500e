'use client'

import { Button, ButtonLink } from '@/components/ui/button'

interface ErrorPageProps {
  error: Error & { digest?: string }
  reset: () => void
}

/** A failure nobody foresaw: it is in the log under the reference shown here. */
export default function ErrorPage({ error, reset }: ErrorPageProps) {
  return (
    <main id="main" className="alone" tabIndex={-1}>
      <h1>This page could not be made</h1>
      <p role="alert">Something failed on our side; what you saved before is kept.{error.digest ? <> If it happens again, quote <b>{error.digest}</b>.</> : null}</p>
      <p className="acts"><Button kind="do" onClick={reset}>Try again</Button><ButtonLink href="/scenarios">To the scenarios</ButtonLink></p>
    </main>
  )
}
