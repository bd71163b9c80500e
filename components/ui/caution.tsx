import type { ReactNode } from 'react'
import { CautionGlyph } from './glyphs'

/** Stands where the work is done: what can hurt, and what to do first. */
export function Caution({ lead, children }: { lead?: ReactNode, children: ReactNode }) {
  return <div className="caution" role="note"><CautionGlyph /><p>{lead ? <><b>{lead}</b> </> : null}{children}</p></div>
}
