import * as math from 'mathjs'
import { describe, expect, it } from 'vitest'
import { convert, families, findFamily, findUnit } from '@/lib/units/families'
import type { FamilyName, Unit } from '@/lib/units/families'
import { unitKey } from '@/lib/units/unit-text'
import { someCases } from '@/tests/support/cases'
import { expectClose } from '@/tests/support/expect-close'

/**
 * Each unit as mathjs builds it from its exact ones. Its own hp and psi are cut after some digits and it has no inHg, rpm, kt or mph,
 * so these are written out from their definitions.
 */
const inMathjs: Record<FamilyName, { base: string; units: Record<string, string> }> = {
  angle: { base: 'deg', units: { '°': 'deg' } },
  rotation: { base: 'minute^-1', units: { rpm: '1 / minute' } },
  time: { base: 's', units: { µs: 'us', ms: 'ms', s: 's' } },
  length: { base: 'm', units: { mm: 'mm', cm: 'cm', m: 'm', in: 'inch', ft: 'ft' } },
  volume: { base: 'm^3', units: { cc: 'cm^3', l: 'litre', 'cu in': 'inch^3' } },
  power: { base: 'W', units: { W: 'W', kW: 'kW', hp: '550 ft lbf / s', PS: '75 kgf m / s' } },
  torque: { base: 'N m', units: { Nm: 'N m', 'lbf·ft': 'lbf ft', 'lbf·in': 'lbf inch' } },
  pressure: {
    base: 'Pa',
    units: { Pa: 'Pa', hPa: 'hPa', kPa: 'kPa', bar: 'bar', inHg: '13595.1 * 9.80665 kg / m^2 / s^2 * 1 inch', psi: 'lbf / inch^2' },
  },
  mass: { base: 'kg', units: { g: 'g', kg: 'kg', lb: 'lb' } },
  temperature: { base: 'K', units: { '°C': 'degC', '°F': 'degF', K: 'K' } },
  temperatureStep: { base: 'K', units: { K: 'K', '°C': 'K', '°F': 'degR' } },
  velocity: { base: 'm / s', units: { 'm/s': 'm / s', 'km/h': 'km / hour', kt: '1852 m / hour', mph: 'mile / hour', 'ft/min': 'ft / minute' } },
  curvature: { base: 'deg^-2', units: { 'per deg²': 'deg^-2' } },
  spacing: { base: 'm / deg', units: { 'mm/°': 'mm / deg', 'in/°': 'inch / deg' } },
  rate: { base: 'hour^-1', units: { '/h': '1 / hour' } },
  area: { base: 'm^2', units: { 'm²': 'm^2', 'ft²': 'ft^2' } },
  duration: { base: 's', units: { h: 'hour', min: 'minute' } },
  resistance: { base: 'ohm', units: { Ω: 'ohm', mΩ: 'mohm' } },
  inductance: { base: 'H', units: { mH: 'mH', µH: 'uH' } },
  capacitance: { base: 'farad', units: { pF: 'pF', nF: 'nF' } },
  potential: { base: 'V', units: { V: 'V', kV: 'kV' } },
  current: { base: 'A', units: { A: 'A', mA: 'mA' } },
  energy: { base: 'J', units: { mJ: 'mJ', J: 'J' } },
  thermalResistance: { base: 'K / W', units: { 'K/W': 'K / W' } },
  activation: { base: 'eV', units: { eV: 'eV' } },
  fraction: { base: '', units: { '': '1', '%': '1%' } },
  plain: { base: '', units: { '': '1' } },
}

const everyUnit = (Object.keys(families) as FamilyName[]).flatMap((family) => families[family].units.map((unit: Unit) => ({ family, unit })))

/** `value` of this unit in the reference's base, by mathjs. */
function reference(value: number, family: FamilyName, symbol: string): number {
  const { base, units } = inMathjs[family]
  const expression = units[symbol]
  if (expression === undefined) throw new Error(`no mathjs unit for ${symbol} of ${family}`)
  if (base === '') return value * Number(math.evaluate(expression))
  if (/^deg[CF]$/.test(expression)) return math.unit(value, expression).toNumber(base)
  const unit = math.evaluate(`${value} * (${/^[a-zA-Z]/.test(expression) ? '1 ' : ''}${expression})`)
  return math.number(unit, base)
}

