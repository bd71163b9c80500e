/** Rounding of a difference like 25.5 − 25 never turns a verdict. */
const hair = 1e-9

export const isWithin = (deviation: number, tolerance: number): boolean => Math.abs(deviation) <= tolerance + hair
