/** Small drawings used as marks. None stands without a word beside it; all are hidden from readers. */

/** The brand: a distributor's arm over half a turn. */
export function BrandGlyph() {
  return (
    <svg viewBox="0 0 22 22" aria-hidden="true">
      <circle cx="11" cy="11" r="9.6" fill="none" stroke="currentColor" strokeWidth="1.4" />
      <path d="M11 4.6A6.4 6.4 0 0 1 11 17.4" fill="none" stroke="currentColor" strokeWidth="2.6" />
      <path d="M11 11 5.6 3.4" stroke="currentColor" strokeWidth="1.6" />
    </svg>
  )
}

/** Points right; the fold turns it down when it opens. */
export function CaretGlyph() {
  return <svg viewBox="0 0 12 12" aria-hidden="true"><path d="M4 2 8.5 6 4 10" fill="none" stroke="currentColor" strokeWidth="1.6" /></svg>
}

/** Points down: a menu. */
export function DownGlyph() {
  return <svg viewBox="0 0 12 12" aria-hidden="true"><path d="M2 4 6 8.5 10 4" fill="none" stroke="currentColor" strokeWidth="1.6" /></svg>
}

export function CautionGlyph() {
  return (
    <svg viewBox="0 0 24 24" aria-hidden="true">
      <path d="M12 2.5 22.5 21H1.5Z" fill="none" stroke="currentColor" strokeWidth="1.8" strokeLinejoin="round" />
      <path d="M12 9v6M12 17v2" stroke="currentColor" strokeWidth="2" />
    </svg>
  )
}
