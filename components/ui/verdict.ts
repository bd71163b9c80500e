/** What can be said of a value, a row or a part: each has a word and a shape. */
export type VerdictName = 'within' | 'close' | 'outside' | 'early' | 'late' | 'due' | 'notJudged' | 'single' | 'singleHeat'

export const verdictWords: Record<VerdictName, string> = {
  within: 'Within',
  close: 'Close',
  outside: 'Outside',
  early: 'Early',
  late: 'Late',
  due: 'Due',
  notJudged: 'Not judged',
  single: 'Single',
  singleHeat: 'Single, aged by heat',
}

export const verdictClass = (verdict: VerdictName): string => verdict.replace(/[A-Z]/g, (letter) => `-${letter.toLowerCase()}`)
