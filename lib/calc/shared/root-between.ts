/**
 * Root of a function that has opposite signs at the two ends (or is 0 at one of them), to `tolerance` in its argument:
 * false position (Illinois) with a bisection every third time, so that no shape makes it slow. A value no further from 0 than `close` ends it;
 * values at the ends that are known already need not be asked for again.
 */
export const rootBetween = (
  f: (x: number) => number, from: number, to: number, tolerance: number,
  { close = 0, atFrom = f(from), atTo = f(to) }: { readonly close?: number, readonly atFrom?: number, readonly atTo?: number } = {},
): number => {
  let [a, b] = [from, to]
  let [atA, atB] = [atFrom, atTo]
  if (atA === 0) return a
  if (atB === 0) return b
  // Kept apart from the weights, which may be halved down to 0.
  const isNegativeAtA = atA < 0
  let lastMoved: 'a' | 'b' | null = null
  for (let i = 1; Math.abs(b - a) > tolerance; i += 1) {
    const middle = a + (b - a) / 2
    if (middle === a || middle === b) break
    const chord = b - (atB * (b - a)) / (atB - atA)
    const x = i % 3 !== 0 && (chord - a) * (chord - b) < 0 ? chord : middle
    const value = f(x)
    if (Math.abs(value) <= close) return x
    if (value < 0 === isNegativeAtA) {
      // The end that stays twice running gives way: its weight is halved, or the chord would creep up on the root from one side.
      if (lastMoved === 'a') atB /= 2
      lastMoved = 'a'
      a = x
      atA = value
    } else {
      if (lastMoved === 'b') atA /= 2
      lastMoved = 'b'
      b = x
      atB = value
    }
  }
  return b
}
