import { CalcError } from '../calc-error'
import type { Notice } from '../notice'
import { parabolaTop } from '../shared/parabola-top'
import { burnStartDeg, checkCycle, type CheckedCycle } from './check-cycle'
import type { CycleCourse, CycleFigures, CycleInput } from './cycle-types'
import { fillGeometry, fillRelease, integrateSegment, makeNodes, segmentsOf } from './integrate-cycle'
import { octaneExponent, prepareCycle, type PreparedCycle } from './prepare-cycle'
import { refuseRunaway } from './runaway'
import { wiebe } from './wiebe'

/** The course as the integration leaves it, with the slopes that interpolation between its samples needs. */
export interface RawCourse {
  readonly cycle: PreparedCycle
  readonly workJ: number
  readonly heatLossJ: number
  readonly knock: number
  readonly thetaDeg: Float64Array
  readonly pressureKpa: Float64Array
  readonly temperatureK: Float64Array
  /** kPa per degree at the start and at the end of the step that leads from sample i to i + 1. */
  readonly slopeAtStart: Float64Array
  readonly slopeAtEnd: Float64Array
}

/** Integrates a checked cycle from inlet closing to exhaust opening. */
export const runCycle = (checked: CheckedCycle): RawCourse => {
  const cycle = prepareCycle(checked)
  const segments = segmentsOf(cycle)
  const samples = segments.reduce((sum, { steps }) => sum + steps, 1)
  // One list for all five: lists are what a short run spends its time on.
  const course = new Float64Array(5 * samples)
  const [thetaDeg, pressureKpa, temperatureK, slopeAtStart, slopeAtEnd] = [0, 1, 2, 3, 4].map((i) => course.subarray(i * samples, (i + 1) * samples)) as [Float64Array, Float64Array, Float64Array, Float64Array, Float64Array]
  const state = { pressureKpa: cycle.startKpa, workJ: 0, heatLossJ: 0, knock: 0 }
  const nodes = makeNodes(segments.reduce((most, { steps }) => Math.max(most, steps), 0))
  let count = 0
  const recorder = {
    open: (theta: number, pressure: number, kelvin: number) => {
      if (count > 0) return
      thetaDeg[0] = theta
      pressureKpa[0] = pressure
      temperatureK[0] = kelvin
      count = 1
    },
    step: (theta: number, pressure: number, kelvin: number, atStart: number, atEnd: number) => {
      thetaDeg[count] = theta
      pressureKpa[count] = pressure
      temperatureK[count] = kelvin
      slopeAtStart[count - 1] = atStart
      slopeAtEnd[count - 1] = atEnd
      count += 1
    },
  }
  for (const segment of segments) {
    fillGeometry(cycle, segment, nodes)
    if (segment.burning) fillRelease(cycle, segment, nodes)
    integrateSegment(cycle, segment, nodes, state, recorder)
  }
  const { workJ, heatLossJ, knock } = state
  if (!Number.isFinite(workJ + heatLossJ + knock + state.pressureKpa)) throw refuseRunaway(checked)
  return { cycle, workJ, heatLossJ, knock, thetaDeg, pressureKpa, temperatureK, slopeAtStart, slopeAtEnd }
}

/** The fit of γ turns upwards here. */
const gammaFitEndsK = 3000
/** Fewer steps than this in a burn and its figures are rough. */
const stepsInBurn = 20

const noticesOf = ({ gamma, burn, stepDeg }: CheckedCycle, peakTemperatureK: number): Notice[] => {
  const notices: Notice[] = []
  if (gamma === 'temperature' && peakTemperatureK > gammaFitEndsK)
    notices.push({ code: 'gammaOutsideFit', severity: 'caution', field: 'gamma', value: peakTemperatureK, limit: `≤ ${gammaFitEndsK} K`, source: 'gamma-fit' })
  if (burn && burn.durationDeg < stepsInBurn * stepDeg)
    notices.push({ code: 'burnCoarse', severity: 'caution', field: 'stepDeg', value: stepDeg, limit: `≤ ${burn.durationDeg / stepsInBurn} deg`, source: 'trade' })
  return notices
}

const ca50Of = ({ burn, engine }: CheckedCycle): number | null => {
  if (!burn) return null
  const share = (Math.LN2 / burn.a) ** (1 / (burn.m + 1))
  const deg = burnStartDeg(burn) + burn.durationDeg * share
  return share <= 1 && deg <= engine.evoDeg ? deg : null
}

