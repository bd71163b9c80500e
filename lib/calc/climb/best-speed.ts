/** What to search: excess power in W against true airspeed in m/s. */
export interface SpeedSearch {
  /** With the propeller as it is. */
  readonly excessW: (speedMps: number) => number
  /** With a propeller without loss: never below `excessW`, one top, falling without end to both sides. */
  readonly mostExcessW: (speedMps: number) => number
  /** Speed of the top of `mostExcessW` or, where that is slower than allowed, the lowest speed. */
  readonly startMps: number
  /** 0 when any speed may be flown. */
  readonly lowestMps: number
}

interface Peak { readonly speedMps: number, readonly watts: number }

const samples = 240
const mostRounds = 8
/** So many of the highest tops that the samples show are climbed to the end. */
const topsTried = 4
const goldenShare = (Math.sqrt(5) - 1) / 2

/**
 * Speeds outside of which even a propeller without loss gives less than a level that was reached: the best speed lies between.
 * Each end is halved in until it is within a small share of its own value.
 */
const spanAbove = ({ mostExcessW, startMps, lowestMps }: SpeedSearch, levelW: number): [number, number] => {
  const endFrom = (factor: number): number => {
    let outside = startMps * factor
    while (outside > lowestMps && mostExcessW(outside) >= levelW) outside *= factor
    let inside = outside / factor
    for (let i = 0; i < 12; i += 1) {
      const middle = (inside + outside) / 2
      if (mostExcessW(middle) >= levelW) inside = middle
      else outside = middle
    }
    return outside
  }
  return [startMps > lowestMps ? Math.max(lowestMps, endFrom(1 / 2)) : lowestMps, endFrom(2)]
}

const higher = (a: Peak, b: Peak): Peak => (b.watts > a.watts ? b : a)

/** Golden-section search between two speeds with one top between them. */
const climbTo = (excessW: SpeedSearch['excessW'], lowMps: number, highMps: number): Peak => {
  const peakAt = (speedMps: number): Peak => ({ speedMps, watts: excessW(speedMps) })
  let low = lowMps
  let high = highMps
  let left = peakAt(high - goldenShare * (high - low))
  let right = peakAt(low + goldenShare * (high - low))
  while (high - low > 1e-9 * high) {
    if (left.watts >= right.watts) {
      high = right.speedMps
      right = left
      left = peakAt(high - goldenShare * (high - low))
    } else {
      low = left.speedMps
      left = right
      right = peakAt(low + goldenShare * (high - low))
    }
  }
  return higher(left, right)
}

/**
 * A top is flat: its values tell its place to a hundred-millionth at best. Where the curve is smooth, the zero of its slope
 * (differences of sixth order) tells it better; at a kink the step is far too long and the place found stays.
 */
const polished = (excessW: SpeedSearch['excessW'], peak: Peak, lowestMps: number): Peak => {
  const step = Math.min(0.002 * peak.speedMps, (peak.speedMps - lowestMps) / 4)
  if (!(step > 1e-5 * peak.speedMps)) return peak
  let { speedMps } = peak
  for (let i = 0; i < 2; i += 1) {
    const off = (steps: number): number => excessW(speedMps + steps * step)
    const [a, b] = [off(1), off(-1)]
    const slope = (45 * (a - b) - 9 * (off(2) - off(-2)) + (off(3) - off(-3))) / 60
    const curvature = a - 2 * excessW(speedMps) + b
    if (!(curvature < 0)) return peak
    speedMps -= (step * slope) / curvature
    if (!(Math.abs(speedMps - peak.speedMps) <= 1e-6 * peak.speedMps)) return peak
  }
  return { speedMps, watts: excessW(speedMps) }
}

/**
 * Speed of the greatest excess power. The whole span in which it can lie is looked over, and again while the level reached narrows
 * that span much: an efficiency typed as a table, or one with a stall of the blades, has more than one top.
 */
export const bestSpeed = (search: SpeedSearch): Peak => {
  const { excessW, startMps, lowestMps } = search
  const peakAt = (speedMps: number): Peak => ({ speedMps, watts: excessW(speedMps) })
  let best = peakAt(startMps)
  let line: Peak[] = []
  let width = Infinity
  for (let round = 0; round < mostRounds; round += 1) {
    const [low, high] = spanAbove(search, best.watts)
    if (high - low > width / 2) break
    width = high - low
    line = Array.from({ length: samples + 1 }, (_, k) => peakAt(low + (width * k) / samples))
    best = line.reduce(higher, best)
  }
  const at = (i: number): Peak => line[i] ?? best
  const tops = line
    .map((peak, i) => ({ peak, i }))
    .filter(({ peak, i }) => peak.watts >= at(Math.max(0, i - 1)).watts && peak.watts >= at(Math.min(samples, i + 1)).watts)
    .sort((a, b) => b.peak.watts - a.peak.watts)
    .slice(0, topsTried)
  for (const { i } of tops) best = higher(best, climbTo(excessW, at(Math.max(0, i - 1)).speedMps, at(Math.min(samples, i + 1)).speedMps))
  return polished(excessW, best, lowestMps)
}
