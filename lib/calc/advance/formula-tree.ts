/** A formula after every name and sign in it was found allowed. Nothing else can be compiled. */
export type FormulaTree =
  | { readonly kind: 'number', readonly value: number }
  | { readonly kind: 'rpm' }
  | { readonly kind: 'map' }
  | { readonly kind: 'negate', readonly of: FormulaTree }
  | { readonly kind: '+' | '-' | '*' | '/' | '^', readonly left: FormulaTree, readonly right: FormulaTree }
  | { readonly kind: 'min' | 'max', readonly of: readonly FormulaTree[] }
  | { readonly kind: 'abs' | 'sqrt', readonly of: FormulaTree }
  | { readonly kind: 'choose', readonly test: ConditionTree, readonly yes: FormulaTree, readonly no: FormulaTree }

export type Comparison = '<' | '<=' | '>' | '>=' | '==' | '!='

/** A condition stands only before a `?`. */
export type ConditionTree =
  | { readonly kind: 'compare', readonly signs: readonly Comparison[], readonly of: readonly FormulaTree[] }
  | { readonly kind: 'and' | 'or', readonly left: ConditionTree, readonly right: ConditionTree }
  | { readonly kind: 'not', readonly of: ConditionTree }

export type Evaluate = (rpm: number, map: number) => number
/** `null`: the condition compares something that has no value, so neither branch may be taken. */
type Decide = (rpm: number, map: number) => boolean | null

const conditionUsesMap = (tree: ConditionTree): boolean => {
  switch (tree.kind) {
    case 'compare': return tree.of.some(usesMap)
    case 'not': return conditionUsesMap(tree.of)
    default: return conditionUsesMap(tree.left) || conditionUsesMap(tree.right)
  }
}

export const usesMap = (tree: FormulaTree): boolean => {
  switch (tree.kind) {
    case 'number': case 'rpm': return false
    case 'map': return true
    case 'negate': case 'abs': case 'sqrt': return usesMap(tree.of)
    case 'min': case 'max': return tree.of.some(usesMap)
    case 'choose': return conditionUsesMap(tree.test) || usesMap(tree.yes) || usesMap(tree.no)
    default: return usesMap(tree.left) || usesMap(tree.right)
  }
}

const comparisons: Readonly<Record<Comparison, (a: number, b: number) => boolean>> = {
  '<': (a, b) => a < b, '<=': (a, b) => a <= b, '>': (a, b) => a > b, '>=': (a, b) => a >= b, '==': (a, b) => a === b, '!=': (a, b) => a !== b,
}

const compileComparison = (signs: readonly Comparison[], of: readonly FormulaTree[]): Decide => {
  const sides = of.map(compileTree)
  const tests = signs.map((sign) => comparisons[sign])
  return (rpm, map) => {
    const values = sides.map((side) => side(rpm, map))
    // A comparison with NaN is false in the language: taken as false it would quietly choose a branch.
    if (values.some(Number.isNaN)) return null
    return tests.every((test, i) => test(values[i] ?? Number.NaN, values[i + 1] ?? Number.NaN))
  }
}

const compileCondition = (tree: ConditionTree): Decide => {
  if (tree.kind === 'compare') return compileComparison(tree.signs, tree.of)
  if (tree.kind === 'not') {
    const of = compileCondition(tree.of)
    return (rpm, map) => {
      const decided = of(rpm, map)
      return decided === null ? null : !decided
    }
  }
  const left = compileCondition(tree.left)
  const right = compileCondition(tree.right)
  const settledBy = tree.kind === 'or'
  return (rpm, map) => {
    const first = left(rpm, map)
    return first === null || first === settledBy ? first : right(rpm, map)
  }
}

const compilePower = (left: Evaluate, right: Evaluate): Evaluate => (rpm, map) => {
  const base = left(rpm, map)
  // NaN to the power 0 is 1 in the language, which would hide a square root of a negative number.
  return Number.isNaN(base) ? base : base ** right(rpm, map)
}

const compileList = (pick: (...values: number[]) => number, of: readonly FormulaTree[]): Evaluate => {
  const parts = of.map(compileTree)
  return (rpm, map) => pick(...parts.map((part) => part(rpm, map)))
}

/** Turns a tree into closures. The value is NaN or infinite where the formula has no finite real one. */
export const compileTree = (tree: FormulaTree): Evaluate => {
  switch (tree.kind) {
    case 'number': {
      const { value } = tree
      return () => value
    }
    case 'rpm': return (rpm) => rpm
    case 'map': return (_rpm, map) => map
    case 'negate': {
      const of = compileTree(tree.of)
      return (rpm, map) => -of(rpm, map)
    }
    case 'abs': {
      const of = compileTree(tree.of)
      return (rpm, map) => Math.abs(of(rpm, map))
    }
    case 'sqrt': {
      const of = compileTree(tree.of)
      return (rpm, map) => Math.sqrt(of(rpm, map))
    }
    case 'min': return compileList(Math.min, tree.of)
    case 'max': return compileList(Math.max, tree.of)
    case 'choose': {
      const test = compileCondition(tree.test)
      const yes = compileTree(tree.yes)
      const no = compileTree(tree.no)
      return (rpm, map) => {
        const decided = test(rpm, map)
        return decided === null ? Number.NaN : decided ? yes(rpm, map) : no(rpm, map)
      }
    }
    default: {
      const left = compileTree(tree.left)
      const right = compileTree(tree.right)
      switch (tree.kind) {
        case '+': return (rpm, map) => left(rpm, map) + right(rpm, map)
        case '-': return (rpm, map) => left(rpm, map) - right(rpm, map)
        case '*': return (rpm, map) => left(rpm, map) * right(rpm, map)
        case '/': return (rpm, map) => left(rpm, map) / right(rpm, map)
        default: return compilePower(left, right)
      }
    }
  }
}
