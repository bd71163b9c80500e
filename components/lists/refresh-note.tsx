'use client'

import { LinkButton, TextLink } from '@/components/ui/button'
import { usePathname } from 'next/navigation'
import type { Fresh } from './use-fresh'

const clock = (time: Date) => `${String(time.getHours()).padStart(2, '0')}:${String(time.getMinutes()).padStart(2, '0')}`

/** Says that what stands here may be older than it could be, and why. Nothing of it is taken away. */
export function RefreshNote({ problem, readAt, retry }: Pick<Fresh<unknown>, 'problem' | 'readAt' | 'retry'>) {
  const path = usePathname()
  return (
    <div role="status">
      {problem ? (
        <p className="oldnote">
          <b>Not refreshed.</b> {problem.message} What stands here was read {readAt ? `at ${clock(readAt)}` : 'when the page was opened'}.{' '}
          {problem.signedOut ? <TextLink href={`/sign-in?next=${encodeURIComponent(path)}`}>Sign in again</TextLink> : <LinkButton onClick={retry}>Try again</LinkButton>}
        </p>
      ) : null}
    </div>
  )
}
