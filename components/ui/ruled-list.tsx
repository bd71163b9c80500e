import clsx from 'clsx'
import type { ReactNode } from 'react'

export function RuledList({ label, children, className }: { label?: string, children: ReactNode, className?: string }) {
  return <ul className={clsx('rows', className)} aria-label={label}>{children}</ul>
}

interface RuledRowProps {
  /** The margin: a verdict mark, or nothing. */
  mark?: ReactNode
  children: ReactNode
  /** What stands at the right end. */
  right?: ReactNode
  /** Outside its limit: red wash over the row. */
  hit?: boolean
}

/** Mark in the margin, what it is, and what stands at the end. */
export function RuledRow({ mark, children, right, hit = false }: RuledRowProps) {
  return <li className={clsx('row', hit && 'hit')}><span>{mark}</span><div className="what">{children}</div>{right ? <div>{right}</div> : null}</li>
}
