import { convert } from './families'
import { quantityOf, shownIn } from './quantities'
import type { QuantityKind, UnitSystem } from './quantities'

const minus = '\u2212'
const narrowNoBreakSpace = '\u202f'
const noBreakSpace = '\u00a0'

/**
 * Digits that are taken as meant. 1.005 in is stored as 25.526999999999997 mm and comes back as 1.0049999999999999: rounding half away from
 * zero works on thirteen digits, so that such dust does not turn a half downwards.
 */
const meantDigits = 13

export interface FormattedQuantity {
  text: string
  unit: string
  /** No gap between number and unit (28.5°). */
  joined: boolean
}

/** A number to fixed decimals: half away from zero, real minus, thousands parted from five digits, no "−0.0". */
export function formatNumber(value: number, decimals: number, sign = false): string {
  if (!Number.isFinite(value)) throw new RangeError(`A number to show is finite, not ${value}`)
  const { whole, part, isZero } = roundedDigits(Math.abs(value), decimals)
  const groups = whole.length >= 5 ? whole.replace(/\B(?=(\d{3})+$)/g, narrowNoBreakSpace) : whole
  const lead = isZero ? '' : value < 0 ? minus : sign ? '+' : ''
  return lead + groups + (decimals > 0 ? `.${part}` : '')
}

function roundedDigits(size: number, decimals: number): { whole: string; part: string; isZero: boolean } {
  const [mantissa = '0', exponent = '0'] = size.toExponential(meantDigits - 1).split('e')
  const digits = BigInt(mantissa.replace('.', ''))
  const shift = Number(exponent) - (meantDigits - 1) + decimals
  // Far below the last decimal shown: no need to build a divisor of hundreds of digits.
  if (shift < -meantDigits - 1) return { whole: '0', part: '0'.repeat(decimals), isZero: true }
  const scaled = shift >= 0 ? digits * 10n ** BigInt(shift) : roundHalfUp(digits, 10n ** BigInt(-shift))
  const text = scaled.toString().padStart(decimals + 1, '0')
  const cut = text.length - decimals
  return { whole: text.slice(0, cut), part: text.slice(cut), isZero: scaled === 0n }
}

const roundHalfUp = (value: bigint, divisor: bigint) => (2n * value + divisor) / (2n * divisor)

const raised = '⁰¹²³⁴⁵⁶⁷⁸⁹'

/** A number times a power of ten, "3.2·10⁻⁶": for chances, where the power is what is read. */
export function formatPowerOfTen(value: number, decimals: number, sign = false): string {
  if (!Number.isFinite(value)) throw new RangeError(`A number to show is finite, not ${value}`)
  if (value === 0) return '0'
  // The digits are moved as text: 9.96 becomes 1.0·10¹, and no power is too small to divide by.
  const [mantissa = '0', exponent = '0'] = value.toExponential(decimals).split('e')
  const power = Number(exponent)
  const text = formatNumber(Number(mantissa), decimals, sign)
  if (power === 0) return text
  const digits = [...String(Math.abs(power))].map((digit) => raised[Number(digit)]).join('')
  return `${text}·10${power < 0 ? '⁻' : ''}${digits}`
}

export interface FormatOptions {
  decimals?: number
  /** Plus before positive values: always on differences. */
  sign?: boolean
}

/** A value in the library's base unit as this system shows it; throws RangeError on what is not finite. */
export function formatQuantity(value: number, kind: QuantityKind, system: UnitSystem, options: FormatOptions = {}): FormattedQuantity {
  const { unit, decimals, powerOfTen } = shownIn(kind, system)
  const write = powerOfTen ? formatPowerOfTen : formatNumber
  const text = write(convert(value, quantityOf(kind).base, unit), options.decimals ?? decimals, options.sign)
  return { text, unit: unit.symbol, joined: unit.joined }
}

/** The same in one string for sentences and titles ("26.5°", "52.5 kW"), which no line break parts. */
export function formatQuantityText(value: number, kind: QuantityKind, system: UnitSystem, options: FormatOptions = {}): string {
  const { text, unit, joined } = formatQuantity(value, kind, system, options)
  return unit === '' ? text : text + (joined ? '' : noBreakSpace) + unit
}

/** A value for a form field: at most six significant digits (more only where the whole part has more), plain ASCII minus and point, no zeros at the end. */
export function formatInput(value: number, kind: QuantityKind, system: UnitSystem): string {
  if (!Number.isFinite(value)) throw new RangeError(`A number to fill a field with is finite, not ${value}`)
  const { unit, powerOfTen } = shownIn(kind, system)
  const converted = convert(value, quantityOf(kind).base, unit)
  if (powerOfTen && converted !== 0 && Math.abs(converted) < 0.01) return Number(converted.toPrecision(6)).toExponential()
  // Taking 459.67 away leaves dust of 1e-13 where the field should hold 0.
  const shownValue = unit.offset === 0 ? converted : Math.round(converted * 1e9) / 1e9
  const wholeDigits = shownValue === 0 ? 1 : Math.floor(Math.log10(Math.abs(shownValue))) + 1
  return String(Number(shownValue.toPrecision(Math.min(Math.max(6, wholeDigits), 17))))
}
