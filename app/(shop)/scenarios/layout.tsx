import { forbidden } from 'next/navigation'
import type { ReactNode } from 'react'
import { can } from '@/lib/auth/permissions'
import { requireActor } from '@/lib/auth/session'

/** Asked before anything of a page is sent, so that the answer carries its status; lib/data is what refuses. */
export default async function ScenariosLayout({ children }: { children: ReactNode }) {
  const actor = await requireActor()
  if (!can(actor, 'scenario.read') && !can(actor, 'scenario.readOwn')) forbidden()
  return children
}
