import { CalcError } from '../calc-error'
import { mustAscend } from '../validate/ascending'
import { takeNumber } from '../validate/number'
import { takeNumbers } from '../validate/numbers'
import { takePairs } from '../validate/pairs'
import { takeChoice, takeList, takeRecord } from '../validate/shape'
import type { Schedule } from './advance-types'
import { compileFormula } from './formula'
import { placeOn, valueAt } from '../shared/interpolate'

/** A schedule checked once, for evaluating many times. Holds copies: later changes of the argument do not reach it. */
export interface PreparedSchedule {
  readonly usesMap: boolean
  /** Speeds at which the slope changes, ascending; linear between them and flat outside. */
  readonly breakpointsRpm: readonly number[]
  /** A formula has no known breakpoints: it is sampled. */
  readonly isSampled: boolean
  /** Crank degrees BTDC, not finite where a formula has no value. `mapKpa` counts only where `usesMap`. */
  readonly degAt: (rpm: number, mapKpa: number) => number
}

const kinds: readonly Schedule['kind'][] = ['fixed', 'mechanical', 'table', 'map', 'formula']
const speed = { unit: 'rpm', min: 0 }
const advance = { unit: 'deg' }

const flat = { usesMap: false, isSampled: false }

const fixed = (members: Record<string, unknown>, field: string): PreparedSchedule => {
  const deg = takeNumber(members.deg, `${field}.deg`, { ...advance, name: 'The fixed advance' })
  return { ...flat, breakpointsRpm: [], degAt: () => deg }
}

/** Linear over a table of speeds. */
const overSpeed = (rpm: readonly number[], deg: readonly number[]): PreparedSchedule =>
  ({ ...flat, breakpointsRpm: rpm, degAt: (speedRpm) => valueAt(deg, placeOn(rpm, speedRpm)) })

const mechanical = (members: Record<string, unknown>, field: string): PreparedSchedule => {
  const initialDeg = takeNumber(members.initialDeg, `${field}.initialDeg`, { ...advance, name: 'The initial advance' })
  const startRpm = takeNumber(members.startRpm, `${field}.startRpm`, { ...speed, name: 'The speed at which the advance starts' })
  const fullRpm = takeNumber(members.fullRpm, `${field}.fullRpm`, { unit: 'rpm', above: startRpm, name: 'The speed of full advance' })
  const fullDeg = takeNumber(members.fullDeg, `${field}.fullDeg`, { ...advance, name: 'The full advance' })
  return overSpeed([startRpm, fullRpm], [initialDeg, fullDeg])
}

const table = (members: Record<string, unknown>, field: string): PreparedSchedule => {
  const points = takeList(members.points, `${field}.points`, 'The advance table', 1)
  const [rpm, deg] = takePairs(points, `${field}.points`, 'Point', { key: 'rpm', ...speed, nameOf: (n) => `The speed of point ${n}` }, { key: 'deg', ...advance, nameOf: (n) => `The advance of point ${n}` })
  mustAscend(rpm, 'rpm', (i) => `${field}.points.${i}.rpm`, (i) => `The speed of point ${i + 1}`)
  return overSpeed(rpm, deg)
}

const sameLength = (list: readonly unknown[], wanted: number, field: string, message: string): void => {
  if (list.length !== wanted) throw new CalcError({ field, value: list, limit: `${wanted} entries`, unit: '', message: `${message}, ${wanted} in all; ${list.length} were given.` })
}

const map = (members: Record<string, unknown>, field: string): PreparedSchedule => {
  const rpm = takeNumbers(takeList(members.rpm, `${field}.rpm`, 'The list of speeds of the map', 1), `${field}.rpm`, speed, (i) => `Speed ${i + 1} of the map`)
  mustAscend(rpm, 'rpm', (i) => `${field}.rpm.${i}`, (i) => `Speed ${i + 1} of the map`)
  const mapKpa = takeNumbers(takeList(members.mapKpa, `${field}.mapKpa`, 'The list of pressures of the map', 1), `${field}.mapKpa`, { unit: 'kPa', above: 0 }, (i) => `Pressure ${i + 1} of the map`)
  mustAscend(mapKpa, 'kPa', (i) => `${field}.mapKpa.${i}`, (i) => `Pressure ${i + 1} of the map`)
  const rows = takeList(members.deg, `${field}.deg`, 'The advances of the map', 1)
  sameLength(rows, rpm.length, `${field}.deg`, 'The map needs one row of advances per speed')
  const deg = rows.map((_, i) => {
    const row = takeList(rows[i], `${field}.deg.${i}`, `Row ${i + 1} of the map`, 1)
    sameLength(row, mapKpa.length, `${field}.deg.${i}`, `Row ${i + 1} of the map needs one advance per pressure`)
    return takeNumbers(row, `${field}.deg.${i}`, advance, (j) => `The advance in row ${i + 1}, column ${j + 1} of the map`)
  })
  const degAt = (speedRpm: number, pressureKpa: number): number => {
    const across = placeOn(mapKpa, pressureKpa)
    const along = placeOn(rpm, speedRpm)
    const low = valueAt(deg[along.index] ?? [], across)
    return along.share === 0 ? low : valueAt([low, valueAt(deg[along.index + 1] ?? [], across)], { index: 0, share: along.share })
  }
  return { usesMap: true, isSampled: false, breakpointsRpm: rpm, degAt }
}

/** Checks a schedule; `field` is its dotted path. CalcError below that path. */
export const prepareSchedule = (schedule: unknown, field: string): PreparedSchedule => {
  const members = takeRecord(schedule, field, 'The advance schedule')
  const kind = takeChoice(members.kind, `${field}.kind`, 'The kind of schedule', kinds)
  switch (kind) {
    case 'fixed': return fixed(members, field)
    case 'mechanical': return mechanical(members, field)
    case 'table': return table(members, field)
    case 'map': return map(members, field)
    case 'formula': {
      const { usesMap, evaluate } = compileFormula(members.expression, `${field}.expression`)
      return { usesMap, isSampled: true, breakpointsRpm: [], degAt: evaluate }
    }
  }
}
