import { CalcError } from '../calc-error'
import { placeOn, valueAt } from '../shared/interpolate'
import { describeValue } from '../validate/describe'
import { mustAscend } from '../validate/ascending'
import { takeNumber } from '../validate/number'
import { takePairs } from '../validate/pairs'
import { finiteResult } from '../validate/result'
import { takeList, takeRecord } from '../validate/shape'

/** Full-throttle power at a speed. */
export interface PowerCurvePoint { readonly rpm: number, readonly kw: number }

/** One point of a propeller's load line, and the density ratio it was taken at. */
export interface PropellerLoad { readonly rpm: number, readonly kw: number, readonly densityRatio: number }

/** Share of the curve's power that is there: a number, or a function of the speed. It holds the engine's lapse with density too. */
export type PowerFraction = number | ((rpm: number) => number)

export interface PreparedCurve {
  readonly rpm: readonly number[]
  readonly fromRpm: number
  readonly toRpm: number
  readonly kwAt: (rpm: number) => number
}

const speedName = (place: number): string => `The speed of point ${place} of the power curve`

export const takePowerCurve = (value: unknown): PreparedCurve => {
  const list = takeList(value, 'powerCurve', 'The power curve', 2)
  const [rpm, kw] = takePairs(
    list, 'powerCurve', 'Power curve point',
    { key: 'rpm', unit: 'rpm', min: 0, nameOf: speedName }, { key: 'kw', unit: 'kW', min: 0, nameOf: (n) => `The power of point ${n} of the power curve` },
  )
  mustAscend(rpm, 'rpm', (i) => `powerCurve.${i}.rpm`, (i) => speedName(i + 1))
  return { rpm, fromRpm: rpm[0] ?? 0, toRpm: rpm[rpm.length - 1] ?? 0, kwAt: (speed) => valueAt(kw, placeOn(rpm, speed)) }
}

/** Power that the propeller takes at a speed, kW: with the cube of the speed and in proportion to the density. */
export type LoadLine = (rpm: number) => number

export const takeLoad = (value: unknown, field: string, densityRatio: number): LoadLine => {
  const members = takeRecord(value, field, 'The propeller load')
  const rpm = takeNumber(members.rpm, `${field}.rpm`, { name: 'The speed of the propeller load', unit: 'rpm', above: 0 })
  const kw = takeNumber(members.kw, `${field}.kw`, { name: 'The power of the propeller load', unit: 'kW', above: 0 })
  const reference = takeNumber(members.densityRatio, `${field}.densityRatio`, { name: 'The density ratio of the propeller load', unit: '', above: 0 })
  const scale = finiteResult(kw * (densityRatio / reference), `${field}.kw`, kw, 'kW')
  return (speed) => finiteResult(scale * (speed / rpm) ** 3, `${field}.rpm`, rpm, 'rpm')
}

export const takeDensityRatio = (value: unknown): number => takeNumber(value, 'densityRatio', { name: 'The density ratio', unit: '', above: 0 })

/** The fraction as a function, each of its values checked. A number must be ≥ 0; a function may fall below, as dead cylinders at low speed do. */
export const takeFraction = (value: unknown): { readonly constant: number | null, readonly at: (rpm: number) => number } => {
  if (typeof value !== 'function') {
    const constant = takeNumber(value, 'fraction', { name: 'The fraction of the power', unit: '', min: 0 })
    return { constant, at: () => constant }
  }
  const at = (rpm: number): number => {
    const fraction: unknown = (value as (rpm: number) => unknown)(rpm)
    if (typeof fraction === 'number' && Number.isFinite(fraction)) return fraction
    throw new CalcError({
      field: 'fraction', value: fraction, limit: 'a finite number at every speed', unit: '',
      message: `The fraction of the power must be a number at every speed; at ${Number(rpm.toPrecision(8))} rpm ${describeValue(fraction)} came out.`,
    })
  }
  return { constant: null, at }
}
