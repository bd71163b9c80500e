interface StripInput {
  value: number | null
  atLeast?: number
  atMost?: number
  width: number
  deviation?: boolean
}

interface Strip {
  from: number
  to: number
  /** x of each limit. */
  ticks: number[]
  forbidden: { from: number, to: number }[]
  /** x of the value, never beyond the ends. */
  marker: number
}

const margin = 4
/** The marker's half width stays on the ruled line. */
const markerRoom = 7
const round = (x: number) => Math.round(x * 10) / 10

/** Pixels of a limit strip. One limit stands in the middle; two stand at a quarter and three quarters, wider apart only when the value lies far out. */
export function stripGeometry({ value, atLeast, atMost, width, deviation = false }: StripInput): Strip {
  const from = margin
  const to = width - margin
  const limits = [atLeast, atMost].filter((limit): limit is number => limit !== undefined)
  const low = Math.min(...limits)
  const high = Math.max(...limits)
  const centre = (low + high) / 2
  const away = value === null ? 0 : Math.abs(value - centre)
  // One limit: from nothing to twice the limit. A value further out widens the strip.
  const reach = Math.max(high > low ? high - low : Math.abs(low), away * 1.2) || 1
  const side = deviation ? -1 : 1
  const at = (v: number) => (from + to) / 2 + side * ((v - centre) / reach) * (to - from) / 2
  const keep = (x: number) => Math.min(to - markerRoom, Math.max(from + markerRoom, x))
  const band = (a: number, b: number) => ({ from: round(Math.min(a, b)), to: round(Math.max(a, b)) })
  const lowEnd = deviation ? to : from
  const highEnd = deviation ? from : to
  const forbidden = [
    ...(atLeast === undefined ? [] : [band(lowEnd, at(atLeast))]),
    ...(atMost === undefined ? [] : [band(at(atMost), highEnd)]),
  ].sort((one, other) => one.from - other.from)
  // No value at all: the mark stands at the forbidden end.
  const missing = atMost === undefined ? lowEnd : highEnd
  return { from, to, ticks: limits.map((limit) => round(at(limit))).sort((one, other) => one - other), forbidden, marker: round(keep(value === null ? missing : at(value))) }
}
