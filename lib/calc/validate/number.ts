import { CalcError } from '../calc-error'
import { describeValue } from './describe'

/** What a number must be. `name` is what people call it; a function where building the words costs time. */
export interface NumberRule {
  readonly name: string | (() => string)
  readonly unit: string
  readonly min?: number
  readonly above?: number
  readonly max?: number
  readonly below?: number
  readonly integer?: boolean
}

const limitOf = ({ min, above, max, below, integer }: NumberRule): string => {
  const low = min !== undefined ? `≥ ${min}` : above !== undefined ? `> ${above}` : ''
  const high = max !== undefined ? `≤ ${max}` : below !== undefined ? `< ${below}` : ''
  const range = [low, high].filter(Boolean).join(' and ')
  return [integer ? 'a whole number' : range ? '' : 'a finite number', range].filter(Boolean).join(', ').replaceAll('-', '−')
}

const rangeWords = ({ min, above, max, below }: NumberRule, unit: string): string => {
  const low = min !== undefined ? `at least ${min}${unit}` : above !== undefined ? `above ${above}${unit}` : ''
  const high = max !== undefined ? `at most ${max}${unit}` : below !== undefined ? `below ${below}${unit}` : ''
  return [low, high].filter(Boolean).join(' and ').replaceAll('-', '−')
}

const numberError = (value: unknown, field: string, rule: NumberRule): CalcError => {
  const name = typeof rule.name === 'string' ? rule.name : rule.name()
  const unit = rule.unit ? ` ${rule.unit}` : ''
  const range = rangeWords(rule, unit)
  const kind = `a ${rule.integer ? 'whole ' : ''}number${rule.unit && !range ? ` in ${rule.unit}` : ''}`
  const wanted = range ? `${kind}, ${range}` : kind
  const message = value === undefined || value === null
    ? `${name} is missing: give ${wanted}.`
    : `${name} must be ${wanted}; ${describeValue(value)} was given.`
  return new CalcError({ field, value, limit: limitOf(rule), unit: rule.unit, message })
}

/** Whether a value is a finite number within the rule. */
export const isAllowed = (value: unknown, rule: Omit<NumberRule, 'name'>): value is number =>
  typeof value === 'number' && Number.isFinite(value)
  && !(rule.min !== undefined && value < rule.min)
  && !(rule.above !== undefined && value <= rule.above)
  && !(rule.max !== undefined && value > rule.max)
  && !(rule.below !== undefined && value >= rule.below)
  && !(rule.integer === true && !Number.isSafeInteger(value))

/** The value itself when it is a finite number within the rule, else a CalcError on `field`. Nothing is converted or clamped. */
export const takeNumber = (value: unknown, field: string, rule: NumberRule): number => {
  if (!isAllowed(value, rule)) throw numberError(value, field, rule)
  return value
}

/** As `takeNumber`, with a default where nothing was given. `null` is not nothing. */
export const takeOptionalNumber = <T>(value: unknown, field: string, rule: NumberRule, fallback: T): number | T =>
  value === undefined ? fallback : takeNumber(value, field, rule)
