import type { ReactNode } from 'react'
import { verdictClass, type VerdictName } from './verdict'
import { VerdictShape } from './verdict-mark'

interface StampProps {
  verdict: VerdictName
  /** The count: "1 outside its limit, 3 close". Never an approval. */
  head: ReactNode
  /** One sentence, with the one number in <b className="one">. */
  children?: ReactNode
  /** Says a change to a reader without taking the focus. */
  live?: boolean
}

export function Stamp({ verdict, head, children, live = false }: StampProps) {
  return (
    <div className={`stamp ${verdictClass(verdict)}`} aria-live={live ? 'polite' : undefined} aria-atomic={live ? true : undefined}>
      <VerdictShape verdict={verdict} />
      <b>{head}</b>
      <span>{children}</span>
    </div>
  )
}
