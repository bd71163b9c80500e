/**
 * Top of the parabola through sample `peak` and its two neighbours, which may lie at unequal distances;
 * the sample itself where it stands at an end.
 */
export const parabolaTop = (at: ArrayLike<number>, values: ArrayLike<number>, peak: number): { readonly at: number, readonly value: number } => {
  const x = at[peak] ?? 0
  const y = values[peak] ?? 0
  if (peak === 0 || peak === at.length - 1) return { at: x, value: y }
  const left = (at[peak - 1] ?? 0) - x
  const right = (at[peak + 1] ?? 0) - x
  const fallLeft = (values[peak - 1] ?? 0) - y
  const fallRight = (values[peak + 1] ?? 0) - y
  const bend = (fallRight / right - fallLeft / left) / (right - left)
  const lean = fallLeft / left - bend * left
  if (!(bend < 0)) return { at: x, value: y }
  const offset = -lean / (2 * bend)
  return { at: x + offset, value: y + (lean * offset) / 2 }
}
