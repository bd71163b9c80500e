import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { bestClimb, climbRateMps, powerRequiredKw } from '@/lib/calc/live'
import { deepFreeze } from '@/tests/support/deep-freeze'
import { expectCalcError } from '@/tests/support/expect-calc-error'
import { expectClose } from '@/tests/support/expect-close'

const aeroplane = { massKg: 620, wingAreaM2: 11.5, cd0: 0.034, inducedK: 0.062, densityKgM3: 1.1 }
const weightN = 620 * 9.80665
const climbing = { ...aeroplane, brakePowerKw: 60 }
const notPositive = [undefined, null, Number.NaN, Infinity, '1', 0, -1]
const speeds = fc.double({ min: 5, max: 150, noNaN: true })
const leastPowerMps = ((4 * 0.062 * weightN ** 2) / (3 * 1.1 ** 2 * 11.5 ** 2 * 0.034)) ** 0.25

describe('powerRequiredKw', () => {
  it('is lift-and-drag arithmetic: drag coefficient times pressure, area and speed', () => {
    fc.assert(fc.property(speeds, (speedMps) => {
      const pressure = 0.5 * 1.1 * speedMps ** 2
      const lift = weightN / (pressure * 11.5)
      expectClose(powerRequiredKw({ ...aeroplane, speedMps }), ((0.034 + 0.062 * lift ** 2) * pressure * 11.5 * speedMps) / 1000, { rel: 1e-13 })
    }))
  })

  it('at the speed of least power the induced drag is three times the rest', () => {
    const at = (change: object) => powerRequiredKw({ ...aeroplane, speedMps: leastPowerMps, ...change })
    expectClose(at({ cd0: 0 }), 3 * at({ inducedK: 0 }), { rel: 1e-13 })
  })

  it('names what cannot be used', () => {
    for (const bad of notPositive) {
      for (const name of ['massKg', 'wingAreaM2', 'densityKgM3', 'speedMps']) expectCalcError(() => powerRequiredKw(deepFreeze({ ...aeroplane, speedMps: 30, [name]: bad })), name)
    }
    for (const bad of [undefined, null, Number.NaN, '1', -0.01]) {
      for (const name of ['cd0', 'inducedK']) expectCalcError(() => powerRequiredKw({ ...aeroplane, speedMps: 30, [name]: bad }), name)
    }
    expectCalcError(() => powerRequiredKw({ ...aeroplane, speedMps: 1e200 }), 'speedMps')
    expectCalcError(() => powerRequiredKw({ ...aeroplane, massKg: 1e200, speedMps: 30 }), 'massKg')
    expectCalcError(() => powerRequiredKw({ ...aeroplane, wingAreaM2: 1e308, cd0: 1e9, speedMps: 30 }), 'wingAreaM2')
    expectCalcError(() => powerRequiredKw(undefined as never), 'massKg')
  })
})

describe('climbRateMps', () => {
  it('is the power to spare over the weight', () => {
    fc.assert(fc.property(speeds, fc.double({ min: 0, max: 1, noNaN: true }), (speedMps, propEfficiency) => {
      const spareW = (propEfficiency * 60 - powerRequiredKw({ ...aeroplane, speedMps })) * 1000
      expectClose(climbRateMps({ ...climbing, propEfficiency, speedMps }), spareW / weightN, { rel: 1e-12, abs: 1e-12 })
      expect(climbRateMps({ ...climbing, propEfficiency: () => propEfficiency, speedMps })).toBe(climbRateMps({ ...climbing, propEfficiency, speedMps }))
    }))
  })

  it('names what cannot be used', () => {
    const of = (change: object) => () => climbRateMps({ ...climbing, propEfficiency: 0.7, speedMps: 35, ...change })
    for (const brakePowerKw of [undefined, null, Number.NaN, -1, '1', 1e308]) expectCalcError(of({ brakePowerKw }), 'brakePowerKw')
    for (const propEfficiency of [undefined, null, -0.1, 1.1, Number.NaN, '0.7', () => Number.NaN, () => 1.01, () => -0.01, () => undefined, () => '0.7']) expectCalcError(of({ propEfficiency }), 'propEfficiency')
    for (const speedMps of notPositive) expectCalcError(of({ speedMps }), 'speedMps')
  })
})

