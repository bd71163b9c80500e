import clsx from 'clsx'
import { useId, type ReactNode } from 'react'
import { ProvenanceShape, provenanceWords, type Provenance } from './provenance'
import { VerdictShape } from './verdict-mark'

/** What every field can show around its input. */
export interface FieldLook {
  label: ReactNode
  /** In words ("degrees", "ohm"), symbols where the trade writes them ("rpm", "mm"). */
  unit?: string
  source?: Provenance
  /** One line under it: where the number comes from, or what a typed unit becomes. */
  note?: ReactNode
  /** What is wrong, where, and the allowed range. */
  error?: ReactNode
  /** This input drives a finding that is outside. */
  flagged?: boolean
  /** Solved, or fixed in a released plan. */
  locked?: boolean
  /** row: number with a unit · wide: a choice or short text · broad: long text · stack: label over a tall input. */
  layout?: 'row' | 'wide' | 'broad' | 'stack'
}

/** The id of a field's input: links of an error summary lead there. */
export const fieldId = (name: string): string => `f-${name}`

export interface FieldIds {
  id: string
  describedBy: string | undefined
  invalid: true | undefined
}

/** Ids that tie an input to its unit, source, note and error; the input spreads `aria` on itself. */
export function useFieldIds({ id, name, unit, source, note, error }: Pick<FieldLook, 'unit' | 'source' | 'note' | 'error'> & { id?: string, name?: string }) {
  const made = useId()
  const own = id ?? (name ? fieldId(name) : made)
  const parts = [unit && `${own}-unit`, note && `${own}-note`, error && `${own}-error`, source && `${own}-source`].filter(Boolean)
  return { id: own, aria: { 'aria-describedby': parts.length > 0 ? parts.join(' ') : undefined, 'aria-invalid': error ? true as const : undefined } }
}

interface FrameProps extends FieldLook {
  id: string
  /** A group of inputs is named by text, not by a label of one of them. */
  group?: boolean
  children: ReactNode
}

export function FieldFrame({ id, label, unit, source, note, error, flagged, locked, layout = 'row', group = false, children }: FrameProps) {
  const stack = layout === 'stack'
  const name = group ? <span className="label" id={`${id}-label`}>{label}</span> : <label htmlFor={id}>{label}</label>
  const unitText = unit ? <span className="unit" id={`${id}-unit`}>{unit}</span> : null
  const lines = (
    <>
      {note ? <p className="fnote" id={`${id}-note`}>{note}</p> : null}
      {error ? <div className="fmsg" id={`${id}-error`}>{stack ? <VerdictShape verdict="outside" /> : null}<span>{error}</span></div> : null}
    </>
  )
  const states = clsx(flagged && 'flag', error && 'err', locked && 'locked')
  if (stack) return <div className={clsx('fs', states)}>{name}{unitText ? <span className="with-unit">{children}{unitText}</span> : children}{lines}</div>
  return (
    <>
      <div className={clsx('f', layout !== 'row' && layout, states)}>
        <span className="src">{source ? <><ProvenanceShape source={source} /><span className="word" id={`${id}-source`}>{provenanceWords[source]}</span></> : null}</span>
        {name}
        {children}
        {layout === 'row' ? unitText ?? <span /> : null}
      </div>
      {lines}
    </>
  )
}
