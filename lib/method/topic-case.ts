import type { PublishedCase, PublishedCheck } from '@/tests/published/published-case'

/** A published case as far as it belongs to one topic. */
export interface TopicCase {
  id: string
  title: string
  provenance: PublishedCase['provenance']
  /** Author and year, and where in it. */
  source: string
  note: string | null
  checks: readonly PublishedCheck[]
}

/** How a figure is known, as the page says it. */
export const provenanceWords: Record<PublishedCase['provenance'], string> = {
  read: 'read in the source',
  memory: 'from memory',
  'common practice': 'common practice',
  computed: 'follows by computing',
}
