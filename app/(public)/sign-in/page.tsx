import type { Metadata } from 'next'
import { ExampleWheel } from '@/components/people/example-wheel'
import { EntryPage } from '@/components/people/entry-page'
import { SignInForm } from '@/components/people/sign-in-form'
import { TextLink } from '@/components/ui/button'
import { signIn } from './actions'

export const metadata: Metadata = { title: 'Sign in' }

export default async function SignInPage({ searchParams }: { searchParams: Promise<{ next?: string | string[] }> }) {
  const { next } = await searchParams
  const wish = typeof next === 'string' ? next : undefined
  return (
    <EntryPage title="Sign in" picture={<ExampleWheel words />}>
      {wish ? <p className="mb-5">Sign in to go on to the page you asked for.</p> : null}
      <SignInForm action={signIn} next={wish} />
      <p className="alt">New here? <TextLink href={wish ? `/sign-up?next=${encodeURIComponent(wish)}` : '/sign-up'}>Make an account</TextLink> with a shop of your own.</p>
    </EntryPage>
  )
}
