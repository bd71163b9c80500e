import { plainText } from './unit-text'

/**
 * A number as people write it, and what stands behind it.
 *
 * Marks: the point is always the decimal mark, because that is what every page shows ("3.386" in a field must be 3.386). A comma is one too,
 * except where it may as well part thousands: exactly three digits behind a lone comma and one to three before it, not a lone 0. "1,234" is
 * refused with both readings; "0,125", "28,5" and "1234,567" have one reading only. With both marks the last one is the decimal mark, and
 * the others must part groups of three. The same mark twice parts thousands. Spaces and apostrophes may part thousands, never anything else.
 */
export type NumberText =
  | { ok: true; value: number; rest: string }
  | { ok: false; problem: 'noNumber' | 'malformed' | 'twoNumbers' | 'fraction' | 'tooBig' | 'tooSmall' }
  | { ok: false; problem: 'ambiguous'; readings: [string, string] }

const grouped = (mark: string) => new RegExp(`^\\d{1,3}(?:${mark}\\d{3})+$`)
const groupedBy: Record<string, RegExp> = { ',': grouped(','), '.': grouped('\\.'), ' ': grouped(' '), "'": grouped("'") }

/** The digits of a whole part without the marks between its thousands, or null when they do not part thousands. */
function ungroup(whole: string, marks: string): string | null {
  if (/^\d*$/.test(whole)) return whole
  for (const mark of marks) if (groupedBy[mark]?.test(whole)) return whole.replaceAll(mark, '')
  return null
}

type Digits = { text: string } | { readings: [string, string] } | null

function readMarks(body: string): Digits {
  const commas = body.split(',').length - 1
  const points = body.split('.').length - 1
  if (commas + points === 0) return whole(body, " '")
  if (commas > 0 && points > 0) {
    const decimal = body.lastIndexOf(',') > body.lastIndexOf('.') ? ',' : '.'
    return split(body, decimal, decimal === ',' ? '.' : ',')
  }
  const mark = commas > 0 ? ',' : '.'
  if (commas + points > 1) return whole(body, mark)
  if (mark === ',' && /^\d{1,3},\d{3}$/.test(body) && !/^0+,/.test(body)) return { readings: [body.replace(',', '.'), body.replace(',', '')] }
  return split(body, mark, " '")
}

function whole(body: string, marks: string): Digits {
  const text = ungroup(body, marks)
  return text === null ? null : { text }
}

function split(body: string, decimal: string, groupMarks: string): Digits {
  const at = body.lastIndexOf(decimal)
  const left = ungroup(body.slice(0, at), groupMarks)
  const right = body.slice(at + 1)
  return left === null || !/^\d*$/.test(right) || left + right === '' ? null : { text: `${left || '0'}.${right || '0'}` }
}

const raisedDigits = '⁰¹²³⁴⁵⁶⁷⁸⁹'

/** The power of ten at the start of what stands behind a number, as it was typed and as "e-6": 3.2e-6, 3.2·10⁻⁶, 3.2 x 10^-6. */
function readPower(behind: string): { typed: string; exponent: string } {
  const short = /^e[+-]?\d+(?![\d.,])/i.exec(behind)?.[0]
  if (short !== undefined) return { typed: short, exponent: short }
  const long = /^ ?[·⋅∙*×x] ?10(?:\^([+-]?\d+)|([⁺⁻]?[⁰¹²³⁴⁵⁶⁷⁸⁹]+))(?![\d.,])/i.exec(behind)
  if (!long) return { typed: '', exponent: '' }
  const power = long[1] ?? [...(long[2] ?? '')].map((sign) => (sign === '⁻' ? '-' : sign === '⁺' ? '+' : String(raisedDigits.indexOf(sign)))).join('')
  return { typed: long[0], exponent: `e${power}` }
}

export function readNumber(typed: string): NumberText {
  // "2450 1/min": the 1 belongs to the unit, not to the number.
  const text = plainText(typed).replace(/ 1\/(?=[a-z°])/i, ' /')
  const head = /^([+-]?) ?([\d.,'’ ]*)/.exec(text)
  const sign = head?.[1] ?? ''
  // An apostrophe or space at the end parts nothing: it belongs to the unit (5' is five feet).
  const body = (head?.[2] ?? '').replace(/['’ ]+$/, '')
  if (!/\d/.test(body)) return { ok: false, problem: /\d/.test(text) ? 'malformed' : 'noNumber' }
  const behind = text.slice(text.indexOf(body, sign.length) + body.length)
  const { typed: power, exponent } = readPower(behind)
  const rest = behind.slice(power.length).trim()
  if (/^\/ ?\d/.test(rest)) return { ok: false, problem: 'fraction' }

  const digits = readMarks(body.replaceAll('’', "'"))
  if (digits === null) return { ok: false, problem: /\d +\d/.test(body) ? 'twoNumbers' : 'malformed' }
  if ('readings' in digits) {
    const [decimal, thousands] = digits.readings
    return { ok: false, problem: 'ambiguous', readings: [sign + decimal + exponent, sign + thousands + exponent] }
  }
  const size = Number(digits.text + exponent)
  if (size === Infinity) return { ok: false, problem: 'tooBig' }
  if (size === 0 && /[1-9]/.test(digits.text)) return { ok: false, problem: 'tooSmall' }
  return { ok: true, value: sign === '-' && size !== 0 ? -size : size, rest }
}
