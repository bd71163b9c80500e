import type { ReactNode } from 'react'
import { WithheldNote } from '@/components/ui/note'
import type { Part, PartName } from '@/lib/calc/live'
import { partTitle, withheldWords } from '@/lib/words/parts'

interface PartViewProps<T> {
  name: PartName
  part: Part<T>
  stale: boolean
  children: (figures: T) => ReactNode
}

/** The figures of a part; dimmed while an input they stand on cannot be read, or the reason why there are none. */
export function PartView<T>({ name, part, stale, children }: PartViewProps<T>) {
  if (!part.ok) {
    const { title, reason } = withheldWords(name, part.error)
    return <WithheldNote title={title}><p>{reason}</p></WithheldNote>
  }
  return (
    <div className={stale ? 'stale' : undefined} aria-busy={stale || undefined}>
      {stale ? <p className="stale-word" role="status">{partTitle[name]}: last valid figures, an input cannot be read.</p> : null}
      {children(part)}
    </div>
  )
}
