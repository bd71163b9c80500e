'use client'

import { useState } from 'react'
import { LinkButton } from '@/components/ui/button'
import { isOutside, type CheckOutcome } from '@/lib/method/judge-check'
import { provenanceWords, type TopicCase } from '@/lib/method/topic-case'
import { CheckInputs } from './check-inputs'
import { CheckRow } from './check-row'

/** Of a longer list this many stand open; a list hardly longer stands whole. */
const firstRows = 6
const fewMore = 2

/** One published example or data set. The tail of a long table unfolds; what lies outside always stands, and paper shows all. */
export function CaseChecks({ published: { title, provenance, source, note, checks }, outcomes }: { published: TopicCase, outcomes: readonly (CheckOutcome | undefined)[] }) {
  const [showsAll, setShowsAll] = useState(false)
  const folds = checks.length > firstRows + fewMore
  const isFolded = (i: number) => {
    const outcome = outcomes[i]
    return folds && !showsAll && i >= firstRows && !(outcome && isOutside(outcome))
  }
  return (
    <div className="case">
      <p className="casehead"><b>{title}</b> <span className="fine">{source}</span> <span className={`tag ${provenance.replace(' ', '-')}`}>{provenanceWords[provenance]}</span></p>
      {note ? <p className="fine">{note}</p> : null}
      <ul className="rows" aria-label={title}>
        {checks.map((check, i) => <CheckRow key={i} check={check} outcome={outcomes[i]} folded={isFolded(i)} />)}
      </ul>
      {folds ? <p className="fine more"><LinkButton aria-expanded={showsAll} onClick={() => setShowsAll(!showsAll)}>{showsAll ? 'fold' : `show all ${checks.length}`}<span className="sr"> of {title}</span></LinkButton></p> : null}
      <CheckInputs title={title} checks={checks} />
    </div>
  )
}
