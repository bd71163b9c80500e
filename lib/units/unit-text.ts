/**
 * What a keyboard, a telephone or a spreadsheet makes of the same sign, brought to one form.
 * Deliberately not Unicode's NFKC: that turns "10⁴" into "104".
 */

/** One minus, one plain space, nothing invisible; both ends trimmed. */
export function plainText(text: string): string {
  return text
    .replace(/[\u200b-\u200f\u202a-\u202e\u2060\ufeff]/g, '')
    .replace(/[\u2010-\u2013\u2212\ufe63\uff0d]/g, '-')
    .replace(/[\t\u00a0\u2000-\u200a\u202f\u3000]/g, ' ')
    .trim()
}

/**
 * The key under which a unit is looked up: case, spaces, dots, product signs and hyphens do not count ("lb-ft", "lbf · ft", "cu. in."),
 * except a hyphen before a digit ("min-1"). Case may be dropped because within one quantity no two accepted units differ by it alone.
 */
export function unitKey(text: string): string {
  return plainText(text)
    .replace(/[\u00ba\u02da]/g, '°')
    .replace(/\u2103/g, '°C')
    .replace(/\u2109/g, '°F')
    .replace(/\u03bc/g, 'µ')
    .replace(/[\u2018\u2019\u2032]/g, "'")
    .replace(/[\u201c\u201d\u2033]|''/g, '"')
    .replace(/\u207b/g, '-')
    .replace(/\u00b9/g, '1')
    .replace(/\u00b2/g, '2')
    .replace(/\u00b3/g, '3')
    .toLowerCase()
    .replace(/[\s.·\u22c5\u2219\u2022*^]|-(?!\d)/g, '')
}
