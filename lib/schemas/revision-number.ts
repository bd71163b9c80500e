/** The number of a revision in an address: digits only, as they are written; NaN for anything else, which no revision has. */
export const revisionNumber = (text: string | string[] | undefined): number => (typeof text === 'string' && /^[1-9]\d{0,8}$/.test(text) ? Number(text) : NaN)
