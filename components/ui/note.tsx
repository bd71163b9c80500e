import type { ReactNode } from 'react'
import { VerdictShape } from './verdict-mark'

interface NoteProps {
  title: ReactNode
  children?: ReactNode
  level?: 2 | 3
}

/** Nothing here yet: what would stand here, and how it gets here. */
export function EmptyNote({ title, children, level = 3 }: NoteProps) {
  const Heading = level === 2 ? 'h2' : 'h3'
  return <div className="empty"><Heading>{title}</Heading>{children}</div>
}

/** A result that is not shown: the reason stands in its place, never a dash. */
export function WithheldNote(props: NoteProps) {
  return <EmptyNote {...props} />
}

/** Something failed: what, that nothing typed is lost, what to do. */
export function FailedNote({ title, children, level = 3 }: NoteProps) {
  const Heading = level === 2 ? 'h2' : 'h3'
  return <div className="empty failed" role="alert"><Heading><VerdictShape verdict="outside" />{title}</Heading>{children}</div>
}
