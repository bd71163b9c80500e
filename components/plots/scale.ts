export interface PlotArea {
  width: number
  height: number
  /** Inset of the plotted area, px. */
  left: number
  right: number
  top: number
  bottom: number
}

export interface Domain { from: number, to: number }

/** Value to pixel along x; the charts use the same insets, so that what is laid over them fits. */
export const xPixel = ({ width, left, right }: PlotArea, { from, to }: Domain, value: number): number => left + ((value - from) / (to - from)) * (width - left - right)

/** Value to pixel along y, upwards. */
export const yPixel = ({ height, top, bottom }: PlotArea, { from, to }: Domain, value: number): number => height - bottom - ((value - from) / (to - from)) * (height - top - bottom)

const steps = [1, 2, 2.5, 5, 10]

/** A round step that puts at most `most` intervals into the span. */
export function niceStep(span: number, most: number): number {
  if (!(span > 0)) return 1
  const rough = span / most
  const power = 10 ** Math.floor(Math.log10(rough))
  // The hair keeps 0.30000000000000004 from asking for the next larger step.
  const step = steps.find((candidate) => candidate * power >= rough * (1 - 1e-9)) ?? 10
  return step * power
}

/** Round values inside a domain. */
export function ticksIn({ from, to }: Domain, step: number): number[] {
  const first = Math.ceil(from / step - 1e-9)
  const last = Math.floor(to / step + 1e-9)
  return Array.from({ length: Math.max(0, last - first + 1) }, (_, index) => Number(((first + index) * step).toPrecision(12)))
}

/** Decimals that a step needs to be written. */
export const decimalsOf = (step: number): number => {
  const text = String(Number(step.toPrecision(6)))
  const point = text.indexOf('.')
  return point < 0 ? 0 : text.length - point - 1
}

/** A domain of whole steps around values, with some room at both ends where the curve would touch them. */
export function domainAround(values: readonly number[], { most = 5, withZero = false, floor }: { most?: number, withZero?: boolean, floor?: number } = {}): Domain & { step: number } {
  const finite = values.filter(Number.isFinite)
  if (finite.length === 0) return { from: 0, to: 1, step: 1 }
  let low = Math.min(...finite, ...(withZero ? [0] : []))
  let high = Math.max(...finite, ...(withZero ? [0] : []))
  if (high - low < 1e-9 * Math.max(1, Math.abs(high))) {
    const room = Math.max(Math.abs(high) * 0.1, 0.5)
    low -= room
    high += room
  }
  const room = (high - low) * 0.06
  const step = niceStep(high - low + 2 * room, most)
  const down = (low < 0 || !withZero) ? Math.floor((low - room) / step) * step : 0
  const from = floor === undefined ? down : Math.max(down, floor)
  return { from: Number(from.toPrecision(12)), to: Number((Math.ceil((high + room) / step) * step).toPrecision(12)), step }
}
