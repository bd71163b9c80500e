import type { ReactNode } from 'react'
import { CaretGlyph } from './glyphs'

interface FoldProps {
  title: ReactNode
  /** One line that stands for the group while it is folded. */
  summary?: ReactNode
  open?: boolean
  level?: 2 | 3
  onToggle?: (open: boolean) => void
  children: ReactNode
}

/** A long group that folds to one line; works without a script. */
export function Fold({ title, summary, open, level = 3, onToggle, children }: FoldProps) {
  const Heading = level === 2 ? 'h2' : 'h3'
  return (
    <details className="fold" open={open} onToggle={onToggle ? (event) => onToggle(event.currentTarget.open) : undefined}>
      <summary><CaretGlyph /><Heading>{title}</Heading><span className="sum">{summary}</span></summary>
      {children}
    </details>
  )
}
