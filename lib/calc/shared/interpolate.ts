/** Place on an ascending axis: between entries `index` and `index + 1`, `share` of the way; flat outside gives a share of 0. */
export interface Place { readonly index: number, readonly share: number }

/** At an entry itself the share is exactly 0, so that a table gives back the very numbers typed into it. */
export const placeOn = (axis: readonly number[], x: number): Place => {
  let low = 0
  let high = axis.length - 1
  const first = axis[0] ?? 0
  const last = axis[high] ?? 0
  if (x <= first) return { index: 0, share: 0 }
  if (x >= last) return { index: high, share: 0 }
  while (high - low > 1) {
    const middle = (low + high) >> 1
    if ((axis[middle] ?? 0) <= x) low = middle
    else high = middle
  }
  const left = axis[low] ?? 0
  return { index: low, share: (x - left) / ((axis[high] ?? 0) - left) }
}

/** Value at a place. `a + (b − a)·share` keeps a flat stretch exactly flat, which `a(1 − share) + b·share` does not. */
export const valueAt = (values: readonly number[], { index, share }: Place): number => {
  const left = values[index] ?? Number.NaN
  return share === 0 ? left : left + ((values[index + 1] ?? Number.NaN) - left) * share
}
