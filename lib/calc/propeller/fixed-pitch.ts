import { CalcError } from '../calc-error'
import { membersOf } from '../validate/shape'
import { enginePowerAt, highestCrossing, type CrossingSearch } from './crossing'
import { takeDensityRatio, takeFraction, takeLoad, takePowerCurve, type PowerCurvePoint, type PowerFraction, type PropellerLoad } from './power-curve'

export interface FixedPitchInput {
  readonly powerCurve: readonly PowerCurvePoint[]
  readonly fraction: PowerFraction
  readonly load: PropellerLoad
  readonly densityRatio: number
}

export interface OperatingPoint { readonly rpm: number, readonly kw: number }

/** Where engine and load line meet, or a CalcError on the load that says which way they miss each other. */
export const meetLoad = (search: CrossingSearch, field: string, given: unknown): OperatingPoint => {
  const rpm = highestCrossing(search)
  if (rpm !== null) return { rpm, kw: search.load(rpm) }
  const { fromRpm, toRpm, load } = search
  const range = `${Number(fromRpm.toPrecision(6))} to ${Number(toRpm.toPrecision(6))} rpm`
  const isAboveAtTop = enginePowerAt(search, toRpm) > load(toRpm)
  throw new CalcError({
    field, value: given, limit: `a load that the engine meets between ${range}`, unit: 'kW',
    message: isAboveAtTop
      ? `The engine makes more than the propeller takes up to the end of the power curve, ${range}: the load must be larger, or the curve go further.`
      : `The propeller takes more than the engine makes at every speed of the power curve, ${range}: the load must be smaller, or the curve start lower.`,
  })
}

/**
 * Where a fixed-pitch propeller holds the engine at full throttle: `{ rpm, kw }`, rpm and kilowatts.
 *
 * fraction · P(n) = load.kw · (n/load.rpm)³ · (densityRatio/load.densityRatio); P linear between its points;
 * the highest crossing where load − engine turns from negative to ≥ 0, ends of the curve included
 *
 * Validity: one advance ratio, such as an aeroplane standing still or one airspeed in proportion; a fraction that varies is looked at each 10 rpm.
 * Source: propeller-cube-law (read).
 *
 * @param input.powerCurve `{ rpm, kw }[]`: full-throttle power, two points at least, rpm ≥ 0 and strictly ascending, kW ≥ 0
 * @param input.fraction share of that power: a number ≥ 0, or a function of rpm that gives finite numbers; it already holds the engine's lapse with density
 * @param input.load `{ rpm, kw, densityRatio }`: one point of the propeller's load line, each > 0
 * @param input.densityRatio air density over that of the standard at sea level, > 0
 * @throws CalcError below `powerCurve` or `load`, on `fraction` or `densityRatio`; on `load` when engine and load never meet
 * @example
 * fixedPitchOperatingPoint({ powerCurve: [{ rpm: 1000, kw: 50 }, { rpm: 3000, kw: 50 }], fraction: 1, load: { rpm: 2500, kw: 97.65625, densityRatio: 1 }, densityRatio: 1 }) // → { rpm: 2000, kw: 50 }
 */
export const fixedPitchOperatingPoint = (input: FixedPitchInput): OperatingPoint => {
  const members = membersOf(input)
  const curve = takePowerCurve(members.powerCurve)
  const fraction = takeFraction(members.fraction)
  const densityRatio = takeDensityRatio(members.densityRatio)
  const load = takeLoad(members.load, 'load', densityRatio)
  return meetLoad({ curve, fraction, load, fromRpm: curve.fromRpm, toRpm: curve.toRpm }, 'load', members.load)
}
