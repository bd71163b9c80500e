/** Longest search looked for, words; more of them narrow nothing. */
const mostWords = 12

const fold = (text: string): string =>
  text.normalize('NFC').toWellFormed().replaceAll('\0', '').toLowerCase().replace(/\s+/g, ' ').trim()

/** What a row is found by: its texts in lower case, one a line, so that each can be replaced alone. */
export const searchText = (...parts: string[]): string => parts.map(fold).join('\n')

/** The words typed, each once. A row must hold all of them. */
export const searchWords = (typed: string): string[] => [...new Set(fold(typed).split(' ').filter(Boolean))].slice(0, mostWords)

/** A LIKE pattern in which nothing typed acts as one: % and _ and the backslash stand for themselves. */
export const likePattern = (word: string): string => `%${word.replace(/[\\%_]/g, '\\$&')}%`
