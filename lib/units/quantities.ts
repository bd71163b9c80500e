import {
  ampere, celsius, cubicCentimetre, cubicInch, degree, electronvolt, fahrenheit, fahrenheitStep, foot, footPerMinute, horsepower, hour, inch,
  inchMercury, inchPerDegree, kelvin, kelvinPerWatt, kilogram, kilometrePerHour, kilopascal, kilovolt, kilowatt, knot, metre, metrePerSecond,
  microsecond, millihenry, millijoule, millimetre, millimetrePerDegree, millisecond, newtonMetre, ohm, one, percent, perHour, perSquareDegree,
  picofarad, pound, poundFoot, psi, rpm, squareFoot, squareMetre, volt,
} from './families'
import type { FamilyName, Unit } from './families'

/** One system on one screen, the person's own. */
export type UnitSystem = 'metric' | 'us'

/** How one system shows a kind: its unit, the usual decimals, and an example in that unit for the sentences. */
export interface Shown {
  unit: Unit
  decimals: number
  example: string
  /** Written as 3.2·10⁻⁶; the decimals are those before the power of ten. */
  powerOfTen?: true
}

export interface Quantity {
  family: FamilyName
  /** The unit `lib/calc` works in and the database stores. */
  base: Unit
  metric: Shown
  us: Shown
}

const shown = (unit: Unit, decimals: number, example: string): Shown => ({ unit, decimals, example })
const quantity = (family: FamilyName, base: Unit, metric: Shown, us: Shown = metric): Quantity => ({ family, base, metric, us })

export const quantities = {
  /** Crank degrees unless the label says otherwise. */
  angle: quantity('angle', degree, shown(degree, 1, '26.5')),
  distributorAngle: quantity('angle', degree, shown(degree, 1, '12.5')),
  engineSpeed: quantity('rotation', rpm, shown(rpm, 0, '2450')),
  timeMs: quantity('time', millisecond, shown(millisecond, 2, '3.3')),
  timeUs: quantity('time', microsecond, shown(microsecond, 0, '55')),
  length: quantity('length', millimetre, shown(millimetre, 1, '86'), shown(inch, 2, '3.4')),
  /** Bore, stroke, rod: made to a hundredth, so the inch needs three decimals. */
  boreLength: quantity('length', millimetre, shown(millimetre, 1, '86'), shown(inch, 3, '3.386')),
  /** Small way along a plate, a cap or a damper's rim. */
  arc: quantity('length', millimetre, shown(millimetre, 2, '2.6'), shown(inch, 3, '0.102')),
  displacement: quantity('volume', cubicCentimetre, shown(cubicCentimetre, 0, '2600'), shown(cubicInch, 0, '158')),
  power: quantity('power', kilowatt, shown(kilowatt, 1, '52.5'), shown(horsepower, 1, '70.5')),
  torque: quantity('torque', newtonMetre, shown(newtonMetre, 0, '172'), shown(poundFoot, 0, '127')),
  pressure: quantity('pressure', kilopascal, shown(kilopascal, 0, '95'), shown(inchMercury, 1, '28.1')),
  /** Mean effective pressure: the trade's other unit is psi, not inches of mercury. */
  meanPressure: quantity('pressure', kilopascal, shown(kilopascal, 0, '850'), shown(psi, 0, '123')),
  mass: quantity('mass', kilogram, shown(kilogram, 0, '505'), shown(pound, 0, '1113')),
  temperature: quantity('temperature', kelvin, shown(celsius, 0, '60'), shown(fahrenheit, 0, '140')),
  /** How much hotter: 20 K is 36 °F here, not −424 °F. */
  temperatureDifference: quantity('temperatureStep', kelvin, shown(kelvin, 0, '20'), shown(fahrenheitStep, 0, '36')),
  altitude: quantity('length', metre, shown(metre, 0, '1500'), shown(foot, 0, '5000')),
  airspeed: quantity('velocity', metrePerSecond, shown(kilometrePerHour, 0, '119'), shown(knot, 0, '64')),
  climb: quantity('velocity', metrePerSecond, shown(metrePerSecond, 1, '3.3'), shown(footPerMinute, 0, '640')),
  curvature: quantity('curvature', perSquareDegree, shown(perSquareDegree, 5, '0.00045')),
  /** Way on a rim for one degree. */
  markSpacing: quantity('spacing', millimetrePerDegree, shown(millimetrePerDegree, 2, '1.4'), shown(inchPerDegree, 3, '0.055')),
  /** Failures an hour: anything from a thousandth to a billionth. */
  failureRate: quantity('rate', perHour, { ...shown(perHour, 1, '3.2e-6'), powerOfTen: true }),
  /** A plain ratio; "85 %" may be typed for 0.85. */
  ratio: quantity('fraction', one, shown(one, 2, '0.85')),
  /** Stored as a fraction, read and typed in percent. */
  percent: quantity('fraction', one, shown(percent, 0, '85')),
  area: quantity('area', squareMetre, shown(squareMetre, 1, '11.2'), shown(squareFoot, 0, '121')),
  durationHours: quantity('duration', hour, shown(hour, 1, '25')),
  resistance: quantity('resistance', ohm, shown(ohm, 2, '0.7')),
  inductance: quantity('inductance', millihenry, shown(millihenry, 1, '4.5')),
  capacitance: quantity('capacitance', picofarad, shown(picofarad, 0, '100')),
  voltage: quantity('potential', volt, shown(volt, 1, '13.5')),
  voltageKv: quantity('potential', kilovolt, shown(kilovolt, 1, '18')),
  current: quantity('current', ampere, shown(ampere, 1, '6.5')),
  energyMj: quantity('energy', millijoule, shown(millijoule, 0, '90')),
  thermalResistance: quantity('thermalResistance', kelvinPerWatt, shown(kelvinPerWatt, 1, '4')),
  activationEnergy: quantity('activation', electronvolt, shown(electronvolt, 2, '0.5')),
  /** Of one scale: nothing converts it. */
  octane: quantity('plain', one, shown(one, 1, '95')),
  /** Drag and other numbers without a unit that need the third decimal. */
  coefficient: quantity('plain', one, shown(one, 3, '0.032')),
  count: quantity('plain', one, shown(one, 0, '6')),
  plain: quantity('plain', one, shown(one, 2, '1.5')),
} as const satisfies Record<string, Quantity>

export type QuantityKind = keyof typeof quantities

export const quantityKinds = Object.keys(quantities) as QuantityKind[]

export function quantityOf(kind: QuantityKind): Quantity {
  return quantities[kind]
}

export function shownIn(kind: QuantityKind, system: UnitSystem): Shown {
  return quantities[kind][system]
}

/** The unit a field of this kind stands in: as a symbol, and as the word for a field's row ("degrees"). */
export function unitOf(kind: QuantityKind, system: UnitSystem): { symbol: string; word: string; joined: boolean; decimals: number } {
  const { unit, decimals } = shownIn(kind, system)
  return { symbol: unit.symbol, word: unit.word, joined: unit.joined, decimals }
}
