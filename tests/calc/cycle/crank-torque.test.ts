import { create, fftDependencies } from 'mathjs'
import { describe, expect, it } from 'vitest'
import { crankTorque, firingSchedule, simulateCycle, type CrankTorqueInput } from '@/lib/calc'
import { expectCalcError } from '@/tests/support/expect-calc-error'
import { expectClose } from '@/tests/support/expect-close'
import { sampleCycle } from './cycles'

const { fft } = create(fftDependencies ?? {}, {})
const six = firingSchedule({ firingOrder: [1, 6, 2, 4, 3, 5] })
const torque = (changes: Partial<CrankTorqueInput> = {}) => crankTorque({ input: sampleCycle(), firingSchedule: six, reciprocatingMassKg: 0.6, ...changes })
const magnitude = (value: { re: number, im: number } | undefined) => Math.hypot(value?.re ?? NaN, value?.im ?? NaN)
const transform = (values: number[]) => fft(values) as unknown as { re: number, im: number }[]

describe('crankTorque', () => {
  it('mean torque · 4π is the work of all cylinders, closed part and gas exchange', () => {
    const { workJ } = simulateCycle(sampleCycle())
    const { engine } = sampleCycle()
    const [exhaustKpa, crankcaseKpa, intakeKpa] = [105, 101, 95]
    const { meanNm } = torque({ exhaustKpa, crankcaseKpa, intakeKpa })
    const area = (Math.PI / 4) * (engine.boreMm / 1000) ** 2
    const travel = (deg: number) => {
      const [r, l, t] = [engine.strokeMm / 2000, engine.rodMm / 1000, (deg * Math.PI) / 180]
      return r * (1 - Math.cos(t)) + l - Math.sqrt(l * l - (r * Math.sin(t)) ** 2)
    }
    // Exhaust from evo to 360°, where the piston is at the top; intake from there to inlet closing.
    const exchange = (exhaustKpa * (0 - travel(engine.evoDeg)) + intakeKpa * (travel(engine.ivcDeg) - 0)) * 1000 * area
    // Whole degrees cannot follow the jump at exhaust opening closer than half a degree.
    expectClose(meanNm * 4 * Math.PI, 6 * (workJ + exchange), { rel: 2e-3 })
  })

  it('orders are those of a Fourier transform from a library', () => {
    const { torqueNm, orders } = torque({ dead: [2] })
    const reference = transform(torqueNm)
    expect(orders.map(({ order }) => order)).toEqual([0.5, 1, 1.5, 2, 2.5, 3, 3.5, 4, 4.5, 5, 5.5, 6])
    for (const { order, amplitudeNm } of orders) expectClose(amplitudeNm, (2 / 720) * magnitude(reference[order * 2]), { rel: 1e-9, abs: 1e-9 })
  })

  it.each([2, 3, 4, 6, 8])('%d cylinders that fire evenly: nothing below half their number', (cylinders) => {
    const schedule = firingSchedule({ firingOrder: Array.from({ length: cylinders }, (_, i) => i + 1) })
    const { orders } = torque({ firingSchedule: schedule })
    const major = cylinders / 2
    for (const { order, amplitudeNm } of orders) {
      if (order % major === 0) expect(amplitudeNm).toBeGreaterThan(1)
      else expect(amplitudeNm).toBeLessThan(1e-9 * 1000)
    }
  })

  it('a dead cylinder changes the torque by one motored less one firing cylinder', () => {
    const all = torque()
    const one = torque({ dead: [4] })
    const alone = (dead: number[]) => torque({ firingSchedule: [{ cylinder: 4, atDeg: 0 }], dead })
    const at = six.find(({ cylinder }) => cylinder === 4)?.atDeg ?? NaN
    const [firing, motored] = [alone([]), alone([4])]
    one.torqueNm.forEach((value, angle) => {
      const own = (angle - at + 720) % 720
      expectClose(value - (all.torqueNm[angle] ?? NaN), (motored.torqueNm[own] ?? NaN) - (firing.torqueNm[own] ?? NaN), { abs: 1e-9 * 1000 })
    })
    expect(one.meanNm).toBeLessThan(all.meanNm)
    expect(one.rippleNm).toBeGreaterThan(all.rippleNm)
  })

  it('the forces of inertia do no work over a cycle and turn with the square of speed', () => {
    const motored = { input: sampleCycle({ burn: null, heatLoss: null }), firingSchedule: [{ cylinder: 1, atDeg: 0 }] }
    const inertia = (rpm: number) => {
      const at = { ...motored, input: { ...motored.input, rpm } }
      const heavy = crankTorque({ ...at, reciprocatingMassKg: 1 })
      const light = crankTorque({ ...at, reciprocatingMassKg: 0 })
      return heavy.torqueNm.map((value, i) => value - (light.torqueNm[i] ?? NaN))
    }
    const [slow, fast] = [inertia(1000), inertia(2000)]
    expectClose(slow.reduce((sum, value) => sum + value, 0) / 720, 0, { abs: 1e-10 })
    fast.forEach((value, i) => expectClose(value, 4 * (slow[i] ?? NaN), { rel: 1e-6, abs: 1e-6 }))
  })

  it('acceleration of the piston is the second derivative of its travel', () => {
    // −m·ω²·x″·x′ with ω = 1, m = 1 against finite differences of the travel.
    const { strokeMm, rodMm } = sampleCycle().engine
    const travel = (t: number) => (strokeMm / 2000) * (1 - Math.cos(t)) + rodMm / 1000 - Math.sqrt((rodMm / 1000) ** 2 - ((strokeMm / 2000) * Math.sin(t)) ** 2)
    const motored = { input: sampleCycle({ burn: null, heatLoss: null, rpm: 30 / Math.PI }), firingSchedule: [{ cylinder: 1, atDeg: 0 }] }
    const heavy = crankTorque({ ...motored, reciprocatingMassKg: 1e6 }).torqueNm
    const light = crankTorque(motored).torqueNm
    for (const deg of [17, 63, 140, 301]) {
      const [t, h] = [(deg * Math.PI) / 180, 1e-4]
      const first = (travel(t + h) - travel(t - h)) / (2 * h)
      const second = (travel(t + h) - 2 * travel(t) + travel(t - h)) / h ** 2
      expectClose(((heavy[deg] ?? NaN) - (light[deg] ?? NaN)) / 1e6, -second * first, { rel: 1e-5 })
    }
  })

  describe('outside the closed cycle', () => {
    const { engine, charge } = sampleCycle()
    const alone = (changes: Partial<CrankTorqueInput> = {}) => torque({ firingSchedule: [{ cylinder: 1, atDeg: 0 }], reciprocatingMassKg: 0, ...changes }).torqueNm
    const area = (Math.PI / 4) * (engine.boreMm / 1000) ** 2
    /** Torque of one kPa on the piston at a crank angle, by a difference of the travel. */
    const leverage = (deg: number) => {
      const travel = (t: number) => (engine.strokeMm / 2000) * (1 - Math.cos(t)) + engine.rodMm / 1000 - Math.sqrt((engine.rodMm / 1000) ** 2 - ((engine.strokeMm / 2000) * Math.sin(t)) ** 2)
      const [t, h] = [(deg * Math.PI) / 180, 1e-4]
      return (1000 * area * (travel(t + h) - travel(t - h))) / (2 * h)
    }

    it('exhausting up to the top, drawing in from there to inlet closing', () => {
      const at = alone({ exhaustKpa: 110, crankcaseKpa: 100, intakeKpa: 70 })
      for (const deg of [117, 200, 300, 359]) expectClose(at[deg], 10 * leverage(deg), { rel: 1e-6 })
      for (const deg of [361, 420, 597]) expectClose(at[deg], -30 * leverage(deg), { rel: 1e-6 })
    })

    it('the pressures left out: outside air, and the charge’s own while drawing in', () => {
      const at = alone()
      expectClose(at[300], 0, { abs: 1e-9 })
      expectClose(at[450], (charge.pressureKpa - 101.325) * leverage(450), { rel: 1e-6 })
    })

    it('0 is where the first of the schedule fires, whatever its angle', () => {
      const shifted = six.map(({ cylinder, atDeg }) => ({ cylinder, atDeg: (atDeg + 90) % 720 }))
      const [plain, moved] = [torque({ dead: [2] }).torqueNm, torque({ firingSchedule: shifted, dead: [2] }).torqueNm]
      moved.forEach((value, angle) => expectClose(value, plain[angle] ?? NaN, { abs: 1e-9 }))
    })
  })

  it('refuses a schedule with a cylinder twice, a dead one that is not in it, and a bad pressure', () => {
    expectCalcError(() => torque({ firingSchedule: [{ cylinder: 1, atDeg: 0 }, { cylinder: 1, atDeg: 360 }] }), 'firingSchedule.1.cylinder')
    expectCalcError(() => torque({ firingSchedule: [] }), 'firingSchedule')
    expectCalcError(() => torque({ firingSchedule: [{ cylinder: 1, atDeg: 720 }] }), 'firingSchedule.0.atDeg')
    const gap: { cylinder: number, atDeg: number }[] = []
    gap[1] = { cylinder: 1, atDeg: 0 }
    expectCalcError(() => torque({ firingSchedule: gap }), 'firingSchedule.0')
    expectCalcError(() => torque({ dead: [7] }), 'dead.0')
    expectCalcError(() => torque({ dead: [1, 1] }), 'dead.1')
    expectCalcError(() => torque({ exhaustKpa: 0 }), 'exhaustKpa')
    expectCalcError(() => torque({ reciprocatingMassKg: -1 }), 'reciprocatingMassKg')
    expectCalcError(() => torque({ input: sampleCycle({ rpm: -1 }) }), 'rpm')
  })
})
