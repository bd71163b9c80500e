import type { Engine } from '../../calc/live'

/** How many lines of each kind a map may have: what a channel's map can hold, and what makes a drawing. */
export const linesAllowed = {
  speeds: { least: 3, most: 40, usual: 21 },
  pressures: { least: 3, most: 30, usual: 11 },
} as const

export type LineCounts = Record<keyof typeof linesAllowed, number>

/** Thinnest and densest line, shares of full throttle. */
const thinnest = 1 / 3
const densest = 1.1

/** Even steps, rounded as far as the step allows, so that a table of them can be read. */
function evenSteps(from: number, to: number, count: number): number[] {
  const step = (to - from) / (count - 1)
  const decimals = -Math.floor(Math.log10(step / 2))
  const unit = 10 ** Math.max(0, -decimals)
  return Array.from({ length: count }, (_, i) => {
    const value = from + i * step
    return decimals > 0 ? Number(value.toFixed(decimals)) : Math.round(value / unit) * unit
  })
}

/** Speeds from idle to full power, manifold pressures from a third of full throttle to a tenth above it. */
export function sparkMapAxes({ idleRpm, maxRpm }: Pick<Engine, 'idleRpm' | 'maxRpm'>, fullKpa: number, { speeds, pressures }: LineCounts): { rpm: number[], manifoldKpa: number[] } {
  return {
    // The ends are the engine's own speeds, to the last digit.
    rpm: evenSteps(idleRpm, maxRpm, speeds).map((rpm, i) => (i === 0 ? idleRpm : i === speeds - 1 ? maxRpm : rpm)),
    manifoldKpa: evenSteps(thinnest * fullKpa, densest * fullKpa, pressures),
  }
}