/** Best climb by looking everywhere, then everywhere around the best. */
const bruteForce = (efficiency: (mps: number) => number, lowest: number): { speedMps: number, climbMps: number } => {
  let [from, to] = [lowest, 200]
  let best = { speedMps: 0, climbMps: -Infinity }
  for (let round = 0; round < 8; round += 1) {
    for (let i = 0; i <= 4000; i += 1) {
      const speedMps = from + ((to - from) * i) / 4000
      const climbMps = (efficiency(speedMps) * 60e3 - (0.5 * 1.1 * 11.5 * 0.034 * speedMps ** 3 + (2 * 0.062 * weightN ** 2) / (1.1 * 11.5 * speedMps))) / weightN
      if (climbMps > best.climbMps) best = { speedMps, climbMps }
    }
    const around = (to - from) / 1000
    from = Math.max(lowest, best.speedMps - around)
    to = best.speedMps + around
  }
  return best
}

describe('bestClimb with a constant efficiency', () => {
  it('flies at the speed of least power, or at the lowest allowed', () => {
    const free = bestClimb({ ...climbing, propEfficiency: 0.7 })
    expectClose(free.speedMps, leastPowerMps, { rel: 1e-14 })
    expectClose(free.climbMps, climbRateMps({ ...climbing, propEfficiency: 0.7, speedMps: leastPowerMps }), { rel: 1e-13 })
    expect(bestClimb({ ...climbing, propEfficiency: 0.7, minSpeedMps: 33 }).speedMps).toBe(33)
    expect(bestClimb({ ...climbing, propEfficiency: 0.7, minSpeedMps: 10 })).toEqual(free)
  })

  it('no other speed climbs better', () => {
    fc.assert(fc.property(speeds, fc.double({ min: 0, max: 1, noNaN: true }), (speedMps, propEfficiency) => {
      const best = bestClimb({ ...climbing, propEfficiency })
      expect(climbRateMps({ ...climbing, propEfficiency, speedMps })).toBeLessThanOrEqual(best.climbMps + 1e-12)
      expectClose(best.gradient, best.climbMps / best.speedMps, { rel: 1e-15, abs: 1e-300 })
    }))
  })

  it('without power it is the slowest descent', () => {
    const glide = bestClimb({ ...climbing, brakePowerKw: 0, propEfficiency: 0.7 })
    expectClose(glide.climbMps, (-1000 * powerRequiredKw({ ...aeroplane, speedMps: leastPowerMps })) / weightN, { rel: 1e-13 })
  })
})

