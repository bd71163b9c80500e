import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { brakeRatioFromIndicated } from '@/lib/calc/live'
import { expectCalcError } from '@/tests/support/expect-calc-error'
import { expectClose } from '@/tests/support/expect-close'

describe('brakeRatioFromIndicated', () => {
  it('agrees with a hand calculation', () => {
    expectClose(brakeRatioFromIndicated({ indicatedRatio: 0.92, imepKpa: 640, fmepKpa: 160 }), 428.8 / 480, { rel: 1e-9 })
  })

  it('is undone by r = (brake · (imep − fmep) + fmep)/imep', () => {
    fc.assert(fc.property(fc.double({ min: 0, max: 1.2, noNaN: true }), fc.double({ min: 100, max: 1500, noNaN: true }), fc.double({ min: 0, max: 0.9, noNaN: true }), (indicatedRatio, imepKpa, share) => {
      const fmepKpa = imepKpa * share
      const brake = brakeRatioFromIndicated({ indicatedRatio, imepKpa, fmepKpa })
      expectClose((brake * (imepKpa - fmepKpa) + fmepKpa) / imepKpa, indicatedRatio, { rel: 1e-9, abs: 1e-12 })
    }))
  })

  it('nothing lost stays nothing lost; without friction both ratios are one; more friction loses more', () => {
    expect(brakeRatioFromIndicated({ indicatedRatio: 1, imepKpa: 640, fmepKpa: 160 })).toBe(1)
    expectClose(brakeRatioFromIndicated({ indicatedRatio: 0.7, imepKpa: 640, fmepKpa: 0 }), 0.7, { rel: 1e-12 })
    expect(brakeRatioFromIndicated({ indicatedRatio: 0.9, imepKpa: 300, fmepKpa: 150 })).toBeLessThan(brakeRatioFromIndicated({ indicatedRatio: 0.9, imepKpa: 900, fmepKpa: 150 }))
    expectClose(brakeRatioFromIndicated({ indicatedRatio: 0.1, imepKpa: 300, fmepKpa: 150 }), -0.8, { rel: 1e-12 })
  })

  it('names the argument that cannot be used', () => {
    const input = { indicatedRatio: 0.9, imepKpa: 500, fmepKpa: 150 }
    for (const indicatedRatio of [-0.1, Number.NaN, undefined, '1']) expectCalcError(() => brakeRatioFromIndicated({ ...input, indicatedRatio } as never), 'indicatedRatio')
    for (const imepKpa of [0, -5, null, Infinity]) expectCalcError(() => brakeRatioFromIndicated({ ...input, imepKpa } as never), 'imepKpa')
    for (const fmepKpa of [-1, 500, 600, undefined]) expectCalcError(() => brakeRatioFromIndicated({ ...input, fmepKpa } as never), 'fmepKpa')
    expectCalcError(() => brakeRatioFromIndicated([] as never), 'indicatedRatio')
    expectCalcError(() => brakeRatioFromIndicated({ indicatedRatio: 1e300, imepKpa: 1e300, fmepKpa: 1 }), 'indicatedRatio')
  })
})
