/** Places in 0 … 1 and their weights, which sum to 1. */
export interface Rule {
  readonly at: readonly number[]
  readonly weight: readonly number[]
}

/** Gauss and Legendre's rule of `order` places on 0 … 1, exact for polynomials up to degree 2·order − 1: roots of the Legendre polynomial by Newton's method. */
const gauss = (order: number): Rule => {
  const at = new Array<number>(order).fill(0)
  const weight = new Array<number>(order).fill(0)
  for (let i = 0; i < (order + 1) >> 1; i += 1) {
    let x = Math.cos((Math.PI * (i + 0.75)) / (order + 0.5))
    let slope = 1
    for (let pass = 0; pass < 50; pass += 1) {
      let before = 0
      let value = 1
      for (let n = 1; n <= order; n += 1) [before, value] = [value, ((2 * n - 1) * x * value - (n - 1) * before) / n]
      slope = (order * (x * value - before)) / (x * x - 1)
      const change = value / slope
      x -= change
      if (Math.abs(change) < 1e-15) break
    }
    const share = 1 / ((1 - x * x) * slope * slope)
    at[i] = (1 - x) / 2
    at[order - 1 - i] = (1 + x) / 2
    weight[i] = share
    weight[order - 1 - i] = share
  }
  return { at, weight }
}

/** Terms of the exponential series up to `amount` that matter in double precision. */
const termsOf = (amount: number): number => {
  let term = 1
  let terms = 0
  while (term > 1e-15 && terms < 20) {
    terms += 1
    term *= amount / terms
  }
  return terms
}

/** Below this share of the interval nothing weighs: a chance that only grows is there no larger than on the rest. */
const mostHalvings = 52

/**
 * A rule for the mean over one interval of what `count` latent faults bring about whose λT sum to `load`: a polynomial of degree `count` times a
 * sum of exponentials. The interval is halved towards its start until the first piece turns by no more than 1, so that steep starts and slow ends are both met.
 */
export const intervalRule = (count: number, load: number): Rule => {
  const halvings = load > 1 ? Math.min(mostHalvings, Math.ceil(Math.log2(load))) : 0
  const smooth = 13 + Math.ceil(3 * Math.sqrt(count))
  const first = gauss(Math.min(Math.ceil((count + termsOf(Math.min(1, load))) / 2), smooth))
  const at: number[] = []
  const weight: number[] = []
  const add = (rule: Rule, from: number, width: number): void => {
    rule.at.forEach((place, i) => {
      at.push(from + width * place)
      weight.push(width * (rule.weight[i] ?? 0))
    })
  }
  add(first, 0, 2 ** -halvings)
  if (halvings > 0) {
    const other = gauss(smooth)
    for (let i = halvings; i > 0; i -= 1) add(other, 2 ** -i, 2 ** -i)
  }
  // Rounding would else take a sure failure off 1.
  const sum = weight.reduce((total, share) => total + share, 0)
  return { at, weight: weight.map((share) => share / sum) }
}
