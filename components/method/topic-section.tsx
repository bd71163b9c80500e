import { Section, SectionHead } from '@/components/ui/section'
import { sources } from '@/lib/calc/live'
import { sourceWords } from '@/lib/words/sources'
import type { Topic } from '@/lib/method/topic'
import type { TopicCase } from '@/lib/method/topic-case'
import { EquationBlock } from './equation-block'
import { TopicChecks } from './topic-checks'

/** One topic: its equations, what is wrong with them, and the published figures they are held against. */
export function TopicSection({ topic, cases }: { topic: Topic, cases: readonly TopicCase[] }) {
  return (
    <div id={topic.id} tabIndex={-1} className="mtopic">
      <Section title={topic.title}>
        <p className="prose">{topic.intro}</p>
        {topic.equations.map((equation) => <EquationBlock key={equation.id} {...equation} />)}
        {topic.handbook
          ? (
            <div className="sec weak">
              <SectionHead title="What handbooks and rules say" level={3} />
              <ul className="rows">{topic.handbook.map(({ says, source }) => <li key={says}>{says} <span className="fine">{sources[source] ? sourceWords(sources[source]) : source}</span></li>)}</ul>
            </div>
          )
          : null}
        <div className="sec weak">
          <SectionHead title="Where it is weak" level={3} />
          <ul className="rows">{topic.weaknesses.map((weakness) => <li key={weakness}>{weakness}</li>)}</ul>
        </div>
        <TopicChecks topic={topic.id} cases={cases} />
      </Section>
    </div>
  )
}
