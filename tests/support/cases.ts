/** Hands a case list through and refuses an empty one: a loop over nothing passes without testing anything. */
export const someCases = <T>(cases: readonly T[]): readonly T[] => {
  if (cases.length === 0) throw new Error('an empty case list tests nothing')
  return cases
}
