import clsx from 'clsx'
import type { ReactNode } from 'react'

interface PageHeadProps {
  /** What this is, its revision or date, when it was saved. */
  over?: ReactNode
  /** Says the state where it can. */
  title: ReactNode
  stamp?: ReactNode
  /** At the right: one filled button at most. */
  actions?: ReactNode
}

export function PageHead({ over, title, stamp, actions }: PageHeadProps) {
  return (
    <div className={clsx('head', stamp && 'with-stamp')}>
      <div>{over ? <p className="over">{over}</p> : null}<h1>{title}</h1></div>
      {stamp}
      {actions ? <div className="acts">{actions}</div> : null}
    </div>
  )
}
