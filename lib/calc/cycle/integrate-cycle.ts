import type { PreparedCycle } from './prepare-cycle'

/** A stretch of crank angle with one set of equations, cut into equal steps. */
export interface Segment {
  readonly fromDeg: number
  readonly toDeg: number
  readonly steps: number
  readonly burning: boolean
  readonly knocking: boolean
  /** After the start of burning, where combustion stirs the gas at the wall. */
  readonly fired: boolean
}

/** What the integration carries along: kPa, J, J and the knock integral. */
export interface CycleState {
  pressureKpa: number
  workJ: number
  heatLossJ: number
  knock: number
}

/** Told of every step: for the course over crank angle, and for sparks that share one compression. */
export interface Recorder {
  readonly open: (thetaDeg: number, pressureKpa: number, kelvin: number) => void
  /** Angle, pressure and temperature at a step's end, kPa per degree at its start and end (they differ where two segments meet), and what the segment gave so far. */
  readonly step: (thetaDeg: number, pressureKpa: number, kelvin: number, slopeAtStart: number, slopeAtEnd: number, workJ: number, heatLossJ: number, knock: number) => void
}

/**
 * Quantities at the ends and the middle of every step of a segment, six to a node in one list: node 2i is the start of step i, 2i + 1 its middle.
 * 1/V in 1/m³ · dV/dθ in m³ per degree · V/(mR) in K/Pa · wall heat in J/degree for 1 kPa^0.25, 1 (m/s)^0.8 and 1 K · motored pressure in kPa · heat release in J per degree
 */
export type Nodes = Float64Array
const perNode = 6
const [inverseAt, spreadAt, warmthAt, coolingAt, motoredAt, releaseAt] = [0, 1, 2, 3, 4, 5] as const

const degree = Math.PI / 180

export const makeNodes = (steps: number): Nodes => new Float64Array(perNode * (2 * steps + 1))

/** Sine and cosine are carried on by the theorem of addition and taken anew every so many nodes, so that rounding cannot add up. */
const renewEvery = 128

/** Below this the series of `rootOfNearOne` is exact to a few units of the last digit. */
const nearOne = 0.03

/** (1 − e)^(−q) by its binomial series, |e| < nearOne: powers change little from node to node, and a series costs less than a logarithm and an exponential. */
const rootOfNearOne = (e: number, q: number): number => {
  const c2 = (q * (q + 1)) / 2
  const c3 = (c2 * (q + 2)) / 3
  const c4 = (c3 * (q + 3)) / 4
  const c5 = (c4 * (q + 4)) / 5
  const c6 = (c5 * (q + 5)) / 6
  const c7 = (c6 * (q + 6)) / 7
  const square = e * e
  return 1 + q * e + square * (c2 + c3 * e + square * (c4 + c5 * e + square * (c6 + c7 * e)))
}

/** e^x by its series, |x| < nearOne. */
const expOfNearZero = (x: number): number => 1 + x * (1 + (x / 2) * (1 + (x / 3) * (1 + (x / 4) * (1 + (x / 5) * (1 + x / 6)))))

/** (γu − 1)/γu of the unburned gas, γu = 1.33. */
const coldExponent = 0.33 / 1.33

