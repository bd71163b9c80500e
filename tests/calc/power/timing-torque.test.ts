import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { curvatureFromPoint, timingTorqueRatio } from '@/lib/calc/live'
import { expectCalcError } from '@/tests/support/expect-calc-error'
import { expectClose } from '@/tests/support/expect-close'

describe('timingTorqueRatio', () => {
  it('agrees with a hand calculation', () => {
    expectClose(timingTorqueRatio({ mbtDeg: 31.5, curvaturePerDeg2: 3.2e-4 }, 19), 0.95, { rel: 1e-9 })
    expect(timingTorqueRatio({ mbtDeg: 31.5, curvaturePerDeg2: 3.2e-4 }, 31.5)).toBe(1)
  })

  it('does not fall below 0', () => {
    expect(timingTorqueRatio({ mbtDeg: 30, curvaturePerDeg2: 1e-3 }, -10)).toBe(0)
    expect(timingTorqueRatio({ mbtDeg: 30, curvaturePerDeg2: 1e300 }, 1e300)).toBe(0)
  })

  it('is the same on both sides of the best spark and never above 1', () => {
    fc.assert(fc.property(fc.integer({ min: -20, max: 60 }), fc.integer({ min: 0, max: 40 }), fc.double({ min: 0, max: 1e-3, noNaN: true }), (mbtDeg, off, curvaturePerDeg2) => {
      const early = timingTorqueRatio({ mbtDeg, curvaturePerDeg2 }, mbtDeg + off)
      expect(timingTorqueRatio({ mbtDeg, curvaturePerDeg2 }, mbtDeg - off)).toBe(early)
      expect(early).toBeLessThanOrEqual(1)
      expect(early).toBeGreaterThanOrEqual(0)
    }))
  })

  it('names the argument that cannot be used', () => {
    for (const mbtDeg of [Number.NaN, undefined, '30', null]) expectCalcError(() => timingTorqueRatio({ mbtDeg, curvaturePerDeg2: 1e-4 } as never, 20), 'mbtDeg')
    for (const curvaturePerDeg2 of [-1e-9, Number.NaN, undefined, Infinity]) expectCalcError(() => timingTorqueRatio({ mbtDeg: 30, curvaturePerDeg2 } as never, 20), 'curvaturePerDeg2')
    for (const sparkDeg of [Number.NaN, undefined, Infinity, '20']) expectCalcError(() => timingTorqueRatio({ mbtDeg: 30, curvaturePerDeg2: 1e-4 }, sparkDeg as number), 'sparkDeg')
    expectCalcError(() => timingTorqueRatio(5 as never, 20), 'mbtDeg')
    expectCalcError(() => timingTorqueRatio({ mbtDeg: 0, curvaturePerDeg2: 0 }, 1e200), 'sparkDeg')
  })
})

describe('curvatureFromPoint', () => {
  it('agrees with a hand calculation', () => {
    expectClose(curvatureFromPoint({ mbtDeg: 31.5, sparkDeg: 19, ratio: 0.95 }), 3.2e-4, { rel: 1e-9 })
    expect(curvatureFromPoint({ mbtDeg: 31.5, sparkDeg: 19, ratio: 1 })).toBe(0)
  })

  it('undoes timingTorqueRatio', () => {
    const off = fc.double({ min: 2, max: 25, noNaN: true })
    fc.assert(fc.property(fc.double({ min: 0, max: 50, noNaN: true }), off, fc.boolean(), fc.double({ min: 1e-5, max: 1e-3, noNaN: true }), (mbtDeg, distance, isEarly, curvaturePerDeg2) => {
      const sparkDeg = isEarly ? mbtDeg + distance : mbtDeg - distance
      const ratio = timingTorqueRatio({ mbtDeg, curvaturePerDeg2 }, sparkDeg)
      expectClose(curvatureFromPoint({ mbtDeg, sparkDeg, ratio }), curvaturePerDeg2, { rel: 1e-9 })
    }))
  })

  it('names the argument that cannot be used', () => {
    const point = { mbtDeg: 30, sparkDeg: 20, ratio: 0.97 }
    expect(expectCalcError(() => curvatureFromPoint({ ...point, sparkDeg: 30 }), 'sparkDeg').message).toContain('must differ')
    expectCalcError(() => curvatureFromPoint({ ...point, sparkDeg: 30 + 1e-200 }), 'sparkDeg')
    expectCalcError(() => curvatureFromPoint({ ...point, mbtDeg: 0, sparkDeg: 1e-170 }), 'sparkDeg')
    for (const ratio of [-0.1, 1.01, Number.NaN, undefined]) expectCalcError(() => curvatureFromPoint({ ...point, ratio } as never), 'ratio')
    expectCalcError(() => curvatureFromPoint({ ...point, mbtDeg: null } as never), 'mbtDeg')
    expectCalcError(() => curvatureFromPoint(undefined as never), 'mbtDeg')
  })
})