/**
 * One closed cycle of one cylinder, from inlet closing to exhaust opening, single zone: work J, mean effective pressure and pressures kPa,
 * temperatures K, heat J, angles in crank degrees after firing top dead centre, the knock integral, and their course over crank angle.
 *
 * dp/dθ = −γ·(p/V)·V′ + ((γ − 1)/V)·(Q′ − Q_w′), classical fourth-order Runge–Kutta; Wiebe's heat release x = 1 − exp(−a·((θ − θ₀)/Δθ)^(m+1)),
 * θ₀ = −spark + delay; Woschni's heat transfer h = 3.26·B^−0.2·p^0.8·T^−0.55·w^0.8, w = 2.28·S_p + c₂·(V_d·T₁/(p₁V₁))·max(0, p − p_mot), c₂ = 3.24e-3 after θ₀, else 0,
 * p_mot = p₁(V₁/V)^1.3; γ constant or 1.338 − 6.0e-5·T + 1.0e-8·T²; knock: ∫dt/τ to 90 % burned, τ = 17.68·(ON/100)^3.402·p^−1.7·exp(3800/T_u) ms, p in atm,
 * T_u = T₁(p/p₁)^(0.33/1.33). The range is cut at θ₀, at 90 % burned, at θ₀ + Δθ and at evoDeg; each segment takes ⌈length/stepDeg⌉ equal steps with its own equations at both ends.
 *
 * Validity: settings of one engine compared with each other; it clears nothing for flight. The burn must last some 20 steps at least (notice `burnCoarse`); the fit of γ ends at 3000 K (notice `gammaOutsideFit`);
 * the knock model was fitted to primary reference fuels: good to ±5 octane at best. At 0.5° steps within 5e-8 of an adaptive integration in work, 8e-8 in heat loss, 1.5e-7 in the knock integral, 5e-6 in the peak and 0.007° in its angle; where m is not a whole number 5e-7 in work.
 * The knock delay is that of douaud-eyzat-1978 and its integral that of livengood-wu-1955, both from memory; Wiebe's constants and the fit of γ are common practice, no published source.
 * Source: woschni-1967, the heat transfer (read)
 *
 * @param input.engine `{ boreMm, strokeMm, rodMm, compressionRatio, ivcDeg, evoDeg }`: mm > 0, rod above half the stroke, ratio > 1, −180 ≤ ivcDeg < 0 < evoDeg ≤ 180
 * @param input.rpm engine speed, rpm > 0
 * @param input.charge `{ pressureKpa, temperatureK, residualFraction, airFuelRatio }` at ivcDeg: kPa > 0, K > 0, 0 ≤ residual < 1, ratio > 0
 * @param input.burn `{ sparkDeg, delayDeg, durationDeg, a = 5, m = 2, efficiency, heatingValueKjPerKg = 44000 }`, or `null`: motored. Degrees BTDC, degrees ≥ 0, degrees > 0, a > 0, m ≥ 0, 0 < efficiency ≤ 1, kJ/kg > 0; ivcDeg ≤ θ₀ < evoDeg
 * @param input.gamma ratio of specific heats in (1, 1.67], or 'temperature'
 * @param input.heatLoss `{ wallK, headAreaFactor = 1 }`, K > 0, factor > 0, or `null`: none
 * @param input.octane octane number > 0; without it `knock` is `null`
 * @param input.stepDeg 0.001 … 10 crank degrees, 0.5 unless given
 * @param input.arrays `false` leaves out the course over crank angle; `true` unless given
 * @throws CalcError on any of these by its path: `engine.boreMm`, `burn.sparkDeg` where burning would start outside the closed cycle, and the value furthest from an engine's where the pressure runs beyond what a number can hold
 * @example
 * simulateCycle({ engine: { boreMm: 90, strokeMm: 80, rodMm: 140, compressionRatio: 8, ivcDeg: -120, evoDeg: 120 }, rpm: 2500, charge: { pressureKpa: 100, temperatureK: 370, residualFraction: 0.05, airFuelRatio: 13 }, burn: null, gamma: 1.35, heatLoss: null, arrays: false }).peakKpa // → 1285.66
 */
export function simulateCycle(input: CycleInput & { readonly arrays: false }): CycleFigures
export function simulateCycle(input: CycleInput & { readonly arrays?: boolean }): CycleCourse
export function simulateCycle(input: CycleInput & { readonly arrays?: boolean }): CycleFigures | CycleCourse {
  const checked = checkCycle(input)
  const { engine, burn, octane } = checked
  if (input.arrays !== undefined && typeof input.arrays !== 'boolean') {
    throw new CalcError({ field: 'arrays', value: input.arrays, limit: 'true or false', unit: '', message: 'Whether the course over crank angle is wanted must be true or false.' })
  }
  const { cycle, workJ, heatLossJ, knock, thetaDeg, pressureKpa, temperatureK } = runCycle(checked)
  let peak = 0
  let peakTemperatureK = 0
  for (let i = 0; i < thetaDeg.length; i += 1) {
    if ((pressureKpa[i] ?? 0) > (pressureKpa[peak] ?? 0)) peak = i
    peakTemperatureK = Math.max(peakTemperatureK, temperatureK[i] ?? 0)
  }
  const top = parabolaTop(thetaDeg, pressureKpa, peak)
  const burnedAt = (theta: number): number => (burn ? wiebe(Math.min(1, (theta - cycle.startDeg) / burn.durationDeg), burn.a, burn.m) : 0)
  const heatReleasedJ = cycle.heatJ * burnedAt(engine.evoDeg)
  const figures: CycleFigures = {
    workJ, imepKpa: workJ / 1000 / cycle.displacementM3,
    efficiency: heatReleasedJ > 0 ? workJ / heatReleasedJ : null,
    peakKpa: top.value, peakDeg: top.at, ca50Deg: ca50Of(checked),
    heatLossJ, heatReleasedJ, peakTemperatureK,
    knock: octane !== null && burn ? { integral: knock, octaneRequired: octane * knock ** (1 / octaneExponent) } : null,
    notices: noticesOf(checked, peakTemperatureK),
  }
  const numbers = [figures.imepKpa, figures.efficiency ?? 0, figures.peakKpa, figures.peakDeg, figures.ca50Deg ?? 0, figures.heatReleasedJ, peakTemperatureK, figures.knock?.octaneRequired ?? 0]
  if (!numbers.every(Number.isFinite)) throw refuseRunaway(checked)
  if (input.arrays === false) return figures
  return { ...figures, thetaDeg, pressureKpa, temperatureK, burned: thetaDeg.map(burnedAt) }
}
