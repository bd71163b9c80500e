import { convert, findFamily, findUnit } from './families'
import type { FamilyName, Unit } from './families'
import { formatInput } from './format'
import { readNumber } from './number-text'
import { quantityOf, shownIn } from './quantities'
import type { QuantityKind, UnitSystem } from './quantities'
import { plainText } from './unit-text'

export type ErrorHint = 'noNumber' | 'malformed' | 'twoNumbers' | 'fraction' | 'tooBig' | 'tooSmall' | 'side'

export interface QuantityError {
  ok: false
  code: 'empty' | 'notANumber' | 'unknownUnit' | 'wrongQuantity' | 'ambiguous'
  typed: string
  hint?: ErrorHint
  /** The unit as typed, where that is what was wrong. */
  unit?: string
  /** The quantity the typed unit belongs to. */
  family?: FamilyName
  /** What an ambiguous number can mean, written so that each has one reading. */
  readings?: [string, string]
}

export interface QuantityValue {
  ok: true
  /** In the library's base unit. */
  value: number
  /** As typed, or the symbol of the system's own unit. */
  unit: string
  unitGiven: boolean
  /** Another unit than the field's was typed: the page says what it becomes. */
  converted: boolean
}

export type QuantityResult = QuantityValue | QuantityError

const sides = /\b(before|after|btdc|atdc|early|late|advanced?|retard(ed)?)\b/i

/** Digits behind what was read as the number, other than in a unit like cm3: a second number. */
const secondNumber = /(^|[\s±+\-x×*/:~])\d/i

/**
 * Reads what a person typed as a quantity of this kind, in the library's base unit. A plain number stands in the unit their system shows
 * (or in `plainUnit`). What has two readings, two numbers or an unknown word is refused, never guessed.
 */
export function parseQuantity(text: string, kind: QuantityKind, system: UnitSystem, plainUnit?: Unit): QuantityResult {
  const typed = plainText(text)
  if (typed === '') return { ok: false, code: 'empty', typed }
  const number = readNumber(typed)
  if (!number.ok) {
    return number.problem === 'ambiguous'
      ? { ok: false, code: 'ambiguous', typed, readings: number.readings }
      : { ok: false, code: 'notANumber', typed, hint: number.problem }
  }

  const { family, base } = quantityOf(kind)
  const own = shownIn(kind, system).unit
  const unit = number.rest === '' ? (plainUnit ?? own) : findUnit(family, number.rest)
  if (unit === null) return refuseUnit(typed, number.rest, family)

  const value = convert(number.value, unit, base)
  if (!Number.isFinite(value)) return { ok: false, code: 'notANumber', typed, hint: 'tooBig' }
  return { ok: true, value, unit: number.rest || unit.symbol, unitGiven: number.rest !== '', converted: unit !== own }
}

function refuseUnit(typed: string, rest: string, family: FamilyName): QuantityError {
  if (family === 'angle' && sides.test(rest)) return { ok: false, code: 'unknownUnit', typed, unit: rest, hint: 'side' }
  const other = findFamily(rest)
  if (other !== null) return { ok: false, code: 'wrongQuantity', typed, unit: rest, family: other }
  if (secondNumber.test(rest)) return { ok: false, code: 'notANumber', typed, hint: 'twoNumbers' }
  return { ok: false, code: 'unknownUnit', typed, unit: rest }
}

/**
 * Like `parseQuantity`, but a field nobody touched gives back the very value it was filled from: the six digits a field shows must not
 * wear a stored value down with every save. `system` is the one the form was drawn in, which may not be the person's present one.
 */
export function keepUntouched(text: string, kind: QuantityKind, system: UnitSystem, baseValue: number | null | undefined): QuantityResult {
  if (baseValue !== null && baseValue !== undefined && Number.isFinite(baseValue) && text.trim() === formatInput(baseValue, kind, system)) {
    return { ok: true, value: baseValue, unit: shownIn(kind, system).unit.symbol, unitGiven: false, converted: false }
  }
  return parseQuantity(text, kind, system)
}
