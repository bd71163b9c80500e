import type { ConstantNode, ConditionalNode, FunctionNode, MathNode, OperatorNode, ParenthesisNode, RelationalNode, SymbolNode } from 'mathjs'
import { FormulaProblem } from './formula-problem'
import type { Comparison, ConditionTree, FormulaTree } from './formula-tree'
import { functionNames, type Token } from './formula-tokens'

/** mathjs' nodes by their `type`, those that an allowed formula can contain. */
type Known =
  | (ConstantNode & { type: 'ConstantNode' }) | (ConditionalNode & { type: 'ConditionalNode' }) | (FunctionNode & { type: 'FunctionNode' })
  | (OperatorNode & { type: 'OperatorNode' }) | (ParenthesisNode & { type: 'ParenthesisNode' }) | (RelationalNode & { type: 'RelationalNode' })
  | (SymbolNode & { type: 'SymbolNode' })

const arithmetic = ['+', '-', '*', '/', '^'] as const
const comparisonOf: Readonly<Record<string, Comparison>> = {
  smaller: '<', smallerEq: '<=', larger: '>', largerEq: '>=', equal: '==', unequal: '!=',
}
const comparisonSigns = new Set<string>(Object.values(comparisonOf))

/**
 * mathjs' nodes carry no place in the text. Its tree keeps every bracket, so a walk from left to right meets the tokens
 * in their order: the walk consumes them, and the next one is the place of whatever is refused.
 */
class Walk {
  private next = 0

  constructor(private readonly tokens: readonly Token[], private readonly length: number) {}

  get at(): number {
    return this.tokens[this.next]?.at ?? this.length
  }

  refuse(message: string, at = this.at): FormulaProblem {
    return new FormulaProblem(message, at)
  }

  /** Consumes the token that must stand here; the place of another one is where the formula is not what it seems. */
  take(text: string): number {
    const token = this.tokens[this.next]
    if (token?.text !== text) throw this.refuse('this does not belong here')
    this.next += 1
    return token.at
  }

  takeNumber(): void {
    if (this.tokens[this.next]?.kind !== 'number') throw this.refuse('this does not belong here')
    this.next += 1
  }
}

const isOneOf = <T extends string>(list: readonly T[], text: string): text is T => (list as readonly string[]).includes(text)

const between = <T>(walk: Walk, read: () => T): T => {
  walk.take('(')
  const inner = read()
  walk.take(')')
  return inner
}

const functionCall = (node: FunctionNode, walk: Walk): FormulaTree => {
  const name = (node.fn as { name?: unknown }).name
  const kind = String(name)
  if (!functionNames.has(kind)) throw walk.refuse(`“${kind}” is not a function; there are min, max, abs, sqrt. For a product write *`)
  const at = walk.take(kind)
  const { args } = node
  const wanted = kind === 'min' || kind === 'max' ? args.length >= 1 : args.length === 1
  if (!wanted) throw walk.refuse(kind === 'min' || kind === 'max' ? `“${kind}” needs at least one value` : `“${kind}” takes exactly one value`, at)
  const of = between(walk, () => args.map((argument, i) => {
    if (i > 0) walk.take(',')
    return valueOf(argument, walk)
  }))
  if (kind === 'min' || kind === 'max') return { kind, of }
  return { kind: kind === 'abs' ? 'abs' : 'sqrt', of: of[0] as FormulaTree }
}

const operator = (node: OperatorNode, walk: Walk): FormulaTree => {
  const { op, args, implicit } = node as OperatorNode & { op: string }
  const [first, second] = args as readonly (MathNode | undefined)[]
  if (first && !second && (op === '-' || op === '+')) {
    walk.take(op)
    const of = valueOf(first, walk)
    return op === '-' ? { kind: 'negate', of } : of
  }
  if (op === 'not') throw walk.refuse('a condition may stand only before “?”')
  if (!first || !second) throw walk.refuse(`“${op}” is not allowed here`)
  const left = valueOf(first, walk)
  if (comparisonSigns.has(op) || op === 'and' || op === 'or') throw walk.refuse('a condition may stand only before “?”')
  if (!isOneOf(arithmetic, op)) throw walk.refuse(`“${op}” is not allowed`)
  if (!implicit) walk.take(op)
  return { kind: op, left, right: valueOf(second, walk) }
}

const valueOf = (given: MathNode, walk: Walk): FormulaTree => {
  const node = given as Known
  switch (node.type) {
    case 'ConstantNode': {
      const at = walk.at
      walk.takeNumber()
      const value: unknown = node.value
      if (typeof value !== 'number' || !Number.isFinite(value)) throw walk.refuse('this number is too large', at)
      return { kind: 'number', value }
    }
    case 'SymbolNode':
      if (node.name !== 'rpm' && node.name !== 'map') throw walk.refuse(`“${node.name}” needs its values in brackets`)
      walk.take(node.name)
      return { kind: node.name }
    case 'ParenthesisNode':
      return between(walk, () => valueOf(node.content, walk))
    case 'FunctionNode':
      return functionCall(node, walk)
    case 'OperatorNode':
      return operator(node, walk)
    case 'ConditionalNode': {
      const test = conditionOf(node.condition, walk)
      walk.take('?')
      const yes = valueOf(node.trueExpr, walk)
      walk.take(':')
      return { kind: 'choose', test, yes, no: valueOf(node.falseExpr, walk) }
    }
    case 'RelationalNode':
      throw walk.refuse('a condition may stand only before “?”')
    default:
      throw walk.refuse('this is not allowed in a formula')
  }
}

const comparison = (signs: readonly Comparison[], sides: readonly MathNode[], walk: Walk): ConditionTree => {
  const of = sides.map((side, i) => {
    if (i > 0) walk.take(signs[i - 1] ?? '')
    return valueOf(side, walk)
  })
  return { kind: 'compare', signs, of }
}

const conditionOf = (given: MathNode, walk: Walk): ConditionTree => {
  const node = given as Known
  if (node.type === 'ParenthesisNode') return between(walk, () => conditionOf(node.content, walk))
  if (node.type === 'RelationalNode') {
    const { conditionals, params } = node as unknown as { conditionals: readonly string[], params: readonly MathNode[] }
    return comparison(conditionals.map((name) => comparisonOf[name] ?? '<'), params, walk)
  }
  if (node.type === 'OperatorNode') {
    const { op, args } = node as OperatorNode & { op: string }
    const [first, second] = args as readonly (MathNode | undefined)[]
    if (op === 'not' && first) {
      walk.take('not')
      return { kind: 'not', of: conditionOf(first, walk) }
    }
    if ((op === 'and' || op === 'or') && first && second) {
      const left = conditionOf(first, walk)
      walk.take(op)
      return { kind: op, left, right: conditionOf(second, walk) }
    }
    if (comparisonSigns.has(op)) return comparison([op as Comparison], args, walk)
  }
  throw walk.refuse('a comparison is expected before “?”, such as rpm < 900')
}

/** The allowed tree of a parsed expression, or a FormulaProblem at the place of what is not allowed in it. */
export const treeOf = (node: MathNode, tokens: readonly Token[], length: number): FormulaTree => valueOf(node, new Walk(tokens, length))
