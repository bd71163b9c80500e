import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { constantSpeedOperatingPoint, fixedPitchOperatingPoint, type ConstantSpeedInput } from '@/lib/calc/live'
import { deepFreeze } from '@/tests/support/deep-freeze'
import { expectCalcError } from '@/tests/support/expect-calc-error'
import { expectClose } from '@/tests/support/expect-close'

const powerCurve = [{ rpm: 1000, kw: 32 }, { rpm: 2500, kw: 80 }, { rpm: 3200, kw: 88 }]
const lowPitchLoad = { rpm: 2500, kw: 50, densityRatio: 1 }
const highPitchLoad = { rpm: 2500, kw: 78, densityRatio: 1 }
const base: ConstantSpeedInput = { powerCurve, fraction: 0.9, densityRatio: 1, governedRpm: 2500, lowPitchLoad, highPitchLoad }
const at = (change: Partial<ConstantSpeedInput>) => constantSpeedOperatingPoint({ ...base, ...change })

describe('constantSpeedOperatingPoint', () => {
  it('holds the governed speed between the two loads, ends included', () => {
    expect(at({})).toEqual({ rpm: 2500, kw: 72, governed: true })
    expect(at({ fraction: 50 / 80 }).governed).toBe(true)
    expect(at({ fraction: 78 / 80 }).governed).toBe(true)
    expect(at({ lowPitchLoad: { ...lowPitchLoad, kw: 72 }, highPitchLoad: { ...highPitchLoad, kw: 72 } }).governed).toBe(true)
  })

  it('falls onto the low-pitch line with too little power', () => {
    const fallen = at({ fraction: 0.5 })
    expect(fallen.governed).toBe(false)
    expect(fallen.rpm).toBeLessThan(2500)
    const fixed = fixedPitchOperatingPoint({ powerCurve, fraction: 0.5, load: lowPitchLoad, densityRatio: 1 })
    expectClose(fallen.rpm, fixed.rpm, { rel: 1e-12 })
    expectClose(fallen.kw, fixed.kw, { rel: 1e-12 })
  })

  it('the search ends at the governed speed: what the curve does beyond does not matter', () => {
    // Beyond 2500 rpm this engine would meet the low-pitch line a second time.
    const wild = [{ rpm: 1000, kw: 32 }, { rpm: 2500, kw: 80 }, { rpm: 2600, kw: 900 }, { rpm: 3200, kw: 10 }]
    expectClose(at({ powerCurve: wild, fraction: 0.5 }).rpm, at({ fraction: 0.5 }).rpm, { rel: 1e-12 })
  })

  it('overspeeds on the high-pitch line with too much power, never without such a line', () => {
    const over = at({ fraction: 1 })
    expect(over.governed).toBe(false)
    expect(over.rpm).toBeGreaterThan(2500)
    expectClose(over.kw, 78 * (over.rpm / 2500) ** 3, { rel: 1e-13 })
    const { highPitchLoad: _stop, ...free } = base
    expect(constantSpeedOperatingPoint({ ...free, fraction: 5 })).toEqual({ rpm: 2500, kw: 400, governed: true })
  })

  it('is continuous where the governor lets go', () => {
    fc.assert(fc.property(fc.double({ min: 1e-9, max: 1e-6, noNaN: true }), (share) => {
      expectClose(at({ fraction: (50 / 80) * (1 - share) }).rpm, 2500, { rel: 1e-5 })
      expectClose(at({ fraction: (78 / 80) * (1 + share) }).rpm, 2500, { rel: 1e-5 })
    }))
  })

  it('less air unloads both lines; a fraction may follow the speed', () => {
    expect(at({ densityRatio: 0.8 }).governed).toBe(false)
    expect(at({ densityRatio: 0.8, fraction: 0.9 * 0.8 }).governed).toBe(true)
    expect(at({ fraction: (rpm) => rpm / 2500 * 0.9 })).toEqual({ rpm: 2500, kw: 72, governed: true })
  })

  it('says when a line is never met', () => {
    expect(expectCalcError(() => at({ fraction: 0 }), 'lowPitchLoad').message).toContain('takes more')
    expect(expectCalcError(() => at({ fraction: 4 }), 'highPitchLoad').message).toContain('makes more')
    expectCalcError(() => at({ governedRpm: 3200, fraction: 4 }), 'highPitchLoad')
    expectCalcError(() => at({ governedRpm: 1000, fraction: 0.01 }), 'lowPitchLoad')
  })

  it('names the argument that cannot be used', () => {
    const of = (change: object) => () => constantSpeedOperatingPoint(deepFreeze({ ...base, ...change }) as never)
    for (const governedRpm of [0, -1, undefined, '2500', 999, 3201]) expectCalcError(of({ governedRpm }), 'governedRpm')
    expectCalcError(of({ powerCurve: [] }), 'powerCurve')
    expectCalcError(of({ fraction: -1 }), 'fraction')
    expectCalcError(of({ densityRatio: 0 }), 'densityRatio')
    for (const bad of [undefined, null, 5]) expectCalcError(of({ lowPitchLoad: bad }), 'lowPitchLoad')
    for (const bad of [null, 5, []]) expectCalcError(of({ highPitchLoad: bad }), 'highPitchLoad')
    expectCalcError(of({ lowPitchLoad: { ...lowPitchLoad, kw: 0 } }), 'lowPitchLoad.kw')
    expectCalcError(of({ highPitchLoad: { ...highPitchLoad, densityRatio: -1 } }), 'highPitchLoad.densityRatio')
    expectCalcError(of({ highPitchLoad: { ...highPitchLoad, kw: 49 } }), 'highPitchLoad')
    expectCalcError(() => constantSpeedOperatingPoint('x' as never), 'powerCurve')
  })
})
