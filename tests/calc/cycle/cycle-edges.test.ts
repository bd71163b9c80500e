import { describe, expect, it } from 'vitest'
import { knockLimitedSpark, simulateCycle } from '@/lib/calc'
import { expectCalcError } from '@/tests/support/expect-calc-error'
import { expectClose } from '@/tests/support/expect-close'
import { sampleCycle } from './cycles'

const burn = { sparkDeg: 27, delayDeg: 9, durationDeg: 67, efficiency: 0.85 }
const figures = (changes: Parameters<typeof sampleCycle>[0]) => simulateCycle({ ...sampleCycle(changes), arrays: false })

describe('the ends of each range', () => {
  it('γ of 1.67, that of a gas of single atoms, is still one; beyond it is none', () => {
    expect(figures({ gamma: 1.67 }).workJ).toBeGreaterThan(0)
    expectCalcError(() => figures({ gamma: 1.6700001 }), 'gamma')
  })

  it('no residual gas, and valves from dead centre to dead centre', () => {
    const { charge, engine } = sampleCycle()
    const { heatReleasedJ } = figures({ charge: { ...charge, residualFraction: 0 } })
    expectClose(figures({}).heatReleasedJ, heatReleasedJ * (1 - charge.residualFraction), { rel: 1e-12 })
    const { thetaDeg } = simulateCycle(sampleCycle({ engine: { ...engine, ivcDeg: -180, evoDeg: 180 } }))
    expect([thetaDeg[0], thetaDeg[thetaDeg.length - 1]]).toEqual([-180, 180])
  })

  it('the head counts once where no factor is given', () => {
    expect(figures({ heatLoss: { wallK: 470 } })).toEqual(figures({ heatLoss: { wallK: 470, headAreaFactor: 1 } }))
    expect(figures({ heatLoss: { wallK: 470 } }).heatLossJ).toBeLessThan(figures({ heatLoss: { wallK: 470, headAreaFactor: 1.01 } }).heatLossJ)
  })

  it('half of the fuel is burned while the exhaust valve is shut, or not at all', () => {
    const { engine } = sampleCycle()
    const share = (Math.LN2 / 5) ** (1 / 3)
    const halfAt = (deg: number) => figures({ burn: { ...burn, sparkDeg: 9 - deg + 67 * share } }).ca50Deg
    expectClose(halfAt(engine.evoDeg - 1e-6), engine.evoDeg - 1e-6, { abs: 1e-9 })
    expect(halfAt(engine.evoDeg + 1e-6)).toBeNull()
  })

  it('a burn of 20 steps is fine, a shorter one coarse', () => {
    const codes = (durationDeg: number) => figures({ burn: { ...burn, durationDeg } }).notices.map(({ code }) => code)
    expect(codes(10)).not.toContain('burnCoarse')
    expect(codes(9.999)).toContain('burnCoarse')
  })

  it('the fit of γ ends at 3000 K', () => {
    const hot = figures({ charge: { pressureKpa: 112, temperatureK: 370, residualFraction: 0, airFuelRatio: 8 }, heatLoss: null, burn: { ...burn, efficiency: 1, durationDeg: 40 } })
    const [notice] = hot.notices
    expect(notice).toMatchObject({ code: 'gammaOutsideFit', value: hot.peakTemperatureK, source: 'gamma-fit' })
    // The same charge with so much less heat that its peak stays just below.
    const cooler = (efficiency: number) => figures({ charge: { pressureKpa: 112, temperatureK: 370, residualFraction: 0, airFuelRatio: 8 }, heatLoss: null, burn: { ...burn, efficiency, durationDeg: 40 } })
    let [low, high] = [0.1, 1]
    for (let i = 0; i < 30; i += 1) {
      const middle = (low + high) / 2
      if (cooler(middle).peakTemperatureK > 3000) high = middle
      else low = middle
    }
    expect(cooler(low).notices).toEqual([])
    expect(cooler(high).notices).toHaveLength(1)
  })
})

describe('the sparks searched', () => {
  const asked = (changes: Parameters<typeof sampleCycle>[0]) => figures(changes).knock?.octaneRequired ?? NaN

  it('begin at −20°: a fuel that just stands it is limited close to there, one that does not knocks always', () => {
    const octane = asked({ burn: { ...burn, sparkDeg: -20 } })
    const { state, limitDeg } = knockLimitedSpark(sampleCycle({ octane: octane + 0.01 }))
    expect(state).toBe('limited')
    expectClose(limitDeg ?? NaN, -20, { abs: 0.5 })
    expect(knockLimitedSpark(sampleCycle({ octane: octane - 0.01 })).state).toBe('always')
  })

  it('end at 60°', () => {
    const late = { ...burn, delayDeg: 18 }
    const at60 = asked({ burn: { ...late, sparkDeg: 60 } })
    expectClose(knockLimitedSpark(sampleCycle({ burn: late, octane: at60 - 0.001 })).limitDeg ?? NaN, 60, { abs: 0.02 })
    expect(knockLimitedSpark(sampleCycle({ burn: late, octane: at60 + 0.001 })).state).toBe('never')
  })

  it('end where burning would start before the inlet valve is shut', () => {
    const engine = { ...sampleCycle().engine, ivcDeg: -35 }
    const prompt = { ...burn, delayDeg: 0 }
    const last = asked({ engine, burn: { ...prompt, sparkDeg: 35 } })
    expect(knockLimitedSpark(sampleCycle({ engine, burn: prompt, octane: last + 0.01 })).state).toBe('never')
    expectClose(knockLimitedSpark(sampleCycle({ engine, burn: prompt, octane: last - 0.01 })).limitDeg ?? NaN, 35, { abs: 0.1 })
  })
})
