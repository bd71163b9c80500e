'use client'

import { useEffect, useRef } from 'react'
import { fieldId } from './field-frame'
import { VerdictShape } from './verdict-mark'

interface ErrorSummaryProps {
  /** What did not happen: "The engine was not saved". */
  title: string
  /** A reason that belongs to no field. */
  formError?: string
  fieldErrors?: Record<string, string>
  /** The label of each field, where its name would not read well. */
  labels?: Record<string, string>
  /** Another id than the one a field takes from its name. */
  idOf?: (name: string) => string
}

/** What did not go in, each with a link to its place. It takes the focus when it appears, so that it is heard and seen. */
export function ErrorSummary({ title, formError, fieldErrors, labels = {}, idOf = fieldId }: ErrorSummaryProps) {
  const box = useRef<HTMLDivElement>(null)
  const entries = Object.entries(fieldErrors ?? {})
  const shown = formError !== undefined || entries.length > 0
  // A second refused attempt brings another object, and the focus again; typing meanwhile does not.
  useEffect(() => {
    if (shown) box.current?.focus()
  }, [shown, fieldErrors, formError])
  if (!shown) return null
  return (
    <div ref={box} className="errors" role="alert" tabIndex={-1}>
      <h2><VerdictShape verdict="outside" />{title}</h2>
      {formError ? <p>{formError}</p> : null}
      {entries.length > 0 ? (
        <ul>
          {entries.map(([name, words]) => <li key={name}><a className="link" href={`#${idOf(name)}`}>{labels[name] ? `${labels[name]}: ` : ''}{words}</a></li>)}
        </ul>
      ) : null}
    </div>
  )
}
