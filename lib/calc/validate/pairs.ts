import { isAllowed, takeNumber, type NumberRule } from './number'
import { isRecord, takeRecord } from './shape'

/** One of the two numbers of an entry: its member, what it must be, and what people call it in entry `place`, counted from 1. */
export interface PairMember<Key extends string> extends Omit<NumberRule, 'name'> {
  readonly key: Key
  readonly nameOf: (place: number) => string
}

/**
 * Two numbers out of each entry of a list, as two lists. Goes by index, so that a hole is a missing entry.
 * Paths and names are only put together for an error: a table is checked at every keystroke.
 */
export const takePairs = <A extends string, B extends string>(
  list: readonly unknown[], field: string, entryName: string, first: PairMember<A>, second: PairMember<B>,
): [number[], number[]] => {
  const firsts: number[] = []
  const seconds: number[] = []
  const take = <Key extends string>(entry: Record<string, unknown>, i: number, member: PairMember<Key>): number => {
    const value = entry[member.key]
    return isAllowed(value, member) ? value : takeNumber(value, `${field}.${i}.${member.key}`, { ...member, name: () => member.nameOf(i + 1) })
  }
  for (let i = 0; i < list.length; i += 1) {
    const given = list[i]
    const entry = isRecord(given) ? given : takeRecord(given, `${field}.${i}`, `${entryName} ${i + 1}`)
    firsts.push(take(entry, i, first))
    seconds.push(take(entry, i, second))
  }
  return [firsts, seconds]
}
