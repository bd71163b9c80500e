/** Loads the formula parser, once, where `lib/calc/live` was imported. Resolves when formula schedules can be computed. */
export const loadFormulaParser = async (): Promise<void> => {
  await import('./formula-mathjs')
}