describe('conversion factors', () => {
  it.each(someCases(everyUnit.map((x) => [x.family, x.unit.symbol, x.unit] as const)))('%s: %s agrees with mathjs to 1e-12, there and back', (family, symbol, unit) => {
    for (const value of someCases([1, 0.37, 41.5, 2780, -7.25])) {
      for (const other of families[family].units as readonly Unit[]) {
        const there = reference(value, family, symbol)
        const back = reference(convert(value, unit, other), family, other.symbol)
        // Near its zero a temperature scale has no relative accuracy: kelvins are compared.
        expectClose(back, there, { rel: 1e-12 })
      }
    }
  })

  it('has a mathjs counterpart for each unit and for no other', () => {
    for (const [family, { units }] of Object.entries(inMathjs)) {
      expect(Object.keys(units).sort(), family).toEqual(families[family as FamilyName].units.map((unit) => unit.symbol).sort())
    }
  })

  it('gives the very number back where both units are one', () => {
    for (const { unit } of everyUnit) expect(convert(0.1 + 0.2, unit, unit)).toBe(0.1 + 0.2)
  })

  it('knows the fixed points', () => {
    const by = (family: FamilyName, symbol: string) => (families[family].units as readonly Unit[]).find((unit) => unit.symbol === symbol) as Unit
    const cases: [number, FamilyName, string, string, number][] = [
      [3.4, 'length', 'in', 'mm', 86.36],
      [1, 'power', 'hp', 'kW', 0.74569987158227022],
      [29.92, 'pressure', 'inHg', 'kPa', 101.32074811902],
      [1, 'torque', 'lbf·ft', 'Nm', 1.3558179483314004],
      [250, 'temperature', '°F', 'K', 394.2611111111111],
      [36, 'temperatureStep', '°F', 'K', 20],
      [100, 'velocity', 'kt', 'km/h', 185.2],
      [158, 'volume', 'cu in', 'cc', 2589.156112],
      [14.5, 'pressure', 'psi', 'kPa', 99.97398075094123],
    ]
    for (const [value, family, from, to, expected] of someCases(cases)) expectClose(convert(value, by(family, from), by(family, to)), expected, { rel: 1e-12 })
  })
})

