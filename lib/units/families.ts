import { unitKey } from './unit-text'

/**
 * The one table of conversion factors. A family is one physical quantity; its units convert by
 * family base = (number + offset) · factor. Bases are chosen so that the factors of everyday units are whole or short decimals.
 *
 * Defining constants (exact): inch 25.4 mm, pound 0.453 592 37 kg, standard gravity 9.806 65 m/s², nautical mile 1852 m.
 */
export interface Unit {
  /** As shown beside a number. */
  symbol: string
  /** As written in a field's row, where the trade writes a word. */
  word: string
  /** Set close to the number, without a gap. */
  joined: boolean
  factor: number
  offset: number
  /** Everything a person may type for it; compared through `unitKey`. */
  typed: readonly string[]
}

export interface Family {
  /** After "measures …". */
  name: string
  units: readonly Unit[]
}

const unit = (symbol: string, factor: number, typed: string[] = [], more: Partial<Pick<Unit, 'word' | 'joined' | 'offset'>> = {}): Unit =>
  ({ symbol, factor, typed: [symbol, ...typed], word: symbol, joined: false, offset: 0, ...more })

const poundForceNewton = 0.45359237 * 9.80665
const squareInchMm2 = 25.4 * 25.4

export const one = unit('', 1)
export const percent = unit('%', 0.01, ['percent', 'per cent', 'pct'])

export const degree = unit('°', 1, ['deg', 'degs', 'degree', 'degrees'], { word: 'degrees', joined: true })
export const rpm = unit('rpm', 1, ['1/min', '/min', 'min-1', 'r/min', 'rev/min', 'revs/min'])

export const microsecond = unit('µs', 1, ['us', 'usec', 'microsecond', 'microseconds'])
export const millisecond = unit('ms', 1e3, ['msec', 'millisecond', 'milliseconds'])
const second = unit('s', 1e6, ['sec', 'second', 'seconds'])

export const millimetre = unit('mm', 1, ['millimetre', 'millimetres', 'millimeter', 'millimeters'])
const centimetre = unit('cm', 10, ['centimetre', 'centimetres', 'centimeter', 'centimeters'])
export const metre = unit('m', 1000, ['metre', 'metres', 'meter', 'meters'])
export const inch = unit('in', 25.4, ['inch', 'inches', '"'], { word: 'inches' })
export const foot = unit('ft', 304.8, ['foot', 'feet', "'"])

export const cubicCentimetre = unit('cc', 1, ['cm3', 'ccm', 'ml'])
const litre = unit('l', 1000, ['litre', 'litres', 'liter', 'liters', 'ltr'])
/** 2.54³ */
export const cubicInch = unit('cu in', 16.387064, ['in3', 'ci', 'cid', 'cubic inch', 'cubic inches', 'cu inch'])

const watt = unit('W', 1, ['watt', 'watts'])
export const kilowatt = unit('kW', 1000, ['kilowatt', 'kilowatts'])
/** Mechanical: 550 ft·lbf/s. */
export const horsepower = unit('hp', 550 * 0.3048 * poundForceNewton, ['bhp', 'horsepower'])
/** Metric: 75 kgf·m/s. */
const metricHorsepower = unit('PS', 75 * 9.80665, ['cv', 'metric hp'])

export const newtonMetre = unit('Nm', 1, ['N·m', 'newton metre', 'newton metres'])
export const poundFoot = unit('lbf·ft', poundForceNewton * 0.3048, ['ft·lbf', 'lb·ft', 'ft·lb', 'lbs·ft', 'ft·lbs'])
const poundInch = unit('lbf·in', poundForceNewton * 0.0254, ['in·lbf', 'lb·in', 'in·lb', 'lbs·in', 'in·lbs'])

const pascal = unit('Pa', 1)
const hectopascal = unit('hPa', 100, ['mbar', 'millibar', 'millibars', 'mb'])
export const kilopascal = unit('kPa', 1000)
const bar = unit('bar', 1e5, ['bars'])
export const psi = unit('psi', (poundForceNewton * 1e6) / squareInchMm2, ['lbf/in2', 'lb/in2'])
/** Conventional inch of mercury at 0 °C: 13 595.1 kg/m³ under standard gravity. */
export const inchMercury = unit('inHg', 13595.1 * 9.80665 * 0.0254, ['in Hg', '"Hg', 'inches Hg', 'inch of mercury', 'inches of mercury'])

const gram = unit('g', 0.001, ['gram', 'grams'])
export const kilogram = unit('kg', 1, ['kilo', 'kilos', 'kilogram', 'kilograms'])
export const pound = unit('lb', 0.45359237, ['lbs', 'lbm', 'pound', 'pounds'])

const kelvinTyped = ['kelvin']
const celsiusTyped = ['C', 'degC', 'deg C', 'degree C', 'degrees C', 'celsius']
const fahrenheitTyped = ['F', 'degF', 'deg F', 'degree F', 'degrees F', 'fahrenheit']
export const kelvin = unit('K', 1, kelvinTyped)
export const celsius = unit('°C', 1, celsiusTyped, { offset: 273.15 })
export const fahrenheit = unit('°F', 5 / 9, fahrenheitTyped, { offset: 459.67 })
export const celsiusStep = unit('°C', 1, celsiusTyped)
export const fahrenheitStep = unit('°F', 5 / 9, fahrenheitTyped)

export const metrePerSecond = unit('m/s', 1, ['mps'])
export const kilometrePerHour = unit('km/h', 1 / 3.6, ['kmh', 'kph', 'km/hr'])
export const knot = unit('kt', 1852 / 3600, ['kts', 'kn', 'knot', 'knots'])
const milePerHour = unit('mph', 0.44704, ['mi/h'])
export const footPerMinute = unit('ft/min', 0.00508, ['fpm', 'feet/min'])

