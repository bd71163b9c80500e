/** Longest search looked for, words; more of them narrow nothing. */
const mostWords = 12

const fold = (text: string): string =>
  text.normalize('NFC').toWellFormed().replaceAll('\0', '').toLowerCase().replace(/\s+/g, ' ').trim()

/** What a row is found by: its texts in lower case, one a line, so that each can be replaced alone. */
export const searchText = (...parts: string[]): string => parts.map(fold).join('\n')

/**
 * One LIKE pattern for each word typed; a row must hold all of them. Nothing typed acts as a pattern:
 * % and _ and the backslash stand for themselves.
 */
export const searchPatterns = (typed: string): string[] =>
  [...new Set(fold(typed).split(' ').filter(Boolean))].slice(0, mostWords).map((word) => `%${word.replace(/[\\%_]/g, '\\$&')}%`)
