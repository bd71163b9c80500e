import clsx from 'clsx'
import { useId, type ReactNode } from 'react'

interface SectionHeadProps {
  title: ReactNode
  /** Stands at the right end of the head's line. */
  right?: ReactNode
  level?: 2 | 3
  id?: string
}

/** Head over an ink rule, alone. */
export function SectionHead({ title, right, level = 2, id }: SectionHeadProps) {
  const Heading = level === 2 ? 'h2' : 'h3'
  return <header className="secline"><Heading id={id}>{title}</Heading>{right ? <span className="right fine">{right}</span> : null}</header>
}

/** A head over an ink rule, and what belongs under it. */
export function Section({ title, right, level = 2, id, className, children }: SectionHeadProps & { className?: string, children: ReactNode }) {
  const made = useId()
  const headId = id ?? made
  return (
    <section className={clsx('sec', className)} aria-labelledby={headId}>
      <SectionHead title={title} right={right} level={level} id={headId} />
      {children}
    </section>
  )
}
