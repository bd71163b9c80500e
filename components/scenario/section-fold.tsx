'use client'

import { memo, useState, type ReactNode } from 'react'
import { Fold } from '@/components/ui/fold'
import type { FieldDef } from '@/lib/schemas/field'
import { SectionFields } from './section-fields'
import type { SheetForm } from './sheet-form'

interface SectionFoldProps {
  title: string
  fields: readonly FieldDef[]
  form: SheetForm
  summary: string
  /** Asked for by another choice, beside a fault in it. */
  open?: boolean
  /** What the group is for, in a sentence or two. */
  lead?: string
  /** Names of other fields that decide what is asked here. */
  follows?: readonly string[]
  /** In place of the plain list of fields. */
  draw?: (form: SheetForm) => ReactNode
}

/** Typing elsewhere must not redraw a folded group: only its own fields, and those that decide what it asks, count. */
function isSame(before: SectionFoldProps, now: SectionFoldProps): boolean {
  const [was, is] = [before.form, now.form]
  const sameValue = (name: string) => was.values[name] === is.values[name]
  return was.system === is.system && was.onChange === is.onChange && before.fields === now.fields && before.summary === now.summary && before.open === now.open
    && (now.follows ?? []).every(sameValue)
    && now.fields.every(({ name }) => sameValue(name) && was.errors[name] === is.errors[name] && was.flagged.has(name) === is.flagged.has(name))
}

/** A group of inputs that stands folded until somebody opens it or something in it is wrong; it does not close under the hand that mends it. */
export const SectionFold = memo(function SectionFold({ title, fields, form, summary, open = false, lead, draw }: SectionFoldProps) {
  const wanted = open || fields.some(({ name }) => form.errors[name])
  const [opened, setOpened] = useState(wanted)
  if (wanted && !opened) setOpened(true)
  return (
    <Fold title={title} level={2} open={opened || wanted || undefined} summary={summary}>
      {lead ? <p className="fnote">{lead}</p> : null}
      {draw ? draw(form) : <SectionFields fields={fields} form={form} />}
    </Fold>
  )
}, isSame)
