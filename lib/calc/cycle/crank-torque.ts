import { CalcError } from '../calc-error'
import { takeNumber, takeOptionalNumber } from '../validate/number'
import { membersOf, takeList, takeRecord } from '../validate/shape'
import { checkCycle } from './check-cycle'
import type { CycleInput } from './cycle-types'
import { runCycle, type RawCourse } from './simulate-cycle'
import { torqueSpectrum, type TorqueSpectrum } from './torque-spectrum'

export interface CrankTorqueInput {
  readonly input: CycleInput
  readonly firingSchedule: readonly { readonly cylinder: number, readonly atDeg: number }[]
  readonly dead?: readonly number[]
  readonly reciprocatingMassKg?: number
  readonly exhaustKpa?: number
  readonly crankcaseKpa?: number
  readonly intakeKpa?: number
}

export interface CrankTorque extends TorqueSpectrum {
  /** 0 … 719, 0 at the firing top dead centre of the first in the schedule. */
  readonly angleDeg: number[]
  readonly torqueNm: number[]
}

const cycleDeg = 720

/** Pressure between the samples of a course: the cubic through both ends of a step and their slopes. */
const pressureAt = ({ thetaDeg, pressureKpa, slopeAtStart, slopeAtEnd }: RawCourse, theta: number): number => {
  let low = 0
  let high = thetaDeg.length - 1
  while (high - low > 1) {
    const middle = (low + high) >> 1
    if ((thetaDeg[middle] ?? 0) <= theta) low = middle
    else high = middle
  }
  const from = thetaDeg[low] ?? 0
  const h = (thetaDeg[high] ?? 0) - from
  const t = (theta - from) / h
  const p0 = pressureKpa[low] ?? 0
  const p1 = pressureKpa[high] ?? 0
  const m0 = h * (slopeAtStart[low] ?? 0)
  const m1 = h * (slopeAtEnd[low] ?? 0)
  return p0 + t * (m0 + t * (3 * (p1 - p0) - 2 * m0 - m1 + t * (2 * (p0 - p1) + m0 + m1)))
}

const takeSchedule = (value: unknown) => {
  const list = takeList(value, 'firingSchedule', 'The firing schedule', 1)
  const schedule: { cylinder: number, atDeg: number }[] = []
  const seen = new Set<number>()
  // By index: a hole in the list is a missing firing.
  for (let i = 0; i < list.length; i += 1) {
    const field = `firingSchedule.${i}`
    const members = takeRecord(list[i], field, `Firing ${i + 1}`)
    const cylinder = takeNumber(members.cylinder, `${field}.cylinder`, { name: 'The cylinder', unit: '', min: 1, integer: true })
    const atDeg = takeNumber(members.atDeg, `${field}.atDeg`, { name: 'The angle of firing', unit: 'deg', min: 0, below: cycleDeg })
    if (seen.has(cylinder)) throw new CalcError({ field: `${field}.cylinder`, value: cylinder, limit: 'each cylinder once', unit: '', message: `Cylinder ${cylinder} fires twice in the schedule.` })
    seen.add(cylinder)
    schedule.push({ cylinder, atDeg })
  }
  return schedule
}

const takeDead = (value: unknown, cylinders: ReadonlySet<number>): Set<number> => {
  if (value === undefined) return new Set()
  const list = takeList(value, 'dead', 'The list of dead cylinders', 0)
  const dead = new Set<number>()
  for (let i = 0; i < list.length; i += 1) {
    const cylinder = takeNumber(list[i], `dead.${i}`, { name: 'The dead cylinder', unit: '', integer: true })
    if (!cylinders.has(cylinder) || dead.has(cylinder)) throw new CalcError({ field: `dead.${i}`, value: cylinder, limit: 'a cylinder of the schedule, each once', unit: '', message: `Cylinder ${cylinder} is not in the firing schedule, or is listed twice.` })
    dead.add(cylinder)
  }
  return dead
}

const pressureRule = (name: string) => ({ name, unit: 'kPa', above: 0 })

