'use client'

import { fontVariables } from './fonts'
import './globals.css'

interface GlobalErrorProps {
  error: Error & { digest?: string }
  reset: () => void
}

/** Stands in when even the frame of the page failed. */
export default function GlobalError({ error, reset }: GlobalErrorProps) {
  return (
    <html lang="en" className={fontVariables}>
      <body>
        <title>Halfspeed could not start</title>
        <main id="main" className="alone">
          <h1>Halfspeed could not start</h1>
          <p role="alert">Something failed on our side; what you saved before is kept.{error.digest ? <> If it happens again, quote <b>{error.digest}</b>.</> : null}</p>
          <p className="acts"><button type="button" className="btn do" onClick={reset}>Try again</button></p>
        </main>
      </body>
    </html>
  )
}
