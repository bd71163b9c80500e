import { sources } from '../calc/live'
import { sourceWords } from '../words/sources'
import type { PublishedCase } from '@/tests/published/published-case'
import type { Topic } from './topic'
import type { TopicCase } from './topic-case'

/** Each check stands once, under the topic that explains the function it calls; a case that calls several is parted. */
export function casesOfTopic({ functions }: Pick<Topic, 'functions'>, cases: readonly PublishedCase[]): TopicCase[] {
  const explained = new Set(functions)
  return cases.flatMap(({ id, title, source, where, provenance, note, checks }): TopicCase[] => {
    const own = checks.filter(({ fn }) => explained.has(fn))
    const known = sources[source]
    const words = known ? sourceWords(known) : source
    return own.length > 0 ? [{ id, title, provenance, source: where ? `${words}, ${where}` : words, note: note ?? null, checks: own }] : []
  })
}
