import { memo } from 'react'
import { VerdictMark } from '@/components/ui/verdict-mark'
import { computedText, differenceText, expectedText, toleranceText } from '@/lib/method/check-figures'
import { isOutside, type CheckOutcome } from '@/lib/method/judge-check'
import type { PublishedCheck } from '@/tests/published/published-case'

function Figure({ name, children }: { name: string, children: string | null }) {
  return <span className="fig"><span className="name">{name} </span>{children === null ? <span className="fine">not yet</span> : <span className="n">{children}</span>}</span>
}

/** One figure: verdict, what it is, expected, computed, difference, tolerance. */
export const CheckRow = memo(function CheckRow({ check, outcome, folded = false }: { check: PublishedCheck, outcome: CheckOutcome | undefined, folded?: boolean }) {
  const isBad = outcome !== undefined && isOutside(outcome)
  return (
    <li className={`chk${isBad ? ' hit' : ''}${folded ? ' folded' : ''}`}>
      <VerdictMark verdict={outcome === undefined ? 'notJudged' : isBad ? 'outside' : 'within'}>{outcome === undefined ? 'Waits' : undefined}</VerdictMark>
      <span className="what">
        {check.label}
        {check.toleranceReason ? <small>Tolerance: {check.toleranceReason}</small> : null}
        {check.knownDeviation ? <small>Known deviation: {check.knownDeviation}</small> : null}
        {outcome?.ok === false ? <small className="bad">Not computed: {outcome.message}</small> : null}
      </span>
      <Figure name="expected">{expectedText(check)}</Figure>
      <Figure name="computed">{outcome?.ok ? computedText(check, outcome.computed) : null}</Figure>
      <Figure name="difference">{outcome?.ok ? differenceText(check, outcome.difference) : null}</Figure>
      <Figure name="tolerance">{toleranceText(check)}</Figure>
    </li>
  )
})
