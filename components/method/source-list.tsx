import { sources } from '@/lib/calc/live'

/** Every publication the library rests on, with what is taken from it and how far it was traced. */
export function SourceList() {
  return (
    <ul className="rows srclist">
      {Object.values(sources).map(({ id, author, title, year, provenance, use }) => (
        <li key={id} id={`source-${id}`} tabIndex={-1}>
          <p><b>{author}</b>, <cite>{title}</cite>{year === null ? '' : `, ${year}`} <span className={`tag ${provenance.replace(' ', '-')}`}>{provenance === 'read' ? 'read in the source' : provenance === 'memory' ? 'from memory' : provenance}</span></p>
          <p className="fine">{use}</p>
        </li>
      ))}
    </ul>
  )
}
