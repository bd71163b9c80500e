import { CalcError } from '../calc-error'
import { describeValue } from '../validate/describe'
import { FormulaProblem } from './formula-problem'
import { compileTree, usesMap, type FormulaTree } from './formula-tree'

export interface CompiledFormula {
  /** Whether `map` stands in it anywhere, so that a manifold pressure is needed. */
  readonly usesMap: boolean
  /** The bare value, NaN or infinite where the formula has none: the caller turns that into an error. */
  readonly evaluate: (rpm: number, mapKpa: number) => number
}

export type FormulaParser = (expression: string) => FormulaTree

/** Bounds the nesting, and with it the depth of the call stack in parser and closures. */
export const longestExpression = 500
const cacheSize = 64

let parser: FormulaParser | null = null
const compiled = new Map<string, CompiledFormula>()

/** Called once by the module that brings the parser. Kept apart so that a page without formulas never loads it. */
export const registerFormulaParser = (parse: FormulaParser): void => {
  parser = parse
}

const remember = (expression: string, formula: CompiledFormula): CompiledFormula => {
  const oldest = compiled.size >= cacheSize ? compiled.keys().next() : null
  if (oldest && !oldest.done) compiled.delete(oldest.value)
  compiled.set(expression, formula)
  return formula
}

const takeExpression = (value: unknown, field: string): string => {
  const limit = `a formula of 1 to ${longestExpression} characters`
  const fail = (message: string) => new CalcError({ field, value, limit, unit: '', message })
  if (value === undefined || value === null) throw fail('The formula is missing: write one in rpm and map, such as 12 + 0.006 * rpm.')
  if (typeof value !== 'string') throw fail(`The formula must be a text; ${describeValue(value)} was given.`)
  if (value.trim() === '') throw fail('The formula is empty: write one in rpm and map, such as 12 + 0.006 * rpm.')
  if (value.length > longestExpression) throw fail(`The formula must have at most ${longestExpression} characters; this one has ${value.length}.`)
  return value
}

/** Parses and compiles a formula once; the same text again costs a look-up. CalcError on `field`, with `at` where a character is to blame. */
export const compileFormula = (value: unknown, field: string): CompiledFormula => {
  const expression = takeExpression(value, field)
  const known = compiled.get(expression)
  if (known) return known
  if (!parser) {
    throw new CalcError({
      field, value, limit: 'a loaded formula parser', unit: '', code: 'formulaParserNotLoaded',
      message: 'The formula parser is not loaded yet: load it before a formula is computed.',
    })
  }
  try {
    const tree = parser(expression)
    return remember(expression, { usesMap: usesMap(tree), evaluate: compileTree(tree) })
  } catch (error) {
    if (error instanceof FormulaProblem) {
      throw new CalcError({
        field, value, limit: 'a formula in rpm and map with + − * / ^, min, max, abs, sqrt and condition ? value : value', unit: '',
        at: error.at, message: `The formula cannot be used, at character ${error.at + 1}: ${error.message}.`,
      })
    }
    throw error
  }
}
