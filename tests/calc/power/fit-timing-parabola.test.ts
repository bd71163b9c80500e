import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { fitTimingParabola, timingTorqueRatio, type TorquePoint } from '@/lib/calc/live'
import { deepFreeze } from '@/tests/support/deep-freeze'
import { expectCalcError } from '@/tests/support/expect-calc-error'
import { expectClose } from '@/tests/support/expect-close'

const onParabola = (mbtDeg: number, curvaturePerDeg2: number, best: number, sparks: readonly number[]): TorquePoint[] =>
  sparks.map((sparkDeg) => ({ sparkDeg, torque: best * (1 - curvaturePerDeg2 * (sparkDeg - mbtDeg) ** 2) }))

/** Torques off a parabola; evenly spaced, so that the normal equations can be solved by hand. */
const offParabola = [18, 21, 24, 27, 30].map((sparkDeg, i) => ({ sparkDeg, torque: [198, 200.4, 200.2, 200.6, 198.8][i] ?? 0 }))

describe('fitTimingParabola', () => {
  it('finds the parabola that exact readings lie on', () => {
    const fit = fitTimingParabola(onParabola(29.3, 2.7e-4, 187, [16, 20, 24.5, 28]))
    expectClose(fit.mbtDeg, 29.3, { rel: 1e-9 })
    expectClose(fit.curvaturePerDeg2, 2.7e-4, { rel: 1e-9 })
    expectClose(fit.torqueAtMbt, 187, { rel: 1e-9 })
    expectClose(fit.rSquared, 1, { rel: 1e-12 })
    expect(fit.extrapolated).toBe(true)
    for (const residual of fit.residuals) expectClose(residual, 0, { abs: 1e-10 })
    expectClose(fit.mbtSeDeg, 0, { abs: 1e-7 })
  })

  it('agrees with a hand calculation on readings that scatter', () => {
    const fit = fitTimingParabola(offParabola)
    // In v = (spark − 24)/3: Σv² 10, Σv⁴ 34, ΣT 998, ΣvT 1.8, Σv²T 1988.2 → c₂ = (5·1988.2 − 10·998)/(5·34 − 100) = −39/70.
    const c2 = -39 / 70
    const c1 = 0.18
    const c0 = 998 / 5 - 2 * c2
    expectClose(fit.mbtDeg, 24 - 3 * c1 / (2 * c2), { rel: 1e-9 })
    expectClose(fit.torqueAtMbt, c0 - c1 ** 2 / (4 * c2), { rel: 1e-9 })
    expectClose(fit.curvaturePerDeg2, -c2 / 9 / (c0 - c1 ** 2 / (4 * c2)), { rel: 1e-9 })
    const residuals = offParabola.map(({ torque }, i) => torque - (c0 + c1 * (i - 2) + c2 * (i - 2) ** 2))
    fit.residuals.forEach((residual, i) => expectClose(residual, residuals[i], { abs: 1e-10 }))
    const sse = residuals.reduce((sum, value) => sum + value ** 2, 0)
    const sst = offParabola.reduce((sum, { torque }) => sum + (torque - 199.6) ** 2, 0)
    expectClose(fit.rSquared, 1 - sse / sst, { rel: 1e-9 })
    // Covariance of c₁ and c₂ here: s²/10 and s²/14, uncorrelated; the vertex is −c₁/(2c₂).
    const se = 3 * Math.sqrt((sse / 2) * (1 / (4 * c2 ** 2 * 10) + c1 ** 2 / (4 * c2 ** 4 * 14)))
    expectClose(fit.mbtSeDeg, se, { rel: 1e-9 })
    expect(fit.extrapolated).toBe(false)
  })

  it('three points leave nothing to judge the spark by', () => {
    const fit = fitTimingParabola(onParabola(30, 3e-4, 200, [20, 30, 40]))
    expect(fit.mbtSeDeg).toBeNull()
    expect(fit.extrapolated).toBe(false)
    expect(fitTimingParabola(onParabola(30, 3e-4, 200, [20, 30, 40, 40])).mbtSeDeg).not.toBeNull()
  })

  it('an order of readings is only an order: residuals follow it', () => {
    const back = fitTimingParabola([...offParabola].reverse())
    const there = fitTimingParabola(offParabola)
    expectClose(back.mbtDeg, there.mbtDeg, { rel: 1e-12 })
    back.residuals.reverse().forEach((residual, i) => expectClose(residual, there.residuals[i], { abs: 1e-10 }))
  })

  it('undoes timingTorqueRatio, moves with the angles and scales with the torque', () => {
    const mbt = fc.double({ min: 10, max: 45, noNaN: true })
    const curvature = fc.double({ min: 1e-4, max: 8e-4, noNaN: true })
    fc.assert(fc.property(mbt, curvature, fc.double({ min: 1e-3, max: 1e6, noNaN: true }), fc.integer({ min: -40, max: 40 }), (mbtDeg, curvaturePerDeg2, best, shift) => {
      const sparks = [12, 15, 19, 22, 26, 31]
      const points = sparks.map((sparkDeg) => ({ sparkDeg: sparkDeg + shift, torque: best * timingTorqueRatio({ mbtDeg, curvaturePerDeg2 }, sparkDeg) }))
      const fit = fitTimingParabola(points)
      expectClose(fit.mbtDeg - shift, mbtDeg, { rel: 1e-8 })
      expectClose(fit.curvaturePerDeg2, curvaturePerDeg2, { rel: 1e-8 })
      expectClose(fit.torqueAtMbt, best, { rel: 1e-9 })
      expect(fit.extrapolated).toBe(fit.mbtDeg < 12 + shift || fit.mbtDeg > 31 + shift)
    }))
  })

  it('is the least of squares: no neighbouring parabola does better', () => {
    const fit = fitTimingParabola(offParabola)
    const squares = (dm: number, dc: number, dt: number) => offParabola.reduce((sum, { sparkDeg, torque }) => {
      const model = (fit.torqueAtMbt + dt) * (1 - (fit.curvaturePerDeg2 + dc) * (sparkDeg - fit.mbtDeg - dm) ** 2)
      return sum + (torque - model) ** 2
    }, 0)
    for (const [dm, dc, dt] of [[0.01, 0, 0], [-0.01, 0, 0], [0, 1e-6, 0], [0, -1e-6, 0], [0, 0, 0.01], [0, 0, -0.01]] as const) expect(squares(dm, dc, dt)).toBeGreaterThan(squares(0, 0, 0))
  })

  it('works in any unit of torque, tiny or huge, and leaves its readings alone', () => {
    for (const unit of [1e-200, 1, 1e200]) expectClose(fitTimingParabola(deepFreeze(onParabola(30, 3e-4, unit, [20, 25, 30, 40]))).mbtDeg, 30, { rel: 1e-9 })
  })

  it('refuses readings that make no parabola with a top', () => {
    const of = (points: unknown) => () => fitTimingParabola(points as never)
    for (const bad of [undefined, null, [], 'x', {}, offParabola.slice(0, 2)]) expectCalcError(of(bad), 'points')
    expect(expectCalcError(of([20, 30, 30, 20].map((sparkDeg) => ({ sparkDeg, torque: sparkDeg }))), 'points').message).toContain('three different')
    expectCalcError(of([{ sparkDeg: 20, torque: 1 }, null, { sparkDeg: 30, torque: 1 }]), 'points.1')
    expectCalcError(of([{ sparkDeg: 20, torque: 1 }, { sparkDeg: 25, torque: '1' }, { sparkDeg: 30, torque: 1 }]), 'points.1.torque')
    expectCalcError(of([{ sparkDeg: 20, torque: 1 }, { sparkDeg: 25, torque: 1 }, { torque: 1 }]), 'points.2.sparkDeg')
    const through = (...torques: number[]) => of(torques.map((torque, i) => ({ sparkDeg: 20 + 5 * i, torque })))
    expect(expectCalcError(through(10, 9, 10), 'points').message).toContain('no top')
    expect(expectCalcError(through(10, 20, 30), 'points').message).toContain('no top')
    expect(expectCalcError(through(7, 7, 7), 'points').message).toContain('no top')
    expect(expectCalcError(through(0, 0, 0), 'points').message).toContain('no top')
    expect(expectCalcError(through(-12, -10, -12), 'points').message).toContain('above 0')
    expectCalcError(of([{ sparkDeg: 1e308, torque: 1 }, { sparkDeg: 1.2e308, torque: 2 }, { sparkDeg: 1.4e308, torque: 1 }]), 'points')
    expectCalcError(of([{ sparkDeg: 0, torque: 1 }, { sparkDeg: 1e-320, torque: 2 }, { sparkDeg: 2e-320, torque: 1 }]), 'points')
    // Just above and just below the bound on how flat a top may be, the torque's own rounding aside.
    expectCalcError(through(1 - 1e-11, 1, 1 - 1e-11), 'points')
    expectClose(fitTimingParabola([20, 25, 30].map((sparkDeg) => ({ sparkDeg, torque: sparkDeg === 25 ? 1 : 1 - 1e-8 }))).mbtDeg, 25, { rel: 1e-9 })
  })
})
