import { convert, families } from './families'
import { formatInput } from './format'
import type { QuantityError } from './parse'
import { quantityOf, shownIn } from './quantities'
import type { QuantityKind, UnitSystem } from './quantities'

const longestEcho = 32

/** What was typed, in quotation marks; a pasted page is cut. */
const quote = (text: string) => `“${text.length > longestEcho ? `${text.slice(0, longestEcho)}…` : text}”`

const sentenceOf: Record<NonNullable<QuantityError['hint']>, (typed: string) => string> = {
  noNumber: (typed) => `${typed} holds no number.`,
  malformed: (typed) => `${typed} is not a number.`,
  twoNumbers: (typed) => `${typed} holds more than one number.`,
  fraction: (typed) => `${typed} holds a fraction; write it as a decimal number.`,
  tooBig: (typed) => `${typed} is too large a number.`,
  tooSmall: (typed) => `${typed} is too small a number.`,
  side: () => '',
}

/** "a number in mm, for example 86" */
function expected(kind: QuantityKind, system: UnitSystem): string {
  const { unit, example } = shownIn(kind, system)
  const inUnit = unit.word === '' || unit.word.startsWith('per ') ? ` ${unit.word}`.trimEnd() : ` in ${unit.word}`
  return `a number${inUnit}, for example ${example}`
}

/** Which units a field takes, and what it makes of a number without one. */
function takes(kind: QuantityKind, system: UnitSystem): string {
  const { unit, example } = shownIn(kind, system)
  const symbols = families[quantityOf(kind).family].units.map(({ symbol }) => symbol).filter((symbol) => symbol !== '')
  const last = symbols.at(-1)
  if (last === undefined) return `It takes a number without a unit, for example ${example}.`
  const list = symbols.length === 1 ? last : `${symbols.slice(0, -1).join(', ')} or ${last}`
  return unit.symbol === '' ? `It takes ${list} or no unit, for example ${example}.` : `It takes ${list}; without a unit, ${expected(kind, system)}.`
}

/** What was wrong with what was typed, what is expected, and an example. */
export function quantityErrorSentence(error: QuantityError, label: string, kind: QuantityKind, system: UnitSystem): string {
  const typed = quote(error.typed)
  const unit = quote(error.unit ?? '')
  const type = `Type ${expected(kind, system)}.`
  switch (error.code) {
    case 'empty':
      return `${label} is empty. ${type}`
    case 'notANumber':
      return `${label}: ${sentenceOf[error.hint ?? 'malformed'](typed)} ${type}`
    case 'ambiguous': {
      const [decimal, thousands] = error.readings ?? ['', '']
      return `${label}: ${typed} can be read as ${decimal} or as ${thousands}. Type the one you mean.`
    }
    case 'wrongQuantity':
      return `${label}: ${unit} measures ${families[error.family ?? 'plain'].name}, which does not fit here. ${takes(kind, system)}`
    case 'unknownUnit':
      return error.hint === 'side'
        ? `${label}: leave out the words behind the angle in ${typed}. Before top dead centre is a plain number, after it a negative one, for example ${shownIn(kind, system).example}.`
        : `${label}: ${unit} is not a unit known here. ${takes(kind, system)}`
  }
}

/** Ends of a range in base units. */
export interface Range {
  min?: number
  above?: number
  max?: number
  below?: number
}

/**
 * An end of a range as it may be typed. Where the base unit is another one the end is cut to four digits inwards: 20 mm is 0.787402 in, and
 * "at least 0.7874 in" would name a value that is itself refused.
 */
function endText(value: number, kind: QuantityKind, system: UnitSystem, inwards: 'up' | 'down'): string {
  const { base } = quantityOf(kind)
  const { unit } = shownIn(kind, system)
  let text = formatInput(value, kind, system)
  if (unit !== base && Number(text) !== 0) {
    const converted = convert(value, base, unit)
    const step = 10 ** (Math.floor(Math.log10(Math.abs(converted))) - 3)
    const steps = converted / step
    const near = Math.round(steps)
    const isDust = Math.abs(steps - near) < 1e-6
    text = String(Number(((isDust ? near : inwards === 'up' ? Math.ceil(steps) : Math.floor(steps)) * step).toPrecision(4)))
  }
  return text.replace('-', '−') + (unit.symbol === '' ? '' : (unit.joined ? '' : '\u00a0') + unit.symbol)
}

/** The allowed range in the person's own units, for a value that was read but lies outside it. */
export function rangeSentence(label: string, kind: QuantityKind, system: UnitSystem, range: Range): string {
  const parts: string[] = []
  if (range.min !== undefined) parts.push(`at least ${endText(range.min, kind, system, 'up')}`)
  if (range.above !== undefined) parts.push(`more than ${endText(range.above, kind, system, 'up')}`)
  if (range.max !== undefined) parts.push(`at most ${endText(range.max, kind, system, 'down')}`)
  if (range.below !== undefined) parts.push(`less than ${endText(range.below, kind, system, 'down')}`)
  if (parts.length === 0) throw new RangeError('A range sentence needs at least one end')
  return `${label} must be ${parts.join(' and ')}.`
}
