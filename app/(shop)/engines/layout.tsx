import { forbidden } from 'next/navigation'
import type { ReactNode } from 'react'
import { can } from '@/lib/auth/permissions'
import { requireActor } from '@/lib/auth/session'

/** Asked before anything of a page is sent, so that the answer carries its status; lib/data is what refuses. */
export default async function EnginesLayout({ children }: { children: ReactNode }) {
  if (!can(await requireActor(), 'engine.read')) forbidden()
  return children
}