/** Geometry of a segment. Volume's two odd powers share one: (V/V₁)^−0.05 to the 11th and to the 26th. */
export const fillGeometry = (cycle: PreparedCycle, { fromDeg, toDeg, steps }: Segment, nodes: Nodes): void => {
  const { crankRadiusM, lean, pistonAreaM2, cooling, wallAreaM2, wallPerM, startKpa } = cycle
  const half = (toDeg - fromDeg) / (2 * steps)
  const turnSin = Math.sin(half * degree)
  const turnCos = Math.cos(half * degree)
  const perStart = 1 / cycle.startVolumeM3
  const perMass = 1 / cycle.massR
  const areaPerDeg = pistonAreaM2 * crankRadiusM * degree
  let sin = 0
  let cos = 1
  let u = 1
  for (let i = 0; i <= 2 * steps; i += 1) {
    if (i % renewEvery === 0) {
      const theta = (fromDeg + i * half) * degree
      sin = Math.sin(theta)
      cos = Math.cos(theta)
    } else {
      const next = sin * turnCos + cos * turnSin
      cos = cos * turnCos - sin * turnSin
      sin = next
    }
    const tilt = lean * sin
    const root = Math.sqrt(1 - tilt * tilt)
    // 1 − cosθ loses digits near the top, where it is small beside the clearance, so they do not matter.
    const travel = crankRadiusM * (1 - cos + (tilt * sin) / (1 + root))
    const volume = cycle.clearanceM3 + pistonAreaM2 * travel
    const at = perNode * i
    nodes[at + inverseAt] = 1 / volume
    nodes[at + spreadAt] = areaPerDeg * sin * (1 + (lean * cos) / root)
    nodes[at + warmthAt] = volume * perMass
    if (cooling > 0) {
      const change = i % renewEvery === 0 ? 1 : 1 - volume * (nodes[at - perNode + inverseAt] ?? 0)
      u = Math.abs(change) < nearOne ? u * rootOfNearOne(change, 0.05) : Math.exp(-0.05 * Math.log(volume * perStart))
      const u2 = u * u
      const u4 = u2 * u2
      const u11 = u4 * u4 * u2 * u
      nodes[at + coolingAt] = cooling * (wallAreaM2 + wallPerM * travel) * u11
      nodes[at + motoredAt] = startKpa * u11 * u11 * u4
    }
  }
}

/** Rate of heat release over a segment, J per degree. */
export const fillRelease = (cycle: PreparedCycle, { fromDeg, toDeg, steps }: Segment, nodes: Nodes): void => {
  const { a, m, durationDeg, startDeg } = cycle
  const scale = (cycle.heatJ * a * (m + 1)) / durationDeg
  const half = (toDeg - fromDeg) / (2 * steps)
  for (let i = 0; i <= 2 * steps; i += 1) {
    const z = Math.max(0, (fromDeg + i * half - startDeg) / durationDeg)
    const power = m === 2 ? z * z : z ** m
    nodes[perNode * i + releaseAt] = scale * power * Math.exp(-a * power * z)
  }
}

/**
 * One segment by the classical fourth-order Runge–Kutta method; work and heat loss ride along with its stages.
 * The knock integral is Simpson's over each step, its middle pressure from the cubic through both ends and their slopes.
 * The four stages share one loop: written out, the formulas are too much for the compiler to keep in line.
 *
 * dp/dθ = −γ·p·V′/V + (γ − 1)·(Q′ − Q_w′)/V, γ = 1.338 − 6·10⁻⁵·T + 10⁻⁸·T² unless constant
 */
