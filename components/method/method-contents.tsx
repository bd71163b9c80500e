'use client'

import { CaretGlyph } from '@/components/ui/glyphs'
import { VerdictMark } from '@/components/ui/verdict-mark'
import { useCheckCounts } from './check-run-context'

export interface ContentsLine {
  id: string
  title: string
  /** Checks under it. */
  total: number
}

function TopicMark({ id, total }: { id: string, total: number }) {
  const counts = useCheckCounts(id)
  if (total === 0) return <span />
  const isDone = counts?.computed === total
  return <VerdictMark verdict={isDone ? (counts.outside > 0 ? 'outside' : 'within') : 'notJudged'} wordless>{isDone ? undefined : 'Waits'}</VerdictMark>
}

function Lines({ lines }: { lines: readonly ContentsLine[] }) {
  return (
    <ul>
      {lines.map(({ id, title, total }) => (
        <li key={id}><TopicMark id={id} total={total} /><a href={`#${id}`}>{title}</a></li>
      ))}
      <li><span /><a href="#sources">Sources</a></li>
    </ul>
  )
}

/** Beside the page in a wide window, folded above it in a narrow one. Each line carries what its checks come to. */
export function MethodContents({ lines }: { lines: readonly ContentsLine[] }) {
  return (
    <div className="mtoc">
      <nav className="beside" aria-label="Contents"><h2 className="fine">Contents</h2><Lines lines={lines} /></nav>
      <details className="fold above">
        <summary><CaretGlyph /><h2>Contents</h2><span className="sum">{lines.length} topics</span></summary>
        <nav aria-label="Contents"><Lines lines={lines} /></nav>
      </details>
    </div>
  )
}