/**
 * Torque at the crank over one working cycle, `{ angleDeg[720], torqueNm[720], meanNm, rippleNm, orders[12] }`: whole crank degrees, N·m, amplitudes of orders 0.5 … 6 a turn. Indicated: friction is left out.
 *
 * T = Σ (p − p_crankcase)·A·dx/dφ − m·ω²·x″·x′ over the cylinders; p from `simulateCycle` between inlet closing and exhaust opening, exhaustKpa from there to 360°, intakeKpa after; a dead cylinder is the same charge motored;
 * ripple = max − min; amplitude = |2/720·Σ T·e^(−i·order·φ)|
 *
 * Validity: constant speed, all cylinders alike, rigid parts; the mass is that of piston, pin and the rod's small end, moved along the bore.
 * Source: common practice, no published source (slider-crank dynamics).
 *
 * @param input.input the cycle of one firing cylinder, as in `simulateCycle`
 * @param input.firingSchedule `{ cylinder, atDeg }[]`, as `firingSchedule` gives it: each cylinder once, 0 ≤ atDeg < 720
 * @param input.dead numbers of cylinders that do not fire, none unless given
 * @param input.reciprocatingMassKg of one cylinder, kg ≥ 0, 0 unless given
 * @param input.exhaustKpa kPa > 0, 101.325 unless given
 * @param input.crankcaseKpa kPa > 0, 101.325 unless given
 * @param input.intakeKpa kPa > 0, charge.pressureKpa unless given
 * @throws CalcError on `firingSchedule.i.…`, `dead.i`, the pressures and the mass by name, and as `simulateCycle` (`engine.boreMm`, `rpm`)
 * @example
 * crankTorque({ input: { engine: { boreMm: 90, strokeMm: 80, rodMm: 140, compressionRatio: 8, ivcDeg: -120, evoDeg: 120 }, rpm: 2500, charge: { pressureKpa: 100, temperatureK: 370, residualFraction: 0.05, airFuelRatio: 13 }, burn: null, gamma: 1.35, heatLoss: null }, firingSchedule: [{ cylinder: 1, atDeg: 0 }] }).orders.length // → 12
 */
export const crankTorque = (input: CrankTorqueInput): CrankTorque => {
  const members = membersOf(input)
  const firing = takeSchedule(members.firingSchedule)
  const dead = takeDead(members.dead, new Set(firing.map(({ cylinder }) => cylinder)))
  const massKg = takeOptionalNumber(members.reciprocatingMassKg, 'reciprocatingMassKg', { name: 'The reciprocating mass', unit: 'kg', min: 0 }, 0)
  const exhaustKpa = takeOptionalNumber(members.exhaustKpa, 'exhaustKpa', pressureRule('The pressure while exhausting'), 101.325)
  const crankcaseKpa = takeOptionalNumber(members.crankcaseKpa, 'crankcaseKpa', pressureRule('The pressure in the crankcase'), 101.325)
  const checked = checkCycle(members.input as CycleInput)
  const intakeKpa = takeOptionalNumber(members.intakeKpa, 'intakeKpa', pressureRule('The pressure while drawing in'), checked.charge.pressureKpa)

  const { engine, rpm } = checked
  const radius = engine.strokeMm / 2000
  const lean = engine.strokeMm / 2 / engine.rodMm
  const areaM2 = (Math.PI / 4) * (engine.boreMm / 1000) ** 2
  const omega = (2 * Math.PI * rpm) / 60
  const alive = runCycle(checked)
  const motored = dead.size > 0 ? runCycle({ ...checked, burn: null }) : alive

  /** Torque of one cylinder at its own angle in 0 … 720 after its firing top dead centre. */
  const torqueAt = (course: RawCourse, ownDeg: number): number => {
    const theta = ownDeg >= cycleDeg + engine.ivcDeg ? ownDeg - cycleDeg : ownDeg
    const kpa = theta <= engine.evoDeg ? pressureAt(course, theta) : theta <= 360 ? exhaustKpa : intakeKpa
    const phi = (ownDeg * Math.PI) / 180
    const [sin, cos] = [Math.sin(phi), Math.cos(phi)]
    const root = Math.sqrt(1 - (lean * sin) ** 2)
    const first = radius * sin * (1 + (lean * cos) / root)
    const second = radius * (cos + (lean * (cos * cos - sin * sin)) / root + (lean ** 3 * sin ** 2 * cos ** 2) / root ** 3)
    return (kpa - crankcaseKpa) * 1000 * areaM2 * first - massKg * omega ** 2 * second * first
  }

  const origin = firing[0]?.atDeg ?? 0
  const torqueNm = Array.from({ length: cycleDeg }, () => 0)
  for (const { cylinder, atDeg } of firing) {
    const course = dead.has(cylinder) ? motored : alive
    for (let angle = 0; angle < cycleDeg; angle += 1) {
      const own = (((angle - (atDeg - origin)) % cycleDeg) + cycleDeg) % cycleDeg
      torqueNm[angle] = (torqueNm[angle] ?? 0) + torqueAt(course, own)
    }
  }
  return { angleDeg: torqueNm.map((_, angle) => angle), torqueNm, ...torqueSpectrum(torqueNm, massKg) }
}