export const perSquareDegree = unit('per deg²', 1, ['/deg²', '1/deg²', '/°²', '1/°²', 'per °²', 'deg-2', '°-2'])
export const millimetrePerDegree = unit('mm/°', 1, ['mm/deg', 'mm per deg', 'mm per degree', 'mm per °'], { word: 'mm per degree' })
export const inchPerDegree = unit('in/°', 25.4, ['in/deg', 'in per deg', 'in per degree', 'in per °', '"/°'], { word: 'inches per degree' })
export const perHour = unit('/h', 1, ['1/h', 'per hour', 'per h', '/hr', '1/hr', '/hour', '1/hour', 'h-1', 'hour-1'], { word: 'per hour' })

export const squareMetre = unit('m²', 1, ['sq m', 'square metre', 'square metres', 'square meter', 'square meters'])
/** 0.3048² */
export const squareFoot = unit('ft²', 0.3048 * 0.3048, ['sq ft', 'square foot', 'square feet'])

export const hour = unit('h', 1, ['hr', 'hrs', 'hour', 'hours'])
const minute = unit('min', 1 / 60, ['mins', 'minute', 'minutes'])

export const ohm = unit('Ω', 1, ['ohm', 'ohms'], { word: 'ohm' })
const milliohm = unit('mΩ', 0.001, ['mohm', 'milliohm', 'milliohms'])
export const millihenry = unit('mH', 1, ['millihenry', 'millihenries'])
const microhenry = unit('µH', 0.001, ['uH', 'microhenry', 'microhenries'])
export const picofarad = unit('pF', 1, ['picofarad', 'picofarads'])
const nanofarad = unit('nF', 1000, ['nanofarad', 'nanofarads'])
export const volt = unit('V', 1, ['volt', 'volts'])
export const kilovolt = unit('kV', 1000, ['kilovolt', 'kilovolts'])
export const ampere = unit('A', 1, ['amp', 'amps', 'ampere', 'amperes'])
const milliampere = unit('mA', 0.001, ['milliamp', 'milliamps'])
export const millijoule = unit('mJ', 0.001, ['millijoule', 'millijoules'])
const joule = unit('J', 1, ['joule', 'joules'])
export const kelvinPerWatt = unit('K/W', 1, ['°C/W', 'degC/W', 'C/W', 'K per W'])
export const electronvolt = unit('eV', 1, ['electronvolt', 'electronvolts'])

export const families = {
  angle: { name: 'an angle', units: [degree] },
  rotation: { name: 'a speed of rotation', units: [rpm] },
  time: { name: 'time', units: [millisecond, microsecond, second] },
  length: { name: 'a length', units: [millimetre, centimetre, metre, inch, foot] },
  volume: { name: 'a volume', units: [cubicCentimetre, litre, cubicInch] },
  power: { name: 'power', units: [kilowatt, watt, horsepower, metricHorsepower] },
  torque: { name: 'torque', units: [newtonMetre, poundFoot, poundInch] },
  pressure: { name: 'pressure', units: [kilopascal, hectopascal, pascal, bar, inchMercury, psi] },
  mass: { name: 'mass', units: [kilogram, gram, pound] },
  temperature: { name: 'temperature', units: [celsius, fahrenheit, kelvin] },
  temperatureStep: { name: 'temperature', units: [kelvin, celsiusStep, fahrenheitStep] },
  velocity: { name: 'a speed', units: [metrePerSecond, kilometrePerHour, knot, milePerHour, footPerMinute] },
  curvature: { name: 'a curvature', units: [perSquareDegree] },
  spacing: { name: 'a spacing of marks', units: [millimetrePerDegree, inchPerDegree] },
  rate: { name: 'a rate of failure', units: [perHour] },
  area: { name: 'an area', units: [squareMetre, squareFoot] },
  duration: { name: 'time', units: [hour, minute] },
  resistance: { name: 'electrical resistance', units: [ohm, milliohm] },
  inductance: { name: 'inductance', units: [millihenry, microhenry] },
  capacitance: { name: 'capacitance', units: [picofarad, nanofarad] },
  potential: { name: 'voltage', units: [volt, kilovolt] },
  current: { name: 'electric current', units: [ampere, milliampere] },
  energy: { name: 'energy', units: [millijoule, joule] },
  thermalResistance: { name: 'thermal resistance', units: [kelvinPerWatt] },
  activation: { name: 'an activation energy', units: [electronvolt] },
  fraction: { name: 'a share', units: [one, percent] },
  plain: { name: 'a plain number', units: [one] },
} as const satisfies Record<string, Family>

export type FamilyName = keyof typeof families

const lookup = new Map<FamilyName, Map<string, Unit>>()
for (const [name, family] of Object.entries(families) as [FamilyName, Family][]) {
  const words = new Map<string, Unit>()
  for (const u of family.units) for (const word of u.typed) words.set(unitKey(word), u)
  words.delete('')
  lookup.set(name, words)
}

/** The unit of this family that was typed, or null. */
export function findUnit(family: FamilyName, typed: string): Unit | null {
  return lookup.get(family)?.get(unitKey(typed)) ?? null
}

/** The first family that knows this unit, or null: tells a unit of another quantity from a word that is no unit. */
export function findFamily(typed: string): FamilyName | null {
  const key = unitKey(typed)
  for (const [name, words] of lookup) if (words.has(key)) return name
  return null
}

/** A number in `from` as a number in `to`; the very same number where both are one unit. */
export function convert(value: number, from: Unit, to: Unit): number {
  if (from === to) return value
  return ((value + from.offset) * from.factor) / to.factor - to.offset
}
