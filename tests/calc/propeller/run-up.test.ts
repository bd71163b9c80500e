import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { runUpDrop, torqueRatioFromDrop } from '@/lib/calc/live'
import { expectCalcError } from '@/tests/support/expect-calc-error'
import { expectClose } from '@/tests/support/expect-close'

describe('runUpDrop and torqueRatioFromDrop', () => {
  it('agree with a hand calculation', () => {
    const drop = runUpDrop({ rpm: 1750, torqueRatio: 0.81, torqueExponent: 0 })
    expectClose(drop.rpm, 1575, { rel: 1e-9 })
    expectClose(drop.dropRpm, 175, { rel: 1e-9 })
    expectClose(runUpDrop({ rpm: 1750, torqueRatio: 0.729, torqueExponent: -1 }).dropRpm, 175, { rel: 1e-9 })
    expectClose(torqueRatioFromDrop({ rpm: 1750, dropRpm: 175, torqueExponent: -0.5 }), 0.9 ** 2.5, { rel: 1e-9 })
  })

  it('no loss is no drop, a gain is a negative one', () => {
    expect(runUpDrop({ rpm: 1750, torqueRatio: 1, torqueExponent: -0.5 })).toEqual({ rpm: 1750, dropRpm: 0 })
    expect(runUpDrop({ rpm: 1750, torqueRatio: 1.02, torqueExponent: -0.5 }).dropRpm).toBeLessThan(0)
    expect(torqueRatioFromDrop({ rpm: 1750, dropRpm: 0, torqueExponent: 1 })).toBe(1)
  })

  it('undo each other; a drop of a millionth of an rpm keeps its digits', () => {
    fc.assert(fc.property(fc.double({ min: 500, max: 3000, noNaN: true }), fc.double({ min: -0.1, max: 0.5, noNaN: true }), fc.double({ min: -1, max: 1.5, noNaN: true }), (rpm, loss, torqueExponent) => {
      const { dropRpm, rpm: after } = runUpDrop({ rpm, torqueRatio: 1 - loss, torqueExponent })
      expectClose(after, rpm - dropRpm, { rel: 1e-12 })
      expectClose(torqueRatioFromDrop({ rpm, dropRpm, torqueExponent }), 1 - loss, { rel: 1e-9 })
    }))
    // 1800·(1 − (1 − 2⁻³⁰)^0.4) to 50 digits: a difference of two near speeds would keep six of them.
    expectClose(runUpDrop({ rpm: 1800, torqueRatio: 1 - 2 ** -30, torqueExponent: -0.5 }).dropRpm, 6.7055225391049466674855e-7, { rel: 1e-12 })
  })

  it('engine and propeller balance at the new speed', () => {
    fc.assert(fc.property(fc.double({ min: 0.5, max: 1.1, noNaN: true }), fc.double({ min: -1, max: 1, noNaN: true }), (torqueRatio, torqueExponent) => {
      const { rpm } = runUpDrop({ rpm: 1800, torqueRatio, torqueExponent })
      const speed = rpm / 1800
      expectClose(torqueRatio * speed ** torqueExponent, speed ** 2, { rel: 1e-9 })
    }))
  })

  it('name the argument that cannot be used', () => {
    const drop = { rpm: 1800, torqueRatio: 0.9, torqueExponent: -0.5 }
    const ratio = { rpm: 1800, dropRpm: 50, torqueExponent: -0.5 }
    for (const bad of [0, -1, Number.NaN, undefined, '5']) {
      expectCalcError(() => runUpDrop({ ...drop, rpm: bad } as never), 'rpm')
      expectCalcError(() => runUpDrop({ ...drop, torqueRatio: bad } as never), 'torqueRatio')
      expectCalcError(() => torqueRatioFromDrop({ ...ratio, rpm: bad } as never), 'rpm')
    }
    for (const bad of [2, 3, Infinity, undefined, null]) {
      expectCalcError(() => runUpDrop({ ...drop, torqueExponent: bad } as never), 'torqueExponent')
      expectCalcError(() => torqueRatioFromDrop({ ...ratio, torqueExponent: bad } as never), 'torqueExponent')
    }
    for (const dropRpm of [1800, 2000, Number.NaN, undefined]) expectCalcError(() => torqueRatioFromDrop({ ...ratio, dropRpm } as never), 'dropRpm')
    expectCalcError(() => runUpDrop({ rpm: 1800, torqueRatio: 2, torqueExponent: 2 - 1e-10 }), 'torqueRatio')
    expectCalcError(() => torqueRatioFromDrop({ rpm: 1, dropRpm: -1e300, torqueExponent: -9 }), 'dropRpm')
    expectCalcError(() => runUpDrop(null as never), 'rpm')
    expectCalcError(() => torqueRatioFromDrop(7 as never), 'rpm')
  })
})
