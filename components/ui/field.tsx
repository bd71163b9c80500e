import clsx from 'clsx'
import type { InputHTMLAttributes, SelectHTMLAttributes, TextareaHTMLAttributes } from 'react'
import { FieldFrame, useFieldIds, type FieldLook } from './field-frame'

type InputFieldProps = FieldLook & InputHTMLAttributes<HTMLInputElement>

/** One line. Numbers are typed as text: a unit may follow them. */
export function InputField({ label, unit, source, note, error, flagged, locked, layout, id: givenId, className, ...input }: InputFieldProps) {
  const { id, aria } = useFieldIds({ id: givenId, name: input.name, unit, source, note, error })
  const number = (layout ?? 'row') === 'row'
  return (
    <FieldFrame {...{ id, label, unit, source, note, error, flagged, locked, layout }}>
      <input type="text" autoComplete="off" spellCheck={number ? false : undefined} {...input} {...aria} id={id} readOnly={locked || input.readOnly} className={clsx('in', className)} />
    </FieldFrame>
  )
}

export interface Choice {
  value: string
  label: string
}

type SelectFieldProps = FieldLook & SelectHTMLAttributes<HTMLSelectElement> & { choices: readonly Choice[] }

export function SelectField({ label, unit, source, note, error, flagged, locked, layout = 'wide', id: givenId, className, choices, children, ...select }: SelectFieldProps) {
  const { id, aria } = useFieldIds({ id: givenId, name: select.name, unit, source, note, error })
  return (
    <FieldFrame {...{ id, label, unit, source, note, error, flagged, locked, layout }}>
      <select {...select} {...aria} id={id} disabled={locked || select.disabled} className={clsx('in', className)}>
        {choices.map((choice) => <option key={choice.value} value={choice.value}>{choice.label}</option>)}
        {children}
      </select>
    </FieldFrame>
  )
}

type TextareaFieldProps = FieldLook & TextareaHTMLAttributes<HTMLTextAreaElement>

export function TextareaField({ label, unit, source, note, error, flagged, locked, layout = 'broad', id: givenId, className, ...area }: TextareaFieldProps) {
  const { id, aria } = useFieldIds({ id: givenId, name: area.name, unit, source, note, error })
  return (
    <FieldFrame {...{ id, label, unit, source, note, error, flagged, locked, layout }}>
      <textarea rows={3} {...area} {...aria} id={id} readOnly={locked || area.readOnly} className={clsx('in', className)} />
    </FieldFrame>
  )
}

type CheckFieldProps = Pick<FieldLook, 'label' | 'note' | 'error'> & Omit<InputHTMLAttributes<HTMLInputElement>, 'type'>

export function CheckField({ label, note, error, id: givenId, ...input }: CheckFieldProps) {
  const { id, aria } = useFieldIds({ id: givenId, name: input.name, note, error })
  return (
    <>
      <div className={clsx('tick', error && 'err')}>
        <input {...input} {...aria} type="checkbox" id={id} />
        <label htmlFor={id}>{label}</label>
      </div>
      {note ? <p className="fnote" id={`${id}-note`}>{note}</p> : null}
      {error ? <div className="fmsg" id={`${id}-error`}><span>{error}</span></div> : null}
    </>
  )
}
