'use client'

import { useEffect } from 'react'
import { SectionHead } from '@/components/ui/section'
import type { TopicCase } from '@/lib/method/topic-case'
import { CaseChecks } from './case-checks'
import { useCheckCounts, useCheckRun } from './check-run-context'

const keyOf = (topic: string, id: string, index: number) => `${topic}/${id}/${index}`

/** Published figures of one topic: what the source says, and what this browser computes. */
export function TopicChecks({ topic, cases }: { topic: string, cases: readonly TopicCase[] }) {
  const run = useCheckRun()
  const counts = useCheckCounts(topic)
  useEffect(() => run.add(topic, cases.flatMap(({ id, checks }) => checks.map((check, i) => ({ key: keyOf(topic, id, i), check })))), [run, topic, cases])
  const total = cases.reduce((sum, { checks }) => sum + checks.length, 0)
  if (total === 0) return <div className="sec"><SectionHead title="Published checks" level={3} /><p className="fine">None: no published figure for these functions has been found yet.</p></div>
  const done = counts?.computed === total
  const right = done ? (counts.outside > 0 ? `${counts.outside} of ${total} outside` : `${total} within`) : `${total} to compute`
  return (
    <div className="sec checks">
      <SectionHead title="Published checks" right={right} level={3} />
      <div className="chk hd" aria-hidden="true"><span>Verdict</span><span>Figure</span><span className="r">Expected</span><span className="r">Computed</span><span className="r">Difference</span><span className="r">Tolerance</span></div>
      {cases.map((published) => <CaseChecks key={published.id} published={published} outcomes={published.checks.map((_, i) => run.outcomeOf(keyOf(topic, published.id, i)))} />)}
    </div>
  )
}
