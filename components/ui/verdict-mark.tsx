import type { ReactNode } from 'react'
import { verdictClass, verdictWords, type VerdictName } from './verdict'

const ring = <circle cx="8" cy="8" r="6.2" fill="none" stroke="currentColor" strokeWidth="1.6" />
const wire = <><path d="M1 8H5M11 8H15" stroke="currentColor" strokeWidth="1.8" /><path d="M8 3 13 8 8 13 3 8Z" fill="currentColor" /></>

const shapes: Record<VerdictName, ReactNode> = {
  within: <>{ring}<circle cx="8" cy="8" r="2.4" fill="currentColor" /></>,
  close: <><path d="M8 1 15 8 8 15 1 8Z" fill="none" stroke="currentColor" strokeWidth="1.6" /><path d="M8 1 8 15 1 8Z" fill="currentColor" /></>,
  outside: <><path d="M8 .4 15.6 8 8 15.6 .4 8Z" fill="currentColor" /><path d="M8 4.2V8.9M8 10.6V12" stroke="var(--paper)" strokeWidth="1.8" /></>,
  early: <><path d="M14.6 1V15M14.6 8H9" stroke="currentColor" strokeWidth="1.6" /><path d="M5.6 2.4 11.2 8 5.6 13.6 0 8Z" fill="currentColor" /></>,
  late: <><path d="M1.4 1V15M1.4 8H7" stroke="currentColor" strokeWidth="1.6" /><path d="M10.4 2.4 16 8 10.4 13.6 4.8 8Z" fill="currentColor" /></>,
  due: ring,
  notJudged: <circle cx="8" cy="8" r="6.2" fill="none" stroke="currentColor" strokeWidth="1.6" strokeDasharray="2.4 2.4" />,
  single: wire,
  singleHeat: wire,
}

/** The shape alone; the word must stand beside it. */
export function VerdictShape({ verdict }: { verdict: VerdictName }) {
  return <svg viewBox="0 0 16 16" aria-hidden="true">{shapes[verdict]}</svg>
}

interface VerdictMarkProps {
  verdict: VerdictName
  /** In the margin of a list the word is for readers only: the row itself says it in sight. */
  wordless?: boolean
  /** Another word in its place: "Overdue 6 days". */
  children?: ReactNode
}

export function VerdictMark({ verdict, wordless = false, children }: VerdictMarkProps) {
  const word = children ?? verdictWords[verdict]
  return <span className={`v ${verdictClass(verdict)}`}><VerdictShape verdict={verdict} />{wordless ? <span className="sr">{word}</span> : word}</span>
}
