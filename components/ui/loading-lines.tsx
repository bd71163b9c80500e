import type { CSSProperties } from 'react'

/** Ruled lines where a list will stand. Nothing moves. */
export function LoadingLines({ label, lines = 6 }: { label: string, lines?: number }) {
  return (
    <div role="status">
      <p className="sr">{label}</p>
      <div className="lines" aria-hidden="true">
        {Array.from({ length: lines }, (_, index) => <span key={index} style={{ '--w': `${[46, 34, 58, 40, 52, 30][index % 6]}%` } as CSSProperties} />)}
      </div>
    </div>
  )
}
