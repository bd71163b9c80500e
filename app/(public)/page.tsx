import type { Metadata } from 'next'
import { cookies } from 'next/headers'
import { setTheme } from '@/app/actions'
import { ExampleWheel } from '@/components/people/example-wheel'
import { BackupPowerExample, ProofSpeedExample } from '@/components/people/landing-examples'
import { PageFoot } from '@/components/shell/page-foot'
import { readTheme, themeCookie } from '@/components/shell/theme'
import { ThemeSwitch } from '@/components/shell/theme-switch'
import { TopStrip } from '@/components/shell/top-strip'
import { ButtonLink, TextLink } from '@/components/ui/button'

export const metadata: Metadata = { title: { absolute: 'Halfspeed: two sparks for every cylinder' } }

export default async function FrontPage() {
  const theme = readTheme((await cookies()).get(themeCookie)?.value)
  return (
    <>
      <TopStrip homeHref="/"><TextLink href="/sign-in" className="text-ink">Sign in</TextLink></TopStrip>
      <main id="main" className="ld" tabIndex={-1}>
        <section className="hero1" aria-labelledby="front-title">
          <div>
            <h1 id="front-title">Two sparks for every cylinder. Know when each one fires, and what is left when one does not.</h1>
            <p className="lead">A workbench for shops that put two independent ignition channels on the air-cooled flat sixes of small homebuilt aircraft: lay out the timing, see at once what lies outside its limit, keep every revision, release the plan.</p>
            <p className="acts"><ButtonLink href="/sign-up" kind="do" size="big">Start a shop’s book</ButtonLink><ButtonLink href="/sign-in" size="big">Sign in</ButtonLink></p>
          </div>
          <div><ExampleWheel /></div>
        </section>
        <div className="three">
          <section aria-labelledby="front-plan">
            <h2 id="front-plan">Plan</h2>
            <p>Change one number: advance, stagger, power and run-up drop follow at once. What lies outside its limit is named, with the limit and whose it is.</p>
            <BackupPowerExample />
          </section>
          <section aria-labelledby="front-prove">
            <h2 id="front-prove">Prove</h2>
            <p>The best check is one at a slow idle. The workbench says from which speed a timing light shows full timing, and warns when that is beside a turning propeller.</p>
            <ProofSpeedExample />
          </section>
          <section aria-labelledby="front-keep">
            <h2 id="front-keep">Keep</h2>
            <p>Every save is a revision that can be opened and compared. Two people saving at once lose nothing. A released plan is never changed, and the whole shop reads it.</p>
            <ul className="rows mt-4" aria-label="An example of revisions">
              <li className="py-1.5">the newest revision, being worked on</li>
              <li className="py-1.5">an older one, released as a plan</li>
            </ul>
          </section>
        </div>
        <p className="fine pb-8">The figures on this page belong to an invented engine and are computed by the same library as the workbench. <TextLink href="/method">Every equation, its source, and where it is weak</TextLink></p>
      </main>
      <PageFoot><ThemeSwitch theme={theme} setTheme={setTheme} /></PageFoot>
    </>
  )
}