describe('units as typed', () => {
  it.each(someCases([
    ['length', 'mm', 'mm'], ['length', 'MM', 'mm'], ['length', 'in', 'in'], ['length', 'inches', 'in'], ['length', 'in.', 'in'], ['length', '"', 'in'],
    ['length', '”', 'in'], ['length', '″', 'in'], ['length', "''", 'in'], ['length', 'cm', 'cm'], ['length', 'm', 'm'], ['length', "'", 'ft'], ['length', 'Feet', 'ft'],
    ['angle', '°', '°'], ['angle', 'º', '°'], ['angle', 'deg', '°'], ['angle', 'degrees', '°'],
    ['rotation', 'RPM', 'rpm'], ['rotation', '1/min', 'rpm'], ['rotation', 'min⁻¹', 'rpm'], ['rotation', 'min^-1', 'rpm'], ['rotation', 'rev/min', 'rpm'],
    ['time', 'us', 'µs'], ['time', '\u00b5s', 'µs'], ['time', '\u03bcs', 'µs'], ['time', 'msec', 'ms'], ['time', 's', 's'],
    ['power', 'bhp', 'hp'], ['power', 'HP', 'hp'], ['power', 'kw', 'kW'], ['power', 'W', 'W'], ['power', 'ps', 'PS'],
    ['torque', 'lb-ft', 'lbf·ft'], ['torque', 'ft-lb', 'lbf·ft'], ['torque', 'ft.lbs', 'lbf·ft'], ['torque', 'lbf ft', 'lbf·ft'], ['torque', 'lbf·ft', 'lbf·ft'],
    ['torque', 'lbf⋅ft', 'lbf·ft'], ['torque', 'N·m', 'Nm'], ['torque', 'Nm', 'Nm'], ['torque', 'N m', 'Nm'], ['torque', 'in-lb', 'lbf·in'],
    ['pressure', 'inHg', 'inHg'], ['pressure', 'in. Hg', 'inHg'], ['pressure', '"Hg', 'inHg'], ['pressure', 'bar', 'bar'], ['pressure', 'mbar', 'hPa'],
    ['pressure', 'hPa', 'hPa'], ['pressure', 'psi', 'psi'], ['pressure', 'kPa', 'kPa'],
    ['volume', 'cc', 'cc'], ['volume', 'cm3', 'cc'], ['volume', 'cm³', 'cc'], ['volume', 'l', 'l'], ['volume', 'litre', 'l'], ['volume', 'liters', 'l'],
    ['volume', 'cu in', 'cu in'], ['volume', 'cu. in.', 'cu in'], ['volume', 'ci', 'cu in'], ['volume', 'in³', 'cu in'],
    ['temperature', 'degF', '°F'], ['temperature', '°F', '°F'], ['temperature', '° F', '°F'], ['temperature', '℉', '°F'], ['temperature', 'F', '°F'],
    ['temperature', 'degC', '°C'], ['temperature', '°C', '°C'], ['temperature', '℃', '°C'], ['temperature', 'K', 'K'],
    ['velocity', 'kt', 'kt'], ['velocity', 'knots', 'kt'], ['velocity', 'mph', 'mph'], ['velocity', 'km/h', 'km/h'], ['velocity', 'm/s', 'm/s'],
    ['resistance', 'ohm', 'Ω'], ['resistance', 'Ω', 'Ω'], ['resistance', '\u2126', 'Ω'], ['resistance', 'mΩ', 'mΩ'], ['inductance', 'mh', 'mH'], ['capacitance', 'nF', 'nF'],
    ['potential', 'kv', 'kV'], ['potential', 'volts', 'V'], ['current', 'amps', 'A'], ['thermalResistance', '°C/W', 'K/W'], ['rate', '1/h', '/h'], ['rate', 'per hour', '/h'],
    ['rate', 'h⁻¹', '/h'], ['area', 'sq ft', 'ft²'], ['area', 'm2', 'm²'], ['duration', 'hours', 'h'],
    ['velocity', 'fpm', 'ft/min'], ['velocity', 'ft/min', 'ft/min'], ['fraction', '%', '%'], ['fraction', 'percent', '%'],
    ['curvature', '/deg²', 'per deg²'], ['curvature', '1/deg2', 'per deg²'], ['curvature', 'deg⁻²', 'per deg²'], ['spacing', 'mm/deg', 'mm/°'],
  ] as const))('%s: %s is %s', (family, typed, symbol) => {
    expect(findUnit(family, typed)?.symbol).toBe(symbol)
  })

  it('has no word that stands for two units of one family', () => {
    for (const { family } of everyUnit) {
      const owners = new Map<string, string>()
      for (const unit of families[family].units as readonly Unit[]) {
        for (const word of unit.typed) {
          const owner = owners.get(unitKey(word)) ?? unit.symbol
          expect(owner, `${family}: ${word}`).toBe(unit.symbol)
          owners.set(unitKey(word), unit.symbol)
        }
      }
    }
  })

  it('does not take a square or its inverse for the other, nor a superscript for a digit', () => {
    expect(findUnit('curvature', 'deg²')).toBeNull()
    expect(findUnit('length', '')).toBeNull()
    expect(findUnit('length', '⁴mm')).toBeNull()
  })

  it('names the quantity of a unit that belongs elsewhere', () => {
    expect(findFamily('kg')).toBe('mass')
    expect(findFamily('rpm')).toBe('rotation')
    expect(findFamily('furlong')).toBeNull()
    expect(findFamily('')).toBeNull()
  })
})
