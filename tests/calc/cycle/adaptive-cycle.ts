import { createRequire } from 'node:module'
import type { CycleInput } from '@/lib/calc'
import { parabolaTop } from '@/lib/calc/shared/parabola-top'

/** The part of odex that is used: the types in its package do not pass this project's compiler settings, so it is required, not imported. */
interface Solver {
  absoluteTolerance: number
  relativeTolerance: number
  initialStepSize: number
  denseOutput: boolean
  grid(pitch: number, sample: (x: number, y: number[]) => unknown): (step: number, from: number, to: number, y: number[]) => unknown
  solve(
    slope: (x: number, y: number[]) => number[], from: number, start: number[], to: number,
    output?: (step: number, from: number, to: number, y: number[]) => unknown,
  ): { y: number[] }
}
const { Solver } = createRequire(import.meta.url)('odex') as { Solver: new (dimension: number) => Solver }

/**
 * The cycle written a second time, plainly and from the specification's equations, and integrated by an adaptive extrapolation method:
 * pressure, work, heat loss and knock integral at exhaust opening, and where samples a pitch apart are asked for the top of the pressure.
 */
export const adaptiveCycle = ({ engine, rpm, charge, burn, gamma, heatLoss, octane }: CycleInput, tolerance = 1e-12, pitchDeg: number | null = null) => {
  const bore = engine.boreMm / 1000
  const radius = engine.strokeMm / 2000
  const rod = engine.rodMm / 1000
  const area = (Math.PI * bore ** 2) / 4
  const displacement = area * 2 * radius
  const clearance = displacement / (engine.compressionRatio - 1)
  const travel = (deg: number) => {
    const t = (deg * Math.PI) / 180
    return radius * (1 - Math.cos(t)) + rod - Math.sqrt(rod ** 2 - (radius * Math.sin(t)) ** 2)
  }
  const volume = (deg: number) => clearance + area * travel(deg)
  const spread = (deg: number) => {
    const t = (deg * Math.PI) / 180
    return (area * (radius * Math.sin(t) + (radius ** 2 * Math.sin(t) * Math.cos(t)) / Math.sqrt(rod ** 2 - (radius * Math.sin(t)) ** 2)) * Math.PI) / 180
  }
  const p1 = charge.pressureKpa
  const t1 = charge.temperatureK
  const v1 = volume(engine.ivcDeg)
  const mass = (p1 * 1000 * v1) / (287 * t1)
  const fuel = (mass * (1 - charge.residualFraction)) / (1 + charge.airFuelRatio)
  const { a = 5, m = 2, heatingValueKjPerKg = 44_000 } = burn ?? {}
  const heat = burn ? fuel * heatingValueKjPerKg * 1000 * burn.efficiency : 0
  const start = burn ? burn.delayDeg - burn.sparkDeg : Infinity
  const end = burn ? start + burn.durationDeg : Infinity
  const ninety = burn ? start + burn.durationDeg * (Math.log(10) / a) ** (1 / (m + 1)) : Infinity
  const cuts = [start, ninety, end].filter((cut) => cut > engine.ivcDeg && cut < engine.evoDeg)
  const edges = [engine.ivcDeg, ...cuts, engine.evoDeg]
  const speed = (2 * 2 * radius * rpm) / 60
  const tau = (p: number) => {
    const unburned = t1 * (p / p1) ** (0.33 / 1.33)
    return 17.68 * ((octane ?? 100) / 100) ** 3.402 * (p / 101.325) ** -1.7 * Math.exp(3800 / unburned)
  }
  let y = [p1, 0, 0, 0]
  const [angles, pressures]: [number[], number[]] = [[], []]
  for (const [i, to] of edges.entries()) {
    const from = edges[i - 1]
    if (from === undefined) continue
    const fired = from >= start
    const solver = new Solver(4)
    solver.absoluteTolerance = solver.relativeTolerance = tolerance
    solver.initialStepSize = 0.01
    solver.denseOutput = pitchDeg !== null
    const sample = (deg: number, [p = 0]: number[]) => {
      angles.push(deg)
      pressures.push(p)
    }
    const result = solver.solve((deg: number, [p = 0]: number[]) => {
      const v = volume(deg)
      const kelvin = (p * 1000 * v) / (mass * 287)
      const g = gamma === 'temperature' ? 1.338 - 6e-5 * kelvin + 1e-8 * kelvin ** 2 : gamma
      const z = burn && fired && from < end ? (deg - start) / burn.durationDeg : 0
      const release = z > 0 && burn ? ((heat * a * (m + 1)) / burn.durationDeg) * z ** m * Math.exp(-a * z ** (m + 1)) : 0
      let loss = 0
      if (heatLoss) {
        const gas = 2.28 * speed + (fired ? 3.24e-3 * ((displacement * t1) / (p1 * v1)) * Math.max(0, p - p1 * (v1 / v) ** 1.3) : 0)
        const wall = ((Math.PI * bore ** 2) / 2) * (heatLoss.headAreaFactor ?? 1) + Math.PI * bore * (travel(deg) + clearance / area)
        loss = (3.26 * bore ** -0.2 * p ** 0.8 * kelvin ** -0.55 * gas ** 0.8 * wall * (kelvin - heatLoss.wallK)) / (6 * rpm)
      }
      return [
        -g * (p / v) * spread(deg) + ((g - 1) / v) * (release - loss) * 1e-3,
        p * spread(deg) * 1000,
        loss,
        burn && from < ninety && octane !== undefined ? 1 / tau(p) / (0.006 * rpm) : 0,
      ]
    }, from, y, to, pitchDeg === null ? undefined : solver.grid(pitchDeg, sample))
    y = result.y
  }
  const highest = pressures.reduce((best, p, i) => (p > (pressures[best] ?? 0) ? i : best), 0)
  return { pressureKpa: y[0] ?? 0, workJ: y[1] ?? 0, heatLossJ: y[2] ?? 0, knock: y[3] ?? 0, peakKpa: pitchDeg === null ? null : parabolaTop(angles, pressures, highest).value, heatJ: heat, startVolumeM3: v1, endVolumeM3: volume(engine.evoDeg) }
}
