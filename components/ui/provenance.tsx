import type { ReactNode } from 'react'

/** Where a typed number comes from. */
export type Provenance = 'typed' | 'measured' | 'sheet' | 'default' | 'solved'

export const provenanceWords: Record<Provenance, string> = {
  typed: 'typed',
  measured: 'measured',
  sheet: 'engine sheet',
  default: 'default',
  solved: 'solved',
}

const dashedRing = <circle cx="7" cy="7" r="4.5" fill="none" stroke="currentColor" strokeWidth="1.3" strokeDasharray="2 1.8" />
const shapes: Record<Provenance, ReactNode> = {
  typed: <path d="M2 12 3 9 10 2 12 4 5 11Z" fill="none" stroke="currentColor" strokeWidth="1.3" />,
  measured: <path d="M1 5H13V10H1ZM4 5V7.5M7 5V8M10 5V7.5" fill="none" stroke="currentColor" strokeWidth="1.2" />,
  sheet: <path d="M3 1.5H9L11.5 4V12.5H3Z" fill="none" stroke="currentColor" strokeWidth="1.3" />,
  default: dashedRing,
  solved: dashedRing,
}

export function ProvenanceShape({ source }: { source: Provenance }) {
  return <svg viewBox="0 0 14 14" aria-hidden="true">{shapes[source]}</svg>
}

/** The words of the marks, once under a column of fields. */
export function ProvenanceKey({ sources = ['typed', 'measured', 'sheet', 'default'] }: { sources?: readonly Provenance[] }) {
  return (
    <p className="key fine">
      {sources.map((source) => (
        <span key={source}><ProvenanceShape source={source} />{source === 'default' ? 'default, solved' : provenanceWords[source]}</span>
      ))}
    </p>
  )
}
