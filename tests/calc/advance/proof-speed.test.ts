import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { proofSpeedRpm, sparkAdvanceDeg, type Channel } from '@/lib/calc'
import { deepFreeze } from '@/tests/support/deep-freeze'
import { expectCalcError } from '@/tests/support/expect-calc-error'
import { expectClose } from '@/tests/support/expect-close'
import { fixed, formula, mapSchedule, mechanicalSchedule, retard, table } from './channels'

const range = { idleRpm: 700, maxRpm: 2780, toleranceDeg: 1 }
const proof = (channel: Channel, change: object = {}) => proofSpeedRpm(channel, { ...range, ...change })

describe('proofSpeedRpm', () => {
  it('a fixed advance is proved at idle', () => {
    expect(proof(fixed(26))).toBe(700)
    expect(proof(fixed(26), { toleranceDeg: 0 })).toBe(700)
  })

  it('a mechanical advance where it comes within the tolerance of its full advance', () => {
    // 18° over 1200 rpm: 1° is 66.67 rpm short of 2000 rpm.
    expectClose(proof({ schedule: mechanicalSchedule }), 2000 - 1200 / 18, { rel: 1e-12 })
    expectClose(proof({ schedule: mechanicalSchedule }, { toleranceDeg: 0 }), 2000, { rel: 1e-12 })
    expect(proof({ schedule: mechanicalSchedule }, { toleranceDeg: 18 })).toBe(700)
  })

  it('with latency the advance falls with speed: idle is further advanced than full power', () => {
    // 6e-6 · 200 µs · rpm: 1° is 833.33 rpm.
    expectClose(proof(fixed(26, { latencyUs: 200 })), 2780 - 1 / (6e-6 * 200), { rel: 1e-12 })
    expectClose(proof(fixed(26, { latencyUs: 200 }), { toleranceDeg: 0 }), 2780, { rel: 1e-9 })
  })

  it('a curve that passes through the band inside one piece is met at its near edge', () => {
    expectClose(proof(table([[1000, 10], [2000, 40], [2500, 26]])), 1000 + 1000 * 15 / 30, { rel: 1e-12 })
    expectClose(proof(table([[1000, 40], [2000, 10], [2500, 26]])), 1000 + 1000 * 13 / 30, { rel: 1e-12 })
  })

  it('a step of two close points', () => {
    expectClose(proof(table([[1799, 15], [1800, 26]])), 1799 + 10 / 11, { rel: 1e-12 })
  })

  it('must be clear of the crank-retard band with its hysteresis', () => {
    expect(proof(fixed(26, { crankRetard: retard }))).toBe(700)
    expect(proof(fixed(26, { crankRetard: retard }), { idleRpm: 480 })).toBe(520)
    expect(proof(fixed(26, { crankRetard: { ...retard, belowRpm: 2780 } }))).toBe(2780)
    expect(proof(fixed(26, { crankRetard: { ...retard, belowRpm: 2781 } }))).toBeNull()
  })

  it('a formula, to the last digit', () => {
    expectClose(proof(formula('min(25, 7 + 18 * (rpm - 800) / 1200)')), 2000 - 1200 / 18, { rel: 1e-12 })
    const step = proof(formula('rpm < 1234.5 ? 10 : 26'))
    expect(step).toBe(1234.5)
    expect(proof(formula('rpm < 2780 ? 10 : 26'))).toBe(2780)
    expect(proof(formula('26'))).toBe(700)
  })

  it('a map at the pressure given', () => {
    expectClose(proof({ schedule: mapSchedule }, { mapKpa: 100, maxRpm: 2500 }), 2250, { rel: 1e-12 })
  })

  it('is the lowest: at it the advance is within the tolerance, anywhere below it is not', () => {
    const points = fc.array(fc.record({ step: fc.double({ min: 1, max: 700, noNaN: true }), deg: fc.double({ min: 0, max: 40, noNaN: true }) }), { minLength: 1, maxLength: 6 })
    fc.assert(fc.property(points, fc.double({ min: 0, max: 200, noNaN: true }), fc.double({ min: 0.1, max: 5, noNaN: true }), (steps, latencyUs, toleranceDeg) => {
      let rpm = 0
      const channel = table(steps.map(({ step, deg }) => [rpm += step, deg] as const), { latencyUs, crankRetard: retard })
      const found = proof(channel, { toleranceDeg, idleRpm: 500 }) ?? Number.NaN
      const deviation = (speed: number) => Math.abs(sparkAdvanceDeg(channel, { rpm: speed }) - sparkAdvanceDeg(channel, { rpm: 2780 }))
      expect(deviation(found)).toBeLessThanOrEqual(toleranceDeg + 1e-9)
      const below: number[] = []
      for (let speed = 520; speed < found - 1e-6; speed += 11) below.push(deviation(speed))
      expect(Math.min(...below, Infinity)).toBeGreaterThan(toleranceDeg - 1e-9)
    }))
  })

  it('names what cannot be used', () => {
    for (const idleRpm of [-1, undefined, Number.NaN, '700']) expectCalcError(() => proof(fixed(1), { idleRpm }), 'idleRpm')
    for (const maxRpm of [700, 5, undefined, Infinity, null]) expectCalcError(() => proof(fixed(1), { maxRpm }), 'maxRpm')
    for (const toleranceDeg of [-1, undefined, Number.NaN, null]) expectCalcError(() => proof(fixed(1), { toleranceDeg }), 'toleranceDeg')
    expectCalcError(() => proof({ schedule: mapSchedule }), 'mapKpa')
    expectCalcError(() => proof(formula('rpm'), { maxRpm: 1e12 }), 'maxRpm')
    expectCalcError(() => proof(formula('100 / (rpm - 703)')), 'channel.schedule.expression')
    expectCalcError(() => proof(table([[900, 1.5e308], [1000, -1.5e308]])), 'channel.schedule')
    expectCalcError(() => proofSpeedRpm(null as never, range), 'channel')
    expect(proofSpeedRpm(deepFreeze({ schedule: mapSchedule, crankRetard: retard }), deepFreeze({ ...range, mapKpa: 55 }))).toBeGreaterThan(700)
  })
})
