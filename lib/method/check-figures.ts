import { formatNumber } from '../units'
import type { PublishedCheck } from '@/tests/published/published-case'
import { allowedDifference } from './judge-check'

const superscript: Record<string, string> = { '-': '⁻', 0: '⁰', 1: '¹', 2: '²', 3: '³', 4: '⁴', 5: '⁵', 6: '⁶', 7: '⁷', 8: '⁸', 9: '⁹' }
/** More digits than a double carries say nothing. */
const mostDigits = 15
/** A small figure of more decimals is easier read as a power of ten. */
const plainDecimals = 5

const magnitude = (value: number) => Math.floor(Math.log10(Math.abs(value)))

/** 3.50 × 10⁻⁵ */
function scientific(value: number, digits: number, sign: boolean): string {
  const [mantissa = '0', exponent = '0'] = value.toExponential(Math.min(Math.max(digits, 0), mostDigits)).split('e')
  const power = [...String(Number(exponent))].map((digit) => superscript[digit] ?? digit).join('')
  return `${formatNumber(Number(mantissa), mantissa.split('.')[1]?.length ?? 0, sign)}\u00a0×\u00a010${power}`
}

function figure(value: number, decimals: number, sign = false, plain = plainDecimals): string {
  if (value === 0) return '0'
  const size = Math.abs(value)
  if (size < 1e-3 && decimals > plain || size >= 1e7) return scientific(value, magnitude(value) + decimals, sign)
  return formatNumber(value, Math.max(0, Math.min(decimals, mostDigits - 1 - magnitude(value))), sign)
}

/** Decimals of the shortest text of a number. */
function ownDecimals(value: number): number {
  const [mantissa = '', exponent = '0'] = String(value).split('e')
  return Math.max(0, (mantissa.split('.')[1]?.length ?? 0) - Number(exponent))
}

/** Decimals the source printed, where the tolerance is half of its last digit; else those of the stored figure. */
function printedDecimals({ expected, tolerance, toleranceReason }: PublishedCheck): number {
  const own = ownDecimals(expected)
  if (!('abs' in tolerance) || tolerance.abs === 0 || toleranceReason) return own
  const decimals = Math.round(-Math.log10(2 * tolerance.abs))
  return Math.abs(0.5 * 10 ** -decimals / tolerance.abs - 1) < 1e-6 ? Math.max(own, decimals) : own
}

/** Decimals that show where inside its tolerance a value lies: one more than the tolerance's first. */
function computedDecimals(check: PublishedCheck): number {
  const allowed = allowedDifference(check)
  return allowed > 0 ? Math.max(0, 1 - magnitude(allowed)) : printedDecimals(check) + 2
}

export const expectedText = (check: PublishedCheck): string => figure(check.expected, printedDecimals(check))
/** As far as its tolerance tells anything; a figure met exactly, like a count, as it was printed. */
export const computedText = (check: PublishedCheck, value: number): string => (value === check.expected ? expectedText(check) : figure(value, computedDecimals(check)))

/** One digit finer than the computed figure, and written like it; below that it is rounding, and shown as none. */
export function differenceText(check: PublishedCheck, difference: number): string {
  const decimals = computedDecimals(check) + 1
  return Math.abs(difference) < 0.5 * 10 ** -decimals ? '0' : figure(difference, decimals, true, plainDecimals + 2)
}

export function toleranceText({ tolerance }: Pick<PublishedCheck, 'tolerance'>): string {
  const [value, ending] = 'abs' in tolerance ? [tolerance.abs, ''] : [tolerance.rel, ' of it']
  return `±${figure(value, ownDecimals(value))}${ending}`
}
