import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { fixedPitchOperatingPoint, type FixedPitchInput } from '@/lib/calc/live'
import { deepFreeze } from '@/tests/support/deep-freeze'
import { expectCalcError } from '@/tests/support/expect-calc-error'
import { expectClose } from '@/tests/support/expect-close'

const curve = [{ rpm: 1200, kw: 34 }, { rpm: 2000, kw: 61 }, { rpm: 2600, kw: 79 }, { rpm: 3100, kw: 84 }]
const load = { rpm: 2780, kw: 81, densityRatio: 1 }
const base: FixedPitchInput = { powerCurve: curve, fraction: 1, load, densityRatio: 1 }
const flat = (kw: number, from = 1000, to = 3000) => [{ rpm: from, kw }, { rpm: to, kw }]
const at = (change: Partial<FixedPitchInput>) => fixedPitchOperatingPoint({ ...base, ...change })

describe('fixedPitchOperatingPoint', () => {
  it('agrees with a hand calculation: flat power meets a cube', () => {
    const point = at({ powerCurve: flat(64), load: { rpm: 2500, kw: 125, densityRatio: 1 } })
    expectClose(point.rpm, 2000, { rel: 1e-12 })
    expectClose(point.kw, 64, { rel: 1e-12 })
  })

  it('meets the load where it was stated', () => {
    const point = at({ load: { rpm: 2780, kw: 79 + 180 * 5 / 500, densityRatio: 1 } })
    expectClose(point.rpm, 2780, { rel: 1e-12 })
  })

  it('thin air unloads the propeller: σ times less load', () => {
    const thin = at({ powerCurve: flat(64, 1000, 4000), load: { rpm: 2500, kw: 125, densityRatio: 0.9 }, densityRatio: 0.5 })
    expectClose(thin.rpm, 2000 * (0.9 / 0.5) ** (1 / 3), { rel: 1e-12 })
  })

  it('power and load balance to the last digits, for a number and for a function that is constant', () => {
    fc.assert(fc.property(fc.double({ min: 0.4, max: 1.1, noNaN: true }), fc.double({ min: 0.75, max: 2, noNaN: true }), (fraction, share) => {
      const densityRatio = fraction * share
      const { rpm, kw } = at({ fraction, densityRatio })
      const i = Math.max(1, curve.findIndex((point) => point.rpm >= rpm))
      const [low, high] = [curve[i - 1] ?? load, curve[i] ?? load]
      expectClose(kw, fraction * (low.kw + ((high.kw - low.kw) * (rpm - low.rpm)) / (high.rpm - low.rpm)), { rel: 2e-12 })
      expectClose(kw, 81 * (rpm / 2780) ** 3 * densityRatio, { rel: 2e-12 })
      expectClose(at({ fraction: () => fraction, densityRatio }).rpm, rpm, { rel: 1e-12 })
    }))
  })

  it('follows a fraction that varies with speed', () => {
    // 64 kW · (n/2000) against 64 kW · (n/2000)³ · 1/4: n = 4000.
    const point = at({ powerCurve: flat(64, 500, 5000), fraction: (rpm) => rpm / 2000, load: { rpm: 2000, kw: 16, densityRatio: 1 } })
    expectClose(point.rpm, 4000, { rel: 1e-12 })
  })

  it('a fraction that jumps: the load turns at the jump itself', () => {
    const point = at({ powerCurve: flat(100), fraction: (rpm) => (rpm < 1777 ? 1 : 0.01), load: { rpm: 3000, kw: 100, densityRatio: 1 } })
    expect(point.rpm).toBe(1777)
  })

  it('takes the highest of several crossings', () => {
    // The load passes the engine at about 1260 rpm, falls behind where the power rises again, and passes for good near its end.
    const powerCurve = [{ rpm: 1000, kw: 9 }, { rpm: 1300, kw: 8 }, { rpm: 1600, kw: 60 }, { rpm: 2600, kw: 62 }]
    const { rpm } = at({ powerCurve, load: { rpm: 1000, kw: 4, densityRatio: 1 } })
    // 4·n³ = 60 + 2(n − 1.6), n in thousands.
    expectClose(rpm, 2490.3729198466945, { rel: 1e-12 })
    const upper = at({ powerCurve: powerCurve.slice(0, 2), load: { rpm: 1000, kw: 4, densityRatio: 1 } })
    expectClose(upper.rpm, 1262, { abs: 5 })
    // Beyond the last crossing the engine may win again: the crossing below still is where the load turned.
    const wins = [...powerCurve, { rpm: 2700, kw: 500 }]
    expectClose(at({ powerCurve: wins, load: { rpm: 1000, kw: 4, densityRatio: 1 } }).rpm, rpm, { abs: 1e-9 })
  })

  it('a piece that dips below the load only in its middle is found', () => {
    // Load n³/1e9·8: 8 at 1000, 64 at 2000; the straight line 8.5 … 63 lies above it between.
    const point = at({ powerCurve: [{ rpm: 1000, kw: 7.9 }, { rpm: 2000, kw: 63 }], load: { rpm: 1000, kw: 8, densityRatio: 1 } })
    expect(point.rpm).toBeGreaterThan(1900)
    expectClose(point.kw, 8 * (point.rpm / 1000) ** 3, { rel: 2e-12 })
  })

  it('ends of the curve count', () => {
    const last = at({ powerCurve: flat(81, 1000, 2780) })
    expect(last).toEqual({ rpm: 2780, kw: 81 })
    // Stated at other conditions, the load at the end differs from the power in its last digit only.
    for (let i = 1; i <= 200; i += 1) {
      const [fraction, densityRatio] = [0.3 + i / 300, 0.5 + i / 500]
      const stated = { rpm: 2780, kw: 81 * fraction * 0.9 / densityRatio, densityRatio: 0.9 }
      expectClose(at({ powerCurve: flat(81, 1000, 2780), fraction, load: stated, densityRatio }).rpm, 2780, { rel: 1e-12 })
    }
    const first = at({ powerCurve: flat(81, 2780, 3000) })
    expect(first).toEqual({ rpm: 2780, kw: 81 })
    expect(at({ powerCurve: flat(81, 2780, 3000), fraction: () => 1 })).toEqual(first)
  })

  it('says which way engine and load miss each other', () => {
    expect(expectCalcError(() => at({ load: { ...load, kw: 900 } }), 'load').message).toContain('takes more')
    expect(expectCalcError(() => at({ load: { ...load, kw: 20 } }), 'load').message).toContain('makes more')
    expectCalcError(() => at({ fraction: 0 }), 'load')
    expectCalcError(() => at({ fraction: () => -0.2 }), 'load')
    // A stopped engine, where load and power both vanish, is no operating point.
    expectCalcError(() => at({ powerCurve: flat(0, 0, 3000) }), 'load')
    // The load starts on the engine's line and falls below it for good.
    expectCalcError(() => at({ powerCurve: [{ rpm: 2780, kw: 81 }, { rpm: 3000, kw: 200 }] }), 'load')
  })

  it('names the argument that cannot be used', () => {
    const of = (change: object) => () => fixedPitchOperatingPoint(deepFreeze({ ...base, ...change }) as never)
    for (const powerCurve of [undefined, null, [], [curve[0]], 'x']) expectCalcError(of({ powerCurve }), 'powerCurve')
    expectCalcError(of({ powerCurve: [curve[0], null] }), 'powerCurve.1')
    expectCalcError(of({ powerCurve: [curve[1], curve[0]] }), 'powerCurve.1.rpm')
    expectCalcError(of({ powerCurve: [curve[1], curve[1]] }), 'powerCurve.1.rpm')
    expectCalcError(of({ powerCurve: [{ rpm: -1, kw: 1 }, curve[1]] }), 'powerCurve.0.rpm')
    expectCalcError(of({ powerCurve: [curve[0], { rpm: 2000, kw: -1 }] }), 'powerCurve.1.kw')
    expectCalcError(of({ powerCurve: new Array(1_000_000_000) }), 'powerCurve.0')
    for (const fraction of [-0.1, Number.NaN, undefined, null, '1', {}]) expectCalcError(of({ fraction }), 'fraction')
    for (const value of [Number.NaN, Infinity, undefined, '1']) expectCalcError(of({ fraction: () => value }), 'fraction')
    expectCalcError(of({ fraction: 1e308 }), 'fraction')
    for (const bad of [0, -1, undefined, null, Number.NaN, '1']) {
      expectCalcError(of({ densityRatio: bad }), 'densityRatio')
      expectCalcError(of({ load: { ...load, rpm: bad } }), 'load.rpm')
      expectCalcError(of({ load: { ...load, kw: bad } }), 'load.kw')
      expectCalcError(of({ load: { ...load, densityRatio: bad } }), 'load.densityRatio')
    }
    expectCalcError(of({ load: 81 }), 'load')
    expectCalcError(of({ load: { rpm: 1e-200, kw: 81, densityRatio: 1 } }), 'load.rpm')
    expectCalcError(of({ load: { rpm: 1, kw: 1e300, densityRatio: 1e-300 } }), 'load.kw')
    expectCalcError(() => fixedPitchOperatingPoint(undefined as never), 'powerCurve')
  })
})
