import type { Finding } from '../calc/live'
import type { FormValues } from '../schemas/field'
import { isScheduleKind } from '../schemas/channel-form'
import { fieldOfScenarioPath } from '../schemas/scenario-form'
import { scheduleFields, type ChannelPrefix } from '../schemas/scenario-fields'

/** The advance itself: what to turn back when a schedule lies outside, not the speeds it is given at. */
function scheduleField(channel: ChannelPrefix, values: FormValues): string {
  const typed = values[`${channel}.kind`] ?? ''
  const kind = isScheduleKind(typed) ? typed : 'fixed'
  if (kind === 'mechanical') return `${channel}.mechanical.fullDeg`
  return scheduleFields(channel)[kind][0]?.name ?? `${channel}.kind`
}

/** Names of the fields that drive a finding outside its limit: flagged where they are typed. */
export function flaggedFields(findings: readonly Finding[], values: FormValues): Set<string> {
  const names = new Set<string>()
  for (const finding of findings) {
    if (finding.verdict !== 'outside') continue
    for (const input of finding.inputs) {
      const schedule = /^sheet\.(primary|backup)\.schedule$/.exec(input)?.[1]
      if (schedule === 'primary' || schedule === 'backup') names.add(scheduleField(schedule, values))
      else if (input.startsWith('sheet.') && !input.endsWith('.latencyUs')) names.add(fieldOfScenarioPath(input, values))
    }
  }
  return names
}
