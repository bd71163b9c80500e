import { isAllowed, takeNumber, type NumberRule } from './number'

/**
 * Checks every entry of a list and returns a copy. Goes by index: a hole in a sparse list is a missing entry,
 * where `map` would step over it. `rule` names an entry only when an error needs the name.
 */
export const takeNumbers = (list: readonly unknown[], field: string, rule: Omit<NumberRule, 'name'>, nameOf: (index: number) => string): number[] => {
  const numbers: number[] = []
  for (let i = 0; i < list.length; i += 1) {
    const value = list[i]
    numbers.push(isAllowed(value, rule) ? value : takeNumber(value, `${field}.${i}`, { ...rule, name: () => nameOf(i) }))
  }
  return numbers
}