export const integrateSegment = (cycle: PreparedCycle, segment: Segment, nodes: Nodes, state: CycleState, recorder: Recorder | null): void => {
  const { wallK, gasMps, gasMpsPerKpa, startKpa, startK, knockPerDeg, gamma: fixedGamma } = cycle
  const { steps, fromDeg, burning, fired } = segment
  const knocking = segment.knocking && knockPerDeg > 0
  const cooled = cycle.cooling > 0
  const autoignitionK = 3800 / startK
  const h = (segment.toDeg - fromDeg) / steps
  // Gas speed to the power −0.2, carried from stage to stage: speed·root is its power 0.8.
  let root = Math.exp(-0.2 * Math.log(gasMps))

  let p = state.pressureKpa
  let next = p
  let work = 0
  let heatLoss = 0
  let knock = 0
  let loss = 0
  let slope = 0
  let nextKelvin = 0
  let knockRate = 0
  // T₁/T_u and the pressure it belongs to, carried from sample to sample.
  let cold = 1
  let knockKpa = Infinity
  recorder?.open(fromDeg, p, p * 1000 * (nodes[warmthAt] ?? 0))
  // Step −1 has its last stage only: the slope at the segment's start.
  for (let k = -1; k < steps; k += 1) {
    let stageSlope = slope
    let slopes = slope
    let works = k < 0 ? 0 : p * (nodes[perNode * 2 * k + spreadAt] ?? 0)
    let losses = loss
    for (let stage = k < 0 ? 3 : 0; stage < 4; stage += 1) {
      if (stage === 3) next = p + (h / 6) * (k < 0 ? 0 : slopes)
      const at = perNode * (stage < 2 ? 2 * k + 1 : 2 * k + 2)
      const q = stage === 3 ? next : p + (stage < 2 ? h / 2 : h) * stageSlope
      const kelvin = q * 1000 * (nodes[at + warmthAt] ?? 0)
      const gamma = fixedGamma > 0 ? fixedGamma : 1.338 - 6.0e-5 * kelvin + 1.0e-8 * kelvin * kelvin
      let wallHeat = 0
      if (cooled) {
        const excess = fired ? q - (nodes[at + motoredAt] ?? 0) : 0
        const speed = excess > 0 ? gasMps + gasMpsPerKpa * excess : gasMps
        const change = 1 - speed * root * root * root * root * root
        root = Math.abs(change) < nearOne ? root * rootOfNearOne(change, 0.2) : Math.exp(-0.2 * Math.log(speed))
        wallHeat = (nodes[at + coolingAt] ?? 0) * Math.sqrt(Math.sqrt(q)) * speed * root * (kelvin - wallK)
      }
      const heat = burning ? (nodes[at + releaseAt] ?? 0) - wallHeat : -wallHeat
      stageSlope = (nodes[at + inverseAt] ?? 0) * ((gamma - 1) * heat * 1e-3 - gamma * q * (nodes[at + spreadAt] ?? 0))
      if (stage < 3) {
        const weight = stage === 2 ? 1 : 2
        slopes += weight * stageSlope
        works += weight * q * (nodes[at + spreadAt] ?? 0)
        losses += weight * wallHeat
      } else {
        loss = wallHeat
        nextKelvin = kelvin
      }
    }
    if (knocking) {
      let rates = knockRate
      for (let end = k < 0 ? 1 : 0; end < 2; end += 1) {
        const kpa = end === 1 ? next : (p + next) / 2 + (h / 8) * (slope - stageSlope)
        const change = 1 - kpa / knockKpa
        const nextCold = cold * rootOfNearOne(change, coldExponent)
        const rise = autoignitionK * (cold - nextCold)
        if (Math.abs(change) < nearOne && Math.abs(rise) < nearOne) {
          knockRate *= rootOfNearOne(change, -1.7) * expOfNearZero(rise)
          cold = nextCold
        } else {
          const log = Math.log(kpa / startKpa)
          cold = Math.exp(-coldExponent * log)
          knockRate = knockPerDeg * Math.exp(1.7 * log - autoignitionK * cold)
        }
        knockKpa = kpa
        rates += end === 1 ? knockRate : 4 * knockRate
      }
      if (k >= 0) knock += rates
    }
    if (k >= 0) {
      work += works
      heatLoss += losses
      recorder?.step(fromDeg + (k + 1) * h, next, nextKelvin, slope, stageSlope, (work * h * 1000) / 6, (heatLoss * h) / 6, (knock * h) / 6)
    }
    p = next
    slope = stageSlope
  }
  state.pressureKpa = p
  state.workJ += (work * h * 1000) / 6
  state.heatLossJ += (heatLoss * h) / 6
  state.knock += (knock * h) / 6
}

/** A hair below a whole number of steps is that number: rounding must not add one. */
export const stepsIn = (lengthDeg: number, stepDeg: number): number => Math.max(1, Math.ceil(lengthDeg / stepDeg - 1e-9))

/** The range from inlet closing to exhaust opening, cut where the equations change. */
export const segmentsOf = (cycle: PreparedCycle, fromDeg = cycle.ivcDeg): Segment[] => {
  const { startDeg, durationDeg, ninetyDeg, evoDeg, stepDeg, heatJ } = cycle
  const endDeg = startDeg + durationDeg
  const knockEndDeg = startDeg + ninetyDeg
  const cuts = heatJ > 0 ? [startDeg, knockEndDeg, endDeg].filter((cut) => cut > fromDeg && cut < evoDeg) : []
  const edges = [fromDeg, ...cuts, evoDeg]
  return edges.slice(1).flatMap((toDeg, i) => {
    const start = edges[i] ?? fromDeg
    if (!(toDeg > start)) return []
    const fired = heatJ > 0 && start >= startDeg
    return [{
      fromDeg: start, toDeg, steps: stepsIn(toDeg - start, stepDeg),
      burning: fired && start < endDeg, knocking: heatJ > 0 && start < knockEndDeg, fired,
    }]
  })
}
