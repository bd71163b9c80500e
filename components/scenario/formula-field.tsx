'use client'

import { useId } from 'react'
import { fieldId } from '@/components/ui/field-frame'
import type { FieldDef } from '@/lib/schemas/field'

interface FormulaFieldProps {
  field: FieldDef
  value: string
  onChange: (name: string, value: string) => void
  error?: string
  /** Index of the faulty character. */
  faultAt?: number
  flagged?: boolean
}

/** A formula, with its fault under the character it belongs to. */
export function FormulaField({ field, value, onChange, error, faultAt, flagged }: FormulaFieldProps) {
  const id = fieldId(field.name)
  const noteId = useId()
  const errorId = useId()
  const place = faultAt === undefined ? null : Math.min(Math.max(0, faultAt), value.length)
  return (
    <div className={`formula${error ? ' err' : ''}${flagged ? ' flag' : ''}`}>
      <label htmlFor={id}>{field.label}</label>
      <textarea
        id={id} name={field.name} className="in" rows={2} value={value} maxLength={field.maxLength} spellCheck={false} autoComplete="off"
        aria-invalid={error ? true : undefined} aria-describedby={error ? `${errorId} ${noteId}` : noteId}
        onChange={(event) => onChange(field.name, event.target.value.replace(/\r?\n/g, ' '))}
      />
      {error && place !== null ? (
        <p className="fault" aria-hidden="true">
          <span>{value.slice(0, place)}</span><mark data-at={place}>{value.slice(place, place + 1) || '\u00a0'}</mark><span>{value.slice(place + 1)}</span>
        </p>
      ) : null}
      {error ? <p className="fmsg" id={errorId}>{place === null ? '' : `At character ${place + 1}: `}{error}</p> : null}
      <p className="fnote" id={noteId}>{field.help}</p>
    </div>
  )
}
