import fc from 'fast-check'
import jstat from 'jstat'
import { describe, expect, it } from 'vitest'
import { normalQuantile, studentTQuantile } from '@/lib/calc/live'
import { someCases } from '@/tests/support/cases'
import { expectCalcError } from '@/tests/support/expect-calc-error'
import { expectClose } from '@/tests/support/expect-close'

const { jStat } = jstat
const probability = fc.double({ min: 1e-6, max: 1 - 1e-6, noNaN: true })

describe('normalQuantile', () => {
  /** Computed with forty digits from the error function. */
  const digits = [
    [1e-300, -37.047096299361199], [1e-20, -9.2623400897984076], [1e-5, -4.2648907939228246], [0.02, -2.053748910631823],
    [0.1, -1.2815515655446004], [0.3, -0.52440051270804082], [0.49, -0.025068908258711058],
  ] as const

  it('agrees with forty digits from the centre to the farthest tail', () => {
    for (const [share, z] of someCases(digits)) expectClose(normalQuantile(share), z, { rel: 1e-14 })
    expect(normalQuantile(0.5)).toBe(0)
  })

  it('agrees with a library', () => {
    fc.assert(fc.property(probability, (share) => expectClose(jStat.normal.cdf(normalQuantile(share), 0, 1), share, { rel: 1e-8 })))
  })

  it('is odd about the middle', () => {
    for (const share of [0.001, 0.2, 0.37, 0.499]) expectClose(normalQuantile(1 - share), -normalQuantile(share), { rel: 1e-12 })
  })

  it('names what is no probability', () => {
    for (const bad of [0, 1, -0.1, 1.1, Number.NaN, '0.5', undefined, null]) expectCalcError(() => normalQuantile(bad as never), 'probability')
  })
})

describe('studentTQuantile', () => {
  /** Upper tail, degrees of freedom, value computed with forty digits from the incomplete beta function or by quadrature. */
  const digits = [
    [0.025, 0.3, 6582.0356994007758], [0.005, 0.5, 4113.964588804181], [0.1, 1.5, 2.1963984175655373], [0.3, 2, 0.61721339984836768], [0.025, 3, 3.1824463052837095],
    [1e-10, 3, 2225.7692846830932], [0.4, 4.5, 0.26875183554217514], [0.005, 16.74, 2.9038060503562502], [0.025, 30, 2.0422724563012383], [1e-20, 30, 22.658878371940183],
    [0.05, 100, 1.6602343260853395], [0.49, 100, 0.025131697537714597], [0.005, 999.5, 2.5807571664291536], [1e-300, 4.5, 6.7094554006634833e66], [5e-17, 10, 109.38147004787309],
    [0.025, 19_999, 1.9600826110898155], [0.025, 20_000, 1.9600826051581352], [0.005, 1e6, 2.5758342201053341], [0.025, 1e9, 1.9599639869123254],
  ] as const

  it('agrees with forty digits, from a third of a degree of freedom to a thousand million', () => {
    for (const [tail, dof, t] of someCases(digits)) expectClose(studentTQuantile(tail, dof), -t, { rel: 1e-12 })
  })

  it('has the closed forms of one, two and four degrees of freedom', () => {
    fc.assert(fc.property(probability, (share) => {
      const spread = 4 * share * (1 - share)
      expectClose(studentTQuantile(share, 1), Math.tan(Math.PI * (share - 0.5)), { rel: 1e-9, abs: 1e-15 })
      expectClose(studentTQuantile(share, 2), (2 * (2 * share - 1)) / Math.sqrt(2 * spread), { rel: 1e-12, abs: 1e-15 })
      const root = Math.cos(Math.acos(Math.sqrt(spread)) / 3) / Math.sqrt(spread)
      expectClose(studentTQuantile(share, 4), Math.sign(share - 0.5) * 2 * Math.sqrt(Math.max(0, root - 1)), { rel: 1e-8, abs: 1e-7 })
    }))
  })

  it('agrees with a library, as far as that is exact', () => {
    fc.assert(fc.property(fc.double({ min: 0.001, max: 0.999, noNaN: true }), fc.double({ min: 1, max: 300, noNaN: true }), (share, dof) => {
      expectClose(jStat.studentt.cdf(studentTQuantile(share, dof), dof), share, { abs: 1e-6 })
    }))
  })

  it('rises with the probability, is odd about the middle and ends in the normal value', () => {
    fc.assert(fc.property(fc.double({ min: 0.01, max: 0.49, noNaN: true }), fc.double({ min: 0.2, max: 1e6, noNaN: true }), (share, dof) => {
      expect(studentTQuantile(share + 0.005, dof)).toBeGreaterThan(studentTQuantile(share, dof))
      expectClose(studentTQuantile(1 - share, dof), -studentTQuantile(share, dof), { rel: 1e-10 })
    }))
    for (const dof of [1e12, 1e15, 1e17, 1e18, 1e200]) expectClose(studentTQuantile(0.975, dof), normalQuantile(0.975), { rel: 1e-11 })
    expect(studentTQuantile(0.5, 7)).toBe(0)
    for (const share of [0.5 + 2 ** -30, 0.5 - 2 ** -40]) expectClose(studentTQuantile(share, 1), Math.tan(Math.PI * (share - 0.5)), { rel: 1e-13 })
  })

  it('does not jump where one method hands over to the other', () => {
    for (const share of [1e-300, 1e-12, 0.001, 0.05, 0.3, 0.49]) expectClose(studentTQuantile(share, 100_000), studentTQuantile(share, 100_000 - 1e-6), { rel: 1e-12 })
  })

  it('names what cannot be used, and a value too large for a number', () => {
    for (const bad of [0, 1, -1, Number.NaN, '0.5', undefined]) expectCalcError(() => studentTQuantile(bad as never, 5), 'probability')
    for (const bad of [0, 0.0009, -1, Infinity, Number.NaN, '5', undefined, null]) expectCalcError(() => studentTQuantile(0.9, bad as never), 'dof')
    expectCalcError(() => studentTQuantile(0.975, 0.001), 'dof')
    expect(Number.isFinite(studentTQuantile(0.975, 0.01))).toBe(true)
  })
})
