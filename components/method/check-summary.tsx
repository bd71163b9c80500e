'use client'

import { LinkButton } from '@/components/ui/button'
import { Stamp } from '@/components/ui/stamp'
import { useCheckCounts, useCheckRun, useRunFailed } from './check-run-context'

/** What all checks of the page come to, growing as they are computed. Only the end is read out. */
export function CheckSummary({ total, known }: { total: number, known: string }) {
  const run = useCheckRun()
  const { computed, within, outside } = useCheckCounts() ?? { computed: 0, within: 0, outside: 0 }
  const hasFailed = useRunFailed()
  const isDone = total > 0 && computed === total
  const counts = `${total} checks, ${within} within, ${outside} outside`
  const head = isDone
    ? outside > 0 ? `${outside} of ${total} checks outside ${outside === 1 ? 'its' : 'their'} tolerance` : `All ${total} checks within their tolerance`
    : computed > 0 ? `${computed} of ${total} checks computed` : `${total} published checks`
  return (
    <div className="summary" data-done={isDone || undefined}>
      <Stamp verdict={isDone ? (outside > 0 ? 'outside' : 'within') : 'notJudged'} head={head}>
        {hasFailed
          ? <>The library could not be fetched, so nothing was computed. <LinkButton onClick={run.tryAgain}>Try again</LinkButton></>
          : <>{computed > 0 ? `${counts}, computed in this browser. ` : 'Computed in this browser as soon as the page is there. '}{known}</>}
      </Stamp>
      <p className="sr" role="status">{isDone ? `${counts}.` : ''}</p>
      <p className="note scriptless">The computed column needs a script. Equations, symbols and the figures of the sources stand without it.</p>
    </div>
  )
}
