import clsx from 'clsx'
import type { ReactNode } from 'react'
import { WithheldNote } from '@/components/ui/note'
import type { Part, PartName } from '@/lib/calc/live'
import { partTitle, withheldWords } from '@/lib/words/parts'

interface PartViewProps<T> {
  name: PartName
  part: Part<T>
  /** An input it stands on cannot be read. */
  stale: boolean
  /** Its figures are being computed again; the word for it stands in the head. */
  pending?: boolean
  isSaved?: boolean
  children: (figures: T) => ReactNode
}

/** The figures of a part; dimmed while an input they stand on cannot be read or they are computed again, or the reason why there are none. */
export function PartView<T>({ name, part, stale, pending = false, isSaved, children }: PartViewProps<T>) {
  if (!part.ok) {
    const { title, reason } = withheldWords(name, part.error, isSaved)
    return <div aria-busy={pending || undefined}><WithheldNote title={title}><p>{reason}</p></WithheldNote></div>
  }
  return (
    <div className={clsx(stale && 'stale', pending && 'again') || undefined} aria-busy={stale || pending || undefined}>
      {stale ? <p className="stale-word" role="status">{partTitle[name]}: last valid figures, an input cannot be read.</p> : null}
      {children(part)}
    </div>
  )
}
