import { families } from './families'
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

/** "A number in mm, for example 86." */
function expected(kind: QuantityKind, system: UnitSystem): string {
  const { unit, example } = shownIn(kind, system)
  return unit.word === '' ? `a number, for example ${example}` : `a number in ${unit.word}, for example ${example}`
}

/** "mm, cm, m, in or ft", or '' where nothing but a plain number is taken. */
function unitsTaken(kind: QuantityKind): string {
  const symbols = families[quantityOf(kind).family].units.map((unit) => unit.symbol).filter((symbol) => symbol !== '')
  const last = symbols.at(-1) ?? ''
  return symbols.length < 2 ? last : `${symbols.slice(0, -1).join(', ')} or ${last}`
}

/** What was wrong with what was typed, what is expected, and an example. */
export function quantityErrorSentence(error: QuantityError, label: string, kind: QuantityKind, system: UnitSystem): string {
  const typed = quote(error.typed)
  const unit = quote(error.unit ?? '')
  const type = `Type ${expected(kind, system)}.`
  const takes = unitsTaken(kind) === '' ? 'It takes a number without a unit' : `It takes ${unitsTaken(kind)}`
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
      return `${label}: ${unit} measures ${families[error.family ?? 'plain'].name}, which does not fit here. ${takes}; without a unit, ${expected(kind, system)}.`
    case 'unknownUnit':
      return error.hint === 'side'
        ? `${label}: leave out the words behind the angle in ${typed}. Before top dead centre is a plain number, after it a negative one, for example ${shownIn(kind, system).example}.`
        : `${label}: ${unit} is not a unit known here. ${takes}; without a unit, ${expected(kind, system)}.`
  }
}

/** The allowed range in the person's own units, for a value that was read but lies outside it. Ends are in base units. */
export function rangeSentence(label: string, kind: QuantityKind, system: UnitSystem, range: { min?: number; above?: number; max?: number; below?: number }): string {
  const { symbol, joined } = shownIn(kind, system).unit
  const end = (value: number) => formatInput(value, kind, system).replace('-', '−') + (symbol === '' ? '' : (joined ? '' : '\u00a0') + symbol)
  const parts: string[] = []
  if (range.min !== undefined) parts.push(`at least ${end(range.min)}`)
  if (range.above !== undefined) parts.push(`more than ${end(range.above)}`)
  if (range.max !== undefined) parts.push(`at most ${end(range.max)}`)
  if (range.below !== undefined) parts.push(`less than ${end(range.below)}`)
  if (parts.length === 0) throw new RangeError('A range sentence needs at least one end')
  return `${label} must be ${parts.join(' and ')}.`
}
