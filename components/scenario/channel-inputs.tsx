'use client'

import { FormulaField } from './formula-field'
import { SheetField } from './sheet-field'
import type { SheetForm } from './sheet-form'
import { channelFields, scheduleFields, type ChannelPrefix, type ScheduleKind } from '@/lib/schemas/scenario-fields'
import { isScheduleKind } from '@/lib/schemas/channel-form'

/** Made once: a field's line in the table stays the same object, so that an edit redraws only the field it is in. */
const tableOf = (channel: ChannelPrefix) => {
  const schedules = scheduleFields(channel)
  const scheduleNames = new Set(Object.values(schedules).flat().map((field) => field.name))
  const [kindField, ...others] = channelFields(channel)
  return { schedules, scheduleNames, kindField, common: others.filter((field) => !scheduleNames.has(field.name)) }
}
const tables = { primary: tableOf('primary'), backup: tableOf('backup') }

/** Inputs of one channel: the schedule kind chosen, crank retard, delay. What was typed for other kinds goes along unseen. */
export function ChannelInputs({ channel, form }: { channel: ChannelPrefix, form: SheetForm }) {
  const typed = form.values[`${channel}.kind`] ?? ''
  const kind: ScheduleKind = isScheduleKind(typed) ? typed : 'fixed'
  const { schedules, scheduleNames, kindField, common } = tables[channel]
  const fieldOf = (name: string) => ({ value: form.values[name] ?? '', error: form.errors[name], flagged: form.flagged.has(name) })
  return (
    <>
      {kindField ? <SheetField field={kindField} system={form.system} onChange={form.onChange} {...fieldOf(kindField.name)} /> : null}
      {schedules[kind].map((field) => (
        field.kind === 'formula'
          ? <FormulaField key={field.name} field={field} onChange={form.onChange} faultAt={form.faultAt[field.name]} {...fieldOf(field.name)} />
          : <SheetField key={field.name} field={field} system={form.system} onChange={form.onChange} source="typed" {...fieldOf(field.name)} />
      ))}
      {common.map((field) => <SheetField key={field.name} field={field} system={form.system} onChange={form.onChange} source={form.values[field.name] ? 'typed' : 'default'} {...fieldOf(field.name)} />)}
      {[...scheduleNames].filter((name) => !schedules[kind].some((field) => field.name === name) && form.values[name]).map((name) => (
        <input key={name} type="hidden" name={name} value={form.values[name]} />
      ))}
    </>
  )
}
