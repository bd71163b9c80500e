import { create, parseDependencies, type MathNode } from 'mathjs/number'
import { registerFormulaParser } from './formula'
import { FormulaProblem } from './formula-problem'
import { tokensOf } from './formula-tokens'
import { treeOf } from './formula-walk'

/**
 * The one module that loads mathjs, and only its parser: nothing of its evaluation is used. Importing it registers the parser.
 * The number-only build is a third of the whole one.
 */
const { parse } = create(parseDependencies ?? {})

/** mathjs' words for a syntax error, in the words of this program. */
const words: readonly (readonly [RegExp, string])[] = [
  [/^Unexpected end/, 'something is missing at the end'],
  [/^Value expected/, 'a number, rpm, map or a function is expected here'],
  [/^Parenthesis \) expected/, 'a closing bracket is missing'],
  [/^False part/, 'the “:” and the other value of the condition are missing'],
  [/^Unexpected/, 'this does not follow from what stands before it'],
]

const problemFrom = (error: unknown, length: number): FormulaProblem => {
  const { message, char } = error as { message?: unknown, char?: unknown }
  const text = typeof message === 'string' ? message : ''
  // mathjs counts characters from 1; the end of the expression is one past its last character.
  const at = typeof char === 'number' ? Math.min(Math.max(char - 1, 0), length) : 0
  return new FormulaProblem(words.find(([pattern]) => pattern.test(text))?.[1] ?? 'the formula cannot be read from here on', at)
}

const parseMathjs = (expression: string): MathNode => {
  try {
    return parse(expression)
  } catch (error) {
    throw problemFrom(error, expression.length)
  }
}

registerFormulaParser((text) => {
  const expression = text.trimEnd()
  const tokens = tokensOf(expression)
  return treeOf(parseMathjs(expression), tokens, expression.length)
})
