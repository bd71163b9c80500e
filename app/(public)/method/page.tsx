import type { Metadata } from 'next'
import { cookies } from 'next/headers'
import { setTheme } from '@/app/actions'
import { CheckRunProvider } from '@/components/method/check-run-context'
import { CheckSummary } from '@/components/method/check-summary'
import { MethodContents } from '@/components/method/method-contents'
import { SourceList } from '@/components/method/source-list'
import { TopicSection } from '@/components/method/topic-section'
import { PageFoot } from '@/components/shell/page-foot'
import { PageHead } from '@/components/shell/page-head'
import { readTheme, themeCookie } from '@/components/shell/theme'
import { ThemeSwitch } from '@/components/shell/theme-switch'
import { TopStrip } from '@/components/shell/top-strip'
import { TextLink } from '@/components/ui/button'
import { Section } from '@/components/ui/section'
import { homeOf } from '@/lib/auth/home'
import { getActor } from '@/lib/auth/session'
import { readCases } from '@/lib/method/read-cases'
import { casesOfTopic } from '@/lib/method/topic-cases'
import { provenanceWords, type TopicCase } from '@/lib/method/topic-case'
import { topics } from '@/lib/method/topics'

export const metadata: Metadata = {
  title: 'Method',
  description: 'Every equation of the calculations, its symbols, source and weaknesses, and published examples computed in your browser.',
}

const checksIn = (cases: readonly TopicCase[]) => cases.reduce((sum, { checks }) => sum + checks.length, 0)

/** "120 read in the source, 20 from memory": how the expected figures are known. */
function knownWords(cases: readonly TopicCase[]): string {
  const counts = Object.entries(provenanceWords).map(([provenance, words]) => ({ words, count: checksIn(cases.filter((each) => each.provenance === provenance)) }))
  return `${counts.filter(({ count }) => count > 0).map(({ words, count }) => `${count} ${words}`).join(', ')}.`
}

export default async function MethodPage() {
  // The page reads nothing of a shop, and must not fail with the database: without an answer the visitor counts as signed out.
  const [cases, actor, jar] = await Promise.all([readCases(), getActor().catch(() => null), cookies()])
  const home = actor ? homeOf(actor) : null
  const parts = topics.map((topic) => ({ topic, cases: casesOfTopic(topic, cases) }))
  const all = parts.flatMap((part) => part.cases)
  return (
    <CheckRunProvider>
      <TopStrip homeHref={home ?? '/'}>
        {home ? <TextLink href={home} className="text-ink">Back to the shop</TextLink> : <TextLink href="/sign-in" className="text-ink">Sign in</TextLink>}
      </TopStrip>
      <main id="main" className="method" tabIndex={-1}>
        <PageHead over="Method" title="Every equation, where it comes from, and where it is weak" />
        <div className="mbody">
          <MethodContents lines={parts.map(({ topic: { id, title }, cases: own }) => ({ id, title, total: checksIn(own) }))} />
          <div className="mtext">
            <CheckSummary total={checksIn(all)} known={knownWords(all)} />
            {parts.map(({ topic, cases: own }) => <TopicSection key={topic.id} topic={topic} cases={own} />)}
            <div id="sources" tabIndex={-1} className="mtopic"><Section title="Sources"><SourceList /></Section></div>
          </div>
        </div>
      </main>
      <PageFoot><ThemeSwitch theme={readTheme(jar.get(themeCookie)?.value)} setTheme={setTheme} /></PageFoot>
    </CheckRunProvider>
  )
}
