import type { Metadata } from 'next'
import { NoPermission } from '@/components/lists/no-permission'
import { requireActor } from '@/lib/auth/session'

export const metadata: Metadata = { title: 'No permission' }

export default async function Forbidden() {
  const { role } = await requireActor()
  return <NoPermission role={role} />
}
