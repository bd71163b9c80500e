'use client'

import { config } from 'zod/v4/core'

// The library would otherwise try whether it may compile functions, and the content policy would report each try.
config({ jitless: true })

/** Settings that client libraries need before they are first used. Draws nothing. */
export function ClientSetup() {
  return null
}
