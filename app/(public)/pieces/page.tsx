import type { Metadata } from 'next'
import { notFound } from 'next/navigation'
import { ControlPieces } from '@/components/pieces/control-pieces'
import { DrawingPieces } from '@/components/pieces/drawing-pieces'
import { FieldPieces } from '@/components/pieces/field-pieces'
import { VerdictPieces } from '@/components/pieces/verdict-pieces'
import { ShellPieces } from '@/components/pieces/shell-pieces'
import { PageHead } from '@/components/shell/page-head'

export const metadata: Metadata = { title: 'Pieces and states' }

/** For those who build pages: every piece once, in each state. Not part of what a shop is served. */
export default function PiecesPage() {
  if (process.env.NODE_ENV === 'production') notFound()
  return (
    <main id="main" tabIndex={-1}>
      <ShellPieces />
      <PageHead over="For developers: every piece once, in each state" title="Pieces and states" />
      <div className="body cols desk:grid-cols-3 border-t border-line pt-4">
        <div><VerdictPieces /></div>
        <div><FieldPieces /></div>
        <div><ControlPieces /></div>
      </div>
      <div className="body"><DrawingPieces /></div>
    </main>
  )
}
