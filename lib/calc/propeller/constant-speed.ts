import { CalcError } from '../calc-error'
import { takeNumber } from '../validate/number'
import { membersOf } from '../validate/shape'
import { enginePowerAt } from './crossing'
import { meetLoad, type OperatingPoint } from './fixed-pitch'
import { takeDensityRatio, takeFraction, takeLoad, takePowerCurve, type PowerCurvePoint, type PowerFraction, type PropellerLoad } from './power-curve'

export interface ConstantSpeedInput {
  readonly powerCurve: readonly PowerCurvePoint[]
  readonly fraction: PowerFraction
  readonly densityRatio: number
  readonly governedRpm: number
  readonly lowPitchLoad: PropellerLoad
  readonly highPitchLoad?: PropellerLoad
}

export interface GovernedPoint extends OperatingPoint {
  /** Whether the governor holds the speed. */
  readonly governed: boolean
}

/** A load line stated through the governed power itself holds it, whatever the last digit does. */
const rounding = 1e-12

/**
 * Where a constant-speed propeller holds the engine at full throttle: `{ rpm, kw, governed }`, rpm and kilowatts.
 *
 * At governedRpm the engine makes fraction · P(governedRpm). Between the loads of low and high pitch there it is held, `governed` true.
 * Below the low-pitch load the speed falls onto that line (search up to governedRpm); above the high-pitch load it overspeeds on that line.
 *
 * Validity: as `fixedPitchOperatingPoint` for each pitch stop; without a high-pitch load the pitch is never at its upper stop.
 * Source: propeller-cube-law (read).
 *
 * @param input.powerCurve `{ rpm, kw }[]`: full-throttle power, two points at least, rpm ≥ 0 and strictly ascending, kW ≥ 0
 * @param input.fraction share of that power: a number ≥ 0, or a function of rpm that gives finite numbers; it already holds the engine's lapse with density
 * @param input.densityRatio air density over that of the standard at sea level, > 0
 * @param input.governedRpm speed the governor is set to, rpm, > 0, within the power curve
 * @param input.lowPitchLoad `{ rpm, kw, densityRatio }`: one point of the load line at the low pitch stop, each > 0
 * @param input.highPitchLoad the same at the high pitch stop, at least the low-pitch load; may be left out
 * @throws CalcError below `powerCurve`, `lowPitchLoad` or `highPitchLoad`, on `fraction`, `densityRatio` or `governedRpm`; on the load whose line the engine never meets
 * @example
 * constantSpeedOperatingPoint({ powerCurve: [{ rpm: 1000, kw: 30 }, { rpm: 3000, kw: 90 }], fraction: 0.9, densityRatio: 1, governedRpm: 2500, lowPitchLoad: { rpm: 2500, kw: 40, densityRatio: 1 } }) // → { rpm: 2500, kw: 67.5, governed: true }
 */
export const constantSpeedOperatingPoint = (input: ConstantSpeedInput): GovernedPoint => {
  const members = membersOf(input)
  const curve = takePowerCurve(members.powerCurve)
  const fraction = takeFraction(members.fraction)
  const densityRatio = takeDensityRatio(members.densityRatio)
  const governedRpm = takeNumber(members.governedRpm, 'governedRpm', { name: 'The governed speed', unit: 'rpm', above: 0 })
  if (governedRpm < curve.fromRpm || governedRpm > curve.toRpm) {
    throw new CalcError({
      field: 'governedRpm', value: governedRpm, limit: `${curve.fromRpm} … ${curve.toRpm}`, unit: 'rpm',
      message: `The governed speed must lie within the power curve, ${curve.fromRpm} to ${curve.toRpm} rpm; ${governedRpm} rpm was given.`,
    })
  }
  const lowPitch = takeLoad(members.lowPitchLoad, 'lowPitchLoad', densityRatio)
  const highPitch = members.highPitchLoad === undefined ? null : takeLoad(members.highPitchLoad, 'highPitchLoad', densityRatio)
  const lowKw = lowPitch(governedRpm)
  const highKw = highPitch ? highPitch(governedRpm) : null
  if (highKw !== null && highKw < lowKw * (1 - rounding)) {
    throw new CalcError({
      field: 'highPitchLoad', value: members.highPitchLoad, limit: `at least the low-pitch load, ${lowKw} at ${governedRpm} rpm`, unit: 'kW',
      message: `At the governed speed the high-pitch load must be at least the low-pitch load, ${Number(lowKw.toPrecision(6))} kW; it is ${Number(highKw.toPrecision(6))} kW.`,
    })
  }

  const kw = enginePowerAt({ curve, fraction }, governedRpm)
  if (kw < lowKw * (1 - rounding)) {
    const fallen = meetLoad({ curve, fraction, load: lowPitch, fromRpm: curve.fromRpm, toRpm: governedRpm }, 'lowPitchLoad', members.lowPitchLoad)
    return { ...fallen, governed: false }
  }
  if (highPitch && highKw !== null && kw > highKw * (1 + rounding)) {
    const overspeeding = meetLoad({ curve, fraction, load: highPitch, fromRpm: governedRpm, toRpm: curve.toRpm }, 'highPitchLoad', members.highPitchLoad)
    return { ...overspeeding, governed: false }
  }
  return { rpm: governedRpm, kw, governed: true }
}
