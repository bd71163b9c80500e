import { TimeAt } from '@/components/lists/time-at'
import { verdictOf } from '@/components/lists/row-verdict'
import { TextLink } from '@/components/ui/button'
import { VerdictMark } from '@/components/ui/verdict-mark'
import { DegreeWheel } from '@/components/wheel/degree-wheel'
import { firingSchedule } from '@/lib/calc/live'
import type { RevisionDto } from '@/lib/schemas/revision-dto'
import { headLine } from '@/lib/words/findings'

/** One side of a comparison: digit, name, when and by whom, wheel at full power, count. */
export function CompareSide({ revision, digit, href }: { revision: RevisionDto, digit: 1 | 2, href: string }) {
  const { engine: { spec }, results, title, number, createdAt, author, releasedAt } = revision
  const full = results.parts.speeds.ok ? results.parts.speeds.points.full : null
  const firings = firingSchedule({ firingOrder: spec.firingOrder, ...(spec.intervalsDeg ? { intervalsDeg: spec.intervalsDeg } : {}) })
  return (
    <section className="cside" aria-label={`${digit}: revision ${number}`}>
      <h2><span className="digit">{digit}</span> <TextLink href={href}>{title}</TextLink></h2>
      <small>revision {number}, <TimeAt iso={createdAt} />, {author.name}{releasedAt ? '; released' : ''}</small>
      {full ? (
        <DegreeWheel
          width={238} rpm={full.rpm} rotation={spec.crankRotation} cylindersAt={firings.map(({ cylinder, atDeg }) => ({ label: String(cylinder), atDeg }))}
          primaryDeg={full.primaryDeg} backupDeg={full.backupDeg} staggerDeg={full.staggerDeg} staggerMs={full.staggerMs}
        />
      ) : null}
      <p><VerdictMark verdict={verdictOf(results.counts)}>{headLine(results.counts)}</VerdictMark></p>
    </section>
  )
}
