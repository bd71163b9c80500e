import type { Metadata } from 'next'
import { ExampleWheel } from '@/components/people/example-wheel'
import { EntryPage } from '@/components/people/entry-page'
import { SignUpForm } from '@/components/people/sign-up-form'
import { TextLink } from '@/components/ui/button'
import { signUp } from './actions'

export const metadata: Metadata = { title: 'Make an account' }

export default async function SignUpPage({ searchParams }: { searchParams: Promise<{ next?: string | string[] }> }) {
  const { next } = await searchParams
  const wish = typeof next === 'string' ? next : undefined
  return (
    <EntryPage title="Make an account" picture={<ExampleWheel words />}>
      <SignUpForm action={signUp} next={wish} />
      <p className="alt">Have one already? <TextLink href={wish ? `/sign-in?next=${encodeURIComponent(wish)}` : '/sign-in'}>Sign in</TextLink>.</p>
    </EntryPage>
  )
}
