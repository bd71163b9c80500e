import type { Channel, Schedule } from '../calc/live'
import { formatInput, formatMatrix, formatTable, type Matrix, type QuantityKind, type UnitSystem } from '../units'
import type { FormValues } from './field'
import type { ReadFields } from './read-fields'
import { readMatrix, readRows } from './read-table'
import { scheduleFields, scheduleKinds, type ChannelPrefix, type ScheduleKind } from './scenario-fields'

const columnsOf = (channel: ChannelPrefix, kind: 'table' | 'map') => scheduleFields(channel)[kind][0]?.columns ?? []

const matrixOf = ({ rpm, mapKpa, deg }: Extract<Schedule, { kind: 'map' }>): Matrix => ({ rows: [...rpm], columns: [...mapKpa], cells: deg.map((row) => [...row]) })

export const isScheduleKind = (text: string): text is ScheduleKind => scheduleKinds.some(({ value }) => value === text)

/** Texts of a channel's fields in the person's units; fields of the kinds not chosen stay empty. */
export function channelToForm(channel: ChannelPrefix, value: Channel, system: UnitSystem): FormValues {
  const { schedule, crankRetard, latencyUs } = value
  const show = (amount: number, kind: QuantityKind) => formatInput(amount, kind, system)
  const form: FormValues = {
    [`${channel}.kind`]: schedule.kind,
    [`${channel}.retardDeg`]: crankRetard ? show(crankRetard.byDeg, 'angle') : '',
    [`${channel}.retardBelowRpm`]: crankRetard ? show(crankRetard.belowRpm, 'engineSpeed') : '',
    [`${channel}.retardHysteresisRpm`]: crankRetard ? show(crankRetard.hysteresisRpm ?? 0, 'engineSpeed') : '',
    [`${channel}.latencyUs`]: show(latencyUs ?? 0, 'timeUs'),
  }
  for (const field of Object.values(scheduleFields(channel)).flat()) form[field.name] = ''
  if (schedule.kind === 'fixed') form[`${channel}.fixed.deg`] = show(schedule.deg, 'angle')
  if (schedule.kind === 'mechanical') {
    form[`${channel}.mechanical.initialDeg`] = show(schedule.initialDeg, 'angle')
    form[`${channel}.mechanical.startRpm`] = show(schedule.startRpm, 'engineSpeed')
    form[`${channel}.mechanical.fullRpm`] = show(schedule.fullRpm, 'engineSpeed')
    form[`${channel}.mechanical.fullDeg`] = show(schedule.fullDeg, 'angle')
  }
  if (schedule.kind === 'table') form[`${channel}.table`] = formatTable(schedule.points.map((point) => [point.rpm, point.deg]), columnsOf(channel, 'table'), system)
  if (schedule.kind === 'map') {
    const [row, column, cell] = columnsOf(channel, 'map')
    if (row && column && cell) form[`${channel}.map`] = formatMatrix(matrixOf(schedule), { row, column, cell }, system)
  }
  if (schedule.kind === 'formula') form[`${channel}.formula`] = schedule.expression
  return form
}

/** Numbers a channel's form was filled from, by field name. */
export function numbersOfChannel(channel: ChannelPrefix, value: Channel): Record<string, number | null> {
  const { schedule, crankRetard, latencyUs } = value
  return {
    [`${channel}.retardDeg`]: crankRetard?.byDeg ?? null,
    [`${channel}.retardBelowRpm`]: crankRetard?.belowRpm ?? null,
    [`${channel}.retardHysteresisRpm`]: crankRetard ? (crankRetard.hysteresisRpm ?? 0) : null,
    [`${channel}.latencyUs`]: latencyUs ?? 0,
    ...(schedule.kind === 'fixed' ? { [`${channel}.fixed.deg`]: schedule.deg } : {}),
    ...(schedule.kind === 'mechanical' ? {
      [`${channel}.mechanical.initialDeg`]: schedule.initialDeg,
      [`${channel}.mechanical.startRpm`]: schedule.startRpm,
      [`${channel}.mechanical.fullRpm`]: schedule.fullRpm,
      [`${channel}.mechanical.fullDeg`]: schedule.fullDeg,
    } : {}),
  }
}

/** A channel as read from the form: unchecked, the schema judges it. */
export function readChannel(channel: ChannelPrefix, values: FormValues, read: ReadFields, system: UnitSystem, base?: Channel): unknown {
  const typedKind = read.text(`${channel}.kind`)
  const kind = isScheduleKind(typedKind) ? typedKind : 'fixed'
  const number = (name: string) => read.number(`${channel}.${name}`)
  const byDeg = number('retardDeg')
  const below = number('retardBelowRpm')
  const hasRetard = byDeg !== null && byDeg !== 0
  if (hasRetard && below === null) read.errors[`${channel}.retardBelowRpm`] ??= 'Type the speed below which the crank retard acts, for example 450 rpm.'
  const hysteresis = number('retardHysteresisRpm') ?? 0
  return {
    schedule: readSchedule(channel, kind, values, read, system, base?.schedule),
    ...(hasRetard ? { crankRetard: { byDeg, belowRpm: below, hysteresisRpm: hysteresis } } : {}),
    latencyUs: number('latencyUs'),
  }
}

function readSchedule(channel: ChannelPrefix, kind: ScheduleKind, values: FormValues, read: ReadFields, system: UnitSystem, base?: Schedule): unknown {
  const number = (name: string) => read.number(`${channel}.${name}`)
  switch (kind) {
    case 'fixed':
      return { kind, deg: number('fixed.deg') }
    case 'mechanical':
      return {
        kind,
        initialDeg: number('mechanical.initialDeg'), startRpm: number('mechanical.startRpm'),
        fullRpm: number('mechanical.fullRpm'), fullDeg: number('mechanical.fullDeg'),
      }
    case 'table': {
      const rows = readRows(`${channel}.table`, values, columnsOf(channel, 'table'), system,
        base?.kind === 'table' ? base.points.map((point) => [point.rpm, point.deg]) : undefined, read.errors)
      return { kind, points: rows.map(([rpm, deg]) => ({ rpm, deg })) }
    }
    case 'map': {
      const matrix = readMatrix(`${channel}.map`, values, columnsOf(channel, 'map'), system, base?.kind === 'map' ? matrixOf(base) : undefined, read.errors)
      return { kind, rpm: matrix.rows, mapKpa: matrix.columns, deg: matrix.cells }
    }
    case 'formula':
      return { kind, expression: read.text(`${channel}.formula`) }
  }
}
