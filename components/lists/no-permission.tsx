'use client'

import { usePathname } from 'next/navigation'
import { PageHead } from '@/components/shell/page-head'
import { ButtonLink } from '@/components/ui/button'
import { EmptyNote } from '@/components/ui/note'
import type { Action } from '@/lib/auth/permissions'
import type { Role } from '@/lib/auth/roles'
import { rolesThatMay } from '@/lib/auth/who-may'
import { roleNames } from '@/lib/words/roles'

type Need = { path: RegExp, what: string, anyOf: [Action, ...Action[]] }

// What each page is for and asks of a role, the narrowest first. Words only: lib/data is what refuses.
const needs: readonly Need[] = [
  { path: /^\/engines\/new$/, what: 'lay out engines', anyOf: ['engine.write'] },
  { path: /^\/engines/, what: 'read engines', anyOf: ['engine.read'] },
  { path: /^\/scenarios\/[^/]+\/release$/, what: 'release plans', anyOf: ['plan.release'] },
  { path: /^\/scenarios\/new$/, what: 'start scenarios', anyOf: ['scenario.create'] },
  { path: /^\/scenarios/, what: 'work on scenarios', anyOf: ['scenario.read', 'scenario.readOwn'] },
]

const listed = (words: readonly string[]) => (words.length < 2 ? words.join('') : `${words.slice(0, -1).join(', ')} and ${words.at(-1)}`)
const nameOf = (role: Role) => roleNames[role].toLowerCase()

/** In place of a page that this role does not open: which roles do, and who can change that. */
export function NoPermission({ role }: { role: Role }) {
  const path = usePathname()
  const need = needs.find((one) => one.path.test(path))
  return (
    <>
      <PageHead over="No permission" title={need ? `Your role does not ${need.what}` : 'Your role does not open this page'} />
      <div className="body">
        <EmptyNote level={2} title={`You are here as ${nameOf(role)}`}>
          {need ? <p>In this shop those who {need.what} are: {listed(rolesThatMay(...need.anyOf).map(nameOf))}. The shop’s owner can change roles.</p> : <p>The shop’s owner can change roles.</p>}
          <p className="mt-3"><ButtonLink href="/plans">To the released plans</ButtonLink></p>
        </EmptyNote>
      </div>
    </>
  )
}
