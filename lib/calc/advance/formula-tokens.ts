import { FormulaProblem } from './formula-problem'

export interface Token {
  readonly kind: 'number' | 'name' | 'sign'
  readonly text: string
  /** Index of its first character in the expression, from 0. */
  readonly at: number
}

/**
 * A point before * / ^ belongs to the parser's elementwise signs, not to the number.
 * Letters of every script count as names, so that the whole word is refused and shown.
 */
const pattern = /([ \t]+)|((?:\d+(?:\.(?![*/^])\d*)?|\.\d+)(?:[eE][+-]?\d+)?)|([\p{L}_$][\p{L}\p{N}_$]*)|(<=|>=|==|!=|[-+*/^(),?:<>])/uy

const operatorNames = new Set(['and', 'or', 'not'])
export const functionNames = new Set(['min', 'max', 'abs', 'sqrt'])
export const variableNames = new Set(['rpm', 'map'])

/** Signs that people paste or type from habit, with what to write. */
const instead: Readonly<Record<string, string>> = {
  '−': '-', '–': '-', '×': '*', '·': '*', '÷': '/', ':=': '==', '≤': '<=', '≥': '>=', '≠': '!=', '=': '==', '&': 'and', '|': 'or', '!': 'not',
}

const refuseCharacter = (expression: string, at: number): FormulaProblem => {
  const character = String.fromCodePoint(expression.codePointAt(at) ?? 32)
  if (character === '\n' || character === '\r') return new FormulaProblem('the formula must stand on one line', at)
  const better = instead[character]
  return new FormulaProblem(`“${character}” is not allowed${better ? `; write ${better}` : ''}`, at)
}

/** Cuts an expression into tokens and refuses every name and sign that is not on the list, with its place. */
export const tokensOf = (expression: string): Token[] => {
  const tokens: Token[] = []
  let at = 0
  while (at < expression.length) {
    pattern.lastIndex = at
    const match = pattern.exec(expression)
    if (!match) throw refuseCharacter(expression, at)
    const [text, , number, name] = match
    if (name !== undefined && !operatorNames.has(name) && !functionNames.has(name) && !variableNames.has(name)) {
      throw new FormulaProblem(`“${name}” is not a name it knows; there are rpm, map, min, max, abs, sqrt, and, or, not`, at)
    }
    if (number !== undefined) tokens.push({ kind: 'number', text, at })
    else if (name !== undefined) tokens.push({ kind: 'name', text, at })
    else if (match[4] !== undefined) tokens.push({ kind: 'sign', text, at })
    at += text.length
  }
  return tokens
}