describe('bestClimb with an efficiency that varies', () => {
  it('agrees with the closed form when it is constant', () => {
    fc.assert(fc.property(fc.double({ min: 0, max: 1, noNaN: true }), fc.option(fc.double({ min: 5, max: 90, noNaN: true }), { nil: undefined }), (efficiency, minSpeedMps) => {
      const bound = minSpeedMps === undefined ? {} : { minSpeedMps }
      const [searched, closed] = [bestClimb({ ...climbing, ...bound, propEfficiency: () => efficiency }), bestClimb({ ...climbing, ...bound, propEfficiency: efficiency })]
      expectClose(searched.speedMps, closed.speedMps, { rel: 1e-9 })
      expectClose(searched.climbMps, closed.climbMps, { rel: 1e-12, abs: 1e-12 })
    }))
  })

  it('finds the zero of the slope to its digits: a propeller by a parabola', () => {
    // η′·P = 3·A·V² − B/V² with η′ = −1.6·(V − 50)/3600.
    const [a, b] = [0.5 * 1.1 * 11.5 * 0.034, (2 * 0.062 * weightN ** 2) / (1.1 * 11.5)]
    let [low, high] = [20, 60]
    for (let i = 0; i < 80; i += 1) {
      const v = (low + high) / 2
      if ((-1.6 * (v - 50) / 3600) * 60e3 > 3 * a * v ** 2 - b / v ** 2) low = v
      else high = v
    }
    const best = bestClimb({ ...climbing, propEfficiency: (v) => 0.8 * (1 - ((v - 50) / 60) ** 2) })
    expectClose(best.speedMps, low, { rel: 1e-11 })
  })

  it.each([
    ['a low hump before a high one', (v: number) => 0.5 * Math.exp(-(((v - 24) / 4) ** 2)) + 0.75 * Math.exp(-(((v - 46) / 5) ** 2)), 0],
    ['a high hump before a low one', (v: number) => 0.75 * Math.exp(-(((v - 24) / 3) ** 2)) + 0.5 * Math.exp(-(((v - 50) / 5) ** 2)), 0],
    ['a table with corners', (v: number) => (v < 32 ? 0.3 + 0.01 * v : Math.max(0, 0.62 + 0.002 * (v - 32))), 0],
    ['no thrust but in a narrow band far from least power', (v: number) => (Math.abs(v - 58) < 4 ? 0.9 * (1 - ((v - 58) / 4) ** 2) : 0), 0],
    ['a braking propeller at both ends', (v: number) => 0.8 - ((v - 40) / 20) ** 2, 0],
    ['a bound above every top', (v: number) => 0.8 - ((v - 40) / 40) ** 2, 52],
    ['a bound between two tops', (v: number) => 0.75 * Math.exp(-(((v - 24) / 3) ** 2)) + 0.5 * Math.exp(-(((v - 50) / 5) ** 2)), 30],
  ])('looks everywhere: %s', (_, efficiency, lowest) => {
    const best = bestClimb({ ...climbing, propEfficiency: efficiency, ...(lowest > 0 ? { minSpeedMps: lowest } : {}) })
    const brute = bruteForce(efficiency, lowest || 5)
    expectClose(best.climbMps, brute.climbMps, { rel: 1e-9 })
    expectClose(best.speedMps, brute.speedMps, { rel: 1e-6 })
  })

  it('looks again, closer, once it has something to beat: a narrow band, with braking elsewhere that makes the first look long', () => {
    for (let centre = 57; centre < 58.5; centre += 0.1) {
      const efficiency = (v: number) => (Math.abs(v - 27.4) < 5 ? -80 : Math.max(0, 0.9 * (1 - ((v - centre) / 0.2) ** 2)))
      expectClose(bestClimb({ ...climbing, propEfficiency: efficiency }).speedMps, centre, { abs: 0.01 })
    }
  })

  it('names what cannot be used', () => {
    const of = (change: object) => () => bestClimb({ ...climbing, propEfficiency: 0.7, ...change })
    for (const propEfficiency of [() => Number.NaN, () => Infinity, () => 1.01, () => null, () => '0.7', () => -0.5, -0.1, 1.1, undefined, null]) expectCalcError(of({ propEfficiency }), 'propEfficiency')
    for (const name of ['massKg', 'wingAreaM2', 'cd0', 'inducedK', 'densityKgM3']) for (const bad of notPositive) expectCalcError(of({ [name]: bad }), name)
    for (const minSpeedMps of [null, Number.NaN, 0, -1, '30', 1e200]) expectCalcError(of({ minSpeedMps }), 'minSpeedMps')
    for (const brakePowerKw of [undefined, null, -1, Infinity]) expectCalcError(of({ brakePowerKw }), 'brakePowerKw')
    expectCalcError(of({ cd0: 5e-324, densityKgM3: 1e-10 }), 'massKg')
    expectCalcError(() => bestClimb('x' as never), 'massKg')
  })
})
