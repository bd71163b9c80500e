'use client'

import clsx from 'clsx'
import { memo, useId } from 'react'
import { fieldId } from '@/components/ui/field-frame'
import { ProvenanceShape, provenanceWords } from '@/components/ui/provenance'
import type { FieldDef } from '@/lib/schemas/field'
import { unitOf, type UnitSystem } from '@/lib/units'
import { conversionNote, fieldTitle } from './sheet-field'
import { useSettledError } from './use-settled-error'

/** One channel’s half of the row. */
interface Half {
  field: FieldDef
  value: string
  error?: string
  flagged: boolean
  origin?: string
}

interface PairFieldProps {
  primary: Half
  backup: Half
  system: UnitSystem
  onChange: (name: string, value: string) => void
}

const isSameHalf = (one: Half, other: Half) =>
  one.field === other.field && one.value === other.value && one.error === other.error && one.flagged === other.flagged && one.origin === other.origin

interface HalfInputProps {
  half: Half
  channel: 'A' | 'B'
  error?: string
  describedBy: string
  system: UnitSystem
  onChange: PairFieldProps['onChange']
  onBlur: () => void
}

function HalfInput({ half: { field, value, flagged }, channel, error, describedBy, system, onChange, onBlur }: HalfInputProps) {
  const id = fieldId(field.name)
  return (
    <input
      type="text" autoComplete="off" spellCheck={false} id={id} name={field.name} value={value} maxLength={60} onBlur={onBlur}
      className={clsx('in', flagged && 'flag', error && 'err')} title={fieldTitle(field, field.label, system)}
      aria-label={`${field.label}, channel ${channel}`} aria-invalid={error ? true : undefined} aria-describedby={[error && `${id}-error`, describedBy].filter(Boolean).join(' ') || undefined}
      onChange={(event) => onChange(field.name, event.target.value)}
    />
  )
}

/** The same input of both channels in one row, A before B. */
export const PairField = memo(function PairField({ primary, backup, system, onChange }: PairFieldProps) {
  const id = useId()
  const [errorA, settleA] = useSettledError(primary.error, primary.value)
  const [errorB, settleB] = useSettledError(backup.error, backup.value)
  const { field } = primary
  const notes = [
    { channel: 'A', note: conversionNote(field, primary.value, system) }, { channel: 'B', note: conversionNote(field, backup.value, system) },
  ].filter(({ note }) => note !== undefined)
  const [one, other] = [primary.origin, backup.origin]
  const origin = one !== undefined && one === other ? one : one ? `A: ${one}` : other ? `B: ${other}` : null
  const source = one && other ? 'default' : 'typed'
  const unit = field.quantity ? unitOf(field.quantity, system).word : ''
  const hasNote = notes.length > 0 || origin !== null
  const describedBy = [unit && `${id}-unit`, hasNote && `${id}-note`].filter(Boolean).join(' ')
  const shared = { describedBy, system, onChange }
  return (
    <>
      <div className="f pair" role="group" aria-label={field.label}>
        <span className="src"><ProvenanceShape source={source} /><span className="word">{provenanceWords[source]}</span></span>
        <span className="label" aria-hidden="true">{field.label}</span>
        <HalfInput half={primary} channel="A" error={errorA} onBlur={settleA} {...shared} />
        <HalfInput half={backup} channel="B" error={errorB} onBlur={settleB} {...shared} />
        <span className="unit" id={`${id}-unit`}>{unit}</span>
      </div>
      {hasNote ? <p className="fnote" id={`${id}-note`}>{[...notes.map(({ channel, note }) => `${channel}: ${note}`), ...(origin ? [origin] : [])].join(' ')}</p> : null}
      {errorA ? <div className="fmsg" id={`${fieldId(primary.field.name)}-error`}><span>A: {errorA}</span></div> : null}
      {errorB ? <div className="fmsg" id={`${fieldId(backup.field.name)}-error`}><span>B: {errorB}</span></div> : null}
    </>
  )
}, (before, now) => before.system === now.system && before.onChange === now.onChange && isSameHalf(before.primary, now.primary) && isSameHalf(before.backup, now.backup))
